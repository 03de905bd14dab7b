import type { Note } from '../base/message.ts';
import * as says from '../base/says/observations.ts';
import { type Random, seeded } from '../numerics/random.ts';
import { evaluate, sizeOf } from '../rules/evaluate.ts';
import type { Input, Key, Recipe } from '../rules/rule.ts';
import type { TrialInputs } from './observe.ts';
import { slopes, statedUncertainty } from './slopes.ts';

/** One key of one trial: standard deviation and mean of its ln (its value for `absolute`) by sampling against the first-order law of propagation. */
export interface MonteCarloRow {
  readonly trial: string;
  readonly key: Key;
  readonly firstOrder: number;
  readonly sampled: number;
  /** Mean of the samples minus the value at the readings, in sampled standard deviations. */
  readonly shift: number;
  /** Samples without a usable value (a logarithm of nothing). */
  readonly lost: number;
}

export interface MonteCarloSpec {
  readonly keys: readonly Key[];
  readonly scale: 'relative' | 'absolute';
  readonly samples: number;
  readonly seed: number;
}

/**
 * Propagation of distributions (JCGM 101:2008): every uncertain reading is drawn from a normal distribution with its stated standard uncertainty, random and
 * systematic together; the recipe is evaluated for each draw. Checks the first-order propagation (JCGM 100) that the fits rest on.
 */
export function monteCarlo(recipe: Recipe, trials: readonly TrialInputs[], spec: MonteCarloSpec): readonly MonteCarloRow[] {
  const random = seeded(spec.seed);
  return trials.flatMap((trial) => sampledTrial(recipe, trial, spec, random));
}

function sampledTrial(
  recipe: Recipe,
  trial: TrialInputs,
  { keys, scale, samples }: MonteCarloSpec,
  random: Random,
): readonly MonteCarloRow[] {
  const places = keys.map((key) => recipe.keys.indexOf(key));
  const spread = recipe.inputs.map((input, j) => spreadOf(input, trial, trial.inputs[j]!));
  const open = spread.flatMap((u, j) => (u > 0 ? [j] : []));
  if (open.length === 0) return [];
  const found = slopes(recipe, trial.inputs, places, (j) =>
    spread[j]! > 0 ? statedUncertainty(recipe.inputs[j]!, trial.inputs[j]!, spread[j]!) : 0,
  );
  const drawn = places.map(() => new Float64Array(samples));
  const inputs = trial.inputs.slice();
  const nodes = new Float64Array(recipe.keys.length);
  for (let m = 0; m < samples; m++) {
    for (const j of open) inputs[j] = trial.inputs[j]! + spread[j]! * random.normal();
    evaluate(recipe, inputs, nodes);
    places.forEach((node, k) => {
      drawn[k]![m] = scale === 'relative' ? Math.log(nodes[node]!) : nodes[node]!;
    });
  }
  return keys.map((key, k): MonteCarloRow => {
    const value = found.nodes[places[k]!]!;
    const natural = Math.hypot(...open.map((j) => (found.columns[j]?.[k] ?? 0) * spread[j]!));
    return {
      trial: trial.trial,
      key,
      firstOrder: scale === 'relative' ? natural / Math.abs(value) : natural,
      ...summary(drawn[k]!, scale === 'relative' ? Math.log(value) : value),
    };
  });
}

/** Random part of the mean of the readings, and every systematic source. */
function spreadOf(input: Input, trial: TrialInputs, x: number): number {
  const stated = input.random === undefined || input.set === true ? 0 : sizeOf(input.random, x) / Math.sqrt(trial.readings);
  return Math.hypot(Math.max(stated, trial.statistical[input.key] ?? 0), ...(input.systematic ?? []).map((one) => sizeOf(one.spread, x)));
}

function summary(values: Float64Array, at: number): Pick<MonteCarloRow, 'sampled' | 'shift' | 'lost'> {
  const good = values.filter(Number.isFinite);
  const mean = good.reduce((sum, v) => sum + v, 0) / good.length;
  const sampled = Math.sqrt(good.reduce((sum, v) => sum + (v - mean) ** 2, 0) / (good.length - 1));
  return { sampled, shift: (mean - at) / sampled, lost: values.length - good.length };
}

/** Disagreement in the standard deviation, and shift of the mean, beyond which the first order is said not to hold. */
const LIMITS = { ratio: 0.1, shift: 0.25 };

/** One sentence where all agree; a warning with the worst case and their number where some do not. */
export function monteCarloNotes(rows: readonly MonteCarloRow[], samples: number): readonly Note[] {
  const note = (level: Note['level'], text: string, about?: string): Note => ({
    section: 'method',
    level,
    code: 'monte-carlo',
    text,
    ...(about === undefined ? {} : { about }),
  });
  const uncertain = rows.filter(({ firstOrder }) => firstOrder > 0);
  if (uncertain.length === 0) return [note('note', says.nothingToSample())];
  const off = (row: MonteCarloRow): number =>
    Math.max(Math.abs(row.sampled / row.firstOrder - 1) / LIMITS.ratio, Math.abs(row.shift) / LIMITS.shift, row.lost);
  const worst = uncertain.reduce((a, b) => (off(b) > off(a) ? b : a));
  const bad = uncertain.filter((row) => off(row) > 1);
  if (bad.length === 0) return [note('note', says.firstOrderHolds(samples, worst))];
  return [note('warning', says.firstOrderFails(samples, bad.length, uncertain.length, worst), worst.trial)];
}
