import { nearest } from '../base/nearest.ts';
import type { Place } from '../base/place.ts';
import * as says from '../base/says/plant.ts';
import { parseAmount } from '../quantities/amount.ts';
import type { Dimension } from '../quantities/dimension.ts';
import { isFault } from '../quantities/fault.ts';
import { quantityNames, quantityOf } from '../quantities/vocabulary.ts';
import type { Input, Key, Rule } from '../rules/rule.ts';
import type { Placed, QuantityEntry, Study } from '../study/study.ts';
import { findColumn } from '../trials/find-column.ts';
import { splitHeader } from '../trials/header.ts';
import type { CaseRow } from '../trials/read-cases.ts';
import { readCases } from '../trials/read-cases.ts';
import type { Table } from '../trials/table.ts';
import type { Faults } from './faults.ts';
import type { Formula } from './formula-rules.ts';
import { headerOf } from './header.ts';
import type { DeclaredColumn } from './plan.ts';
import type { PlantBasis } from './plant-basis.ts';
import { planQuantities } from './quantity-plan.ts';
import { spreadsOf } from './spreads.ts';

/** What the plant's table and `plant.quantities` state. */
export interface PlantQuantities {
  readonly inputs: readonly Input[];
  readonly columns: readonly DeclaredColumn[];
  readonly rows: readonly CaseRow[];
  /** Constants of all cases that are ranges, SI. */
  readonly ranges: ReadonlyMap<Key, Range>;
  readonly formulas: readonly Formula[];
  readonly rules: readonly Rule[];
  readonly dimensions: ReadonlyMap<Key, Dimension>;
  readonly texts: Readonly<Record<string, string>>;
  readonly remarks: readonly { readonly code: string; readonly text: string }[];
}

/** A constant of all cases that is a range, SI, with its uncertainty. */
interface Range {
  readonly from: number;
  readonly to: number;
  readonly input: Input;
}

const RANGE = /^(.+?)\s+to\s+(.+)$/u;

/** Columns named like quantities are read as such; what the plant states of its own carries sources of its own. */
export function plantQuantities(
  basis: PlantBasis,
  settings: NonNullable<Study['plant']>,
  table: Table | undefined,
  faults: Faults,
): PlantQuantities {
  const { ranges, plain } = rangesOf(settings.quantities, faults);
  const caseColumn = table === undefined ? undefined : caseIndex(table, settings.case, faults);
  const claimed = new Set(Object.values(plain).flatMap(({ is }) => (is.column === undefined ? [] : [is.column.is])));
  const named = table === undefined ? { entries: {}, texts: {}, remarks: [] } : namedColumns(table, caseColumn, claimed, basis, faults);
  const planned = planQuantities({ ...named.entries, ...plain }, table === undefined ? undefined : headerOf(table), faults);
  const read = table === undefined ? { rows: [], faults: [] } : readCases(table, planned.columns, caseColumn);
  for (const { code, text, place } of read.faults) faults.add(code, text, place!);
  return {
    inputs: [...planned.inputs, ...[...ranges.values()].map(({ input }) => input)].map((input) => ofThePlant(input, basis)),
    columns: planned.columns,
    rows: read.rows,
    ranges,
    formulas: planned.formulas,
    rules: planned.rules,
    dimensions: planned.dimensions,
    texts: { ...named.texts, ...planned.texts },
    remarks: [...named.remarks, ...planned.remarks],
  };
}

/**
 * The rig's instruments do not stand at the plant: its sources get names of their own. A property for which the plant states no uncertainty keeps the
 * source it has in the study, so that the same error shifts rig and plant together.
 */
const ofThePlant = (input: Input, { sources }: PlantBasis): Input => ({
  ...input,
  label: `plant ${input.label}`,
  ...(input.systematic === undefined
    ? sources[input.key] === undefined
      ? {}
      : { systematic: sources[input.key]! }
    : { systematic: input.systematic.map((one) => ({ ...one, source: `plant ${one.source}`, per: 'study' as const })) }),
});

type Entries = Readonly<Record<string, Placed<QuantityEntry>>>;

