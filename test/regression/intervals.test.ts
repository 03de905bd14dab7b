import { describe, expect, test } from 'vitest';
import { normalQuantile } from '../../pipeline/numerics/distributions.ts';
import { seeded } from '../../pipeline/numerics/random.ts';
import { campaignResamples, clusterErrors } from '../../pipeline/regression/campaign-resamples.ts';
import { equations } from '../../pipeline/regression/equations.ts';
import type { FitData } from '../../pipeline/regression/fit.ts';
import { subset } from '../../pipeline/regression/fit-data.ts';
import { fitLaw } from '../../pipeline/regression/fit-law.ts';
import { type IntervalRow, intervalRows } from '../../pipeline/regression/intervals.ts';
import { modelOf } from '../../pipeline/regression/model.ts';
import { solveLaw } from '../../pipeline/regression/solve-law.ts';
import { solveTheta } from '../../pipeline/regression/theta.ts';
import { resampler } from '../../pipeline/regression/warm-resamples.ts';
import { agree, data, law, options } from './laws.ts';

/** Invented: ln Sh = ln(2 + 0.6 Re^0.5 Sc^(1/3)) with scatter 0.05, campaigns where asked, errors in Re where asked. */
function study(n: number, campaigns: number, uRe: number, seed = 21): FitData {
  const random = seeded(seed);
  const shift = Array.from({ length: campaigns }, () => (campaigns > 1 ? 0.1 * random.normal() : 0));
  const rows = Array.from({ length: n }, (_, i) => {
    const [re, sc] = [Math.log(20) + Math.log(500) * random.uniform(), Math.log(300) + Math.log(4) * random.uniform()];
    return {
      y: Math.log(2 + 0.6 * Math.exp(0.5 * re + sc / 3)) + shift[i % campaigns]! + 0.05 * random.normal(),
      x: [re + uRe * random.normal(), sc],
    };
  });
  return data({
    y: rows.map((row) => row.y),
    x: [0, 1].map((k) => rows.map((row) => row.x[k]!)),
    campaign: rows.map((_, i) => i % campaigns),
    sigma: rows.map(() => [0, 0, 0, 0, uRe * uRe, 0, 0, 0, 0]),
  });
}

const power = law('Sh = C * Re^a * Sc^(1/3)', ['Re', 'Sc']);
const offset = law('Sh = A + C * Re^a * Sc^(1/3)', ['Re', 'Sc']);
const find = (rows: readonly IntervalRow[], parameter: string, method: string): IntervalRow =>
  rows.find((row) => row.parameter === parameter && row.method === method)!;
const methods = (rows: readonly IntervalRow[]): string[] => [...new Set(rows.map(({ method }) => method))];

describe('which methods', () => {
  const settings = options({ resamples: 50 });
  test.each([
    ['no campaigns', study(24, 1, 0), power, ['t', 'parametric bootstrap', 'bootstrap by trial']],
    ['a nonlinear law', study(24, 1, 0), offset, ['t', 'profile', 'parametric bootstrap', 'bootstrap by trial']],
    ['two campaigns', study(24, 2, 0), power, ['t', 'parametric bootstrap']],
    ['six campaigns', study(24, 6, 0), power, ['t', 'parametric bootstrap', 'bootstrap by campaign']],
    ['ten campaigns', study(30, 10, 0.05), power, ['t', 'parametric bootstrap', 'bootstrap by campaign', 'bootstrap-t by campaign']],
  ] as const)('%s', (_name, trials, of, want) => {
    const fit = fitLaw(of, trials, settings, 'law only');
    expect(methods(intervalRows(of, fit, trials, settings))).toEqual(want);
  });

  test('t and profile are those that the fit prints; campaigns by percentile are told to be no headline', () => {
    const trials = study(30, 6, 0.05);
    for (const of of [power, offset]) {
      const fit = fitLaw(of, trials, settings, 'law only');
      const rows = intervalRows(of, fit, trials, settings);
      for (const { name, lower, upper, intervalBy } of fit.parameters) {
        agree(find(rows, name, intervalBy).lower, lower, 6);
        agree(find(rows, name, intervalBy).upper, upper, 6);
      }
      expect(find(rows, 'a', 'bootstrap by campaign').note).toContain('a check only');
    }
  });

  test('the same seed gives the same rows, another seed others', () => {
    const trials = study(24, 6, 0.05);
    const fit = fitLaw(power, trials, settings, 'law only');
    const rows = (seed: number): readonly IntervalRow[] => intervalRows(power, fit, trials, { ...settings, seed });
    expect(rows(4)).toEqual(rows(4));
    expect(find(rows(4), 'a', 'parametric bootstrap').lower).not.toBe(find(rows(5), 'a', 'parametric bootstrap').lower);
  });
});

