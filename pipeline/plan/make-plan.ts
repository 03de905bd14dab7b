import type { Correlation } from '../../correlations/correlation.ts';
import type { Note } from '../base/message.ts';
import { nearest } from '../base/nearest.ts';
import * as says from '../base/says/plan.ts';
import { groupRules } from '../groups/groups.ts';
import { quantityOf } from '../quantities/vocabulary.ts';
import { derivedRulesFor } from '../rules/derived/derived-rules.ts';
import { type RuleBook, resolve, rootsOfMissing, ruleBook } from '../rules/resolve.ts';
import type { Input, Key, Missing, Recipe, Rule } from '../rules/rule.ts';
import type { Study } from '../study/study.ts';
import { families } from '../study/study-schema.ts';
import type { Table } from '../trials/table.ts';
import { type Applicable, applicable, keysAsked, keyText, trustRules, unitRules } from './audit-plan.ts';
import { type CoefficientPlan, planCoefficient } from './coefficient-plan.ts';
import { Faults } from './faults.ts';
import { planFluids } from './fluid-plan.ts';
import { formulaRules } from './formula-rules.ts';
import { planGroups } from './group-plan.ts';
import { headerOf } from './header.ts';
import { planLaws } from './law-plan.ts';
import { namingsOf } from './namings.ts';
import { campaignsNamed, planOtherSide } from './other-side-plan.ts';
import type { Candidate, Plan, PlannedLaw } from './plan.ts';
import { type PlantBasis, plantBasis } from './plant-basis.ts';
import { type PlantPlan, planPlant, plantExtras } from './plant-plan.ts';
import { planQuantities } from './quantity-plan.ts';
import { planRig } from './rig-plan.ts';
import { planWeights } from './weight-plan.ts';

/** What a plan is made from beside the study file. */
export interface PlanInputs {
  readonly trials: Table;
  /** Property tables that the study names, by file. */
  readonly tables: ReadonlyMap<string, Table>;
  readonly catalogue: readonly Correlation[];
  readonly own: readonly Correlation[];
  /** The plant's table, where the study names one. */
  readonly plant?: Table;
}

/** Study + header -> Plan. Throws one InputError (exit 2) with every fault found so far. */
export function makePlan(study: Study, { trials, tables, catalogue, own, plant: plantTable }: PlanInputs): Plan {
  const faults = new Faults();
  if (!(families as readonly string[]).includes(study.equipment.is))
    faults.add('unknown-equipment', says.unknownEquipment(study.equipment.is, families), study.equipment.place);
  const header = headerOf(trials);
  const quantities = planQuantities(study.quantities, header, faults);
  const formulas = formulaRules(quantities.formulas, quantities.dimensions, faults);
  const weights = planWeights(study, header, faults);
  const groups = planGroups(study.groups, header, quantities.dimensions, faults);
  const coefficient = planCoefficient(study, quantities, faults);
  const fluids = planFluids(study.fluid, tables, faults, Object.keys(study.quantities));
  const asked = applicable(study, catalogue, own, faults);
  const curve = coefficient?.curve;
  for (const { key } of quantities.inputs)
    if (curve?.gives.includes(key))
      faults.add('curve-and-column', says.curveAndColumn(key), study.quantities[key]?.place ?? study.trials.file.place);
  const fromCurve = (curve?.gives ?? []).map((key): Input => ({ key, label: `logged curve: ${key}` }));
  const given = [...quantities.inputs, ...groups.inputs, ...fromCurve];
  const base = [
    ...quantities.rules,
    ...formulas,
    ...groups.rules,
    ...(coefficient?.rules ?? []),
    ...fluids,
    ...derivedRulesFor(study.equipment.is),
    ...groupRules,
  ];
  const canHave = haver(ruleBook(base), given);
  const { laws: written, rules } = planLaws({ study, groups: groups.keys, dimensions: quantities.dimensions, canHave }, faults);
  const otherSide = planOtherSide(study, coefficient, written, faults);
  const laws = otherSide?.embed(campaignsNamed(trials, study.trials)) ?? written;
  checkReferences(study, canHave, faults);
  faults.throwIfAny();
  const inputs = [...given, ...(otherSide?.inputs ?? [])];
  const book = ruleBook([
    ...base,
    ...rules,
    ...(otherSide?.rules ?? []),
    ...trustRules(keysAsked(asked), groups.onTrust),
    ...unitRules(keysAsked(asked.filter((one) => one.own))),
  ]);
  const settled = settle(study, book, inputs, laws, asked, coefficient, faults);
  const basis = plantBasis(study, quantities, tables, settled.recipe);
  const plant = faults.any ? undefined : plantOf(study, laws, settled, basis, plantTable, faults);
  const rig = study.rig === undefined ? undefined : planRig(study.rig, laws, book, inputs, faults);
  faults.throwIfAny();
  return {
    study,
    columns: [...quantities.columns, ...groups.columns, ...weights],
    book,
    laws,
    ...settled,
    ...(curve === undefined ? {} : { curve }),
    ...(otherSide === undefined ? {} : { otherSide }),
    basis,
    ...(plant === undefined ? {} : { plant }),
    ...(rig === undefined ? {} : { rig }),
    tried: resolve(book, inputs, [...new Set([...plantExtras, ...inputs.map(({ key }) => key)])]).recipe,
    namings: new Map([...namingsOf(laws, groups, quantities.units), ...(otherSide?.namings ?? []).map((one) => [one.key, one] as const)]),
    texts: quantities.texts,
    notes: [
      ...quantities.remarks.map((remark): Note => ({ section: 'method', level: 'note', ...remark })),
      ...assumptions(settled.recipe),
      ...givenNotes(book, inputs, settled.recipe),
      ...(plant?.notes ?? []).map((note): Note => ({ section: 'plant', level: 'note', ...note })),
    ],
  };
}

