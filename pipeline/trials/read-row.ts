import type { Place } from '../base/place.ts';
import { says } from '../base/says/trials.ts';
import { toSI, type Unit } from '../quantities/unit.ts';
import { quantityOf } from '../quantities/vocabulary.ts';
import { headerText } from './header.ts';
import type { NameColumns } from './name-columns.ts';
import type { CellReader } from './number-cell.ts';
import { orderOf } from './order.ts';
import type { Table, TableRow } from './table.ts';

/** A column whose cells become numbers in SI. */
export interface ColumnToRead {
  readonly key: string;
  /** Position in the table, from 0. */
  readonly index: number;
  readonly unit: Unit;
  /** An empty cell refuses the row; true where left out. */
  readonly needed?: boolean;
}

/** One row as a reading of a trial. */
export interface TrialReading {
  readonly trial: string;
  /** The row tells its own trial name. */
  readonly named: boolean;
  readonly campaign: string;
  readonly setting?: string;
  /** Time or sequence; NaN where the cell is neither. */
  readonly order?: number;
  readonly line: number;
  readonly place: Place;
  /** SI, one per column; NaN where missing. */
  readonly values: Float64Array;
  /** Why the row is refused. */
  readonly fault?: { readonly code: string; readonly text: string; readonly place: Place };
}

export interface RowReader {
  readonly table: Table;
  readonly names: NameColumns;
  /** Line -> number of the row, which names a trial that has no name. */
  readonly numbers: ReadonlyMap<number, string>;
  readonly columns: readonly ColumnToRead[];
  readonly cell: CellReader;
}

/** Name of the one campaign where the study tells none. */
export const onlyCampaign = 'all';

/** A row to numbers in SI; the first cell that is none refuses it. */
export function readRow(row: TableRow, reader: RowReader): TrialReading {
  const { table, names, columns } = reader;
  const named = (index: number | undefined): string | undefined => (index === undefined ? undefined : headerText(row.cells[index] ?? ''));
  const trial = named(names.trial) || reader.numbers.get(row.line)!;
  const place = { file: table.file, line: row.line };
  const values = new Float64Array(columns.length).fill(Number.NaN);
  const fault = nameFault(row, reader) ?? fillValues(row, reader, values);
  const setting = named(names.setting);
  const order = named(names.order);
  return {
    trial,
    named: names.trial !== undefined && named(names.trial) !== '',
    campaign: named(names.campaign) ?? onlyCampaign,
    ...(setting === undefined || setting === '' ? {} : { setting }),
    ...(order === undefined ? {} : { order: orderOf(order, table.decimal) }),
    line: row.line,
    place,
    values,
    ...(fault === undefined ? {} : { fault: { ...fault, place: { ...place, key: fault.column, trial } } }),
  };
}

interface CellFault {
  readonly code: string;
  readonly text: string;
  readonly column: string;
}

function nameFault({ cells }: TableRow, { table, names, cell }: RowReader): CellFault | undefined {
  for (const index of [names.trial, names.campaign]) {
    if (index !== undefined && cell.isMissing(cells[index] ?? '')) {
      const column = table.header[index]!;
      return { code: 'no-name', text: says.noName(column), column };
    }
  }
  return undefined;
}

/** Fills `values`; the fault of the first cell that is no number, or empty and needed. */
function fillValues({ cells }: TableRow, { table, columns, cell }: RowReader, values: Float64Array): CellFault | undefined {
  let empty: CellFault | undefined;
  for (const [k, { key, index, unit, needed = true }] of columns.entries()) {
    const column = table.header[index]!;
    const read = cell.read(cells[index] ?? '');
    if (read === 'missing') {
      if (needed) empty ??= { code: 'empty-cell', text: says.emptyCell(column, cells[index] ?? ''), column };
      continue;
    }
    if (typeof read !== 'number') return { code: read.code, text: says.ofColumn(column, read.text), column };
    const si = toSI(read, unit);
    const wrong = impossible(key, si, cells[index]!);
    if (wrong !== undefined) return { code: 'impossible-value', text: says.ofColumn(column, wrong), column };
    values[k] = si;
  }
  return empty;
}

function impossible(key: string, si: number, text: string): string | undefined {
  if (!Number.isFinite(si)) return says.tooLargeInSI(text);
  return quantityOf(key)?.kind === 'temperature' && !(si > 0) ? says.belowZero(text) : undefined;
}
