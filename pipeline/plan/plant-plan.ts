import type { Place } from '../base/place.ts';
import * as says from '../base/says/plant.ts';
import { groupRules } from '../groups/groups.ts';
import { derivedRulesFor } from '../rules/derived/derived-rules.ts';
import { type RuleBook, resolve, rootsOfMissing, ruleBook } from '../rules/resolve.ts';
import type { Input, Key, Recipe, Rule } from '../rules/rule.ts';
import type { Study } from '../study/study.ts';
import type { Table } from '../trials/table.ts';
import { trustRules, unitRules } from './audit-plan.ts';
import type { Faults } from './faults.ts';
import { planFluids } from './fluid-plan.ts';
import { formulaRules } from './formula-rules.ts';
import { planGroups } from './group-plan.ts';
import { headerOf } from './header.ts';
import { isLength, type PlantBasis } from './plant-basis.ts';
import { type PlantCase, plantCases } from './plant-cases.ts';
import { type PlantQuantities, plantQuantities } from './plant-quantities.ts';
import { type PlantTarget, planTarget } from './plant-target.ts';

/** Plant cases settled: one recipe for all of them, and each case's inputs. */
export interface PlantPlan {
  readonly recipe: Recipe;
  readonly cases: readonly PlantCase[];
  /** What turns the response into the coefficient: the response of a coefficient of 1. Undefined where the response is its own result. */
  readonly perCoefficient?: Key;
  /** Keys of the plant's own inputs, for the comparison with what was tried. */
  readonly given: readonly Key[];
  readonly conservative: 'low' | 'high';
  readonly target?: PlantTarget;
  readonly texts: Readonly<Record<string, string>>;
  readonly notes: readonly { readonly code: string; readonly text: string }[];
}

/** What is asked of the plant. */
export interface PlantAsked {
  readonly basis: PlantBasis;
  /** Keys of all laws with the name by which a message calls each; the response among them. */
  readonly keys: ReadonlyMap<Key, string>;
  readonly response: Key;
  readonly coefficient: Key | undefined;
  /** Keys that published correlations need; taken where they can be had. */
  readonly others: readonly Key[];
  readonly settings: NonNullable<Study['plant']>;
  readonly table?: Table;
  readonly place: Place;
}

/** Quantities beyond the laws that the plant's table and criteria look at, where they can be had. */
export const plantExtras: readonly Key[] = [
  'velocity',
  'gas_velocity',
  'rotation_speed',
  'impeller_diameter',
  'vessel_diameter',
  'liquid_volume',
  'power',
  'power_per_volume',
  'tip_speed',
  'just_suspended_speed',
  'diameter',
  'outer_diameter',
  'particle_diameter',
  'length',
  'specific_area',
  'interfacial_area',
  'area',
  'time',
];

/** Study's definitions + plant table -> cases. Adds a fault for everything that a law needs and no case has. */
export function planPlant(asked: PlantAsked, faults: Faults): PlantPlan | undefined {
  const { basis, settings, table } = asked;
  const found = plantQuantities(basis, settings, table, faults);
  const own = new Set(found.inputs.map(({ key }) => key));
  const inherited = basis.inherited.filter(({ key }) => !own.has(key));
  const unit: readonly Input[] =
    asked.coefficient === undefined ? [] : [{ key: asked.coefficient, constant: 1, label: 'coefficient of 1' }];
  if (asked.coefficient !== undefined && own.has(asked.coefficient))
    faults.add('coefficient-given', says.coefficientGiven(asked.coefficient), asked.place);
  const inputs = [...found.inputs, ...inherited, ...unit];
  const book = plantBook(asked, found, faults);
  if (faults.any) return undefined;
  const wanted = [...new Set([...asked.keys.keys(), ...asked.others, ...plantExtras])];
  const { recipe, missing } = resolve(book, inputs, wanted);
  lacking(asked, book, inputs, new Set(missing.map(({ key }) => key)), faults);
  const target = planTarget(settings.target, basis.transfer, faults);
  if (faults.any) return undefined;
  return {
    recipe,
    cases: plantCases(found, recipe, table),
    ...(asked.coefficient === undefined ? {} : { perCoefficient: asked.response }),
    given: found.inputs.map(({ key }) => key),
    conservative: settings.conservative,
    ...(target === undefined ? {} : { target }),
    texts: found.texts,
    notes: [
      ...found.remarks,
      ...(inherited.length === 0 ? [] : [{ code: 'inherited', text: says.inherited(inherited.map(({ key }) => key)) }]),
    ],
  };
}

function plantBook({ basis, settings, table, keys, others }: PlantAsked, found: PlantQuantities, faults: Faults): RuleBook {
  const dimensions = new Map([...Object.entries(basis.dimensions), ...found.dimensions]);
  const own = new Set([...found.inputs.map(({ key }) => key), ...found.formulas.map(({ key }) => key)]);
  const formulas = formulaRules([...found.formulas, ...basis.formulas.filter(({ key }) => !own.has(key))], dimensions, faults);
  const header = table === undefined ? { find: () => undefined } : headerOf(table);
  const ofFormula = Object.fromEntries(Object.entries(basis.groups).filter(([, { is }]) => is.formula !== undefined));
  const groups = planGroups(ofFormula, header, dimensions, faults);
  const onTrust = new Set(Object.entries(basis.groups).flatMap(([name, { is }]) => (is.column === undefined ? [] : [name])));
  const asked = [...keys.keys(), ...others];
  return ruleBook([
    ...found.rules,
    ...formulas,
    ...groups.rules,
    ...planFluids(settings.fluid ?? basis.fluid, new Map(Object.entries(basis.tables)), faults, basis.stated),
    ...derivedRulesFor(basis.equipment),
    ...groupRules.filter(sameLength(basis)),
    ...unitRules(asked),
    ...trustRules(asked, onTrust),
  ]);
}

/** The plant's length is held by the same quantity as the rig's: a bore is no particle. */
const sameLength =
  ({ lengths }: PlantBasis) =>
  ({ gives, from }: Rule): boolean =>
    !isLength(gives) || lengths[gives] === undefined || lengths[gives] === from[0];

/** What a law cannot have at the plant, with what would give it. */
function lacking(asked: PlantAsked, book: RuleBook, inputs: readonly Input[], missing: ReadonlySet<Key>, faults: Faults): void {
  const have = (key: Key): boolean => resolve(book, inputs, [key]).recipe.wanted[0]! >= 0;
  const stated: RuleBook = { waysTo: (key) => (asked.basis.stated.includes(key) ? [] : book.waysTo(key)) };
  const told = new Set<string>();
  for (const [key, name] of asked.keys) {
    if (!missing.has(key)) continue;
    const roots = rootsOfMissing(stated, have, key);
    const text = says.plantLacks(name, roots, asked.basis.rigOnly);
    if (!told.has(text)) faults.add('plant-lacks', text, asked.place);
    told.add(text);
  }
}
