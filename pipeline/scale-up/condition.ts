import { slopes, statedUncertainty } from '../observations/slopes.ts';
import type { Condition } from '../regression/predict-ln.ts';
import { type CheckOutcome, failedChecks, sizeOf } from '../rules/evaluate.ts';
import type { Key, Recipe, SourceId } from '../rules/rule.ts';

/** One plant condition evaluated: every key of the recipe, and what moves each of the keys asked for. */
export interface Evaluation {
  /** SI; NaN where the recipe does not have the key. */
  readonly value: (key: Key) => number;
  /** Change of the key by one standard uncertainty of each source, SI. */
  readonly shifts: (key: Key) => ReadonlyMap<SourceId, number>;
  readonly checks: readonly CheckOutcome[];
}

/** Systematic sources of a new campaign at the plant; a random uncertainty stated for the plant is one more source of its own. */
export function evaluateAt(recipe: Recipe, inputs: Float64Array, keys: readonly Key[]): Evaluation {
  const place = new Map(recipe.keys.map((key, node) => [key, node]));
  const wanted = keys.filter((key) => place.has(key));
  const found = slopes(
    recipe,
    inputs,
    wanted.map((key) => place.get(key)!),
    (j) => statedUncertainty(recipe.inputs[j]!, inputs[j]!, 0),
  );
  const moved = new Map(wanted.map((key) => [key, new Map<SourceId, number>()]));
  recipe.inputs.forEach((input, j) => {
    const slope = found.columns[j];
    if (slope === undefined) return;
    const sizes: [SourceId, number][] = (input.systematic ?? []).map(({ spread, source, per }) => [
      per === 'study' ? source : `${source} (plant)`,
      sizeOf(spread, inputs[j]!),
    ]);
    if (input.random !== undefined) sizes.push([`${input.label} (random)`, sizeOf(input.random, inputs[j]!)]);
    for (const [source, size] of sizes)
      wanted.forEach((key, k) => {
        const at = moved.get(key)!;
        at.set(source, (at.get(source) ?? 0) + slope[k]! * size);
      });
  });
  return {
    value: (key) => found.nodes[place.get(key) ?? -1] ?? Number.NaN,
    shifts: (key) => moved.get(key) ?? new Map(),
    checks: failedChecks(recipe, found.nodes),
  };
}

/**
 * What a law is asked at a plant condition. `groups`: the law's names -> keys, response left out. `perCoefficient`: key of the response of a
 * coefficient of 1, which turns the response into the coefficient; none where the response is its own result.
 */
export function conditionOf(
  at: Evaluation,
  groups: Readonly<Record<string, Key>>,
  perCoefficient: Key | undefined,
  scale: 'relative' | 'absolute',
): Condition {
  const names = Object.keys(groups);
  const per = (key: Key, source: SourceId): number => (at.shifts(key).get(source) ?? 0) / (scale === 'relative' ? at.value(key) : 1);
  const lnPer = (source: SourceId): number =>
    perCoefficient === undefined ? 0 : -(at.shifts(perCoefficient).get(source) ?? 0) / at.value(perCoefficient);
  const keys = [...names.map((name) => groups[name]!), ...(perCoefficient === undefined ? [] : [perCoefficient])];
  const sources = [...new Set(keys.flatMap((key) => [...at.shifts(key).keys()]))];
  return {
    at: Object.fromEntries(names.map((name) => [name, at.value(groups[name]!)])),
    lnFactor: perCoefficient === undefined ? 0 : -Math.log(at.value(perCoefficient)),
    sources: Object.fromEntries(
      sources.map((source) => [
        source,
        { groups: Object.fromEntries(names.map((name) => [name, per(groups[name]!, source)])), factor: lnPer(source) },
      ]),
    ),
  };
}