/** The plant's cases by the definitions of the laws. Faults are told where the study names the plant. */
function plantOf(
  study: Study,
  laws: readonly PlannedLaw[],
  { candidates, coefficient }: Pick<Plan, 'candidates' | 'coefficient'>,
  basis: PlantBasis,
  table: Table | undefined,
  faults: Faults,
): PlantPlan | undefined {
  if (study.plant === undefined || laws.length === 0) return undefined;
  const response = laws[0]!.groups[laws[0]!.form.response]!;
  const keys = new Map(laws.flatMap((law) => law.form.groups.map((name) => [law.groups[name]!, name] as const)));
  if (coefficient !== null) keys.set(response, laws[0]!.form.response);
  return planPlant(
    {
      basis,
      keys,
      response,
      coefficient: coefficient?.key,
      others: candidates.filter((one) => one.lacks.length === 0).flatMap((one) => Object.values(one.keys)),
      settings: study.plant,
      ...(table === undefined ? {} : { table }),
      place: study.plant.file?.place ?? study.laws[0]!.form.place,
    },
    faults,
  );
}

/** Whether a key is given or can be derived, remembered. */
function haver(book: RuleBook, inputs: readonly Input[]): (key: Key) => boolean {
  const known = new Map<Key, boolean>();
  return (key) => {
    if (!known.has(key)) known.set(key, resolve(book, inputs, [key]).recipe.wanted[0]! >= 0);
    return known.get(key)!;
  };
}

/** Quantities that the fluid's conditions point to must exist. */
function checkReferences(study: Study, canHave: (key: Key) => boolean, faults: Faults): void {
  for (const entry of [study.fluid?.own, study.fluid?.other]) {
    for (const held of Object.values(entry?.is.at ?? {})) {
      if (!canHave(held.is))
        faults.add('no-such-quantity', says.noSuchCondition(held.is, nearest(held.is, Object.keys(study.quantities))), held.place);
    }
  }
}

/** The recipe for all laws and all comparable correlations; what a law cannot have is a fault, what a correlation cannot have is said beside it. */
function settle(
  study: Study,
  book: RuleBook,
  inputs: readonly Input[],
  laws: readonly PlannedLaw[],
  asked: readonly Applicable[],
  coefficient: CoefficientPlan | undefined,
  faults: Faults,
): Pick<Plan, 'recipe' | 'required' | 'candidates' | 'coefficient'> {
  const ofLaws = [...new Set(laws.flatMap((law) => Object.values(law.groups)))];
  const ofAudit = [...new Set(asked.flatMap((one) => Object.values(one.keys)))];
  const response = laws[0] === undefined ? undefined : coefficientOf(laws[0].groups[laws[0].form.response]!, study);
  const wanted = [...new Set([...ofLaws, ...ofAudit, ...(response === null || response === undefined ? [] : [response.key])])];
  const { recipe, missing } = resolve(book, inputs, wanted);
  const have = (key: Key): boolean => recipe.keys.includes(key) || resolve(book, inputs, [key]).recipe.wanted[0]! >= 0;
  for (const law of laws) {
    for (const [name, key] of Object.entries(law.groups)) {
      const lack = missing.find((one) => one.key === key);
      if (lack !== undefined) faults.add('cannot-have', sentenceOf(name, lack, book, have, study, coefficient), law.place);
    }
  }
  const candidates = asked.map((one): Candidate => {
    const lacks = Object.entries(one.keys).flatMap(([name, key]) =>
      missing.some((lack) => lack.key === key) ? [says.correlationLacks(name, keyText(key), rootsOfMissing(book, have, key))] : [],
    );
    return { ...one, lacks, definitions: Object.fromEntries(Object.entries(one.keys).map(([name, key]) => [name, keyText(key)])) };
  });
  return { recipe, required: new Set(ofLaws), candidates, coefficient: response ?? null };
}

