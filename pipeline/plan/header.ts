import type { Place } from '../base/place.ts';
import * as says from '../base/says/plan.ts';
import { splitHeader } from '../trials/header.ts';
import type { Table } from '../trials/table.ts';
import type { Faults } from './faults.ts';

/** A column found: its name without the unit, its position, and the unit text of its header or units row. */
export interface FoundColumn {
  readonly name: string;
  readonly index: number;
  readonly unit?: string;
}

/** The header of a table as a study may refer to it: by the whole heading (`T [degC]`) or by its name alone (`T`). */
export interface Header {
  readonly names: readonly string[];
  /** Adds a fault at `place` where there is no such column or more than one. */
  readonly find: (text: string, place: Place, faults: Faults) => FoundColumn | undefined;
}

export function headerOf(table: Table): Header {
  const columns = table.header.map((cell, index) => {
    const { name, unit } = splitHeader(cell);
    const below = table.unitsRow?.[index]?.trim();
    return { cell: cell.trim(), name, index, unit: unit ?? (below === '' ? undefined : below) };
  });
  const find = (text: string, place: Place, faults: Faults): FoundColumn | undefined => {
    const whole = columns.filter((column) => column.cell === text.trim());
    const found = whole.length > 0 ? whole : columns.filter((column) => column.name === text.trim());
    if (found.length === 0)
      faults.add(
        'no-such-column',
        says.noSuchColumn(
          text,
          columns.map((column) => column.cell),
        ),
        place,
      );
    if (found.length > 1) faults.add('column-twice', says.columnTwice(text), place);
    const [one] = found;
    return one === undefined || found.length > 1
      ? undefined
      : { name: one.name, index: one.index, ...(one.unit === undefined ? {} : { unit: one.unit }) };
  };
  return { names: columns.map((column) => column.cell), find };
}
