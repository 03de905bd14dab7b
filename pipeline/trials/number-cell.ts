import { readDecimal } from '../quantities/decimal.ts';
import type { Fault } from '../quantities/fault.ts';

/** How the cells of a table are read. */
export interface CellReading {
  readonly decimal: '.' | ',';
  /** Marks of a missing value besides the empty cell, as the study declares them. */
  readonly missing: readonly string[];
}

/** A text that stands for a missing value: an empty cell, a declared mark, or a number equal to a declared one (-9999.0 for -9999). */
export function isMissing(text: string, { decimal, missing }: CellReading): boolean {
  const trimmed = text.trim();
  if (trimmed === '' || missing.some((mark) => mark.trim() === trimmed)) return true;
  const value = readDecimal(trimmed, decimal);
  return typeof value === 'number' && missing.some((mark) => readDecimal(mark, '.') === value);
}

/** A cell to a number, `missing`, or a refusal with the reason; nothing becomes a number that is not one. */
export function readCell(text: string, reading: CellReading): number | 'missing' | Fault {
  return isMissing(text, reading) ? 'missing' : readDecimal(text, reading.decimal);
}
