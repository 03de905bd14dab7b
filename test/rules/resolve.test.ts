import { describe, expect, test } from 'vitest';
import { evaluate, failedChecks } from '../../pipeline/rules/evaluate.ts';
import { factorKey, resolve, rootsOfMissing, ruleBook } from '../../pipeline/rules/resolve.ts';
import type { Input, Rule } from '../../pipeline/rules/rule.ts';

const rule = (gives: string, from: string[], of: (...x: number[]) => number, more: Partial<Rule> = {}): Rule => ({
  gives,
  from,
  of,
  formula: `${gives} of ${from}`,
  source: 'test',
  ...more,
});
const input = (key: string): Input => ({ key, label: key });
const run = (book: readonly Rule[], inputs: Record<string, number>, wanted: readonly string[]) => {
  const { recipe } = resolve(ruleBook(book), Object.keys(inputs).map(input), wanted);
  const values = recipe.inputs.map((one) => one.constant ?? inputs[one.key]!);
  const nodes = new Float64Array(recipe.keys.length);
  evaluate(recipe, Float64Array.from(values), nodes);
  return { recipe, nodes, wanted: recipe.wanted.map((node) => nodes[node]!) };
};

const identities = [
  rule('viscosity', ['kinematic_viscosity', 'density'], (nu, rho) => nu! * rho!),
  rule('kinematic_viscosity', ['viscosity', 'density'], (mu, rho) => mu! / rho!),
  rule('Re', ['velocity', 'diameter', 'kinematic_viscosity'], (u, d, nu) => (u! * d!) / nu!),
];

describe('resolve', () => {
  test('goes either way round a pair of rules that are each other’s inverse', () => {
    expect(run(identities, { velocity: 2, diameter: 0.1, viscosity: 1e-3, density: 1000 }, ['Re']).wanted[0]).toBeCloseTo(2e5, 6);
    expect(run(identities, { density: 1000, kinematic_viscosity: 1e-6 }, ['viscosity']).wanted[0]).toBeCloseTo(1e-3, 15);
  });

  test('a failure inside a cycle does not hide a way that works from elsewhere', () => {
    const book = [
      rule('a', ['b'], (b) => b! + 1),
      rule('b', ['a'], (a) => a! - 1),
      rule('b', ['c'], (c) => c! * 10),
      rule('top', ['b', 'a'], (b, a) => b! + a!),
    ];
    expect(run(book, { c: 1 }, ['a', 'b', 'top']).wanted).toEqual([11, 10, 21]);
    expect(run(book, { c: 1 }, ['b', 'top', 'a']).wanted).toEqual([10, 21, 11]);
  });

  test('takes the first rule whose needs can be met, not the shortest way', () => {
    const book = [rule('q', ['far'], () => 1), rule('q', ['near'], () => 2), rule('far', ['near'], (x) => x!)];
    expect(run(book, { near: 5 }, ['q']).wanted).toEqual([1]);
  });

  test('given beats derived', () => {
    expect(run(identities, { kinematic_viscosity: 7, viscosity: 1, density: 1 }, ['kinematic_viscosity']).wanted).toEqual([7]);
  });

  test('what is missing is named with every way to it and what each lacks', () => {
    const { recipe, missing } = resolve(ruleBook(identities), [input('velocity'), input('density')], ['Re', 'velocity']);
    expect(recipe.wanted).toEqual([-1, 0]);
    expect(missing.map(({ key, ways }) => [key, ways.map((way) => way.lacks)])).toEqual([['Re', [['diameter', 'kinematic_viscosity']]]]);
  });

  test('the roots of what is missing are what the user could give', () => {
    const have = (key: string): boolean => ['velocity', 'density', 'diameter'].includes(key);
    expect(rootsOfMissing(ruleBook(identities), have, 'Re')).toEqual(['viscosity']);
  });

  test('a model’s stated accuracy enters as one factor shared by all steps of that model', () => {
    const accuracy = { source: 'property: viscosity of water', share: 0.01 };
    const book = [rule('mu', ['T'], () => 2, { accuracy }), rule('mu@film', ['T'], () => 3, { accuracy })];
    const { recipe, wanted } = run(book, { T: 300 }, ['mu', 'mu@film']);
    expect(recipe.inputs.map((one) => one.key)).toEqual(['T', factorKey(accuracy.source)]);
    expect(recipe.inputs[1]!.systematic).toEqual([{ spread: { share: 0.01 }, source: accuracy.source, per: 'study' }]);
    expect(wanted).toEqual([2, 3]);
  });

  test('a check may look at what is derived from its rule’s own result', () => {
    const check = {
      code: 'biot',
      from: ['Bi'],
      holds: (bi: number) => bi < 0.1,
      otherwise: 'note' as const,
      says: (bi: number) => `Bi ${bi}`,
    };
    const book = [rule('h', ['x'], (x) => x!, { checks: [check] }), rule('Bi', ['h'], (h) => h! / 10)];
    const { recipe, nodes } = run(book, { x: 5 }, ['h']);
    expect(recipe.keys).toEqual(['x', 'h', 'Bi']);
    expect(failedChecks(recipe, nodes).map((failed) => failed.text)).toEqual(['Bi 0.5']);
  });
});