describe('against closed forms', () => {
  test('parametric percentiles of a linear law at held variance are estimate +- z se (normal theory)', () => {
    const settings = options({ resamples: 8000 });
    const trials = study(24, 1, 0);
    const fit = fitLaw(power, trials, settings, 'law only');
    const row = find(intervalRows(power, fit, trials, settings), 'a', 'parametric bootstrap');
    const { estimate, standardError } = fit.parameters[1]!;
    const half = normalQuantile(0.975) * standardError;
    // a percentile of 8,000 draws has a standard error of 0.03 standard errors there; four of them
    expect(Math.abs(row.lower - (estimate - half)) / standardError).toBeLessThan(0.12);
    expect(Math.abs(row.upper - (estimate + half)) / standardError).toBeLessThan(0.12);
  });

  test('cluster-robust errors of campaigns are sqrt(sum e_c^2)/C for the mean of balanced campaigns (Liang and Zeger 1986 for that case)', () => {
    const trials = study(24, 6, 0);
    const mean = law('Sh = C * Re^0 * Sc^0', ['Re', 'Sc']);
    const solved = solveLaw(mean, trials, options());
    const overall = trials.y.reduce((sum, value) => sum + value, 0) / 24;
    const deviations = Array.from(
      { length: 6 },
      (_, c) => trials.y.reduce((sum, value, i) => sum + (trials.campaign[i] === c ? value / 4 : 0), 0) - overall,
    );
    agree(
      clusterErrors(solved.eq, solved.columns, [1, 1, 1, 1, 1, 1])[0]!,
      Math.sqrt(deviations.reduce((sum, d) => sum + d * d, 0)) / 6,
      9,
    );
  });
});

describe('weighted warm refits', () => {
  test('are cold fits of the drawn trials, trial for trial (offset law, fused kernel)', () => {
    const trials = study(40, 1, 0);
    const fit = fitLaw(offset, trials, options(), 'law only');
    const model = modelOf(offset.form, 'relative');
    const theta = Float64Array.from(model.constants, (name) => fit.values[name]!);
    const kernel = resampler(model, trials.y, trials.x, new Float64Array(40).fill(1), theta);
    const random = seeded(2);
    for (let resample = 0; resample < 20; resample++) {
      const drawn = Array.from({ length: 40 }, () => random.integer(40));
      const copies = new Float64Array(40);
      for (const i of drawn) copies[i]! += 1;
      const out = new Float64Array(3);
      expect(kernel.fit(copies, out)).toBe(true);
      const cold = fitLaw({ ...offset, start: fit.values }, subset(trials, drawn), options(), 'law only');
      model.constants.forEach((name, j) => {
        const se = cold.parameters[j]!.standardError;
        expect(Math.abs(out[j]! - cold.values[name]!) / se).toBeLessThan(1e-4);
      });
    }
  });

  test('of campaigns with errors in the groups are fits in which every drawn campaign is one of its own', () => {
    const trials = study(24, 6, 0.08);
    const solved = solveLaw(power, trials, options());
    const { problem } = solved.eq;
    const counted = [2, 0, 1, 3, 0, 0];
    const copies = Float64Array.from(trials.campaign, (c) => counted[c]!);
    const warm = solveTheta(solved.eq, solved.settled.theta, solved.settled.components, { ...solved.search, copies });
    const drawn = counted.flatMap((times, c) => Array.from({ length: times }, () => c));
    const rows = drawn.flatMap((c, block) => trials.trials.flatMap((_, i) => (trials.campaign[i] === c ? [{ i, block }] : [])));
    const whole = equations({
      ...problem,
      n: rows.length,
      y: Float64Array.from(rows, ({ i }) => problem.y[i]!),
      x: problem.x.map((column) => Float64Array.from(rows, ({ i }) => column[i]!)),
      sigma: Float64Array.from(rows.flatMap(({ i }) => [...problem.sigma!.subarray(9 * i, 9 * i + 9)])),
      scatter: new Float64Array(rows.length).fill(1),
      block: Int32Array.from(rows, ({ block }) => block),
      blocks: drawn.length,
    });
    const cold = solveTheta(whole, solved.settled.theta, solved.settled.components, solved.search);
    agree(warm.q, cold.q, 10);
    warm.theta.forEach((value, k) => {
      agree(value, cold.theta[k]!, 9);
    });
  });

  test('leave the fit where it stood', () => {
    const trials = study(24, 6, 0.08);
    const solved = solveLaw(power, trials, options());
    const before = solved.eq.w.slice();
    campaignResamples(solved, 5, 1);
    solved.eq.w.forEach((value, i) => {
      agree(value, before[i]!, 10);
    });
  });
});
