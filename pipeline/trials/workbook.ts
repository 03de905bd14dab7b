import * as XLSX from '@e965/xlsx';
import { InputError } from '../base/input-error.ts';
import type { Message } from '../base/message.ts';
import { didYouMean } from '../base/nearest.ts';
import { says } from '../base/says/trials.ts';
import { caps } from './caps.ts';
import type { Grid, GridRow } from './table.ts';
import { zipSizes } from './zip-sizes.ts';

/**
 * One sheet of an .xlsx workbook as text cells: stored values at full precision, dates as ISO texts, percentages as they are shown, errors as their sign.
 * Cells are walked one by one, never the declared range. A cell merged downwards holds for each of its rows.
 */
export function readWorkbook(bytes: Buffer, file: string, sheet?: string): Grid {
  const book = opened(bytes, file);
  const name = chosenSheet(book, file, sheet);
  const cells = book.Sheets[name]!;
  const found = textCells(cells, file);
  const commas = commaTexts(cells, found, file, name);
  const remarks = [...commas, ...fillMerged(cells, found, file, name), ...hiddenRows(cells, found, file, name)];
  return { file, sheet: name, rows: gridRows(found), mayUseComma: false, remarks };
}

function opened(bytes: Buffer, file: string): XLSX.WorkBook {
  const sizes = zipSizes(bytes, { parts: caps.workbookParts, unpacked: caps.workbookBytes });
  if (sizes === undefined) throw stop(file, 'not-a-workbook', says.notAWorkbook(bytes.length >= 8 && bytes.readUInt32BE(0) === 0xd0cf11e0));
  if (sizes.unpacked > caps.workbookBytes || sizes.parts > caps.workbookParts)
    throw stop(file, 'workbook-too-large', says.workbookTooLarge(sizes.unpacked, caps.workbookBytes));
  try {
    return XLSX.read(bytes, { type: 'buffer', cellNF: true, cellDates: true, cellStyles: true, cellHTML: false, sheetStubs: false });
  } catch {
    throw stop(file, 'not-a-workbook', says.notAWorkbook(false));
  }
}

function chosenSheet(book: XLSX.WorkBook, file: string, wanted: string | undefined): string {
  const names = book.SheetNames;
  if (wanted !== undefined) {
    if (names.includes(wanted)) return wanted;
    throw stop(file, 'no-such-sheet', says.noSuchSheet(wanted, names, didYouMean(wanted, names)));
  }
  const filled = names.filter((name) => Object.keys(book.Sheets[name] ?? {}).some(isAddress));
  if (filled.length === 1) return filled[0]!;
  throw stop(file, 'which-sheet', filled.length === 0 ? says.emptyWorkbook() : says.whichSheet(filled));
}

const isAddress = (key: string): boolean => /^[A-Z]{1,3}\d+$/u.test(key);

/** Rows (0-based) of columns (0-based) of text. */
type TextCells = Map<number, Map<number, string>>;

function textCells(sheet: XLSX.WorkSheet, file: string): TextCells {
  const rows: TextCells = new Map();
  for (const key of Object.keys(sheet)) {
    if (!isAddress(key)) continue;
    const { r, c } = XLSX.utils.decode_cell(key);
    const text = cellText(sheet[key] as XLSX.CellObject);
    if (text === '') continue;
    if (c >= caps.columns) throw stop(file, 'too-many-columns', says.tooManyColumns(caps.columns));
    put(rows, r, c, text);
    if (rows.size > caps.rows) throw stop(file, 'too-many-rows', says.tooManyRows(caps.rows));
  }
  return rows;
}

function put(rows: TextCells, r: number, c: number, text: string): void {
  const row = rows.get(r) ?? new Map<number, string>();
  row.set(c, text);
  rows.set(r, row);
}

function cellText(cell: XLSX.CellObject): string {
  if (cell.v === undefined) return cell.f === undefined ? '' : '#FORMULA without a stored value';
  if (cell.t === 'e') return cell.w ?? '#ERROR!';
  if (cell.v instanceof Date) return dateText(cell.v);
  if (cell.t === 'n') return /%/u.test(String(cell.z ?? '')) ? (cell.w ?? `${Number(cell.v) * 100}%`) : String(cell.v);
  if (cell.t === 'b') return cell.v === true ? 'TRUE' : 'FALSE';
  return String(cell.v).replace(/\s+/gu, ' ').trim();
}

