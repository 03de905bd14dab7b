import { InputError } from '../base/input-error.ts';
import { says } from '../base/says/trials.ts';
import type { TrialReading } from './read-row.ts';

/** One trial: one row, or the mean of several that are its readings. */
export interface Trial {
  readonly trial: string;
  readonly campaign: string;
  readonly setting?: string;
  readonly order?: number;
  readonly file: string;
  /** Line of its first reading. */
  readonly line: number;
  readonly lines: readonly number[];
  readonly readings: number;
  /** Mean of its readings in SI, one per column; NaN where none has it. */
  readonly values: Float64Array;
  /** Positions of columns whose mean rests on fewer readings than the trial has. */
  readonly thin: readonly number[];
  /** Standard uncertainty (SI, k = 1) of a value by key where the readings themselves tell it: means over steady windows, curves. */
  readonly statistical?: Readonly<Record<string, number>>;
}

/** Rows of one trial name to their mean, in the order of first rows. Rows of one trial that name two campaigns or settings stop with InputError (exit 3). */
export function averaged(rows: readonly TrialReading[], file: string): readonly Trial[] {
  const groups = new Map<string, TrialReading[]>();
  for (const row of rows) {
    const same = groups.get(row.trial);
    if (same === undefined) groups.set(row.trial, [row]);
    else same.push(row);
  }
  const mixed = [...groups.values()].filter((same) =>
    same.some(({ campaign, setting }) => campaign !== same[0]!.campaign || setting !== same[0]!.setting),
  );
  if (mixed.length > 0) throw new InputError(mixed.map(twoHomes), 3);
  return [...groups.values()].map((same) => mean(same, file));
}

const twoHomes = (same: readonly TrialReading[]) => {
  const other = same.find(({ campaign, setting }) => campaign !== same[0]!.campaign || setting !== same[0]!.setting)!;
  return { code: 'trial-in-two', text: says.trialInTwo(other.trial, same[0]!.line, other.line), place: other.place };
};

function mean(same: readonly TrialReading[], file: string): Trial {
  const { trial, campaign, setting, line, values: first } = same[0]!;
  const counts = new Int32Array(first.length);
  const values = new Float64Array(first.length);
  for (const row of same) {
    for (let k = 0; k < values.length; k++) {
      if (Number.isNaN(row.values[k])) continue;
      values[k]! += row.values[k]!;
      counts[k]! += 1;
    }
  }
  const order = Math.min(...same.map((row) => row.order ?? Number.NaN));
  return {
    trial,
    campaign,
    ...(setting === undefined ? {} : { setting }),
    ...(Number.isNaN(order) ? {} : { order }),
    file,
    line,
    lines: same.map((row) => row.line),
    readings: same.length,
    values: values.map((sum, k) => (same.length === 1 ? first[k]! : sum / counts[k]!)),
    thin: [...counts].flatMap((count, k) => (count > 0 && count < same.length ? [k] : [])),
  };
}
