import { CsvError, parse } from 'csv-parse/sync';
import { InputError } from '../base/input-error.ts';
import { says } from '../base/says/trials.ts';
import { caps } from './caps.ts';
import { recogniseSeparator } from './separator.ts';
import type { Grid, GridRow } from './table.ts';

interface Parsed {
  readonly record: readonly string[];
  readonly info: { readonly lines: number };
}

/** Text with fields separated by comma, semicolon or tab, quotes doubled inside quotes (RFC 4180). Stray and unclosed quotes stop the file with their place. */
export function readDelimited(text: string, file: string): Grid {
  const plain = text.replace(/\r\n?/gu, '\n');
  const separator = recogniseSeparator(plain);
  const rows: GridRow[] = [];
  let before = 0;
  for (const { record, info } of parsed(plain, separator, file)) {
    const line = before + 1;
    before = info.lines;
    if (record.every((cell) => cell.trim() === '')) continue;
    rows.push(record.some((cell) => cell.includes('\0')) ? { line, cells: record, broken: says.nul() } : { line, cells: record });
    if (rows.length > caps.rows) throw stop(file, line, 1, 'too-many-rows', says.tooManyRows(caps.rows));
  }
  return { file, rows, mayUseComma: separator !== ',', remarks: [] };
}

function parsed(text: string, separator: string, file: string): readonly Parsed[] {
  try {
    return parse(text, {
      delimiter: separator,
      record_delimiter: '\n',
      relax_column_count: true,
      info: true,
      max_record_size: caps.recordCharacters,
    }) as unknown as readonly Parsed[];
  } catch (error) {
    if (error instanceof CsvError) throw faultOf(error, text, file, separator);
    throw error;
  }
}

function faultOf(error: CsvError, text: string, file: string, separator: string): InputError {
  const quote = openQuote(text, separator);
  if (error.code === 'CSV_QUOTE_NOT_CLOSED' && quote !== undefined)
    return stop(file, quote.line, quote.column, 'quote-not-closed', says.quoteNotClosed());
  if (error.code === 'CSV_MAX_RECORD_SIZE') {
    const line = Number(error.lines);
    return stop(file, line, 1, 'field-too-long', says.fieldTooLong(caps.recordCharacters, quote));
  }
  const stray = strayQuote(text, separator);
  return stop(file, stray.line, stray.column, 'stray-quote', says.strayQuote());
}

interface Spot {
  readonly line: number;
  readonly column: number;
}

/** Walks fields and quotes; says where a quote stands that is no field's first or last character, or where one opens that never closes. */
function walkQuotes(text: string, separator: string): { readonly open?: Spot; readonly stray?: Spot } {
  let line = 1;
  let lineStart = 0;
  let fieldStart = 0;
  let open: Spot | undefined;
  for (let k = 0; k < text.length; k++) {
    const c = text[k];
    if (c === '"') {
      const here = { line, column: k - lineStart + 1 };
      if (open === undefined) {
        if (k !== fieldStart) return { stray: here };
        open = here;
      } else if (text[k + 1] === '"') k += 1;
      else {
        open = undefined;
        const next = text[k + 1];
        if (next !== undefined && next !== separator && next !== '\n') return { stray: here };
      }
    }
    if (c === '\n') {
      line += 1;
      lineStart = k + 1;
    }
    if (open === undefined && (c === separator || c === '\n')) fieldStart = k + 1;
  }
  return { open };
}

const openQuote = (text: string, separator: string): Spot | undefined => walkQuotes(text, separator).open;
const strayQuote = (text: string, separator: string): Spot => walkQuotes(text, separator).stray ?? { line: 1, column: 1 };

const stop = (file: string, line: number, column: number, code: string, text: string): InputError =>
  new InputError([{ code, text, place: { file, line, column } }], 3);
