import { says } from '../base/says/quantities.ts';
import { type Amount, parseAmount, splitAmount } from './amount.ts';
import { type Fault, fault, isFault } from './fault.ts';
import type { Quantity } from './vocabulary.ts';

export interface Range {
  readonly from: Amount;
  readonly to: Amount;
}

export const isRange = (text: string): boolean => /\sto\s/u.test(text);

/** `400 to 600 rpm`, `15 degC to 40 degC`: both ends in SI, the lower one first. The unit may stand once, at the end. */
export function parseRange(text: string, quantity?: Quantity, unit?: string): Range | Fault {
  const ends = text.split(/\sto\s/u);
  if (ends.length !== 2) return fault('range-unreadable', says.range(text));
  const last = splitAmount(ends[1]!);
  const first = splitAmount(ends[0]!);
  if (first === undefined || last === undefined) return fault('range-unreadable', says.range(text));
  const from = parseAmount(first.unit === '' && last.unit !== '' ? `${first.number} ${last.unit}` : ends[0]!, quantity, unit);
  if (isFault(from)) return from;
  const to = parseAmount(ends[1]!, quantity, unit);
  if (isFault(to)) return to;
  return from.si <= to.si ? { from, to } : fault('range-reversed', says.rangeReversed(text));
}
