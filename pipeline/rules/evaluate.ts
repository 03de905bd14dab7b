import type { Check, Key, Recipe, Spread } from './rule.ts';

/** THE pure function of the program: one trial's or plant case's inputs -> every node. All else only calls it. SI throughout. */
export function evaluate(recipe: Recipe, inputs: Float64Array, nodes: Float64Array): void {
  nodes.set(inputs);
  const first = recipe.inputs.length;
  for (let k = 0; k < recipe.steps.length; k++) {
    const { rule, from, factor } = recipe.steps[k]!;
    const value = rule.of(...from.map((node) => nodes[node]!));
    nodes[first + k] = factor === undefined ? value : value * nodes[factor]!;
  }
}

/** Standard uncertainty in SI of a value with this spread. */
export const sizeOf = (spread: Spread, value: number): number => ('share' in spread ? spread.share * Math.abs(value) : spread.si);

/** The key inside `u(KEY)`, or the key itself. */
export const uncertainOf = (key: Key): Key => /^u\((.+)\)$/.exec(key)?.[1] ?? key;

/** What a check says about one evaluation that it does not hold for. */
export interface CheckOutcome {
  readonly check: Check;
  readonly gives: Key;
  readonly text: string;
}

/** Nodes whose uncertainty some check of the recipe asks for. */
export function nodesWithUncertainty(recipe: Recipe): readonly number[] {
  const asked = new Set(
    recipe.steps.flatMap(({ rule }) =>
      (rule.checks ?? []).flatMap((check) => check.from.filter((key) => uncertainOf(key) !== key).map(uncertainOf)),
    ),
  );
  return recipe.keys.flatMap((key, node) => (asked.has(key) ? [node] : []));
}

/** Checks that do not hold. A check whose keys are not all in the recipe has nothing to look at and is passed over. `uncertainty` by node, SI. */
export function failedChecks(
  recipe: Recipe,
  nodes: Float64Array,
  uncertainty: (node: number) => number = () => 0,
): readonly CheckOutcome[] {
  const nodeOf = new Map(recipe.keys.map((key, node) => [key, node]));
  const look = (key: Key): number => {
    const inner = uncertainOf(key);
    const node = nodeOf.get(inner)!;
    return inner === key ? nodes[node]! : uncertainty(node);
  };
  const failed: CheckOutcome[] = [];
  for (const { rule } of recipe.steps) {
    for (const check of rule.checks ?? []) {
      if (!check.from.every((key) => nodeOf.has(uncertainOf(key)))) continue;
      const x = check.from.map(look);
      if (!check.holds(...x)) failed.push({ check, gives: rule.gives, text: check.says(...x) });
    }
  }
  return failed;
}
