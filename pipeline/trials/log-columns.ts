import { InputError } from '../base/input-error.ts';
import type { Message } from '../base/message.ts';
import type { Place } from '../base/place.ts';
import { says } from '../base/says/trials.ts';
import { type Fault, fault, isFault } from '../quantities/fault.ts';
import { toSI, type Unit } from '../quantities/unit.ts';
import { unitFor } from '../quantities/unit-for.ts';
import { type Quantity, quantities } from '../quantities/vocabulary.ts';
import { clockSeconds } from './clock.ts';
import { findColumn } from './find-column.ts';
import type { LogHead } from './log-stream.ts';
import { cellReader } from './number-cell.ts';

/** A column of a log as the study names it. */
export interface LogColumn {
  readonly column: string;
  /** Overrides what the log tells. */
  readonly unit?: string;
  /** Checks the dimension where it is known. */
  readonly quantity?: Quantity;
  /** Position and unit, where they are settled already. */
  readonly settled?: { readonly index: number; readonly unit: Unit };
  /** Where the study names it. */
  readonly place: Place;
}

/** Position of a column and what turns its cell into SI; `missing` cells are no faults. */
export interface LogCell {
  readonly index: number;
  readonly header: string;
  readonly unit?: Unit;
  readonly read: (text: string) => number | 'missing' | Fault;
}

/** A column of numbers. Faults of name and unit are thrown at the study's place (exit 2). */
export function valueCell(head: LogHead, column: LogColumn, missing: readonly string[]): LogCell {
  if (column.settled !== undefined) {
    const { index, unit } = column.settled;
    const cell = cellReader({ decimal: head.decimal, missing });
    return { index, header: head.header[index]!, unit, read: (text) => inSI(cell.read(text), unit) };
  }
  const { index, header, unit } = located(head, column);
  if (unit === undefined && column.quantity !== undefined && column.quantity.unit !== '1')
    throw stop(fault('unit-missing', says.logUnitMissing(header, column.quantity.unit)), column.place);
  const read = unitFor(column.quantity, unit ?? '');
  if (isFault(read)) throw stop(read, column.place);
  const cell = cellReader({ decimal: head.decimal, missing });
  return { index, header, unit: read, read: (text) => inSI(cell.read(text), read) };
}

/** The column of time: numbers with a unit, or dates and times of day, which count from the first one. */
export function timeCell(head: LogHead, column: LogColumn, missing: readonly string[]): LogCell {
  const { index, header, unit } = located(head, column);
  if (unit !== undefined) return valueCell(head, { ...column, unit, quantity: quantities.time! }, missing);
  const cell = cellReader({ decimal: head.decimal, missing });
  const read = (text: string): number | 'missing' | Fault => {
    const seconds = clockSeconds(text);
    if (!Number.isNaN(seconds)) return seconds;
    return cell.isMissing(text) ? 'missing' : fault('time-not-read', says.timeNotRead(text));
  };
  return { index, header, read };
}

const inSI = (value: number | 'missing' | Fault, unit: Unit): number | 'missing' | Fault =>
  typeof value === 'number' ? toSI(value, unit) : value;

function located(head: LogHead, column: LogColumn): { readonly index: number; readonly header: string; readonly unit: string | undefined } {
  const found = findColumn(head, column.column);
  if (isFault(found)) throw stop(found, column.place);
  return { index: found.index, header: found.header, unit: column.unit ?? found.unit?.text };
}

const stop = ({ code, text }: Fault, place: Place): InputError => new InputError([{ code, text, place } satisfies Message]);
