import { says } from '../base/says/quantities.ts';
import { splitAmount } from './amount.ts';
import { readDecimal } from './decimal.ts';
import { isDimensionless, sameDimension } from './dimension.ts';
import { type Fault, fault, isFault } from './fault.ts';
import { parseUnit, type Unit } from './unit.ts';
import { isMolar, unitFor } from './unit-for.ts';
import type { Quantity } from './vocabulary.ts';

/** The size of an uncertainty: a share of the value, or in SI. */
export type SpreadSize = { readonly share: number } | { readonly si: number };

/** What an uncertainty belongs to. */
export interface SpreadOf {
  readonly quantity?: Quantity;
  /** Unit of the value, which settles the dimension of a user's own quantity. */
  readonly unit?: Unit;
}

/**
 * `0.5 %` of the value, `0.1 K`, `1 % of 50 L/min`; on a plain number also `0.02`.
 * Refused: a % of a temperature, degC and degF (a temperature's uncertainty is in K), a sign, a wrong dimension.
 */
export function parseSpread(text: string, of: SpreadOf): SpreadSize | Fault {
  if (/^\s*(?:±|\+-|\+\/-)/u.test(text)) return fault('spread-sign', says.plusMinus(text));
  const share = /^\s*(\S+?)\s*%(?:\s+of\s+(.+?))?\s*$/u.exec(text);
  if (share === null) return absolute(text, of);
  const percent = nonNegative(share[1]!, text);
  if (typeof percent !== 'number') return percent;
  return share[2] === undefined || /^(?:the )?(?:value|reading|measured value)$/u.test(share[2])
    ? shareOfValue(text, percent, of)
    : shareOfAmount(text, percent, share[2], of);
}

const isTemperature = ({ quantity, unit }: SpreadOf): boolean =>
  quantity?.kind === 'temperature' || (unit !== undefined && unit.offset !== 0);

function shareOfValue(text: string, percent: number, of: SpreadOf): SpreadSize | Fault {
  return isTemperature(of) ? fault('spread-of-temperature', says.percentOfTemperature(text)) : { share: percent / 100 };
}

function shareOfAmount(text: string, percent: number, whole: string, of: SpreadOf): SpreadSize | Fault {
  if (/full.?scale|span|range|f\.?s\.?$/iu.test(whole)) return fault('spread-of-scale', says.ofFullScale(text));
  const size = absolute(whole, of);
  return isFault(size) || 'share' in size ? size : { si: (percent / 100) * size.si };
}

function absolute(text: string, of: SpreadOf): SpreadSize | Fault {
  const parts = splitAmount(text);
  if (parts === undefined) return fault('spread-unreadable', says.spread(text));
  const value = nonNegative(parts.number, text);
  if (typeof value !== 'number') return value;
  const unit = differenceUnit(parts.unit, of, text);
  return isFault(unit) ? unit : { si: (value * unit.times) / unit.over };
}

function differenceUnit(unitText: string, of: SpreadOf, text: string): Unit | Fault {
  const { quantity } = of;
  const dimension = of.unit?.dimension ?? quantity?.dimension;
  if (unitText === '' && dimension !== undefined && !isDimensionless(dimension)) return fault('unit-missing', says.spreadUnitMissing(text));
  const unit = quantity === undefined || quantity.kind === 'temperature' ? parseUnit(unitText) : unitFor(quantity, unitText);
  if (isFault(unit)) return unitText.includes('%') ? fault('spread-unreadable', says.spread(text)) : unit;
  if (unit.offset !== 0) return fault('spread-degrees', says.spreadInDegrees(text));
  if (unit.reference?.kind === 'gauge') return fault('spread-gauge', says.spreadGauge(text));
  if (dimension !== undefined && !sameDimension(unit.dimension, dimension) && !mayBeMolar(of, unit))
    return fault('unit-dimension', says.spreadDimension(text, quantity?.unit ?? of.unit?.text ?? ''));
  return unit;
}

/** The value's own unit is not known yet, and the quantity may count moles. */
const mayBeMolar = ({ quantity, unit: valueUnit }: SpreadOf, unit: Unit): boolean =>
  valueUnit === undefined && quantity !== undefined && isMolar(quantity, unit);

function nonNegative(number: string, text: string): number | Fault {
  const value = readDecimal(number, '.');
  if (typeof value !== 'number') return value;
  return value >= 0 ? value : fault('spread-negative', says.spreadNegative(text));
}
