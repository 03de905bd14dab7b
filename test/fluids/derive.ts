import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { evaluate, failedChecks } from '../../pipeline/rules/evaluate.ts';
import { resolve, ruleBook } from '../../pipeline/rules/resolve.ts';
import type { Rule } from '../../pipeline/rules/rule.ts';

/** Values of keys by the rule book from given SI values, and the checks that failed. */
export function derive(rules: readonly Rule[], given: Readonly<Record<string, number>>, wanted: readonly string[]) {
  const inputs = Object.entries(given).map(([key, constant]) => ({ key, constant, label: key }));
  const { recipe, missing } = resolve(ruleBook(rules), inputs, wanted);
  const nodes = new Float64Array(recipe.keys.length);
  evaluate(
    recipe,
    Float64Array.from(recipe.inputs, ({ constant }) => constant!),
    nodes,
  );
  const assumed = recipe.steps.flatMap(({ rule }) => rule.assumes ?? []);
  return { values: recipe.wanted.map((node) => nodes[node] ?? Number.NaN), missing, failed: failedChecks(recipe, nodes), recipe, assumed };
}

/** Rows of a fixture below its line of origin and its header, by column name. */
export function fixture(name: string): readonly Readonly<Record<string, string>>[] {
  const [, header, ...lines] = readFileSync(join(import.meta.dirname, 'fixtures', name), 'utf8')
    .trim()
    .split('\n');
  const names = header!.split(',');
  return lines.map((line) => Object.fromEntries(line.split(',').map((cell, k) => [names[k]!, cell])));
}