/** A time of day has no date: worksheets count days from 1899-12-31. */
const dateText = (date: Date): string =>
  date.getUTCFullYear() < 1900
    ? date.toISOString().slice(11, 19)
    : date
        .toISOString()
        .slice(0, 19)
        .replace(/T00:00:00$/u, '');

const decimalComma = /^[-+−]?\d*,\d+(?:[eE][-+]?\d+)?$/u;
/** `1,234`: a decimal or a thousand. */
const eitherWay = /^[-+−]?[1-9]\d{0,2},\d{3}$/u;

/**
 * Numbers that were stored as text with a decimal comma, as pasted ones are: read as numbers in a column that writes its numbers so and where at least one of
 * them can be nothing else. A single one among real numbers, and a column in which all might be thousands (`1,234`), stay text and are refused.
 */
function commaTexts(sheet: XLSX.WorkSheet, rows: TextCells, file: string, name: string): readonly Message[] {
  const columns = new Map<number, { readonly r: number; readonly text: string }[]>();
  const real = new Map<number, number>();
  for (const [r, row] of rows)
    for (const [c, text] of row) {
      const { t } = sheet[XLSX.utils.encode_cell({ r, c })] as XLSX.CellObject;
      if (t === 'n') real.set(c, (real.get(c) ?? 0) + 1);
      if (t === 's' && decimalComma.test(text)) columns.set(c, [...(columns.get(c) ?? []), { r, text }]);
    }
  const sure = [...columns].filter(([c, texts]) => texts.length > (real.get(c) ?? 0) && texts.some(({ text }) => !eitherWay.test(text)));
  for (const [c, texts] of sure) for (const { r, text } of texts) put(rows, r, c, text.replace(',', '.'));
  if (sure.length === 0) return [];
  const count = sure.reduce((sum, [, texts]) => sum + texts.length, 0);
  return [
    {
      code: 'comma-text',
      text: says.commaText(
        count,
        sure.map(([c]) => XLSX.utils.encode_col(c)),
      ),
      place: { file, key: name },
    },
  ];
}

function fillMerged(sheet: XLSX.WorkSheet, rows: TextCells, file: string, name: string): readonly Message[] {
  const downwards = (sheet['!merges'] ?? []).filter(({ s, e }) => e.r > s.r && e.c === s.c && rows.get(s.r)?.has(s.c));
  for (const { s, e } of downwards) {
    const text = rows.get(s.r)!.get(s.c)!;
    for (let r = s.r + 1; r <= Math.min(e.r, s.r + caps.rows); r++) if (rows.has(r)) put(rows, r, s.c, text);
  }
  if (downwards.length === 0) return [];
  const ranges = downwards.map((range) => XLSX.utils.encode_range(range));
  return [{ code: 'merged-cells', text: says.mergedCells(ranges), place: { file, key: name } }];
}

function hiddenRows(sheet: XLSX.WorkSheet, rows: TextCells, file: string, name: string): readonly Message[] {
  const hidden = (sheet['!rows'] ?? []).flatMap((row, r) => (row?.hidden === true && rows.has(r) ? [r + 1] : []));
  return hidden.length === 0 ? [] : [{ code: 'hidden-rows', text: says.hiddenRows(hidden), place: { file, key: name } }];
}

/** In order of the sheet, each as wide as the widest. */
function gridRows(found: TextCells): readonly GridRow[] {
  const numbers = [...found.keys()].sort((a, b) => a - b);
  const width = numbers.reduce((most, r) => Math.max(most, ...found.get(r)!.keys()), -1) + 1;
  return numbers.map((r) => ({ line: r + 1, cells: Array.from({ length: width }, (_, c) => found.get(r)!.get(c) ?? '') }));
}

const stop = (file: string, code: string, text: string): InputError => new InputError([{ code, text, place: { file } }], 3);
