import type { Observations } from '../observations/observation.ts';
import type { Candidate } from '../plan/plan.ts';
import type { Fit, FitOptions } from '../regression/fit.ts';
import { factorFit } from './judge.ts';
import { compare } from './ratio.ts';
import type { AuditResult, AuditRow } from './verdict.ts';

/** A published correlation that the trials leave standing, with its rig factor as a fit of its own. */
export interface Accepted {
  readonly candidate: Candidate;
  readonly label: string;
  readonly asPublished: boolean;
  /** measured/predicted = factor, with its variances and systematic shifts. */
  readonly factor: Fit;
}

/** Correlations with the verdict `fits as published` or `fits with a rig factor`, in the audit's order. */
export function acceptedCorrelations(
  { rows }: AuditResult,
  candidates: readonly Candidate[],
  observations: Observations,
  options: FitOptions,
): readonly Accepted[] {
  return rows.flatMap((row) => {
    const candidate = candidates.find((one) => one.correlation.id === row.id && one.basis === row.basis);
    if (candidate === undefined || !(row.verdict === 'fits as published' || row.verdict === 'fits with a rig factor')) return [];
    const comparison = compare(candidate.correlation, candidate.basis, candidate.keys, observations);
    const trials = comparison.inside.flatMap((inside, i) => (inside ? [i] : []));
    return [
      {
        candidate,
        label: labelOf(row, rows),
        asPublished: row.verdict === 'fits as published',
        factor: factorFit(comparison, observations, trials, options),
      },
    ];
  });
}

/** Authors and year; what the identifier adds where one publication gives more than one line. */
function labelOf({ authors, year, id }: AuditRow, rows: readonly AuditRow[]): string {
  const same = rows.filter((other) => other.authors === authors && other.year === year);
  const variant = /-\d{4}-(.+)$/u.exec(id)?.[1]?.replaceAll('-', ' ') ?? id;
  return same.length > 1 ? `${authors} ${year}, ${variant}` : `${authors} ${year}`;
}
