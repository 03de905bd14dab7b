import { says } from '../base/says/trials.ts';
import type { Staged } from '../base/staged.ts';
import { Growing } from './growing.ts';
import { type LogCell, type LogColumn, timeCell, valueCell } from './log-columns.ts';
import { type LogSource, streamLog } from './log-stream.ts';
import { Skipped } from './skipped.ts';

/** Declared columns of a log in SI: 8 bytes a number, nothing else is held. */
export interface Log {
  readonly file: string;
  readonly keys: readonly string[];
  /** s, ascending; dates count from the first row. */
  readonly time: Float64Array;
  readonly lines: Float64Array;
  /** One per key. */
  readonly values: readonly Float64Array[];
  /** rows = length of `time` + rows skipped. */
  readonly rows: number;
  readonly skipped: number;
}

export interface LogSpec {
  readonly time: LogColumn;
  readonly columns: readonly (LogColumn & { readonly key: string })[];
  readonly missing: readonly string[];
}

/** A log to columns in SI. A row with a declared cell that is missing or no number, or whose time runs backwards, is skipped, counted and told. */
export async function readLog(source: LogSource, spec: LogSpec): Promise<Staged<Log>> {
  const time = new Growing();
  const lines = new Growing();
  const values = spec.columns.map(() => new Growing());
  const skipped = new Skipped();
  let last = Number.NEGATIVE_INFINITY;
  const totals = await streamLog(source, [spec.time.column, ...spec.columns.map(({ column }) => column)], (head) => {
    const clock = timeCell(head, spec.time, spec.missing);
    const cells = spec.columns.map((column) => valueCell(head, column, spec.missing));
    const all = [clock, ...cells];
    const numbers = new Float64Array(all.length);
    return (row, line) => {
      if (!fillRow(all, row, line, numbers, skipped)) return;
      if (numbers[0]! < last) {
        skipped.add('time-backwards', line, says.logBackwards());
        return;
      }
      last = numbers[0]!;
      time.push(last);
      lines.push(line);
      for (const [k, column] of values.entries()) column.push(numbers[k + 1]!);
    };
  });
  for (let k = 0; k < totals.ragged.count; k++) skipped.add('log-ragged', totals.ragged.firstLine!, says.logRagged());
  const log = {
    file: source.file,
    keys: spec.columns.map(({ key }) => key),
    time: time.toArray(),
    lines: lines.toArray(),
    values: values.map((one) => one.toArray()),
  };
  return { value: { ...log, rows: totals.rows, skipped: skipped.rows }, notes: skipped.notes(source.file), refused: [] };
}

/** False where a cell is no number; the first such cell is counted. */
function fillRow(cells: readonly LogCell[], row: readonly string[], line: number, numbers: Float64Array, skipped: Skipped): boolean {
  for (let k = 0; k < cells.length; k++) {
    const cell = cells[k]!;
    const read = cell.read(row[cell.index]!);
    if (typeof read !== 'number') {
      if (read === 'missing') skipped.add('log-missing', line, says.emptyCell(cell.header, row[cell.index]!));
      else skipped.add(read.code, line, says.ofColumn(cell.header, read.text));
      return false;
    }
    numbers[k] = read;
  }
  return true;
}
