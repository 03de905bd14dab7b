import * as XLSX from '@e965/xlsx';
import type { Place } from '../../pipeline/base/place.ts';
import { isFault } from '../../pipeline/quantities/fault.ts';
import { unitFor } from '../../pipeline/quantities/unit-for.ts';
import { quantityOf } from '../../pipeline/quantities/vocabulary.ts';
import type { Study } from '../../pipeline/study/study.ts';
import { findColumn } from '../../pipeline/trials/find-column.ts';
import { sumLedger } from '../../pipeline/trials/ledger.ts';
import { readTable } from '../../pipeline/trials/read-table.ts';
import { readTrials } from '../../pipeline/trials/read-trials.ts';
import type { Table } from '../../pipeline/trials/table.ts';

/** A table as a rig prints it, what a study declares of it, and what must come of it. */
export interface Sample {
  readonly says: string;
  readonly file?: string;
  readonly text?: string;
  readonly bytes?: Buffer;
  readonly sheet?: string;
  /** Quantity -> column, and its unit where the table tells none. */
  readonly read: Readonly<Record<string, string | readonly [column: string, unit: string]>>;
  readonly trials?: Partial<Study['trials']>;
}

export interface ReadSample {
  readonly table: Table;
  /** One per trial: its name and its values in SI, in the order of `read`. */
  readonly rows: readonly (readonly [string, ...number[]])[];
  /** `line: reason` of every row that is not used. */
  readonly out: readonly string[];
  readonly notes: readonly string[];
  /** Faults of columns and units, before any row is read. */
  readonly faults: readonly string[];
}

export const place: Place = { file: 'study.yaml', line: 1 };
export const placed = <T>(is: T) => ({ is, place });

export const declared = (trials: Partial<Study['trials']> = {}): Study['trials'] => ({
  file: placed('trials.csv'),
  missing: [],
  leaveOut: [],
  ...trials,
});

export function readSample(sample: Sample): ReadSample {
  const wanted = Object.entries(sample.read).map(([key, column]) => ({
    key,
    column: typeof column === 'string' ? column : column[0],
    unit: typeof column === 'string' ? undefined : column[1],
  }));
  const table = readTable(sample.bytes ?? Buffer.from(sample.text ?? ''), {
    file: sample.file ?? 'trials.csv',
    ...(sample.sheet === undefined ? {} : { sheet: sample.sheet }),
    expects: wanted.map(({ column }) => column),
  });
  const faults: string[] = [];
  const columns = wanted.flatMap(({ key, column, unit }) => {
    const found = findColumn(table, column);
    if (isFault(found)) {
      faults.push(found.text);
      return [];
    }
    const read = unitFor(quantityOf(key), unit ?? found.unit?.text ?? '');
    if (!isFault(read)) return [{ key, index: found.index, unit: read }];
    faults.push(read.text);
    return [];
  });
  const { value, notes } = readTrials(table, declared(sample.trials), columns);
  const sums = sumLedger(value.ledger);
  if (sums.read !== sums.used + sums.leftOut + sums.refused || sums.read !== table.rows.length + table.badRows.length)
    throw new Error('the ledger does not add up');
  return {
    table,
    rows: value.trials.map(({ trial, values }) => [trial, ...values] as const),
    out: value.ledger.filter((entry) => entry.status !== 'used').map((entry) => `${entry.line}: ${entry.reason}`),
    notes: notes.map((note) => note.code),
    faults,
  };
}

/** A workbook of one sheet from rows of cells; `undefined` leaves a cell empty. */
export function workbook(
  rows: readonly (readonly unknown[])[],
  change: (sheet: XLSX.WorkSheet, book: XLSX.WorkBook) => void = () => {},
): Buffer {
  const sheet = XLSX.utils.aoa_to_sheet(rows as unknown[][], { cellDates: true });
  const book = XLSX.utils.book_new();
  XLSX.utils.book_append_sheet(book, sheet, 'Trials');
  change(sheet, book);
  return XLSX.write(book, { type: 'buffer', bookType: 'xlsx', cellDates: true }) as Buffer;
}
