import type { LiveData } from '../../live-data.ts';
import { plainNumber } from '../../numbers.ts';
import { behind } from '../../units.ts';

/** A trial in a few lines: who it is, what it gave, what was read. */
export function facts(data: LiveData, row: number): readonly (readonly [string, string])[] {
  const trial = data.trials[row];
  if (trial === undefined) return [];
  return [
    ['trial', trial.trial],
    ...(trial.campaign === '' ? [] : [['campaign', trial.campaign] as const]),
    ...(data.coefficient === null
      ? []
      : [[data.coefficient.symbol, `${plainNumber(trial.coefficient)}${behind(data.coefficient.unit)}`] as const]),
    ...data.columns.map(({ name, unit }, k) => [name, `${plainNumber(trial.values[k] ?? Number.NaN)}${behind(unit)}`] as const),
    ...data.rawKeys.flatMap(({ key, unit }, k) => {
      const value = trial.raw[k];
      return value === null || value === undefined ? [] : [[key, `${plainNumber(value, 4)}${behind(unit)}`] as const];
    }),
  ];
}
