import type { Message } from '../base/message.ts';
import { isFault } from '../quantities/fault.ts';
import type { Placed, Study } from '../study/study.ts';
import { findColumn } from './find-column.ts';
import type { Table } from './table.ts';

/** Positions of the columns that name and order trials; undefined where the study names none. */
export interface NameColumns {
  readonly trial?: number;
  readonly campaign?: number;
  readonly setting?: number;
  readonly order?: number;
}

/** The columns under `trials:` of a study file, with a message at the study's place for each that the table does not have. */
export function nameColumns(
  table: Table,
  declared: Study['trials'],
): { readonly columns: NameColumns; readonly faults: readonly Message[] } {
  const faults: Message[] = [];
  const index = (column: Placed<string> | undefined): number | undefined => {
    if (column === undefined) return undefined;
    const found = findColumn(table, column.is);
    if (!isFault(found)) return found.index;
    faults.push({ code: found.code, text: found.text, place: column.place });
    return undefined;
  };
  const columns = {
    trial: index(declared.trial),
    campaign: index(declared.campaign),
    setting: index(declared.setting),
    order: index(declared.order),
  };
  return { columns, faults };
}
