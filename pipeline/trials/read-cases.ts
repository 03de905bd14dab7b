import type { Message } from '../base/message.ts';
import { says } from '../base/says/trials.ts';
import { toSI } from '../quantities/unit.ts';
import { headerText } from './header.ts';
import { cellReader } from './number-cell.ts';
import type { ColumnToRead } from './read-row.ts';
import type { Table, TableRow } from './table.ts';

/** One row of a plant table: every column's value in SI, from and to where the cell holds a range, NaN where it is empty. */
export interface CaseRow {
  readonly name: string;
  readonly line: number;
  readonly values: readonly { readonly from: number; readonly to: number }[];
}

const RANGE = /^(.+?)\s+to\s+(.+)$/u;

/** Rows of a plant table, `400 to 600` read as a range. Rows without a single value are passed over. `name`: the column that names the case. */
export function readCases(
  table: Table,
  columns: readonly ColumnToRead[],
  name: number | undefined,
): { readonly rows: readonly CaseRow[]; readonly faults: readonly Message[] } {
  const faults: Message[] = table.badRows.map(({ line, text }) => ({ code: 'bad-row', text, place: { file: table.file, line } }));
  const cell = cellReader({ decimal: table.decimal, missing: [] });
  const rows = table.rows.map((row, k): CaseRow => {
    const called = name === undefined ? '' : headerText(row.cells[name] ?? '');
    return {
      name: called === '' ? String(k + 1) : called,
      line: row.line,
      values: columns.map((column) => readCell(row, column, table, cell.read, faults)),
    };
  });
  const seen = new Map<string, number>();
  for (const { name: one, line } of rows) {
    const before = seen.get(one);
    if (before !== undefined) faults.push({ code: 'case-twice', text: says.caseTwice(one, before), place: { file: table.file, line } });
    seen.set(one, line);
  }
  return { rows, faults };
}

function readCell(
  { cells, line }: TableRow,
  { index, unit }: ColumnToRead,
  table: Table,
  read: ReturnType<typeof cellReader>['read'],
  faults: Message[],
): CaseRow['values'][number] {
  const text = (cells[index] ?? '').trim();
  const ends = RANGE.exec(text);
  const [from, to] = (ends === null ? [text, text] : [ends[1]!, ends[2]!]).map((one) => {
    const value = read(one);
    if (value === 'missing') return Number.NaN;
    if (typeof value === 'number') return toSI(value, unit);
    faults.push({
      code: value.code,
      text: says.ofColumn(table.header[index]!, value.text),
      place: { file: table.file, line, key: table.header[index]! },
    });
    return Number.NaN;
  });
  return from! <= to! ? { from: from!, to: to! } : { from: to!, to: from! };
}
