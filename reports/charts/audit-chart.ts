import type { AuditRow } from '../../pipeline/audit/verdict.ts';
import type { StudyResult } from '../../pipeline/results/study-result.ts';
import { axisOver } from './axis.ts';
import { intervalRows } from './interval-rows.ts';
import { correlationLabels } from './labels.ts';
import { inParts } from './named-rows.ts';
import type { Spec } from './palette.ts';

/** Correlations that could be held against the trials, in the order of the table. */
export const compared = (result: StudyResult): readonly AuditRow[] =>
  (result.audit?.rows ?? []).filter(
    (row) => row.verdict !== 'not comparable' && [row.rigFactor, row.bias].some((v) => Number.isFinite(v) && v > 0),
  );

/** Measured over predicted of each correlation with the interval of its rig factor, against the tolerance; no trial in range is drawn hollow. */
export function auditCharts(result: StudyResult): readonly Spec[] {
  const rows = compared(result);
  const tolerance = result.audit?.tolerance ?? Number.NaN;
  const labels = correlationLabels(result.audit?.rows ?? []);
  const band: readonly [number, number] | undefined = tolerance > 0 ? [1 / (1 + tolerance), 1 + tolerance] : undefined;
  const near = (value: number): boolean => value > 1 / 30 && value < 30;
  const axis = axisOver(
    [...(band ?? []), 1, ...rows.flatMap((row) => [row.rigFactorLower, row.rigFactorUpper, row.rigFactor, row.bias].filter(near))],
    'measured over predicted, with the interval of the rig factor',
    true,
    0.05,
  );
  return inParts(rows).map((part) =>
    intervalRows({
      axis,
      lines: [1],
      names: 200,
      ...(band === undefined ? {} : { band }),
      marks: part.map((row) => ({
        name: labels.get(row.id)!,
        value: Number.isFinite(row.rigFactor) ? row.rigFactor : row.bias,
        lower: row.rigFactorLower,
        upper: row.rigFactorUpper,
        hollow: row.nInRange === 0,
        main: row.verdict === 'fits as published' || row.verdict === 'fits with a rig factor',
        remark: row.verdict,
      })),
    }),
  );
}
