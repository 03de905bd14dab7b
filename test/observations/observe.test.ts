import { expect, test } from 'vitest';
import { observe, type TrialInputs } from '../../pipeline/observations/observe.ts';
import { resolve, ruleBook } from '../../pipeline/rules/resolve.ts';
import type { Input, Rule } from '../../pipeline/rules/rule.ts';

const rule = (gives: string, from: string[], of: (...x: number[]) => number): Rule => ({ gives, from, of, formula: gives, source: 'test' });
const trial = (inputs: number[], more: Partial<TrialInputs> = {}): TrialInputs => ({
  trial: 'T1',
  campaign: 'A',
  line: 2,
  file: 'trials.csv',
  readings: 1,
  statistical: {},
  inputs: Float64Array.from(inputs),
  ...more,
});
const norm = (values: ArrayLike<number>): number => Math.hypot(...Array.from(values));

// JCGM 100:2008, H.1: end-gauge calibration; input uncertainties unrounded (0.05/sqrt 3 K, 1e-6/sqrt 3 1/K). Printed u(l) = 32 nm, first order 31.67 nm.
test('GUM H.1: end gauge, first-order standard uncertainty', () => {
  const inputs: Input[] = [
    { key: 'ls', random: { si: 25e-9 }, label: 'ls' },
    { key: 'd', random: { si: 9.7e-9 }, label: 'd' },
    { key: 'dAlpha', random: { si: 1e-6 / Math.sqrt(3) }, label: 'dAlpha' },
    { key: 'theta', random: { si: 0.41 }, label: 'theta' },
    { key: 'alphaS', random: { si: 1.2e-6 }, label: 'alphaS' },
    { key: 'dTheta', random: { si: 0.05 / Math.sqrt(3) }, label: 'dTheta' },
  ];
  const length = rule(
    'l',
    ['ls', 'd', 'dAlpha', 'theta', 'alphaS', 'dTheta'],
    (ls, d, dAlpha, theta, alphaS, dTheta) => ls! + d! - ls! * (dAlpha! * theta! + alphaS! * dTheta!),
  );
  const { recipe } = resolve(ruleBook([length]), inputs, ['l']);
  const { value } = observe([trial([50.000623e-3, 215e-9, 0, -0.1, 11.5e-6, 0])], { recipe, scale: 'absolute', required: new Set(['l']) });
  expect(norm(value.observations.random[0]!) * 1e9).toBeCloseTo(31.67, 2);
});

// JCGM 100:2008, H.2: resistance and reactance from five simultaneous readings of V, I, phi (table H.2); printed results in tables H.3 and H.4.
// The correlation of the three means enters as shared sources (Cholesky factor of their covariance).
test('GUM H.2: covariance travels from correlated readings to results', () => {
  const readings = [
    [5.007, 4.994, 5.005, 4.99, 4.999],
    [19.663e-3, 19.639e-3, 19.64e-3, 19.685e-3, 19.678e-3],
    [1.0456, 1.0438, 1.0468, 1.0428, 1.0433],
  ];
  const mean = readings.map((x) => x.reduce((a, b) => a + b) / 5);
  const c = (a: number, b: number): number =>
    readings[a]!.reduce((sum, x, i) => sum + (x - mean[a]!) * (readings[b]![i]! - mean[b]!), 0) / 20;
  const l = [
    [Math.sqrt(c(0, 0)), 0, 0],
    [0, 0, 0],
    [0, 0, 0],
  ];
  l[1]![0] = c(1, 0) / l[0]![0]!;
  l[1]![1] = Math.sqrt(c(1, 1) - l[1]![0]! ** 2);
  l[2]![0] = c(2, 0) / l[0]![0]!;
  l[2]![1] = (c(2, 1) - l[2]![0]! * l[1]![0]!) / l[1]![1]!;
  l[2]![2] = Math.sqrt(c(2, 2) - l[2]![0]! ** 2 - l[2]![1]! ** 2);
  const inputs: Input[] = ['V', 'I', 'phi'].map((key, i) => ({
    key,
    label: key,
    systematic: [0, 1, 2].map((s) => ({ source: `s${s}`, per: 'study' as const, spread: { si: l[i]![s]! } })),
  }));
  const rules = [
    rule('R', ['V', 'I', 'phi'], (v, i, phi) => (v! / i!) * Math.cos(phi!)),
    rule('X', ['V', 'I', 'phi'], (v, i, phi) => (v! / i!) * Math.sin(phi!)),
    rule('Z', ['V', 'I'], (v, i) => v! / i!),
  ];
  const { recipe } = resolve(ruleBook(rules), inputs, ['R', 'X', 'Z']);
  const { observations } = observe([trial(mean)], { recipe, scale: 'absolute', required: new Set() }).value;
  const s = observations.systematic[0]!;
  const row = (k: number): Float64Array => s.subarray(3 * k, 3 * k + 3);
  const corr = (a: number, b: number): number => row(a).reduce((sum, v, i) => sum + v * row(b)[i]!, 0) / (norm(row(a)) * norm(row(b)));
  expect(observations.z.map((column) => column[0]!.toFixed(3))).toEqual(['127.732', '219.847', '254.260']);
  expect([0, 1, 2].map((k) => norm(row(k)).toFixed(3))).toEqual(['0.071', '0.296', '0.236']);
  expect(norm(row(1))).toBeCloseTo(0.29558, 5);
  expect([corr(0, 1), corr(0, 2), corr(1, 2)].map((r) => r.toFixed(3))).toEqual(['-0.588', '-0.485', '0.993']);
});

