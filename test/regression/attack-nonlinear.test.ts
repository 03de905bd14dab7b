import { describe, expect, test } from 'vitest';
import { seeded } from '../../pipeline/numerics/random.ts';
import { breakSearches } from '../../pipeline/regression/break-search.ts';
import type { Fit, FitData } from '../../pipeline/regression/fit.ts';
import { subset } from '../../pipeline/regression/fit-data.ts';
import { fitLaw } from '../../pipeline/regression/fit-law.ts';
import { robustRefits } from '../../pipeline/regression/robust.ts';
import { agree, data, law, options } from './laws.ts';
import { digits } from './nist-problems.ts';

/** Sh = 2 + 0.6 Re^0.5 Sc^(1/3) with scatter, campaigns and errors in Re. */
function study(seed: number): FitData {
  const random = seeded(seed);
  const shifts = [0.05, -0.03, 0, -0.02];
  const rows = Array.from({ length: 32 }, (_, i) => {
    const [re, sc] = [1 + 5 * random.uniform(), 1 + 2 * random.uniform()];
    const y = Math.log(2 + 0.6 * Math.exp(0.5 * re + sc / 3)) + shifts[i % 4]! + 0.03 * random.normal();
    return { y, re: re + 0.03 * random.normal(), sc };
  });
  return data({
    y: rows.map(({ y }) => y),
    x: [rows.map(({ re }) => re), rows.map(({ sc }) => sc)],
    campaign: rows.map((_, i) => i % 4),
    sigma: rows.map(() => [0.01 ** 2, 0, 0, 0, 0.03 ** 2, 0, 0, 0, 0]),
  });
}

const groups = ['Re', 'Sc'];
const start = { A: 2, C: 0.6, a: 0.5, c: 1 / 3 };
/** The same law with its parameters met in different orders. */
const orders = ['Sh = A + C * Re^a * Sc^c', 'Sh = Sc^c * Re^a * C + A', 'Sh = C * Sc^c * Re^a + A', 'Sh = Re^a * C * Sc^c + A'];

function same(one: Fit, two: Fit, figures: number): void {
  for (const parameter of one.parameters) {
    const other = two.parameters.find(({ name }) => name === parameter.name)!;
    expect(other.fixed).toBe(parameter.fixed);
    agree(other.estimate, parameter.estimate, figures);
    if (parameter.fixed) continue;
    agree(other.standardError, parameter.standardError, figures - 2);
    agree(other.lower, parameter.lower, figures - 3);
  }
}

describe('a nonlinear law under attack', () => {
  test.each([1, 2, 3])('the order of its parameters changes nothing (study %i)', (seed) => {
    const trials = study(seed);
    const [first, ...others] = orders.map((text) => law(text, groups, { start }));
    const fit = fitLaw(first!, trials, options());
    for (const other of others) {
      const turned = { ...trials, ...inOrder(trials, other.form.groups) };
      same(fit, fitLaw(other, turned, options()), 7);
    }
  });

  test.each(Object.entries(start))('%s held at %f stays there, and the others move as without it, in every order', (name, value) => {
    const trials = study(4);
    const bounds = { [name]: [value, value] as const };
    const [first, ...others] = orders.map((text) => law(text, groups, { start, bounds }));
    const fit = fitLaw(first!, trials, options());
    expect(fit.values[name]).toBeCloseTo(value, 12);
    expect(fit.free).not.toContain(name);
    expect(fit.free.length).toBe(3);
    for (const other of others) same(fit, fitLaw(other, { ...trials, ...inOrder(trials, other.form.groups) }, options()), 7);
    const constant = law(orders[0]!.replace(new RegExp(`\\b${name}\\b`, 'u'), `(${value})`), groups, { start });
    const typed = fitLaw(constant, trials, options());
    for (const free of fit.free) agree(typed.values[free]!, fit.values[free]!, 7);
  });

  test('the order of the trials changes neither the robust refits nor the break', () => {
    const trials = study(6);
    const order = trials.trials.map((_, i) => (i * 13 + 5) % 32);
    const form = law(orders[0]!, groups, { start });
    const looks = [trials, subset(trials, order)].map((one) => {
      const fit = fitLaw(form, one, options());
      return { robust: robustRefits(form, fit, one, options()), found: breakSearches(form, fit, one, options())[0]! };
    });
    const [a, b] = looks as [(typeof looks)[number], (typeof looks)[number]];
    a.robust.forEach((one, k) => {
      for (const name of Object.keys(start)) agree(b.robust[k]!.values[name]!, one.values[name]!, 6);
      order.forEach((from, to) => {
        expect(b.robust[k]!.weights[to]!).toBeCloseTo(one.weights[from]!, 6);
      });
    });
    if (!a.found.looked || !b.found.looked) throw new Error('no look was taken');
    agree(b.found.at, a.found.at, 5);
    agree(b.found.largestF, a.found.largestF, 6);
    expect(Math.abs(b.found.chance - a.found.chance)).toBeLessThan(0.06); // the same draws meet other trials
  });
});

/** Columns and covariances in the order in which a form names its groups. */
function inOrder(trials: FitData, names: readonly string[]): Pick<FitData, 'x' | 'sigma'> {
  const at = [0, ...names.map((name) => 1 + groups.indexOf(name))];
  return {
    x: names.map((name) => trials.x[groups.indexOf(name)]!),
    sigma: trials.sigma.map((m) => Float64Array.from(at.flatMap((a) => at.map((b) => m[a * 3 + b]!)))),
  };
}

test('one sign flipped in a certified value leaves no digit', () => {
  expect(digits(0.2, 0.2)).toBe(11);
  expect(digits(0.2, -0.2)).toBe(0);
  expect(digits(-7.6e-1, 7.6e-1)).toBe(0);
});
