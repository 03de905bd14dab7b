import type { Accepted } from '../audit/accepted.ts';
import type { Note } from '../base/message.ts';
import * as says from '../base/says/scale-up.ts';
import type { PlantCase as PlannedCase } from '../plan/plant-cases.ts';
import type { PlantPlan } from '../plan/plant-plan.ts';
import type { Predictable, Prediction } from '../regression/predict-ln.ts';
import type { Key } from '../rules/rule.ts';
import { casePrediction, correlationSpeaker, lawSpeaker, type Speaker } from './case-predictions.ts';
import { type Evaluation, evaluateAt } from './condition.ts';
import { type Anchor, criteriaOf } from './criteria.ts';
import { extrapolationOf, type Tried } from './extrapolation.ts';
import { floorsOf } from './floors.ts';
import type { PlantCase, PlantResult } from './plant-result.ts';
import { overallOf, seriesOf, sizeOf } from './sizing.ts';

/** What the trials and their laws give to the plant. */
export interface ScaleUpSpec {
  readonly plan: PlantPlan;
  readonly coefficient: PlantResult['coefficient'];
  readonly equipment: string;
  /** The chosen law first, then the other accepted ones. */
  readonly laws: readonly Predictable[];
  /** Largest random standard deviation of the chosen law among the trials. */
  readonly largestSpread: number;
  readonly correlations: readonly Accepted[];
  readonly tried: readonly Tried[];
  readonly anchor: Anchor;
  /** Text quantities of the rig, for the reader to compare. */
  readonly texts: Readonly<Record<string, string>>;
}

/** Every plant case: what all standing laws and correlations say, how far it lies outside, what to design with. */
export function scaleUp(spec: ScaleUpSpec): PlantResult {
  const { plan, laws } = spec;
  const { speakers, left } = speakersOf(spec);
  const keys = [...new Set([...speakers.flatMap((one) => one.keys), ...(plan.perCoefficient === undefined ? [] : [plan.perCoefficient])])];
  const worked = plan.cases.map((planned) => workedCase(planned, evaluateAt(plan.recipe, planned.inputs, keys), speakers, spec));
  const cases = worked.map((one) => one.result);
  // A case that is a range is one vessel: its criteria are told once.
  const vessels = plan.cases.filter((one, k) => plan.cases.findIndex(({ of }) => of === one.of) === k);
  const criteria = vessels.flatMap((planned) => {
    const rows = speakers[0] === undefined ? [] : criteriaOf(plan, planned, spec.anchor, speakers[0], isVolumetric(spec));
    return rows.length === 0 ? [] : [{ of: says.criteriaOf(planned.of, spec.anchor.speed, spec.anchor.impeller), rows }];
  });
  const notes = [...worked.flatMap((one) => one.notes), ...left, ...standing(spec, cases), ...rangeNotes(plan, cases)];
  return {
    coefficient: spec.coefficient,
    cases,
    criteria,
    notes,
    says: says.plantHeadline(cases, spec.coefficient, laws[0]!.confidence),
  };
}

const isVolumetric = ({ coefficient }: ScaleUpSpec): boolean => coefficient.key.startsWith('volumetric_coefficient');

/** Laws and correlations that the plant's data suffice for; who is left out is said. */
function speakersOf({ plan, laws, correlations, coefficient }: ScaleUpSpec): {
  readonly speakers: readonly Speaker[];
  readonly left: readonly Note[];
} {
  const have = new Set(plan.recipe.keys);
  const selfMade = dependsOn(plan, plan.perCoefficient === undefined ? undefined : coefficient.key);
  const left: Note[] = [];
  const able = (speaker: Speaker, response: Key | undefined): boolean => {
    const lacks = speaker.keys.filter((key) => !have.has(key));
    const circular = speaker.keys.filter((key) => key !== response && selfMade.has(key));
    if (lacks.length > 0) left.push(note('plant-not-asked', says.lacksAtPlant(speaker.by, lacks), speaker.by));
    else if (circular.length > 0) left.push(note('plant-circular', says.circular(speaker.by, circular), speaker.by, 'warning'));
    return lacks.length === 0 && circular.length === 0;
  };
  const speakers = [
    ...laws.map((fit) => ({ speaker: lawSpeaker(fit, plan.perCoefficient), response: plan.perCoefficient })),
    ...correlations.map((one) => ({
      speaker: correlationSpeaker(one, plan.perCoefficient !== undefined),
      response: one.candidate.keys[one.candidate.correlation.form.response],
    })),
  ].filter(({ speaker, response }) => able(speaker, response));
  return { speakers: speakers.map(({ speaker }) => speaker), left };
}

