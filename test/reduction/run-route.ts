import { groupRules } from '../../pipeline/groups/groups.ts';
import { plainContext, type RouteContext, type Settings } from '../../pipeline/reduction/route.ts';
import { routes } from '../../pipeline/reduction/routes.ts';
import { derivedRulesFor } from '../../pipeline/rules/derived/derived-rules.ts';
import { evaluate, failedChecks, sizeOf } from '../../pipeline/rules/evaluate.ts';
import { resolve, ruleBook } from '../../pipeline/rules/resolve.ts';
import type { Key, Recipe, Spread } from '../../pipeline/rules/rule.ts';

/** One trial through a route: quantities in SI -> every key of the recipe, codes of the checks that fail, what is assumed. */
export interface Reduced {
  readonly of: (key: Key) => number;
  readonly codes: readonly string[];
  readonly refused: boolean;
  readonly texts: readonly string[];
  readonly assumes: readonly string[];
  readonly recipe: Recipe;
}

export interface RouteCase {
  readonly settings?: Settings;
  readonly given: Readonly<Record<Key, number>>;
  readonly context?: Partial<RouteContext>;
  /** Standard uncertainties by input key, SI or share. */
  readonly stated?: Readonly<Record<Key, Spread>>;
  /** Further keys to work out. */
  readonly also?: readonly Key[];
}

export function runRoute(name: string, { settings = {}, given, context = {}, stated = {}, also = [] }: RouteCase): Reduced {
  const route = routes[name]!;
  const whole: RouteContext = { ...plainContext, stated: (key) => stated[key], ...context };
  const book = ruleBook([...route.rules(settings, whole), ...derivedRulesFor(whole.equipment), ...groupRules]);
  const inputs = Object.entries(given).map(([key, constant]) => ({ key, constant, label: key }));
  const wanted = [route.gives(settings, whole), ...also];
  const { recipe, missing } = resolve(book, inputs, wanted);
  if (missing.some(({ key }) => key === wanted[0]))
    throw new Error(`${wanted[0]} cannot be had: ${missing.flatMap(({ ways }) => ways.map(({ lacks }) => lacks.join(' '))).join(' | ')}`);
  const values = Float64Array.from(recipe.inputs, (input) => input.constant!);
  const nodes = new Float64Array(recipe.keys.length);
  evaluate(recipe, values, nodes);
  const failed = failedChecks(recipe, nodes, (node) => uncertainty(recipe, values, node, stated));
  return {
    of: (key) => (recipe.keys.includes(key) ? nodes[recipe.keys.indexOf(key)]! : Number.NaN),
    codes: failed.map(({ check }) => check.code),
    refused: failed.some(({ check }) => check.otherwise === 'refuse'),
    texts: failed.map(({ text }) => text),
    assumes: recipe.steps.flatMap(({ rule }) => rule.assumes ?? []),
    recipe,
  };
}

/** First-order standard uncertainty of a node, inputs independent. */
function uncertainty(recipe: Recipe, values: Float64Array, node: number, stated: Readonly<Record<Key, Spread>>): number {
  const at = (j: number, x: number): number => {
    const moved = Float64Array.from(values);
    moved[j] = x;
    const nodes = new Float64Array(recipe.keys.length);
    evaluate(recipe, moved, nodes);
    return nodes[node]!;
  };
  let variance = 0;
  recipe.inputs.forEach(({ key }, j) => {
    const spread = stated[key];
    if (spread === undefined) return;
    const u = sizeOf(spread, values[j]!);
    variance += ((at(j, values[j]! + 1e-3 * u) - at(j, values[j]! - 1e-3 * u)) / 2e-3) ** 2;
  });
  return Math.sqrt(variance);
}

/** Degrees Celsius. */
export const C = (t: number): number => t + 273.15;
