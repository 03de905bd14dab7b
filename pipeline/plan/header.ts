import type { Place } from '../base/place.ts';
import { isFault } from '../quantities/fault.ts';
import { findColumn } from '../trials/find-column.ts';
import { splitHeader } from '../trials/header.ts';
import type { Table } from '../trials/table.ts';
import type { Faults } from './faults.ts';

/** A column found: its name without the unit, its position, and the unit text of its header or units row. */
interface NamedColumn {
  readonly name: string;
  readonly index: number;
  readonly unit?: string;
}

/** The header of a table as a study may refer to it: by the whole heading (`T [degC]`) or by its name alone (`T`). */
export interface Header {
  /** Adds a fault at `place` where there is no such column, more than one, or two units for it. */
  readonly find: (text: string, place: Place, faults: Faults) => NamedColumn | undefined;
}

export const headerOf = (table: Table): Header => ({
  find: (text, place, faults) => {
    const found = findColumn(table, text);
    if (!isFault(found))
      return { name: splitHeader(found.header).name, index: found.index, ...(found.unit === undefined ? {} : { unit: found.unit.text }) };
    faults.add(found.code, found.text, place);
    return undefined;
  },
});