/** Keys that follow from the coefficient itself (Bi): a law in them cannot be asked without knowing the answer. */
function dependsOn({ recipe }: PlantPlan, coefficient: Key | undefined): ReadonlySet<Key> {
  const found = new Set<Key>(coefficient === undefined ? [] : [coefficient]);
  for (const { rule } of recipe.steps) if (rule.from.some((key) => found.has(key))) found.add(rule.gives);
  return found;
}

function workedCase(
  planned: PlannedCase,
  at: Evaluation,
  speakers: readonly Speaker[],
  spec: ScaleUpSpec,
): { readonly result: PlantCase; readonly notes: readonly Note[] } {
  const { plan, laws } = spec;
  const law = laws[0]!;
  const groups = Object.fromEntries(law.form.groups.map((name) => [name, at.value(law.groups[name]!)]));
  const values = Object.fromEntries(plan.given.map((key) => [key, at.value(key)]));
  const notes = at.checks.map(({ check, text }) => note(check.code, says.ofCase(planned.name, text), planned.name, 'warning'));
  const found = speakers.map((speaker) => casePrediction(speaker, at)).filter(({ row }) => Number.isFinite(row.coefficient));
  const blank = { name: planned.name, values, groups };
  if (found.length === 0 || found[0]!.row.by !== law.name) return { result: withoutAnswer(blank, spec, groups), notes };
  const predictions = found.map(({ row }) => row);
  const extrapolation = extrapolationOf(at, law, spec.largestSpread, spec.tried, plan.given);
  const design = designOf(
    found.map((one) => one.prediction),
    plan.conservative,
    law.confidence,
  );
  const floors = floorsOf(at, spec.equipment, plan.perCoefficient);
  const js = at.value('just_suspended_speed');
  const speed = at.value('rotation_speed');
  if (js > 0 && speed > 0)
    notes.push(note('just-suspended', says.justSuspended(planned.name, speed, js), planned.name, speed < js ? 'warning' : 'note'));
  for (const floor of floors)
    if (design.coefficient < floor.value)
      notes.push(note('below-floor', says.belowFloor(planned.name, floor.says), planned.name, 'warning'));
  const sized = sizedOf(at, predictions[0]!, design.coefficient, spec);
  return {
    result: {
      ...blank,
      predictions,
      spread: design.spread,
      wider: design.wider,
      design: { coefficient: design.coefficient, side: plan.conservative, confidence: law.confidence },
      ...sized.parts,
      extrapolation,
      floors,
      verdict: says.caseVerdict(extrapolation, design.wider),
    },
    notes: [...notes, ...sized.notes.map((text) => note('size-lacks', says.ofCase(planned.name, text), planned.name, 'warning'))],
  };
}

/** One-sided limit of the chosen law; where laws differ by more than its interval is wide, the outermost of them. */
function designOf(
  predictions: readonly Prediction[],
  side: 'low' | 'high',
  confidence: number,
): { readonly coefficient: number; readonly spread: number; readonly wider: PlantCase['wider'] } {
  const first = predictions[0]!;
  const values = predictions.map(({ value }) => value);
  const spread = Math.max(...values) / Math.min(...values);
  const limit = first.limit(side, confidence);
  const wider = spread > first.upper / first.lower ? 'spread between laws' : 'interval';
  if (wider === 'interval') return { coefficient: limit, spread, wider };
  return { coefficient: side === 'low' ? Math.min(limit, ...values) : Math.max(limit, ...values), spread, wider };
}

