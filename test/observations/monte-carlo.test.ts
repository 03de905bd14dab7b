import { expect, test } from 'vitest';
import { monteCarlo, monteCarloNotes } from '../../pipeline/observations/monte-carlo.ts';
import type { TrialInputs } from '../../pipeline/observations/observe.ts';
import { resolve, ruleBook } from '../../pipeline/rules/resolve.ts';
import type { Input, Rule } from '../../pipeline/rules/rule.ts';

const rule = (gives: string, from: string[], of: (...x: number[]) => number): Rule => ({ gives, from, of, formula: gives, source: 'test' });
const trial = (inputs: number[]): TrialInputs => ({
  trial: 'T1',
  campaign: 'A',
  line: 2,
  file: 'trials.csv',
  readings: 1,
  statistical: {},
  inputs: Float64Array.from(inputs),
});

// JCGM 100:2008, H.1: 31.67 nm to first order (printed 32), 34 nm with the second-order terms of H.1.7, which normal distributions share with sampling.
test('GUM H.1: sampling finds the second-order term, and the disagreement is a warning', () => {
  const inputs: Input[] = [
    { key: 'ls', random: { si: 25e-9 }, label: 'ls' },
    { key: 'd', random: { si: 9.7e-9 }, label: 'd' },
    { key: 'dAlpha', random: { si: 1e-6 / Math.sqrt(3) }, label: 'dAlpha' },
    { key: 'theta', random: { si: 0.41 }, label: 'theta' },
    { key: 'alphaS', random: { si: 1.2e-6 }, label: 'alphaS' },
    { key: 'dTheta', systematic: [{ spread: { si: 0.05 / Math.sqrt(3) }, source: 'thermometer', per: 'study' }], label: 'dTheta' },
  ];
  const length = rule(
    'l',
    ['ls', 'd', 'dAlpha', 'theta', 'alphaS', 'dTheta'],
    (ls, d, dAlpha, theta, alphaS, dTheta) => ls! + d! - ls! * (dAlpha! * theta! + alphaS! * dTheta!),
  );
  const { recipe } = resolve(ruleBook([length]), inputs, ['l']);
  const rows = monteCarlo(recipe, [trial([50.000623e-3, 215e-9, 0, -0.1, 11.5e-6, 0])], {
    keys: ['l'],
    scale: 'absolute',
    samples: 200_000,
    seed: 1,
  });
  expect(rows[0]!.firstOrder * 1e9).toBeCloseTo(31.67, 2);
  expect(Math.round(rows[0]!.sampled * 1e9)).toBe(34);
  // 34 against 32 is 7 % in the standard deviation: within the 10 % that the check allows.
  expect(monteCarloNotes(rows, 200_000)[0]!.level).toBe('note');
});

// Analytic: ln of a lognormal variate, and ln(1 + N(0, u^2)) whose mean is -u^2/2 to second order.
test('a logarithm: exact where the law is, a warning where the reading is too uncertain', () => {
  const inputs = (u: number): Input[] => [{ key: 'x', random: { share: u }, label: 'x' }];
  const square = rule('y', ['x'], (x) => x! * x!);
  const run = (u: number) =>
    monteCarlo(resolve(ruleBook([square]), inputs(u), ['y']).recipe, [trial([3])], {
      keys: ['y'],
      scale: 'relative',
      samples: 50_000,
      seed: 2,
    });
  const [fine] = run(0.01);
  expect(fine!.firstOrder).toBeCloseTo(0.02, 8);
  expect(Math.abs(fine!.sampled / 0.02 - 1)).toBeLessThan(0.02);
  const [wild] = run(0.4);
  expect(monteCarloNotes(run(0.4), 50_000)[0]!).toMatchObject({ level: 'warning', about: 'T1' });
  expect(wild!.shift).toBeLessThan(-0.1);
});

test('nothing uncertain is said, not passed over', () => {
  expect(monteCarloNotes([], 100)[0]!.text).toContain('no uncertainty is stated');
});
