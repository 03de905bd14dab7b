import { isFault } from '../quantities/fault.ts';
import { parseSpread, type SpreadSize } from '../quantities/spread.ts';
import type { Unit } from '../quantities/unit.ts';
import type { Quantity } from '../quantities/vocabulary.ts';
import type { Input, Key, SourceId, Spread } from '../rules/rule.ts';
import type { Placed, QuantityEntry } from '../study/study.ts';
import type { Faults } from './faults.ts';

type Stated = Pick<Input, 'random' | 'set' | 'systematic'>;

/**
 * Standard uncertainties of one quantity, k = 1. `accuracy` is a limit and is divided by sqrt 3 (JCGM 100, 4.3.7), `expanded` by its k (JCGM 100, 6.2).
 * On a constant value every uncertainty is systematic: the same wrong value holds for all trials.
 */
export function spreadsOf(
  key: Key,
  entry: QuantityEntry,
  quantity: Quantity | undefined,
  unit: Unit,
  random: 'random' | 'systematic',
  faults: Faults,
): Stated {
  const read = (text: Placed<string> | undefined, divide: number): Spread | undefined => {
    if (text === undefined) return undefined;
    const size = parseSpread(text.is, { quantity, unit });
    if (!isFault(size)) return divided(size, divide);
    faults.add(size.code, `${key}: ${size.text}`, text.place);
    return undefined;
  };
  const drawn = read(entry.random, 1);
  const shift = read(entry.systematic, 1) ?? read(entry.accuracy, Math.sqrt(3)) ?? read(entry.expanded, entry.k?.is ?? 1);
  const shifts = [...(random === 'systematic' && drawn !== undefined ? [drawn] : []), ...(shift === undefined ? [] : [shift])];
  const source: SourceId = entry.instrument?.is ?? key;
  const per = entry.per?.is ?? 'study';
  return {
    ...(random === 'random' && drawn !== undefined ? { random: drawn } : {}),
    ...(entry.kind?.is === 'set' ? { set: true } : {}),
    ...(shifts.length === 0
      ? {}
      : { systematic: shifts.map((spread, k) => ({ spread, source: k === 0 ? source : `${source} (second part)`, per })) }),
  };
}

const divided = (size: SpreadSize, by: number): Spread => ('share' in size ? { share: size.share / by } : { si: size.si / by });
