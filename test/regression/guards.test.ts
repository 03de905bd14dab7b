import { describe, expect, test } from 'vitest';
import { InputError } from '../../pipeline/base/input-error.ts';
import * as says from '../../pipeline/base/says/regression.ts';
import { seeded } from '../../pipeline/numerics/random.ts';
import type { Fit, FitData, FitOptions } from '../../pipeline/regression/fit.ts';
import { fitLaw } from '../../pipeline/regression/fit-law.ts';
import type { LawToFit } from '../../pipeline/regression/solve-law.ts';
import { agree, data, law, options } from './laws.ts';

const codes = (fit: Fit): string[] => fit.notes.map(({ code }) => code);
const textOf = (fit: Fit, code: string): string => fit.notes.find((note) => note.code === code)?.text ?? '';

interface Rig {
  readonly n: number;
  readonly range: number;
  readonly uRe: number;
  readonly statedRe: number;
  readonly uSh: number;
  readonly statedSh: number;
  readonly sigma: number;
  readonly tau: number;
  readonly campaigns: number;
  readonly seed: number;
}
const rig: Rig = { n: 30, range: 10, uRe: 0, statedRe: 0, uSh: 0.03, statedSh: 0, sigma: 0.05, tau: 0.1, campaigns: 5, seed: 3 };

/** ln Sh = ln 0.4 + 0.6 ln Re with campaign shifts, invented. */
function study(change: Partial<Rig> = {}): FitData {
  const s = { ...rig, ...change };
  const random = seeded(s.seed);
  const shift = Array.from({ length: s.campaigns }, () => s.tau * random.normal());
  const rows = Array.from({ length: s.n }, (_, i) => {
    const re = Math.log(1000) + Math.log(s.range) * random.uniform();
    const y = Math.log(0.4) + 0.6 * re + shift[i % s.campaigns]! + s.sigma * random.normal() + s.uSh * random.normal();
    return { y, x: re + s.uRe * random.normal() };
  });
  return data({
    y: rows.map((row) => row.y),
    x: [rows.map((row) => row.x)],
    campaign: rows.map((_, i) => i % s.campaigns),
    sigma: rows.map(() => [s.statedSh ** 2, 0, 0, s.statedRe ** 2]),
  });
}

const power = law('Sh = C * Re^a', ['Re']);
const run = (change: Partial<Rig> = {}, more: Partial<FitOptions> = {}, of: LawToFit = power): Fit =>
  fitLaw(of, study(change), options(more));

describe('campaigns, by their number alone', () => {
  test('one: no variance between campaigns, and that is said beside every prediction', () => {
    const fit = run({ campaigns: 1 });
    expect(fit.campaigns.kind).toBe('none');
    expect(fit.statistics.campaignSd).toBeNaN();
    expect(fit.notes.find(({ code }) => code === 'one-campaign')).toMatchObject({
      section: 'plant',
      level: 'warning',
      about: 'law',
      text: says.oneCampaign('law'),
    });
  });

  test('two: a fixed shift for the exponents, said; the exponent is that of lm with a factor for the campaign', () => {
    const trials = study({ campaigns: 2 });
    const fit = fitLaw(power, trials, options());
    expect(fit.campaigns.kind).toBe('fixed');
    expect(codes(fit)).toContain('two-campaigns');
    // pooled within-campaign slope: closed form of the analysis of covariance
    const groups = [0, 1].map((c) => trials.campaign.flatMap((own, i) => (own === c ? [i] : [])));
    const mean = (column: Float64Array, of: number[]): number => of.reduce((sum, i) => sum + column[i]!, 0) / of.length;
    let [sxx, sxy] = [0, 0];
    for (const of of groups) {
      for (const i of of) {
        sxx += (trials.x[0]![i]! - mean(trials.x[0]!, of)) ** 2;
        sxy += (trials.x[0]![i]! - mean(trials.x[0]!, of)) * (trials.y[i]! - mean(trials.y, of));
      }
    }
    agree(fit.values.a!, sxy / sxx, 10);
    expect(fit.residualDegreesOfFreedom).toBe(27);
    expect(fit.campaigns.shifts[0]! + fit.campaigns.shifts[1]!).toBeCloseTo(0, 12);
    expect(Object.keys(fit.values)).toEqual(['C', 'a']);
  });

  test('two under `intercept`: a variance all the same, with few degrees of freedom, said', () => {
    const fit = run({ campaigns: 2, tau: 0.3 }, { campaignEffect: 'intercept' });
    expect(fit.campaigns.kind).toBe('random');
    expect(codes(fit)).toContain('two-campaigns');
    expect(fit.parameters[0]!.degreesOfFreedom).toBeLessThan(28);
  });

  test('whatever their number: what a prediction holds and what not is said once for each law', () => {
    for (const count of [1, 2, 5])
      expect(codes(run({ campaigns: count })).filter((code) => code === 'what-predictions-hold')).toHaveLength(1);
  });

  test('told not to differ: said', () => {
    expect(codes(run({}, { campaignEffect: 'none' }))).toContain('campaigns-ignored');
  });

  test('as many as trials: their variance cannot be told from scatter', () => {
    const fit = run({ n: 12, campaigns: 12 });
    expect(fit.campaigns.kind).toBe('inseparable');
    expect(codes(fit)).toContain('campaigns-inseparable');
    const plain = run({ n: 12, campaigns: 12 }, { campaignEffect: 'none' });
    agree(fit.parameters[1]!.standardError, plain.parameters[1]!.standardError, 12);
  });

  test('a variance that comes out as zero is said, and its degrees of freedom are kept', () => {
    const seed = Array.from({ length: 20 }, (_, k) => k + 1).find((k) => run({ tau: 0, seed: k }).components.values[1] === 0)!;
    const fit = run({ tau: 0, seed });
    expect(codes(fit)).toContain('campaign-variance-zero');
    expect(fit.components.names).toEqual(['scatter', 'campaign']);
    expect(fit.components.covariance[1]![1]).toBeGreaterThan(0);
  });
});

