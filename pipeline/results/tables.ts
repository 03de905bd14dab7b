import { type ColumnTable, table } from 'arquero';
import type { PlantResult } from '../scale-up/plant-result.ts';
import { guarded } from './guarded.ts';
import type { StudyResult, TrialRow } from './study-result.ts';

type Cell = string | number;
type Columns = Record<string, readonly Cell[]>;

/** A table by columns; a number that does not exist becomes an empty cell, a name is guarded against spreadsheet formulas. */
function columns(entries: Columns): ColumnTable {
  const clean = Object.entries(entries).map(
    ([name, values]) =>
      [guarded(name), values.map((value) => (typeof value === 'string' ? guarded(value) : Number.isNaN(value) ? null : value))] as const,
  );
  return table(clean as [string, (string | number | null)[]][]);
}

/** `trials.csv`: one row for each row read, in the file's order; readings of one trial repeat the trial's values. */
export function trialsTable(result: StudyResult): ColumnTable {
  const used = new Map(result.trials.map((trial, i) => [trial.trial, { trial, i }]));
  const rows = result.ledger.rows.map((row) => ({ row, found: row.status === 'used' ? used.get(row.trial) : undefined }));
  const number = (pick: (trial: TrialRow, i: number) => number): readonly number[] =>
    rows.map(({ found }) => (found === undefined ? Number.NaN : pick(found.trial, found.i)));
  const fit = result.fits.find((one) => one.name === result.chosen);
  const diagnostic = (pick: (d: NonNullable<typeof fit>['diagnostics']) => readonly number[]): readonly number[] =>
    number((_, i) => (fit === undefined ? Number.NaN : (pick(fit.diagnostics)[i] ?? Number.NaN)));
  return columns({
    trial: rows.map(({ row }) => row.trial),
    campaign: rows.map(({ row }) => row.campaign),
    line: rows.map(({ row }) => row.line),
    status: rows.map(({ row }) => row.status),
    reason: rows.map(({ row }) => row.reason),
    coefficient: number((trial) => trial.coefficient),
    ...Object.fromEntries(result.columns.map((column, k) => [column.name, number((trial) => trial.values[k]!)])),
    ...Object.fromEntries(result.columns.map((column, k) => [`u_ln_${column.name}`, number((trial) => trial.uLn[k]!)])),
    fitted: diagnostic((d) => d.fitted),
    residual: diagnostic((d) => d.residual),
    leverage: diagnostic((d) => d.leverage),
    influence: diagnostic((d) => d.cook),
  });
}

/** `audit.csv`: one row for each published correlation, best first; the trend shown is the one that amounts to most over the trials. */
export function auditTable(result: StudyResult): ColumnTable | undefined {
  const rows = result.audit?.rows;
  if (rows === undefined) return undefined;
  const trend = rows.map((row) => [...row.trends].sort((a, b) => b.span - a.span)[0]);
  return columns({
    correlation: rows.map((row) => row.id),
    source: rows.map((row) => row.source),
    basis: rows.map((row) => row.basis),
    n: rows.map((row) => row.n),
    n_in_range: rows.map((row) => row.nInRange),
    bias: rows.map((row) => row.bias),
    scatter_ln: rows.map((row) => row.scatterLn),
    rms_ln: rows.map((row) => row.rmsLn),
    within_20: rows.map((row) => row.within20),
    within_30: rows.map((row) => row.within30),
    rig_factor: rows.map((row) => row.rigFactor),
    rig_factor_lower: rows.map((row) => row.rigFactorLower),
    rig_factor_upper: rows.map((row) => row.rigFactorUpper),
    cv_rms_ln_as_published: rows.map((row) => row.cvRmsLnAsPublished),
    cv_rms_ln_with_factor: rows.map((row) => row.cvRmsLnWithFactor),
    cv_rms_ln_fitted_law: rows.map((row) => row.cvRmsLnFittedLaw),
    trend_group: trend.map((one) => one?.group ?? ''),
    trend_slope: trend.map((one) => one?.slope ?? Number.NaN),
    trend_lower: trend.map((one) => one?.lower ?? Number.NaN),
    trend_upper: trend.map((one) => one?.upper ?? Number.NaN),
    verdict: rows.map((row) => row.verdict),
    why: rows.map((row) => row.why),
  });
}

/** `plant.csv`: one row for each case and law; values of the case and its groups, coefficient in SI with law and prediction interval. */
export const plantTable = ({ plant }: StudyResult): ColumnTable | undefined => (plant === null ? undefined : casesTable(plant));

/** The same of plant cases that were predicted without a study. */
export function casesTable(plant: PlantResult): ColumnTable {
  const rows = plant.cases.flatMap((one) => one.predictions.map((prediction, k) => ({ one, prediction, first: k === 0 })));
  const keysOf = (pick: (row: (typeof rows)[number]) => Readonly<Record<string, number>>): readonly string[] => [
    ...new Set(rows.flatMap((row) => Object.keys(pick(row)))),
  ];
  const spread = (pick: (row: (typeof rows)[number]) => Readonly<Record<string, number>>): Columns =>
    Object.fromEntries(keysOf(pick).map((key) => [key, rows.map((row) => pick(row)[key] ?? Number.NaN)]));
  const worst = (of: (typeof rows)[number], kind: string): number =>
    Math.max(...of.one.extrapolation.filter((e) => e.kind === kind).map((e) => e.beyond), 1);
  return columns({
    case: rows.map(({ one }) => one.name),
    law: rows.map(({ prediction }) => prediction.by),
    kind: rows.map(({ prediction }) => prediction.kind),
    ...spread(({ one }) => one.values),
    ...spread(({ one }) => one.groups),
    coefficient: rows.map(({ prediction }) => prediction.coefficient),
    unit: rows.map(() => plant.coefficient.unit),
    law_lower: rows.map(({ prediction }) => prediction.lawLower),
    law_upper: rows.map(({ prediction }) => prediction.lawUpper),
    lower: rows.map(({ prediction }) => prediction.lower),
    upper: rows.map(({ prediction }) => prediction.upper),
    design_value: rows.map(({ one, first }) => (first ? one.design.coefficient : Number.NaN)),
    target: rows.map(({ one, first }) => (first ? (one.target?.nominal ?? Number.NaN) : Number.NaN)),
    target_design: rows.map(({ one, first }) => (first ? (one.target?.design ?? Number.NaN) : Number.NaN)),
    beyond_groups: rows.map((row) => worst(row, 'group')),
    beyond_joint: rows.map((row) => worst(row, 'joint')),
    beyond_raw: rows.map((row) => worst(row, 'raw')),
    verdict: rows.map(({ one, first }) => (first ? one.verdict : '')),
  });
}
