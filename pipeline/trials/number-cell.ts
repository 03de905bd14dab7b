import { readDecimal } from '../quantities/decimal.ts';
import type { Fault } from '../quantities/fault.ts';
import { quickDecimal } from './quick-decimal.ts';

/** How the cells of a table are read. */
export interface CellReading {
  readonly decimal: '.' | ',';
  /** Marks of a missing value besides the empty cell, as the study declares them. */
  readonly missing: readonly string[];
}

/** Takes a cell's text. */
export interface CellReader {
  /** A number, `missing`, or a refusal with the reason; nothing becomes a number that is not one. */
  readonly read: (text: string) => number | 'missing' | Fault;
  /** An empty cell, a declared mark, or a number equal to a declared one (-9999.0 for -9999). */
  readonly isMissing: (text: string) => boolean;
}

export function cellReader({ decimal, missing }: CellReading): CellReader {
  const marks = new Set(missing.map((mark) => mark.trim()));
  const numbers = missing.flatMap((mark) =>
    [readDecimal(mark, '.'), readDecimal(mark, decimal)].filter((value) => typeof value === 'number'),
  );
  const isMark = (value: number): boolean => numbers.length > 0 && numbers.includes(value);
  const read = (text: string): number | 'missing' | Fault => {
    const quick = quickDecimal(text, decimal);
    if (!Number.isNaN(quick)) return isMark(quick) ? 'missing' : quick;
    const trimmed = text.trim();
    if (trimmed === '' || marks.has(trimmed)) return 'missing';
    const value = readDecimal(trimmed, decimal);
    return typeof value === 'number' && isMark(value) ? 'missing' : value;
  };
  return { read, isMissing: (text) => read(text) === 'missing' };
}
