import type { Plan } from '../plan/plan.ts';
import { fromSI } from '../quantities/unit.ts';
import type { SteadyTrials } from '../trials/steady.ts';
import type { StudyResult } from './study-result.ts';

/** Points of a log that are drawn, evenly over its rows, both ends kept. */
const MOST_POINTS = 500;

/** Each column of a raw log with its steady windows and their means, in the unit it was logged in; time in s from the first row. */
export const drawnLog = ({ log, windows }: SteadyTrials, { columns }: Plan): StudyResult['series'] =>
  log.keys.map((key, k) => {
    const { unit } = columns.find((column) => column.key === key)!;
    const places = thinned(log.time.length);
    const clock = (row: number): number => log.time[row]! - log.time[0]!;
    return {
      trial: '',
      quantity: key,
      unit: unit.text,
      t: places.map(clock),
      value: places.map((row) => fromSI(log.values[k]![row]!, unit)),
      fitted: [],
      windows: windows.map(({ trial, from, to, mean }) => ({ trial, from: clock(from), to: clock(to - 1), level: fromSI(mean[k]!, unit) })),
    };
  });

function thinned(length: number): readonly number[] {
  if (length <= MOST_POINTS) return Array.from({ length }, (_, k) => k);
  return Array.from({ length: MOST_POINTS }, (_, k) => Math.round((k * (length - 1)) / (MOST_POINTS - 1)));
}
