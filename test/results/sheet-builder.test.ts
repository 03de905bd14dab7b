import { type CellObject, read, utils, write } from '@e965/xlsx';
import { expect, test } from 'vitest';
import { SheetBuilder } from '../../pipeline/results/sheet-builder.ts';

// Found by throwing odd studies at the command line (test/strength/fuzz-commands.ts): the cell was left out, and with it its formula.
test('a formula whose value is no number now stays, shows #NUM! and can be replaced', () => {
  const sheet = new SheetBuilder();
  const at = sheet.formula('half-width', 'SQRT(-1)', Number.NaN);
  sheet.replace(at, 'SQRT(-2)');
  const book = utils.book_new();
  utils.book_append_sheet(book, sheet.sheet, 'law');
  const cell = read(write(book, { type: 'buffer', bookType: 'xlsx' }), { cellFormula: true }).Sheets.law![at] as CellObject;
  expect([cell.t, cell.w, cell.f]).toEqual(['e', '#NUM!', 'SQRT(-2)']);
});
