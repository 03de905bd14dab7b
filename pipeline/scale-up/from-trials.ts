import type { Observed } from '../observations/observe.ts';
import { trialInputs } from '../observations/trial-inputs.ts';
import type { Plan } from '../plan/plan.ts';
import type { PlantPlan } from '../plan/plant-plan.ts';
import { dimensionText } from '../quantities/dimension.ts';
import { quantityOf } from '../quantities/vocabulary.ts';
import type { Choice, Contender } from '../regression/choose.ts';
import type { FitData } from '../regression/fit.ts';
import type { Predictable } from '../regression/predict-ln.ts';
import { evaluate } from '../rules/evaluate.ts';
import type { Key, Recipe } from '../rules/rule.ts';
import type { Trials } from '../trials/read-trials.ts';
import { lawSpeaker } from './case-predictions.ts';
import { evaluateAt } from './condition.ts';
import { anchorOf } from './criteria.ts';
import { lawSpread, type Tried, triedOf } from './extrapolation.ts';
import type { ForPlant } from './for-plant.ts';
import type { CaseToNarrow } from './next/next-trials.ts';
import type { ScaleUpSpec } from './scale-up.ts';

/** What the trials tell of themselves: raw ranges, the rig's middle, what the coefficient is called. */
export function scaleUpFacts(
  plan: Plan,
  read: Trials,
  observed: Observed,
): Pick<ScaleUpSpec, 'coefficient' | 'equipment' | 'tried' | 'anchor' | 'texts'> {
  const tried = triedRanges(plan, read, observed);
  const response = plan.namings.get(plan.laws[0]!.groups[plan.laws[0]!.form.response]!)!;
  const coefficient = plan.coefficient ?? { key: response.key, symbol: response.symbol, unit: response.unit };
  return {
    coefficient,
    equipment: plan.study.equipment.is,
    tried,
    anchor: anchorOf(tried, coefficients(coefficient.key, plan, observed)),
    texts: plan.texts,
  };
}

function triedRanges({ tried, basis }: Plan, read: Trials, { observations }: Observed): readonly Tried[] {
  const used = new Set(observations.trials);
  const rows = trialInputs(tried, read)
    .filter(({ trial }) => used.has(trial))
    .map(({ inputs }) => {
      const nodes = new Float64Array(tried.keys.length);
      evaluate(tried, inputs, nodes);
      return tried.wanted.map((node) => (node < 0 ? Number.NaN : nodes[node]!));
    });
  const keys = tried.wanted.map((node, k) => (node < 0 ? `${k}` : tried.keys[node]!));
  const unitOf = (key: Key): string =>
    quantityOf(key)?.unit ?? (basis.dimensions[key] === undefined ? '1' : dimensionText(basis.dimensions[key]));
  return triedOf(keys, rows, unitOf);
}

/** Measured coefficients of the trials, where the recipe has the key; else the response itself. */
function coefficients(key: Key, { recipe }: Plan, { evaluated }: Observed): readonly number[] {
  const node = recipe.keys.indexOf(key);
  return node < 0 ? [] : evaluated.map(({ nodes }) => nodes[node]!);
}

/** What laws.json carries so that a later prediction needs no study. */
export function forPlant(
  plan: Plan,
  facts: Pick<ScaleUpSpec, 'tried' | 'anchor'>,
  contenders: readonly (Contender & { readonly data: FitData })[],
  choice: Choice,
): ForPlant {
  return {
    basis: plan.basis,
    tried: facts.tried,
    anchor: facts.anchor,
    largestSpreads: Object.fromEntries(contenders.map(({ fit, data }) => [fit.name, largestSpreadOf(fit, data)])),
    accepted: choice.compared.filter((one) => one.accepted).map(({ law }) => law),
  };
}

function largestSpreadOf(fit: Predictable, { x, trials, scale }: FitData): number {
  const spread = lawSpread(fit);
  const at = (i: number): Record<string, number> =>
    Object.fromEntries(fit.form.groups.map((name, g) => [name, scale === 'relative' ? Math.exp(x[g]![i]!) : x[g]![i]!]));
  return trials.reduce((most, _, i) => Math.max(most, spread(at(i))), 0);
}

/** Each plant case as the chosen law predicts it, for the choice of further trials. */
export function casesToNarrow(plant: PlantPlan | undefined, fit: Predictable): readonly CaseToNarrow[] {
  if (plant === undefined) return [];
  const speaker = lawSpeaker(fit, plant.perCoefficient);
  return plant.cases.flatMap(({ name, inputs }) => {
    const at = evaluateAt(plant.recipe, inputs, [...speaker.keys, ...(plant.perCoefficient === undefined ? [] : [plant.perCoefficient])]);
    const prediction = speaker.predict(at);
    const groups = Object.fromEntries(fit.form.groups.map((group) => [group, at.value(fit.groups[group]!)]));
    return Number.isFinite(prediction.value) ? [{ name, groups, prediction }] : [];
  });
}

/** Medians of the used trials for the inputs of a recipe; constants as they are. */
export function middleInputs(recipe: Recipe, read: Trials, { observations }: Observed): readonly number[] {
  const used = new Set(observations.trials);
  const rows = trialInputs(recipe, read).filter(({ trial }) => used.has(trial));
  return recipe.inputs.map((_, j) => {
    const values = rows
      .map(({ inputs }) => inputs[j]!)
      .filter(Number.isFinite)
      .sort((a, b) => a - b);
    const half = Math.floor(values.length / 2);
    return values.length % 2 === 1 ? values[half]! : (values[half - 1]! + values[half]!) / 2;
  });
}
