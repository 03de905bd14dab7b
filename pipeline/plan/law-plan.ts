import type { Form } from '../algebra/form.ts';
import { parseForm } from '../algebra/parse.ts';
import type { Place } from '../base/place.ts';
import * as says from '../base/says/plan.ts';
import { basesOf, groupNames } from '../groups/groups.ts';
import { type Dimension, sameDimension } from '../quantities/dimension.ts';
import { isFault } from '../quantities/fault.ts';
import { fromSI } from '../quantities/unit.ts';
import { unitFor } from '../quantities/unit-for.ts';
import { quantityNames, quantityOf } from '../quantities/vocabulary.ts';
import type { Key, Rule } from '../rules/rule.ts';
import type { LawEntry, Placed, Study } from '../study/study.ts';
import type { Faults } from './faults.ts';
import { impliedKey } from './group-plan.ts';
import type { PlannedLaw } from './plan.ts';

/** What a law's names may mean. */
export interface LawContext {
  readonly study: Study;
  /** Names settled under `groups`. */
  readonly groups: ReadonlyMap<string, Key>;
  readonly dimensions: ReadonlyMap<Key, Dimension>;
  readonly canHave: (key: Key) => boolean;
}

/** Laws with every name settled; rules for quantities that enter in a unit of their own. */
export function planLaws(context: LawContext, faults: Faults): { readonly laws: readonly PlannedLaw[]; readonly rules: readonly Rule[] } {
  const { study } = context;
  const rules: Rule[] = [];
  const known = [...groupNames, ...context.groups.keys(), ...quantityNames, ...context.dimensions.keys()];
  const laws = study.laws.flatMap((entry) => planLaw(entry, context, known, rules, faults));
  const responses = [...new Set(laws.map((law) => law.groups[law.form.response]!))];
  if (responses.length > 1)
    faults.add(
      'responses-differ',
      says.responsesDiffer(responses),
      study.laws.find((law) => law.form.place !== study.laws[0]!.form.place)!.form.place,
    );
  return { laws, rules };
}

function planLaw(entry: LawEntry, context: LawContext, known: readonly string[], rules: Rule[], faults: Faults): readonly PlannedLaw[] {
  const { is: text, place } = entry.form;
  const parsed = parseForm(text, { known, parameters: entry.parameters?.map(({ is }) => is), needsParameter: true });
  if ('faults' in parsed) {
    for (const fault of parsed.faults) faults.add(fault.code, `"${shortened(text)}": ${fault.text}`, shifted(place, fault.at));
    return [];
  }
  const { form } = parsed;
  const groups: Record<string, Key> = {};
  const units: Record<string, string> = {};
  for (const name of [form.response, ...form.groups]) {
    const key = keyOfName(name, entry, context, rules, units, faults);
    if (key !== undefined) groups[name] = key;
  }
  for (const [name, unit] of Object.entries(entry.in))
    if (!(form.groups.includes(name) || form.response === name)) faults.add('unit-for-what', says.unitForWhat(name), unit.place);
  return [{ name: entry.name.is, form, groups, ...numbers(entry, form, faults), units, place }];
}

const shortened = (text: string): string => (text.length > 80 ? `${text.slice(0, 77)}...` : text);
const shifted = (place: Place, at: number): Place => (place.column === undefined ? place : { ...place, column: place.column + at });

function keyOfName(
  name: string,
  entry: LawEntry,
  context: LawContext,
  rules: Rule[],
  units: Record<string, string>,
  faults: Faults,
): Key | undefined {
  const place = entry.form.place;
  const unit = entry.in[name];
  const settled = context.groups.get(name);
  if (settled !== undefined || basesOf(name) !== undefined) {
    if (unit !== undefined) faults.add('unit-of-group', says.unitOfGroup(name), unit.place);
    return settled ?? impliedKey(name, context.study.equipment.is, context.canHave, place, faults);
  }
  const quantity = quantityOf(name);
  if (quantity === undefined && !context.dimensions.has(name)) {
    faults.add('unknown-response', says.unknownResponse(name, [...groupNames, ...quantityNames, ...context.dimensions.keys()]), place);
    return undefined;
  }
  return unit === undefined ? name : inUnit(name, unit, context, rules, units, faults);
}

/** A quantity that a law takes in a unit of its own: `velocity [ft/s]`. */
function inUnit(
  name: string,
  { is, place }: Placed<string>,
  context: LawContext,
  rules: Rule[],
  units: Record<string, string>,
  faults: Faults,
): Key | undefined {
  const unit = unitFor(quantityOf(name), is);
  if (isFault(unit)) {
    faults.add(unit.code, `${name}: ${unit.text}`, place);
    return undefined;
  }
  const own = context.dimensions.get(name);
  if (own !== undefined && !sameDimension(own, unit.dimension)) {
    faults.add('unit-dimension', says.wrongDimension(name, is, quantityOf(name)?.unit ?? 'its own unit'), place);
    return undefined;
  }
  const key = `${name} [${unit.text}]`;
  units[name] = unit.text;
  rules.push({ gives: key, from: [name], of: (si) => fromSI(si!, unit), formula: `${name} in ${unit.text}`, source: 'unit conversion' });
  return key;
}

/** Start values and bounds belong to parameters of the law. */
function numbers(entry: LawEntry, form: Form, faults: Faults): Pick<PlannedLaw, 'start' | 'bounds'> {
  const named = <T>(record: Readonly<Record<string, Placed<T>>>): Record<string, T> => {
    const taken: Record<string, T> = {};
    for (const [name, { is, place }] of Object.entries(record)) {
      if (form.constants.includes(name)) taken[name] = is;
      else faults.add('unknown-parameter', says.startForWhat(name, entry.name.is, form.constants), place);
    }
    return taken;
  };
  return { start: named(entry.start), bounds: named(entry.bounds) };
}
