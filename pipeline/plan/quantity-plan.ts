import { nearest } from '../base/nearest.ts';
import type { Place } from '../base/place.ts';
import * as says from '../base/says/plan.ts';
import { parseAmount } from '../quantities/amount.ts';
import type { Dimension } from '../quantities/dimension.ts';
import { isFault } from '../quantities/fault.ts';
import type { Unit } from '../quantities/unit.ts';
import { unitFor } from '../quantities/unit-for.ts';
import { type Quantity, quantityNames, quantityOf } from '../quantities/vocabulary.ts';
import type { Input, Key, Rule } from '../rules/rule.ts';
import type { Placed, QuantityEntry } from '../study/study.ts';
import type { Faults } from './faults.ts';
import type { Header } from './header.ts';
import type { DeclaredColumn } from './plan.ts';
import { readingKey, referenceRules } from './references.ts';
import { spreadsOf } from './spreads.ts';

/** Said of a name or unit at its place; no fault. */
interface Remark {
  readonly code: string;
  readonly text: string;
  readonly place: Place;
}

/** Quantities of a study settled: recipe inputs, the columns they are read from, formulas still to be parsed, texts, and each name's dimension. */
export interface QuantityPlan {
  readonly inputs: Input[];
  readonly columns: DeclaredColumn[];
  readonly formulas: { readonly key: Key; readonly text: string; readonly place: Place }[];
  readonly texts: Record<string, string>;
  readonly dimensions: Map<Key, Dimension>;
  /** Unit as written, for print; SI where the quantity is known. */
  readonly units: Map<Key, string>;
  /** From readings that are not yet the quantity: gauge pressures, gas volumes at a reference condition. */
  readonly rules: Rule[];
  readonly remarks: Remark[];
}

/** `header` is undefined where the table has none of its own (plant conditions in the study file). */
export function planQuantities(
  entries: Readonly<Record<string, Placed<QuantityEntry>>>,
  header: Header | undefined,
  faults: Faults,
): QuantityPlan {
  const plan: QuantityPlan = {
    inputs: [],
    columns: [],
    formulas: [],
    texts: {},
    dimensions: new Map(),
    units: new Map(),
    rules: [],
    remarks: [],
  };
  for (const [key, entry] of Object.entries(entries)) planQuantity(key, entry, header, plan, faults);
  oneKindOfConcentration(plan, faults, entries);
  return plan;
}

function planQuantity(
  key: Key,
  { is, place }: Placed<QuantityEntry>,
  header: Header | undefined,
  plan: QuantityPlan,
  faults: Faults,
): void {
  const quantity = quantityOf(key);
  if (quantity === undefined) remarkOwnName(key, place, plan);
  if (quantity?.kind === 'text') planText(key, is, place, plan, faults);
  else if (is.formula !== undefined) planFormula(key, is, quantity, plan, faults);
  else if (is.value !== undefined) planValue(key, is, quantity, plan, faults);
  else if (is.column !== undefined) planColumn(key, is, quantity, header, plan, faults);
}

function remarkOwnName(key: Key, place: Place, plan: QuantityPlan): void {
  const meant = nearest(key, quantityNames);
  if (meant !== undefined && meant.length > 3) plan.remarks.push({ code: 'own-name', text: says.ownName(key, meant), place });
}

function planText(key: Key, entry: QuantityEntry, place: Place, plan: QuantityPlan, faults: Faults): void {
  if (entry.value !== undefined) plan.texts[key] = entry.value.is;
  else faults.add('text-quantity', says.textQuantity(key), place);
}

function planFormula(key: Key, entry: QuantityEntry, quantity: Quantity | undefined, plan: QuantityPlan, faults: Faults): void {
  for (const stated of [entry.random, entry.systematic, entry.accuracy, entry.expanded])
    if (stated !== undefined) faults.add('not-exact', says.notExact(key), stated.place);
  plan.formulas.push({ key, text: entry.formula!.is, place: entry.formula!.place });
  if (quantity !== undefined) plan.dimensions.set(key, quantity.dimension);
}

function planValue(key: Key, entry: QuantityEntry, quantity: Quantity | undefined, plan: QuantityPlan, faults: Faults): void {
  const { is, place } = entry.value!;
  const amount = parseAmount(is, quantity, entry.unit?.is);
  if (isFault(amount)) {
    faults.add(amount.code, `${key}: ${amount.text}`, place);
    return;
  }
  settleUnit(key, amount.unit, place, plan);
  const spreads = spreadsOf(key, entry, quantity, amount.unit, 'systematic', faults);
  plan.inputs.push({ key: readingKey(key, amount.unit), constant: amount.si, label: labelOf(key, entry), ...spreads });
}

function planColumn(
  key: Key,
  entry: QuantityEntry,
  quantity: Quantity | undefined,
  header: Header | undefined,
  plan: QuantityPlan,
  faults: Faults,
): void {
  const { is, place } = entry.column!;
  const found = header?.find(is, place, faults);
  if (found === undefined) return;
  const text = entry.unit?.is ?? found.unit;
  const unitPlace = entry.unit?.place ?? place;
  if (text === undefined && quantity !== undefined && quantity.unit !== '1') {
    faults.add('unit-missing', says.noUnit(key, quantity.unit), place);
    return;
  }
  const unit = unitFor(quantity, text ?? '1');
  if (isFault(unit)) {
    faults.add(unit.code, `${key}: ${unit.text}`, unitPlace);
    return;
  }
  settleUnit(key, unit, unitPlace, plan);
  const reading = readingKey(key, unit);
  plan.columns.push({ key: reading, column: found.name, index: found.index, unit, place });
  plan.inputs.push({ key: reading, label: labelOf(key, entry), ...spreadsOf(key, entry, quantity, unit, 'random', faults) });
}

function settleUnit(key: Key, unit: Unit, place: Place, plan: QuantityPlan): void {
  plan.dimensions.set(key, unit.dimension);
  plan.units.set(key, unit.text);
  plan.rules.push(...referenceRules(key, unit));
  for (const note of unit.notes) plan.remarks.push({ ...note, place });
}

/** What a report calls this source of uncertainty. */
const labelOf = (key: Key, entry: QuantityEntry): string => entry.instrument?.is ?? key;

/** kg/m^3 or mol/m^3, one kind per study: they would be subtracted from each other. */
function oneKindOfConcentration(plan: QuantityPlan, faults: Faults, entries: Readonly<Record<string, Placed<QuantityEntry>>>): void {
  const kinds = [...plan.dimensions].filter(([key]) => quantityOf(key)?.molar !== undefined && key.includes('concentration'));
  const first = kinds[0];
  if (first === undefined) return;
  for (const [key, dimension] of kinds.slice(1)) {
    if (dimension[5] !== first[1][5])
      faults.add('two-kinds', says.twoKinds(first[0], plan.units.get(first[0])!, key, plan.units.get(key)!), entries[key]!.place);
  }
}
