import { isFault } from './fault.ts';
import { fromSI, type Unit } from './unit.ts';
import { unitFor } from './unit-for.ts';
import type { Quantity } from './vocabulary.ts';

/** A number for a reader: `digits` significant ones, plain from 0.001 to a million, else with an exponent. */
export function numberText(value: number, digits = 4): string {
  if (!Number.isFinite(value)) return Number.isNaN(value) ? 'not known' : value > 0 ? 'infinite' : '-infinite';
  if (value === 0) return '0';
  const rounded = Number(value.toPrecision(digits));
  const size = Math.abs(rounded);
  if (size >= 1e-3 && size < 1e6) return String(rounded);
  return rounded.toExponential().replace('e+', 'e');
}

/** The unit of the quantity's friendly ones that gives a number between 1 and 1000, else its first, else SI. */
function friendlyUnit(si: number, quantity: Quantity): Unit | undefined {
  const units = [...quantity.friendly, quantity.unit].flatMap((text) => {
    const unit = unitFor(quantity, text);
    return isFault(unit) ? [] : [unit];
  });
  return units.find((unit) => inSight(fromSI(si, unit))) ?? units[0];
}

const inSight = (value: number): boolean => Math.abs(value) >= 1 && Math.abs(value) < 1000;

/** `120 mm`, `300 rpm`, `24.85 degC`: a SI value in a unit that its readers use. Texts have no number: use their own text. */
export function amountText(si: number, quantity: Quantity, digits = 4): string {
  const unit = friendlyUnit(si, quantity);
  if (unit === undefined) return numberText(si, digits);
  const value = numberText(fromSI(si, unit), digits);
  return unit.text === '1' ? value : `${value} ${unit.text}`;
}
