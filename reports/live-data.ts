import { quantityOf } from '../pipeline/quantities/vocabulary.ts';
import type { Fit } from '../pipeline/regression/fit.ts';
import type { StudyResult, TraceStep, TrialRow } from '../pipeline/results/study-result.ts';
import { chosenFit } from './law-text.ts';
import type { Walk } from './sections/walk.ts';

/** One trial as the live page tells it. */
interface LiveTrial {
  readonly trial: string;
  readonly campaign: string;
  /** Values of the columns. */
  readonly values: readonly number[];
  readonly coefficient: number;
  /** Readings in the order of `rawKeys`; null where there is none. */
  readonly raw: readonly (number | null)[];
  /** Values of the steps of `ways[way]`. */
  readonly way: number;
  readonly steps: readonly number[];
}

/** All that the script of the page knows. Plain JSON but for numbers that JSON cannot hold, see `frozen`. */
export interface LiveData {
  /** Compiled Vega specifications by name of picture. */
  readonly charts: Readonly<Record<string, unknown>>;
  readonly columns: readonly { readonly name: string; readonly unit: string }[];
  readonly coefficient: { readonly symbol: string; readonly unit: string } | null;
  readonly campaigns: readonly string[];
  readonly rawKeys: readonly { readonly key: string; readonly unit: string }[];
  /** Steps from readings to groups; trials that were reduced alike share one list. */
  readonly ways: readonly (readonly Omit<TraceStep, 'value'>[])[];
  readonly trials: readonly LiveTrial[];
  /** The chosen law for the calculator: what a prediction needs, no diagnostics. */
  readonly fit: Fit | null;
  readonly response: { readonly name: string; readonly unit: string };
}

/** Seven digits are more than a reading has. */
const short = (value: number): number => (Number.isFinite(value) ? Number(value.toPrecision(7)) : value);

/** A compiled picture without what the trials say anyway (their names, by row), and its numbers at seven digits. */
const lightened = (chart: unknown): unknown =>
  JSON.parse(
    JSON.stringify(chart, (_, one: unknown) => {
      if (typeof one === 'number') return short(one);
      if (one === null || typeof one !== 'object' || !('row' in one) || !('trial' in one)) return one;
      const { trial, campaign, ...rest } = one as unknown as Record<string, unknown>;
      return rest;
    }),
  );

/** SI unit of a quantity that the program knows by name. */
export const siUnit = (key: string): string => quantityOf(key.split('@')[0]!)?.unit ?? '';

/** What the script needs, from the result and the compiled pictures. */
export function liveData(result: StudyResult, charts: Readonly<Record<string, unknown>>): LiveData {
  const rawKeys = [...new Set(result.trials.flatMap((trial) => Object.keys(trial.raw)))];
  const ways = new Map<string, number>();
  const trials = result.trials.map(
    (trial): LiveTrial => ({
      trial: trial.trial,
      campaign: trial.campaign,
      values: trial.values.map(short),
      coefficient: short(trial.coefficient),
      raw: rawKeys.map((key) => (trial.raw[key] === undefined ? null : short(trial.raw[key]))),
      way: wayOf(trial, ways),
      steps: trial.trace.map((step) => short(step.value)),
    }),
  );
  const fit = chosenFit(result);
  return {
    charts: Object.fromEntries(Object.entries(charts).map(([name, chart]) => [name, lightened(chart)])),
    columns: result.columns.map(({ name, unit }) => ({ name, unit })),
    coefficient: result.coefficient,
    campaigns: result.campaigns,
    rawKeys: rawKeys.map((key) => ({ key, unit: siUnit(key) })),
    ways: [...ways.keys()].map((key) => JSON.parse(key)),
    trials,
    fit: fit === undefined ? null : forPrediction(fit),
    response: { name: fit?.form.response ?? result.response.name, unit: result.response.unit },
  };
}

function wayOf({ trace }: TrialRow, ways: Map<string, number>): number {
  const key = JSON.stringify(trace.map(({ key, unit, formula, source }) => ({ key, unit, formula, source })));
  const known = ways.get(key);
  if (known !== undefined) return known;
  ways.set(key, ways.size);
  return ways.size - 1;
}

/** A fit without what a prediction does not read. */
const forPrediction = (fit: Fit): Fit => ({
  ...fit,
  diagnostics: { fitted: [], residual: [], studentised: [], leverage: [], cook: [], residualSd: [] },
  inverseOfB: [],
  notes: [],
});

/** The walk through one trial of a result. */
export const walkOf = (trial: TrialRow): Walk => ({
  trial: trial.trial,
  raw: Object.entries(trial.raw).map(([key, value]) => ({ key, value, unit: siUnit(key) })),
  steps: trial.trace,
});