describe('stated uncertainties against the trials', () => {
  test('scatter at zero and too good an agreement: chi-squared with both tails and the uncorrected exponent', () => {
    const fit = run({ uRe: 0.05, statedRe: 0.1, uSh: 0.02, statedSh: 0.05, sigma: 0, range: 3, seed: 5 });
    expect(fit.statistics.residualSd).toBe(0);
    expect(codes(fit)).toContain('uncertainty-too-large');
    const test = fit.statedUncertainty!;
    expect(test.below + test.above).toBeCloseTo(1, 12);
    expect(test.below).toBeLessThan(0.05);
    expect(test.degreesOfFreedom).toBe(30 - 2 - 4);
    expect(textOf(fit, 'uncertainty-too-large')).toContain(String(Number(fit.uncorrected[1]!.toPrecision(3))));
    expect(fit.uncorrected[1]!).toBeLessThan(fit.values.a!);
  });

  test('scatter: none with more scatter than stated: the intervals are too narrow, said', () => {
    const fit = run({ statedSh: 0.02, sigma: 0.1 }, { scatter: 'none' });
    expect(codes(fit)).toContain('scatter-ignored');
    expect(fit.components.names).toEqual(['campaign']);
  });

  test('scatter: none with a trial that has no uncertainty is refused by name, with the remedy', () => {
    const whole = study({ statedSh: 0.05 });
    const one = { ...whole, sigma: whole.sigma.map((m, i) => (i === 4 ? new Float64Array(4) : m)) };
    expect(() => fitLaw(power, one, options({ scatter: 'none' }))).toThrow(InputError);
    expect(() => fitLaw(power, one, options({ scatter: 'none' }))).toThrow(says.exactTrials(['T5']));
    expect(() => fitLaw(power, study(), options({ scatter: 'none', weights: 'equal' }))).toThrow(InputError);
  });

  test('weights that are no positive numbers are refused by trial', () => {
    const whole = { ...study(), weight: Float64Array.from({ length: 30 }, (_, i) => (i === 2 ? 0 : 1)) };
    expect(() => fitLaw(power, whole, options({ weights: 'column' }))).toThrow(says.weightNotPositive('T3', 0));
  });
});

describe('errors in the groups', () => {
  test('a share of real variation below 0.85 is said, with what the exponent would be without the correction', () => {
    const seed = Array.from({ length: 40 }, (_, k) => k + 1).find((k) => {
      const { reliability } = run({ uRe: 0.1, statedRe: 0.1, statedSh: 0.03, range: 2, seed: k });
      return reliability < 0.8 && reliability > 0.65;
    })!;
    const fit = run({ uRe: 0.1, statedRe: 0.1, statedSh: 0.03, range: 2, seed });
    expect(codes(fit)).toContain('attenuation');
    expect(fit.held).toEqual([]);
  });

  const hopeless = { uRe: 0.2, statedRe: 0.2, statedSh: 0.03, range: 1.6, seed: 7 };
  test('below 0.6 the exponent is held at the nearest common one, has no interval, and the note says why', () => {
    const fit = run(hopeless);
    expect(fit.held).toHaveLength(1);
    expect(fit.held[0]).toMatchObject({ parameter: 'a', why: 'own error of the group', from: 'common exponent' });
    expect(fit.held[0]!.reliability).toBeLessThan(0.6);
    const a = fit.parameters[1]!;
    expect(a).toMatchObject({
      fixed: true,
      standardError: 0,
      lower: Number.NEGATIVE_INFINITY,
      upper: Number.POSITIVE_INFINITY,
      intervalBy: 'none',
    });
    expect(textOf(fit, 'held-unreliable')).toContain('not measured');
    expect(fit.free).toEqual(['C']);
    expect(fit.covariance[1]).toEqual([0, 0]);
  });

  test('theory goes before a start value, a start value before the nearest common exponent', () => {
    const start = law('Sh = C * Re^a', ['Re'], { start: { a: 0.55 } });
    expect(run(hopeless, {}, start).held[0]).toMatchObject({ value: 0.55, from: 'start' });
    const theory = law('Sh = C * Re^a', ['Re'], { start: { a: 0.55 }, theory: { a: 0.8 } });
    expect(run(hopeless, {}, theory).held[0]).toMatchObject({ value: 0.8, from: 'theory' });
  });
});

