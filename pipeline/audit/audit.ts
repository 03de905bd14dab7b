import { formText } from '../algebra/print.ts';
import type { Note } from '../base/message.ts';
import * as says from '../base/says/audit.ts';
import type { Staged } from '../base/staged.ts';
import type { Observations } from '../observations/observation.ts';
import type { Candidate } from '../plan/plan.ts';
import { foldsOf } from '../regression/cross-validate.ts';
import type { FitOptions } from '../regression/fit.ts';
import { bestOfMany, foldErrors, rms } from './equal-footing.ts';
import { judge, leastTrials } from './judge.ts';
import { type Comparison, compare } from './ratio.ts';
import type { AuditResult, AuditRow, VerdictWord } from './verdict.ts';

export interface AuditSpec {
  readonly tolerance: number;
  readonly options: FitOptions;
  /** Out-of-fold ln errors of the fitted law, by trial, and its name; NaN where it could not be refitted. */
  readonly lawErrors: readonly number[];
  readonly lawName: string;
  /** Inverse variance of ln response for each trial. */
  readonly weight: readonly number[];
}

const order: readonly VerdictWord[] = [
  'fits as published',
  'fits with a rig factor',
  'not decided by these trials',
  'wrong trend',
  'outside its range',
  'not comparable',
];

/** Every candidate against the same observations; best first. */
export function audit(candidates: readonly Candidate[], observations: Observations, spec: AuditSpec): Staged<AuditResult> {
  const { folds } = foldsOf(observations.campaign, observations.campaigns.length);
  const prepared = candidates.map((candidate) => ({
    candidate,
    comparison: candidate.lacks.length > 0 ? undefined : compare(candidate.correlation, candidate.basis, candidate.keys, observations),
  }));
  const rows = prepared.map(({ candidate, comparison }) =>
    comparison === undefined ? notComparable(candidate, observations) : auditRow(candidate, comparison, observations, folds, spec),
  );
  const ranked = [...rows].sort(
    (a, b) => order.indexOf(a.verdict) - order.indexOf(b.verdict) || rank(a) - rank(b) || (a.id < b.id ? -1 : 1),
  );
  const able = prepared.flatMap(({ comparison }) =>
    comparison !== undefined && comparison.inside.filter(Boolean).length >= leastTrials(comparison.correlation.form.groups.length)
      ? [comparison]
      : [],
  );
  const best = able.length > 1 ? bestOfMany(able, folds, spec.weight) : undefined;
  const notes: Note[] = [];
  if (best !== undefined && best.trials > 0) {
    const law = rms(spec.lawErrors.filter(Number.isFinite));
    notes.push({ section: 'audit', level: 'note', code: 'best-of-many', text: says.bestOfMany(able.length, best.rms, law, spec.lawName) });
  }
  if (rows.some((row) => row.basis === 'analogy'))
    notes.push({ section: 'audit', level: 'note', code: 'by-analogy', text: says.byAnalogy() });
  return { value: { tolerance: spec.tolerance, rows: ranked, notes, says: says.headline(ranked, spec) }, notes, refused: [] };
}

const rank = (row: AuditRow): number => (Number.isFinite(row.cvRmsLnWithFactor) ? row.cvRmsLnWithFactor : Number.POSITIVE_INFINITY);

function auditRow(
  candidate: Candidate,
  comparison: Comparison,
  observations: Observations,
  folds: readonly (readonly number[])[],
  spec: AuditSpec,
): AuditRow {
  const { correlation } = candidate;
  const trials = comparison.inside.flatMap((inside, i) => (inside ? [i] : []));
  const base = {
    ...blank(candidate, observations),
    nInRange: trials.length,
    predicted: Array.from(comparison.predicted),
    inside: comparison.inside,
    limits: limitCounts(comparison),
  };
  const needed = leastTrials(correlation.form.groups.length);
  const plain = { ...base, ...plainNumbers(comparison, trials) };
  if (trials.length < needed)
    return { ...plain, verdict: 'outside its range', why: says.outside(trials.length, observations.trials.length, needed, base.limits) };
  const judged = judge(comparison, observations, trials, spec.tolerance, spec.options);
  const errors = foldErrors(comparison, folds, spec.weight);
  return {
    ...plain,
    verdict: judged.verdict,
    why: says.why(judged, spec.tolerance),
    rigFactor: judged.rigFactor,
    rigFactorLower: judged.rigFactorLower,
    rigFactorUpper: judged.rigFactorUpper,
    trends: judged.trends,
    cvRmsLnAsPublished: rms(errors.asPublished),
    cvRmsLnWithFactor: rms(errors.withFactor),
    cvRmsLnFittedLaw: rms(errors.trials.map((i) => spec.lawErrors[i]!)),
  };
}

function limitCounts({ correlation, holds }: Comparison): AuditRow['limits'] {
  return correlation.limits.map((limit, k) => ({ says: limit.says, inside: holds[k]!.filter(Boolean).length }));
}

function plainNumbers(
  { lnRatio }: Comparison,
  trials: readonly number[],
): Pick<AuditRow, 'bias' | 'scatterLn' | 'rmsLn' | 'within20' | 'within30'> {
  const ln = trials.map((i) => lnRatio[i]!);
  const mean = ln.reduce((sum, v) => sum + v, 0) / ln.length;
  const within = (share: number): number => ln.filter((v) => Math.abs(Math.expm1(-v)) <= share).length / ln.length;
  const scatter = Math.sqrt(ln.reduce((sum, v) => sum + (v - mean) ** 2, 0) / (ln.length - 1));
  return { bias: Math.exp(mean), scatterLn: scatter, rmsLn: rms(ln), within20: within(0.2), within30: within(0.3) };
}

function notComparable(candidate: Candidate, observations: Observations): AuditRow {
  return { ...blank(candidate, observations), verdict: 'not comparable', why: says.lacks(candidate.lacks) };
}

function blank(candidate: Candidate, observations: Observations): AuditRow {
  const { correlation } = candidate;
  const nan = Number.NaN;
  return {
    id: correlation.id,
    title: correlation.title,
    authors: correlation.authors,
    year: correlation.year,
    text: formText(correlation.form, correlation.values),
    source: correlation.source,
    basis: candidate.basis,
    own: candidate.own,
    reads: correlation.reads,
    accuracy: correlation.accuracy,
    definitions: candidate.definitions,
    verdict: 'not comparable',
    why: '',
    lacks: candidate.lacks,
    n: observations.trials.length,
    nInRange: 0,
    limits: correlation.limits.map((limit) => ({ says: limit.says, inside: 0 })),
    bias: nan,
    scatterLn: nan,
    rmsLn: nan,
    within20: nan,
    within30: nan,
    rigFactor: nan,
    rigFactorLower: nan,
    rigFactorUpper: nan,
    cvRmsLnAsPublished: nan,
    cvRmsLnWithFactor: nan,
    cvRmsLnFittedLaw: nan,
    trends: [],
    predicted: [],
    inside: [],
  };
}