/** Overall coefficient and size, each at the expected and at the design coefficient. */
function sizedOf(
  at: Evaluation,
  first: PlantCase['predictions'][number],
  design: number,
  spec: ScaleUpSpec,
): { readonly parts: Pick<PlantCase, 'overall' | 'target'>; readonly notes: readonly string[] } {
  const { plan, coefficient, equipment } = spec;
  const heat = coefficient.key === 'heat_transfer_coefficient';
  const series = heat ? seriesOf(at.value, equipment) : undefined;
  const overall = series && {
    nominal: overallOf(series, first.coefficient),
    lower: overallOf(series, first.lower),
    upper: overallOf(series, first.upper),
    resistances: [{ name: 'own side', value: series.areaRatio / first.coefficient }, ...series.others],
  };
  if (plan.target === undefined) return { parts: overall === undefined ? {} : { overall }, notes: [] };
  const sizeBy = (value: number) =>
    sizeOf(
      plan.target!,
      series === undefined ? value : overallOf(series, value),
      at.value,
      isVolumetric(spec) ? 'volumetric' : 'surface',
      series === undefined ? coefficient.symbol : 'U',
    );
  const [nominal, designed] = [sizeBy(first.coefficient), sizeBy(design)];
  const target = {
    find: plan.target.find,
    unit: nominal.unit,
    nominal: nominal.value,
    design: designed.value,
    formula: nominal.formula,
  };
  return {
    parts: { ...(overall === undefined ? {} : { overall }), target },
    notes: nominal.lacks === undefined ? [] : [says.sizeLacks(plan.target.find, nominal.lacks)],
  };
}

function withoutAnswer(
  blank: Pick<PlantCase, 'name' | 'values' | 'groups'>,
  { plan, laws }: ScaleUpSpec,
  groups: Readonly<Record<string, number>>,
): PlantCase {
  const missing = Object.entries(groups).flatMap(([name, value]) => (Number.isFinite(value) ? [] : [name]));
  return {
    ...blank,
    predictions: [],
    spread: Number.NaN,
    wider: 'interval',
    design: { coefficient: Number.NaN, side: plan.conservative, confidence: laws[0]!.confidence },
    extrapolation: [],
    floors: [],
    verdict: says.noAnswer(missing),
  };
}

/** What no interval of these holds. */
function standing({ laws, texts, plan }: ScaleUpSpec, cases: readonly PlantCase[]): readonly Note[] {
  const first = laws[0]!;
  const texted = Object.entries(texts).map(([key, value]) => note('compare-by-eye', says.compareByEye(key, value, plan.texts[key])));
  return [
    note('interval-holds', says.whatTheIntervalHolds(first.confidence)),
    ...(first.campaigns.kind === 'random'
      ? []
      : [note('no-campaign-variance', says.noCampaignVariance(first.campaigns.kind), undefined, 'warning')]),
    ...(cases.some((one) => one.wider === 'spread between laws') ? [note('spread-wider', says.spreadWider(), undefined, 'warning')] : []),
    ...(cases.some(({ overall }) => overall !== undefined) ? [note('resistances-as-stated', says.resistancesAsStated())] : []),
    ...texted,
  ];
}

/** The worst corner of a case that is a range. */
function rangeNotes({ cases: planned, conservative }: PlantPlan, cases: readonly PlantCase[]): readonly Note[] {
  const names = [...new Set(planned.map((one) => one.of))];
  return names.flatMap((name) => {
    const mine = planned.flatMap((one, k) => (one.of === name && Number.isFinite(cases[k]!.design.coefficient) ? [cases[k]!] : []));
    if (mine.length < 2) return [];
    const worst = mine.reduce((a, b) => ((conservative === 'low') === b.design.coefficient < a.design.coefficient ? b : a));
    return [note('worst-of-range', says.worstOfRange(name, worst.name, worst.design.coefficient, conservative), name)];
  });
}

const note = (code: string, text: string, about?: string, level: Note['level'] = 'note'): Note => ({
  section: 'plant',
  level,
  code,
  text,
  ...(about === undefined ? {} : { about }),
});