/** `rotation_speed: 400 to 600 rpm` among the constants. */
function rangesOf(entries: Entries, faults: Faults): { readonly ranges: Map<Key, Range>; readonly plain: Entries } {
  const ranges = new Map<Key, Range>();
  const plain: Record<string, Placed<QuantityEntry>> = {};
  for (const [key, entry] of Object.entries(entries)) {
    const ends = RANGE.exec(entry.is.value?.is ?? '');
    if (ends === null) plain[key] = entry;
    else {
      const range = rangeOf(key, entry, [ends[1]!, ends[2]!], faults);
      if (range !== undefined) ranges.set(key, range);
    }
  }
  return { ranges, plain };
}

/** Both ends in the unit that stands behind the second one. */
function rangeOf(key: Key, { is, place }: Placed<QuantityEntry>, ends: readonly [string, string], faults: Faults): Range | undefined {
  const quantity = quantityOf(key);
  const unit = is.unit?.is ?? / (\S.*)$/u.exec(ends[1].trim())?.[1];
  const amounts = ends.map((text) => {
    const bare = unit !== undefined && text.trim().endsWith(unit) ? text.trim().slice(0, -unit.length).trim() : text;
    return parseAmount(bare, quantity, unit);
  });
  const [low, high] = amounts;
  for (const one of amounts) if (isFault(one)) faults.add(one.code, `${key}: ${one.text}`, is.value?.place ?? place);
  if (isFault(low!) || isFault(high!)) return undefined;
  const spreads = spreadsOf(key, is, quantity, low!.unit, 'systematic', faults);
  return { from: Math.min(low!.si, high!.si), to: Math.max(low!.si, high!.si), input: { key, label: key, ...spreads } };
}

const CASE_NAMES = ['case', 'name', 'plant case', 'plant', 'unit'];

/** The column that names the case: as the study says, else one called case or name. */
function caseIndex(table: Table, asked: Placed<string> | undefined, faults: Faults): number | undefined {
  if (asked !== undefined) {
    const found = findColumn(table, asked.is);
    if (!isFault(found)) return found.index;
    faults.add(found.code, found.text, asked.place);
    return undefined;
  }
  const at = table.header.findIndex((text) => CASE_NAMES.includes(text.trim().toLowerCase()));
  return at < 0 ? undefined : at;
}

/** Every other column that bears the name of a quantity or of a group that is a column. A near miss is a fault, a stranger is said. */
function namedColumns(
  table: Table,
  caseColumn: number | undefined,
  claimed: ReadonlySet<string>,
  basis: PlantBasis,
  faults: Faults,
): { readonly entries: Entries; readonly texts: Record<string, string>; readonly remarks: { code: string; text: string }[] } {
  const entries: Record<string, Placed<QuantityEntry>> = {};
  const texts: Record<string, string> = {};
  const remarks: { code: string; text: string }[] = [];
  const trusted = Object.entries(basis.groups).flatMap(([name, { is }]) => (is.column === undefined ? [] : [name]));
  const own = [...Object.keys(basis.dimensions), ...trusted];
  const known = [...quantityNames, ...own];
  table.header.forEach((text, index) => {
    const { name } = splitHeader(text);
    if (text.trim() === '' || index === caseColumn || claimed.has(text) || claimed.has(name)) return;
    const place: Place = { file: table.file, line: table.headerLine, key: text };
    if (quantityOf(name)?.kind === 'text') {
      texts[name] = [...new Set(table.rows.map((row) => (row.cells[index] ?? '').trim()))].filter((cell) => cell !== '').join(', ');
    } else if (quantityOf(name) !== undefined || own.includes(name)) {
      if (entries[name] !== undefined) faults.add('column-twice', says.columnTwice(name), place);
      entries[name] = { is: { column: { is: text, place } }, place };
    } else {
      const meant = nearest(name, known);
      if (meant !== undefined && meant.length > 3) faults.add('unknown-column', says.unknownColumn(name, meant), place);
      else remarks.push({ code: 'unused-column', text: says.unusedColumn(table.file, name) });
    }
  });
  return { entries, texts, remarks };
}
