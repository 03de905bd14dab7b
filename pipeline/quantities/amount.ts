import { says } from '../base/says/quantities.ts';
import { readDecimal } from './decimal.ts';
import { isDimensionless } from './dimension.ts';
import { type Fault, fault, isFault } from './fault.ts';
import { toSI, type Unit } from './unit.ts';
import { unitFor } from './unit-for.ts';
import type { Quantity } from './vocabulary.ts';

/** A number with its unit, as written and in SI. */
export interface Amount {
  readonly value: number;
  readonly unit: Unit;
  /** In SI, temperatures in K; a gauge pressure still above ambient, a normal volume still at its reference condition (`unit.reference`). */
  readonly si: number;
}

/** `120 mm` as number and unit text; the unit is empty where none is written. Of digits a unit may start with `1/` only: `1 100 m` is no amount. */
export function splitAmount(text: string): { readonly number: string; readonly unit: string } | undefined {
  const found = /^\s*([-+−]?(?:\d[\d.,]*|[.,]\d+)(?:[eE][-+−]?\d+)?)(?:\s*$|\s+((?:1\/|[^\s\d.,]).*?)\s*$|(?=[^\s\d.,])(.*?)\s*$)/u.exec(
    text,
  );
  return found === null ? undefined : { number: found[1]!, unit: found[2] ?? found[3] ?? '' };
}

/**
 * `120 mm`, `997 kg/m^3`, `1.0e-9 m^2/s`; with `unit` given (`{value: 120, unit: mm}`) the text is the bare number.
 * `quantity` checks the dimension; undefined allows any unit. A bare number is refused where the quantity has a unit.
 */
export function parseAmount(text: string, quantity?: Quantity, unit?: string): Amount | Fault {
  const parts = splitAmount(text);
  if (parts === undefined) return fault('amount-unreadable', says.amount(text, quantity));
  if (unit !== undefined && parts.unit !== '') return fault('unit-twice', says.unitTwice(text, unit));
  const value = readDecimal(parts.number, '.');
  if (typeof value !== 'number') return value;
  const unitText = unit ?? parts.unit;
  if (unitText === '' && quantity !== undefined && !isDimensionless(quantity.dimension))
    return fault('unit-missing', says.unitMissing(text, quantity));
  const read = unitFor(quantity, unitText);
  return isFault(read) ? read : amountOf(value, read, text);
}

function amountOf(value: number, unit: Unit, text: string): Amount | Fault {
  const si = toSI(value, unit);
  if (!Number.isFinite(si)) return fault('number-overflow', says.overflow(text));
  if (unit.offset !== 0 && !(si >= 0)) return fault('below-absolute-zero', says.belowZero(text));
  return { value, unit, si };
}
