import type { Observed } from '../observations/observe.ts';
import { trialInputs } from '../observations/trial-inputs.ts';
import type { Plan } from '../plan/plan.ts';
import { dimensionText } from '../quantities/dimension.ts';
import { quantityOf } from '../quantities/vocabulary.ts';
import type { Choice, Contender } from '../regression/choose.ts';
import type { FitData } from '../regression/fit.ts';
import type { Predictable } from '../regression/predict-ln.ts';
import { evaluate } from '../rules/evaluate.ts';
import type { Key } from '../rules/rule.ts';
import type { Trials } from '../trials/read-trials.ts';
import { anchorOf } from './criteria.ts';
import { lawSpread, type Tried, triedOf } from './extrapolation.ts';
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

/** The chosen law first, then the other accepted ones in their order; and the largest spread of the chosen one among its trials. */
export function standingLaws(
  contenders: readonly (Contender & { readonly data: FitData })[],
  choice: Choice,
  chosen: Contender & { readonly data: FitData },
): { readonly laws: readonly Predictable[]; readonly largestSpread: number } {
  const accepted = choice.compared.filter((one) => one.accepted && one.law !== choice.law).map(({ law }) => law);
  const others = contenders.filter(({ fit }) => accepted.includes(fit.name)).map(({ fit }) => fit);
  return { laws: [chosen.fit, ...others], largestSpread: largestSpreadOf(chosen.fit, chosen.data) };
}

export function largestSpreadOf(fit: Predictable, { x, trials, scale }: FitData): number {
  const spread = lawSpread(fit);
  const at = (i: number): Record<string, number> =>
    Object.fromEntries(fit.form.groups.map((name, g) => [name, scale === 'relative' ? Math.exp(x[g]![i]!) : x[g]![i]!]));
  return trials.reduce((most, _, i) => Math.max(most, spread(at(i))), 0);
}
