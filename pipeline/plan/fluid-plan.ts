import type { Place } from '../base/place.ts';
import * as says from '../base/says/plan.ts';
import { diffusivityRules } from '../fluids/diffusivity/diffusivity-rules.ts';
import { fluidNames, fluidRules } from '../fluids/fluid-rules.ts';
import { type Conditions, pressureRules } from '../fluids/property-rules.ts';
import { tableRules } from '../fluids/table-rules.ts';
import { readDecimal } from '../quantities/decimal.ts';
import { isFault } from '../quantities/fault.ts';
import { toSI } from '../quantities/unit.ts';
import { unitFor } from '../quantities/unit-for.ts';
import { quantityOf } from '../quantities/vocabulary.ts';
import type { Rule } from '../rules/rule.ts';
import type { FluidEntry, Placed, Study } from '../study/study.ts';
import { splitHeader } from '../trials/header.ts';
import type { Table } from '../trials/table.ts';
import type { Faults } from './faults.ts';

type Stream = 'own' | 'other';

/** Rules for the properties of the study's stream or streams. `tables`: the property tables the study names, by file. */
export function planFluids(
  fluid: Study['fluid'],
  tables: ReadonlyMap<string, Table>,
  faults: Faults,
  given: readonly string[] = [],
): readonly Rule[] {
  if (fluid === undefined) return estimates(given, {});
  return (['own', 'other'] as const).flatMap((stream) => {
    const entry = fluid[stream];
    return entry === undefined ? [] : streamRules(entry, stream, tables, faults, given);
  });
}

function streamRules(
  { is: entry, place }: Placed<FluidEntry>,
  stream: Stream,
  tables: ReadonlyMap<string, Table>,
  faults: Faults,
  given: readonly string[],
): readonly Rule[] {
  const at = Object.fromEntries(Object.entries(entry.at).map(([condition, held]) => [condition, held.is]));
  if (entry.name !== undefined) {
    if (fluidNames.includes(entry.name.is)) return fluidRules({ name: entry.name.is, stream, at });
    faults.add('unknown-fluid', says.unknownFluid(entry.name.is, fluidNames), entry.name.place);
    return [];
  }
  const file = entry.table?.is;
  const table = file === undefined ? undefined : tables.get(file);
  if (table === undefined) return [];
  const columns = numericColumns(table, entry.table!.place, faults);
  const made = tableRules({ file: file!, stream, by: (entry.by ?? []).map(({ is }) => is), columns, at });
  for (const text of made.faults) faults.add('property-table', `${file}: ${text}`, place);
  return stream === 'own' ? [...made.rules, ...estimates(given, at)] : made.rules;
}

/** What estimators of the diffusivity start from: a study without a fluid by name that gives one of them wants an estimate. */
const estimated = new Set(['solute_molar_volume', 'solute_radius', 'diffusion_volume']);

const estimates = (given: readonly string[], at: Conditions): readonly Rule[] =>
  given.some((key) => estimated.has(key))
    ? [...diffusivityRules('own', 'liquid', at), ...diffusivityRules('own', 'gas', at), ...pressureRules({ title: 'the gas' }, 'own', at)]
    : [];

/** A property table's columns in SI by quantity name; every cell must be a number. */
function numericColumns(table: Table, place: Place, faults: Faults): Readonly<Record<string, readonly number[]>> {
  const columns: Record<string, number[]> = {};
  table.header.forEach((cell, index) => {
    const { name, unit: inHeader } = splitHeader(cell);
    const quantity = quantityOf(name);
    const unit = unitFor(quantity, inHeader ?? table.unitsRow?.[index] ?? '1');
    if (isFault(unit)) {
      faults.add(unit.code, `${table.file}: ${name}: ${unit.text}`, place);
      return;
    }
    columns[name] = table.rows.map((row) => {
      const value = readDecimal(row.cells[index] ?? '', table.decimal);
      if (typeof value === 'number') return toSI(value, unit);
      faults.add(value.code, value.text, { file: table.file, line: row.line, key: name });
      return Number.NaN;
    });
  });
  return columns;
}
