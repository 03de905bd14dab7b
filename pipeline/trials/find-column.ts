import { nearest } from '../base/nearest.ts';
import { says } from '../base/says/trials.ts';
import { type Fault, fault } from '../quantities/fault.ts';
import { headerText, splitHeader } from './header.ts';
import type { Table } from './table.ts';

/** A column that the study names, and the unit that the table itself tells for it. */
export interface FoundColumn {
  readonly index: number;
  /** Header as it stands in the file. */
  readonly header: string;
  readonly unit?: { readonly text: string; readonly from: 'header' | 'units row' };
}

/** A column by its whole header (`T [degC]`) or by its name alone (`T`). Refused where none or more than one is meant, or where header and units row contradict. */
export function findColumn(table: Pick<Table, 'header' | 'unitsRow'>, wanted: string): FoundColumn | Fault {
  const text = headerText(wanted);
  const whole = indices(table.header, (header) => header === text);
  const found = whole.length > 0 ? whole : indices(table.header, (header) => splitHeader(header).name === text);
  if (found.length > 1)
    return fault(
      'column-twice',
      says.columnTwice(
        wanted,
        found.map((k) => table.header[k]!),
      ),
    );
  if (found.length === 0) return fault('no-such-column', noSuchColumn(table, text));
  return withUnit(table, found[0]!);
}

const indices = (header: readonly string[], is: (text: string) => boolean): readonly number[] =>
  header.flatMap((text, k) => (text !== '' && is(text) ? [k] : []));

function withUnit({ header, unitsRow }: Pick<Table, 'header' | 'unitsRow'>, index: number): FoundColumn | Fault {
  const inHeader = splitHeader(header[index]!).unit;
  const below = unitsRow?.[index];
  const found = { index, header: header[index]! };
  if (inHeader !== undefined && below !== undefined && below !== '' && below !== inHeader)
    return fault('unit-twice', says.unitsContradict(header[index]!, inHeader, below));
  if (inHeader !== undefined) return { ...found, unit: { text: inHeader, from: 'header' } };
  return below === undefined || below === '' ? found : { ...found, unit: { text: below, from: 'units row' } };
}

function noSuchColumn({ header }: Pick<Table, 'header'>, text: string): string {
  const names = header.filter((name) => name !== '');
  return says.noSuchColumn(text, names, nearest(text, [...names, ...names.map((name) => splitHeader(name).name)]));
}