const product = rule('y', ['a', 'b'], (a, b) => a! * b!);

test('readings of one trial average their random uncertainty, a systematic one stays whole, a set point brings none', () => {
  const shift = [{ source: 'TT-1', per: 'study' as const, spread: { share: 0.02 } }];
  const inputs: Input[] = [
    { key: 'a', random: { share: 0.04 }, systematic: shift, label: 'a' },
    { key: 'b', random: { share: 0.5 }, set: true, label: 'b' },
  ];
  const { recipe } = resolve(ruleBook([product]), inputs, ['y']);
  const { observations } = observe([trial([3, 5], { readings: 4 })], { recipe, scale: 'relative', required: new Set(['y']) }).value;
  expect(observations.z[0]![0]).toBeCloseTo(Math.log(15), 12);
  expect(norm(observations.random[0]!)).toBeCloseTo(0.02, 8);
  expect(norm(observations.systematic[0]!)).toBeCloseTo(0.02, 8);
});

test('quantities read by one instrument share one shift, signed', () => {
  const shift = [{ source: 'TT-1', per: 'study' as const, spread: { si: 0.3 } }];
  const inputs: Input[] = [
    { key: 'a', systematic: shift, label: 'a' },
    { key: 'b', systematic: shift, label: 'b' },
  ];
  const { recipe } = resolve(ruleBook([rule('y', ['a', 'b'], (a, b) => a! - b!)]), inputs, ['y']);
  const { observations } = observe([trial([350, 300])], { recipe, scale: 'absolute', required: new Set(['y']) }).value;
  expect(observations.sources).toEqual(['TT-1']);
  expect(Math.abs(observations.systematic[0]![0]!)).toBeLessThan(1e-9);
});

test('a source per campaign touches the trials of its campaign alone', () => {
  const inputs: Input[] = [
    { key: 'a', systematic: [{ source: 'scale', per: 'campaign', spread: { share: 0.1 } }], label: 'a' },
    { key: 'b', label: 'b' },
  ];
  const { recipe } = resolve(ruleBook([product]), inputs, ['y']);
  const { observations } = observe([trial([1, 1]), trial([1, 1], { trial: 'T2', campaign: 'B' })], {
    recipe,
    scale: 'relative',
    required: new Set(['y']),
  }).value;
  expect(observations.sources).toEqual(['scale (A)', 'scale (B)']);
  expect(observations.systematic.map((one) => Array.from(one, (v) => Number(v.toFixed(6))))).toEqual([
    [0.1, 0],
    [0, 0.1],
  ]);
});

test('a trial without a usable value is refused with its reason, the others stand', () => {
  const { recipe } = resolve(
    ruleBook([product]),
    [
      { key: 'a', label: 'a' },
      { key: 'b', label: 'b' },
    ],
    ['y'],
  );
  const { value, refused } = observe([trial([1, -2]), trial([1, 2], { trial: 'T2' })], {
    recipe,
    scale: 'relative',
    required: new Set(['y']),
  });
  expect(value.observations.trials).toEqual(['T2']);
  expect(refused.map((one) => [one.trial, one.code, one.place?.line])).toEqual([['T1', 'no-usable-value', 2]]);
  expect(refused[0]!.text).toContain('-2');
});

test('a check can weigh a value against its own uncertainty', () => {
  const check = {
    code: 'imbalance',
    from: ['y', 'u(y)'],
    holds: (y: number, u: number) => Math.abs(y) <= 4 * u,
    otherwise: 'refuse' as const,
    says: (y: number, u: number) => `${y} against ${u.toFixed(3)}`,
  };
  const inputs: Input[] = [
    { key: 'a', random: { si: 0.1 }, label: 'a' },
    { key: 'b', systematic: [{ source: 's', per: 'study', spread: { si: 0.1 } }], label: 'b' },
  ];
  const { recipe } = resolve(ruleBook([{ ...rule('y', ['a', 'b'], (a, b) => a! - b!), checks: [check] }]), inputs, ['y']);
  const { refused } = observe([trial([2, 1]), trial([1.5, 1], { trial: 'T2' })], { recipe, scale: 'absolute', required: new Set(['y']) });
  expect(refused.map((one) => one.text)).toEqual(['1 against 0.141']);
});