describe('parameters that the trials cannot tell', () => {
  const constantSc = (): FitData => {
    const one = study();
    return { ...one, x: [one.x[0]!, new Float64Array(30).fill(Math.log(700))], sigma: one.sigma.map(() => new Float64Array(9)) };
  };
  const two = 'Sh = C * Re^a * Sc^c';

  test('a group that never changed: its exponent has no value, and the note names what is entangled', () => {
    const fit = fitLaw(law(two, ['Re', 'Sc']), constantSc(), options());
    expect(fit.stop.why).toBe('rank deficient');
    expect(fit.parameters.every(({ estimate }) => Number.isNaN(estimate))).toBe(true);
    const text = textOf(fit, 'not-identified');
    expect(text).toContain('c');
    expect(text).toContain('C');
    expect(fit.statistics.residualSd).toBeNaN();
  });

  test('with theory for it, it is held there and the rest is fitted', () => {
    const fit = fitLaw(law(two, ['Re', 'Sc'], { theory: { c: 1 / 3 } }), constantSc(), options());
    expect(fit.held).toMatchObject([{ parameter: 'c', value: 1 / 3, why: 'not identified', from: 'theory' }]);
    const plain = fitLaw(power, study(), options());
    agree(fit.values.a!, plain.values.a!, 9);
    agree(fit.values.C! * 700 ** (1 / 3), plain.values.C!, 9);
    expect(codes(fit)).toContain('held-not-identified');
  });

  test('as many parameters as trials: values, but no interval and no error', () => {
    const fit = run({ n: 2, campaigns: 1 });
    expect(codes(fit)).toContain('too-few-trials');
    expect(fit.parameters[1]).toMatchObject({ lower: Number.NEGATIVE_INFINITY, upper: Number.POSITIVE_INFINITY });
    expect(Number.isFinite(fit.values.a!)).toBe(true);
    expect(fit.statistics.residualSd).toBeNaN();
  });

  test('few degrees of freedom are said', () => {
    expect(codes(run({ n: 6, campaigns: 1 }))).toContain('few-degrees-of-freedom');
    expect(codes(run({ n: 7, campaigns: 1 }))).not.toContain('few-degrees-of-freedom');
  });

  test('a law without a value at some trial ends as such', () => {
    const fit = fitLaw(law('Sh = C * ln(1 - Re)', ['Re']), study(), options());
    expect(fit.stop.why).toBe('not finite');
    expect(codes(fit)).toContain('law-without-value');
  });
});

describe('bounds', () => {
  const bounded = (bounds: readonly [number, number]): LawToFit => law('Sh = C * Re^a', ['Re'], { bounds: { a: bounds } });

  test('inside its bounds a parameter is fitted as without them', () => {
    agree(run({}, {}, bounded([0, 1])).values.a!, run().values.a!, 11);
  });

  test('on a bound: said, open where the data press, one-sided on the other side; the others take it as known', () => {
    const fit = run({}, {}, bounded([0.7, 1]));
    const a = fit.parameters[1]!;
    expect(a).toMatchObject({ estimate: 0.7, onBound: true, lower: Number.NEGATIVE_INFINITY, standardError: Number.NaN });
    expect(a.upper).toBeGreaterThan(0.7);
    expect(a.upper).toBeLessThan(0.85);
    expect(fit.stop.why).toBe('on a bound');
    expect(fit.notes.find(({ code }) => code === 'on-bound')?.text).toBe(says.onBound('a', 0.7));
    const fixed = fitLaw(law('Sh = C * Re^0.7', ['Re']), study(), options());
    agree(fit.values.C!, fixed.values.C!, 9);
    agree(fit.parameters[0]!.standardError, fixed.parameters[0]!.standardError, 8);
  });

  test('an interval ends at the bound', () => {
    const wide = run({ n: 8, campaigns: 1, sigma: 0.3 }, {}, bounded([0.3, 0.75]));
    const a = wide.parameters[1]!;
    expect(a.lower === 0.3 || a.upper === 0.75 || a.onBound).toBe(true);
  });

  test('equal bounds hold a parameter', () => {
    const fit = run({}, {}, bounded([0.6, 0.6]));
    expect(fit.parameters[1]).toMatchObject({ estimate: 0.6, fixed: true });
    expect(fit.free).toEqual(['C']);
  });
});
