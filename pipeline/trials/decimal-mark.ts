import type { GridRow } from './table.ts';

const withComma = /^[-+−]?\d*,\d+(?:[eE][-+]?\d+)?$/u;
const withPoint = /^[-+−]?\d*\.\d+(?:[eE][-+]?\d+)?$/u;
/** `1,234` and `12.345`: a decimal or a thousand. */
const eitherWay = /^[-+−]?[1-9]\d{0,2}[.,]\d{3}$/u;

/**
 * The decimal mark of a file that may use a comma. It is the comma where more cells can only be decimals with a comma than decimals with a point;
 * `1,234` alone proves nothing, and is then refused cell by cell.
 */
export function recogniseDecimal(rows: readonly GridRow[]): '.' | ',' {
  let commas = 0;
  let points = 0;
  for (const { cells } of rows) {
    for (const cell of cells) {
      const text = cell.trim();
      if (eitherWay.test(text)) continue;
      if (withComma.test(text)) commas += 1;
      else if (withPoint.test(text)) points += 1;
    }
  }
  return commas > points ? ',' : '.';
}