function sentenceOf(
  name: string,
  lack: Missing,
  book: RuleBook,
  have: (key: Key) => boolean,
  study: Study,
  coefficient: CoefficientPlan | undefined,
): string {
  const roots = rootsOfMissing(book, have, lack.key);
  const result = study.transfer === 'heat' ? 'heat_transfer_coefficient' : 'mass_transfer_coefficient';
  if (roots.includes(result)) {
    if (coefficient === undefined) return says.noCoefficient(name);
    if (coefficient.route.gives(coefficient.settings, coefficient.context) !== result)
      return says.coefficientIsOverall(coefficient.route.gives(coefficient.settings, coefficient.context), name);
  }
  return [
    `${says.cannotHave(name, roots)}${instead(lack, roots)}`,
    ...lack.ways.slice(0, 3).map((way) => says.wayTo(lack.key, way.rule.formula, way.lacks)),
    ...quantitiesLacked(lack)
      .slice(0, 3)
      .flatMap((key) => waysOf(key, book, have)),
    ...(coefficient?.route.series === undefined ||
    coefficient.curve !== undefined ||
    have(coefficient.route.gives(coefficient.settings, coefficient.context))
      ? []
      : [says.giveTheCurve(coefficient.route.name)]),
  ].join('; ');
}

/** Quantities that the ways to a key lack, each once. */
const quantitiesLacked = ({ ways }: Missing): readonly Key[] => [
  ...new Set(ways.flatMap(({ lacks }) => lacks.filter((key) => quantityOf(key) !== undefined))),
];

/** What stands nearer than the roots and may be given in their place. */
function instead({ ways }: Missing, roots: readonly Key[]): string {
  const near = ways.find(({ lacks }) => lacks.length > 0 && lacks.every((key) => quantityOf(key) !== undefined))?.lacks ?? [];
  return near.length === 0 || near.every((key) => roots.includes(key)) ? '' : says.orGive(near);
}

/** From what a quantity that is lacking could be had, the ways that lack least first. */
const waysOf = (key: Key, book: RuleBook, have: (key: Key) => boolean): readonly string[] =>
  book
    .waysTo(key)
    .map((rule) => ({ rule, lacks: rule.from.filter((need) => !have(need)) }))
    .filter(({ lacks }) => lacks.length > 0 && lacks.every((need) => quantityOf(need) !== undefined))
    .sort((a, b) => a.lacks.length - b.lacks.length)
    .slice(0, 2)
    .map(({ rule, lacks }) => says.wayTo(key, rule.formula, lacks));

const coefficients: Readonly<Record<string, { readonly key: Key; readonly symbol: string; readonly unit: string }>> = {
  heat: { key: 'heat_transfer_coefficient', symbol: 'h', unit: 'W/(m^2 K)' },
  mass: { key: 'mass_transfer_coefficient', symbol: 'k', unit: 'm/s' },
};
const transferGroups = new Set(['Nu', 'Sh', 'St_heat', 'St_mass', 'j_heat', 'j_mass']);

/** The coefficient behind a response: h or k for a transfer group by definition; none for a group read from a column or a dimensional response, which is its own result. */
function coefficientOf(response: Key, study: Study): Plan['coefficient'] {
  const [name, definition] = response.split('@');
  return definition !== undefined && transferGroups.has(name!) ? coefficients[study.transfer]! : null;
}

/** What the rules in force assume is said once. */
function assumptions(recipe: Recipe): readonly Note[] {
  const texts = new Set(recipe.steps.flatMap(({ rule }) => (rule.assumes === undefined ? [] : [rule.assumes])));
  return [...texts].map((text) => ({ section: 'method', level: 'note', code: 'assumed', text }));
}

/** Given beats derived, and that is said where the program could have derived it from what else is given. */
function givenNotes(book: RuleBook, inputs: readonly Input[], recipe: Recipe): readonly Note[] {
  const used = new Set(recipe.steps.flatMap(({ rule }) => rule.from));
  return inputs.flatMap((input): readonly Note[] => {
    if (!used.has(input.key)) return [];
    const others = inputs.filter((one) => one !== input);
    const derivable = book
      .waysTo(input.key)
      .some((way: Rule) => way.from.length > 0 && resolve(book, others, way.from).missing.length === 0);
    return derivable ? [{ section: 'method', level: 'note', code: 'given-beats-derived', text: says.valueStated(input.key) }] : [];
  });
}
