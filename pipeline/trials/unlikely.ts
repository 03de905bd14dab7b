import type { Note } from '../base/message.ts';
import { says } from '../base/says/trials.ts';
import { usual } from '../quantities/usual.ts';
import { quantities } from '../quantities/vocabulary.ts';
import type { Trials } from './read-trials.ts';

/** A warning for each quantity whose typical value lies far from where such values lie: most often a unit is wrong. `constants`: SI. */
export function unlikelyValues(
  { keys, trials }: Pick<Trials, 'keys' | 'trials'>,
  constants: Readonly<Record<string, number>>,
): readonly Note[] {
  const typical = new Map<string, number>(Object.entries(constants));
  keys.forEach((key, k) => {
    const values = trials.map((trial) => trial.values[k]!).filter(Number.isFinite);
    if (values.length > 0) typical.set(key, values.sort((a, b) => a - b)[Math.floor(values.length / 2)]!);
  });
  return [...typical].flatMap(([key, value]): readonly Note[] => {
    const plain = key.replace(/_other$/u, '');
    const range = usual[plain];
    if (range === undefined || (value >= range[0] && value <= range[1])) return [];
    return [
      {
        section: 'trials',
        level: 'warning',
        code: 'unlikely-value',
        text: says.unlikelyValue(key, value, quantities[plain]!.unit, range),
        about: key,
      },
    ];
  });
}
