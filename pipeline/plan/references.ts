import * as says from '../base/says/plan.ts';
import type { Unit } from '../quantities/unit.ts';
import type { Key, Rule } from '../rules/rule.ts';

const STANDARD_ATMOSPHERE = 101_325; // Pa, ISO 2533

/** The key under which a reading enters that is not yet the quantity itself: a gauge pressure, a gas volume at its reference condition. */
export const readingKey = (key: Key, { reference }: Unit): Key =>
  reference?.kind === 'gauge' ? `${key} (gauge)` : reference?.kind === 'normal' ? `${key} (at reference condition)` : key;

/** Rules from such a reading to the quantity. */
export function referenceRules(key: Key, unit: Unit): readonly Rule[] {
  const { reference } = unit;
  const reading = readingKey(key, unit);
  if (reference?.kind === 'gauge') {
    const source = 'definition';
    return [
      {
        gives: key,
        from: [reading, 'ambient_pressure'],
        of: (p, ambient) => p! + ambient!,
        formula: `${key} = gauge reading + ambient_pressure`,
        source,
      },
      {
        gives: key,
        from: [reading],
        of: (p) => p! + STANDARD_ATMOSPHERE,
        formula: `${key} = gauge reading + 101.325 kPa`,
        source,
        assumes: says.ambientAssumed(key),
      },
    ];
  }
  if (reference?.kind === 'normal') {
    const { temperature: t0 = Number.NaN, pressure: p0 = Number.NaN } = reference;
    return [
      {
        gives: key,
        from: [reading, 'temperature', 'pressure'],
        of: (v, t, p) => v! * (t! / t0) * (p0 / p!),
        formula: `${key} = reading (T/${t0} K) (${p0} Pa/p)`,
        source: 'ideal gas law',
        assumes: says.idealGasVolume(key, t0, p0),
      },
    ];
  }
  return [];
}
