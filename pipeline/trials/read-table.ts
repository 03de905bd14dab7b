import { InputError } from '../base/input-error.ts';
import type { Message } from '../base/message.ts';
import { says } from '../base/says/trials.ts';
import { decodeText } from '../files/decode.ts';
import { caps } from './caps.ts';
import { recogniseDecimal } from './decimal-mark.ts';
import { readDelimited } from './delimited.ts';
import { headerText } from './header.ts';
import { findHeaderRow, unitsOf } from './header-row.ts';
import type { Grid, GridRow, Table } from './table.ts';
import { readWorkbook } from './workbook.ts';

export interface TableOptions {
  /** Name of the file, whose ending tells its kind; also its name in messages. */
  readonly file: string;
  /** Workbooks only. */
  readonly sheet?: string;
  /** Names of columns that will be asked for: they tell the header from title rows above it. */
  readonly expects?: readonly string[];
}

/**
 * Bytes of a .csv, .tsv, .txt or .xlsx file to a table of text cells. Recognised: encoding by its mark, separator, decimal mark, title rows above
 * the header, a units row below it. Rows of another width or with a NUL come back as `badRows`; an unclosed quote, a wrong kind of file
 * or one beyond the caps stops with InputError (exit 3).
 */
export function readTable(bytes: Buffer, { file, sheet, expects = [] }: TableOptions): Table {
  return tableOf(gridOf(bytes, file, sheet), expects);
}

function gridOf(bytes: Buffer, file: string, sheet: string | undefined): Grid {
  const ending = /\.([^./\\]+)$/u.exec(file)?.[1]?.toLowerCase() ?? '';
  if (ending === 'xlsx') return readWorkbook(bytes, file, sheet);
  if (!['csv', 'tsv', 'txt'].includes(ending)) throw stop(file, 1, 'file-kind', says.fileKind(ending));
  if (sheet !== undefined) throw stop(file, 1, 'sheet-of-text', says.sheetOfText(sheet));
  if (bytes.subarray(0, 4).equals(Buffer.from('PK\u0003\u0004'))) throw stop(file, 1, 'file-kind', says.workbookNamedText());
  return readDelimited(decodeText(bytes, file), file);
}

/** Finds header, units row and decimal mark of a grid. */
export function tableOf(grid: Grid, expects: readonly string[]): Table {
  const { file, rows } = grid;
  if (rows.length === 0) throw stop(file, 1, 'empty-table', says.emptyTable());
  const at = findHeaderRow(rows, expects);
  const top = rows[at]!;
  if (top.broken !== undefined) throw stop(file, top.line, 'header-broken', top.broken);
  if (top.cells.length > caps.columns) throw stop(file, top.line, 'too-many-columns', says.tooManyColumns(caps.columns));
  const unitsRow = top.cells.length === rows[at + 1]?.cells.length ? unitsOf(rows[at + 1], rows.slice(at + 2, at + 7)) : undefined;
  const body = rows.slice(at + (unitsRow === undefined ? 1 : 2));
  const { good, bad } = sorted(body, top.cells.length);
  if (body.length === 0) throw stop(file, top.line, 'no-rows', says.noRows());
  return {
    file,
    ...(grid.sheet === undefined ? {} : { sheet: grid.sheet }),
    header: top.cells.map(headerText),
    headerLine: top.line,
    ...(unitsRow === undefined ? {} : { unitsRow }),
    decimal: grid.mayUseComma ? recogniseDecimal(good) : '.',
    rows: good,
    badRows: bad,
    remarks: [...grid.remarks, ...titleRows(file, rows.slice(0, at)), ...oneColumn(file, top)],
  };
}

/** Rows of the header's width, and those of another or with a fault of form. */
function sorted(
  body: readonly GridRow[],
  width: number,
): { readonly good: readonly GridRow[]; readonly bad: readonly { line: number; text: string }[] } {
  const good: GridRow[] = [];
  const bad: { line: number; text: string }[] = [];
  for (const row of body) {
    const text = row.broken ?? (row.cells.length === width ? undefined : says.ragged(row.cells.length, width));
    if (text === undefined) good.push(row);
    else bad.push({ line: row.line, text });
  }
  return { good, bad };
}

function titleRows(file: string, above: readonly GridRow[]): readonly Message[] {
  if (above.length === 0) return [];
  const words = above.map(({ cells }) => cells.filter((cell) => cell.trim() !== '').join(' '));
  return [{ code: 'title-rows', text: says.titleRows(words), place: { file, line: above[0]!.line } }];
}

/** One column whose header has blanks or bars in it: the separator is one that is not read. */
function oneColumn(file: string, { cells, line }: GridRow): readonly Message[] {
  const [only = ''] = cells;
  return cells.length === 1 && /\s{2,}|\|/u.test(only.trim())
    ? [{ code: 'one-column', text: says.oneColumn(), place: { file, line } }]
    : [];
}

const stop = (file: string, line: number, code: string, text: string): InputError =>
  new InputError([{ code, text, place: { file, line } }], 3);
