import { InputError } from '../base/input-error.ts';
import type { Note, Refusal } from '../base/message.ts';
import type { Place } from '../base/place.ts';
import { says } from '../base/says/trials.ts';
import type { Staged } from '../base/staged.ts';
import type { Study } from '../study/study.ts';
import { averaged, type Trial } from './average.ts';
import { leaveOut } from './leave-out.ts';
import type { LedgerEntry } from './ledger.ts';
import { nameColumns } from './name-columns.ts';
import { cellReader } from './number-cell.ts';
import { type ColumnToRead, type RowReader, readRow, type TrialReading } from './read-row.ts';
import type { Table } from './table.ts';

/** Trials in SI with the fate of every row. */
export interface Trials {
  /** One per column that was read; the order of `Trial.values`. */
  readonly keys: readonly string[];
  readonly trials: readonly Trial[];
  readonly ledger: readonly LedgerEntry[];
}

/**
 * Rows of a table to trials in SI: every declared cell a number or the row refused with the reason, missing marks, rows left out, readings averaged.
 * Refusals carry the row's place. A repeated trial name without `readings: average`, a trial in two campaigns and a left-out trial that no row has
 * stop with InputError.
 */
export function readTrials(table: Table, declared: Study['trials'], columns: readonly ColumnToRead[]): Staged<Trials> {
  const { columns: names, faults } = nameColumns(table, declared);
  if (faults.length > 0) throw new InputError(faults);
  const reader: RowReader = {
    table,
    names,
    numbers: rowNumbers(table),
    columns,
    cell: cellReader({ decimal: table.decimal, missing: declared.missing }),
  };
  const rows = table.rows.map((row) => readRow(row, reader));
  const out = leaveOut(rows, declared.leaveOut);
  const used = rows.filter((row) => row.fault === undefined && !out.has(row));
  const repeated = declared.readings === undefined ? twice(rows) : [];
  if (repeated.length > 0) throw new InputError(repeated, 3);
  const trials = averaged(used, table.file);
  const refused = [
    ...badRows(table, reader.numbers),
    ...rows.filter((row) => row.fault !== undefined && !out.has(row)).map((row): Refusal => ({ trial: row.trial, ...row.fault! })),
  ];
  return {
    value: { keys: columns.map(({ key }) => key), trials, ledger: ledgerOf(reader, rows, out, trials) },
    notes: notesOf(table, rows, trials),
    refused,
  };
}

/** Rows count from 1 below the header, those of broken form among them. */
function rowNumbers({ rows, badRows }: Table): ReadonlyMap<number, string> {
  const lines = [...rows, ...badRows].map(({ line }) => line).sort((a, b) => a - b);
  return new Map(lines.map((line, k) => [line, String(k + 1)]));
}

function badRows({ file, badRows }: Table, numbers: ReadonlyMap<number, string>): readonly Refusal[] {
  return badRows.map(({ line, text }) => ({ trial: numbers.get(line)!, code: 'bad-row', text, place: { file, line } }));
}

/** Trial names that stand in more than one row, each told once with its lines. */
function twice(rows: readonly TrialReading[]): readonly { readonly code: string; readonly text: string; readonly place: Place }[] {
  const lines = new Map<string, TrialReading[]>();
  for (const row of rows) if (row.named) lines.set(row.trial, [...(lines.get(row.trial) ?? []), row]);
  return [...lines.values()]
    .filter((same) => same.length > 1)
    .map((same) => ({
      code: 'trial-twice',
      text: says.trialTwice(
        same[0]!.trial,
        same.map((row) => row.line),
      ),
      place: same[1]!.place,
    }));
}

function ledgerOf(
  { table, numbers }: RowReader,
  rows: readonly TrialReading[],
  out: ReadonlyMap<TrialReading, string>,
  trials: readonly Trial[],
): readonly LedgerEntry[] {
  const readings = new Map(trials.map((trial) => [trial.trial, trial.readings]));
  const { file } = table;
  const entries = rows.map((row): LedgerEntry => {
    const { trial, campaign, line } = row;
    const reason = out.get(row);
    if (reason !== undefined) return { trial, campaign, file, line, status: 'left out', reason };
    if (row.fault !== undefined) return { trial, campaign, file, line, status: 'refused', reason: row.fault.text };
    const count = readings.get(trial) ?? 1;
    return { trial, campaign, file, line, status: 'used', reason: count > 1 ? says.oneReadingOf(count, trial) : '' };
  });
  const bad = table.badRows.map(
    ({ line, text }): LedgerEntry => ({ trial: numbers.get(line)!, campaign: '', file, line, status: 'refused', reason: text }),
  );
  return [...entries, ...bad].sort((a, b) => a.line - b.line);
}

function notesOf(table: Table, rows: readonly TrialReading[], trials: readonly Trial[]): readonly Note[] {
  const notes: Note[] = table.remarks.map((remark) => ({ section: 'trials', level: 'note', ...remark }));
  if (table.decimal === ',')
    notes.push({ section: 'trials', level: 'note', code: 'decimal-comma', text: says.decimalComma(), place: { file: table.file } });
  for (const { trial, thin } of trials)
    if (thin.length > 0)
      notes.push({ section: 'trials', level: 'note', code: 'thin-readings', text: says.thinReadings(trial, thin.length), about: trial });
  const unordered = rows.find((row) => Number.isNaN(row.order));
  if (unordered !== undefined)
    notes.push({ section: 'trials', level: 'warning', code: 'order-not-read', text: says.orderNotRead(), place: unordered.place });
  return notes;
}
