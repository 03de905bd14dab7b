import { utils, write } from '@e965/xlsx';
import type { ColumnTable } from 'arquero';
import { lawSheet } from './law-sheet.ts';
import type { StudyResult } from './study-result.ts';
import { auditTable, plantTable, trialsTable } from './tables.ts';

type Cells = (string | number | null)[][];

/** `results.xlsx`: the result tables, and a sheet where the chosen law is a live formula with the reader's own inputs. */
export function workbook(result: StudyResult): Uint8Array {
  const book = utils.book_new();
  const sheets: readonly (readonly [string, ColumnTable | undefined])[] = [
    ['trials', trialsTable(result)],
    ['audit', auditTable(result)],
    ['plant', plantTable(result)],
  ];
  utils.book_append_sheet(book, lawSheet(result), 'law');
  for (const [name, table] of sheets) if (table !== undefined) utils.book_append_sheet(book, utils.aoa_to_sheet(cellsOf(table)), name);
  return new Uint8Array(write(book, { type: 'array', bookType: 'xlsx', compression: true }) as ArrayBuffer);
}

function cellsOf(table: ColumnTable): Cells {
  const names = table.columnNames();
  const columns = names.map((name) => table.array(name) as (string | number | null)[]);
  return [names, ...Array.from({ length: table.numRows() }, (_, i) => columns.map((column) => finite(column[i] ?? null)))];
}

/** A workbook has no cell for infinity. */
const finite = (cell: string | number | null): string | number | null => (typeof cell === 'number' && !Number.isFinite(cell) ? null : cell);
