import { describe, expect, test } from 'vitest';
import type { FitData, FitOptions } from '../../pipeline/regression/fit.ts';
import { subset } from '../../pipeline/regression/fit-data.ts';
import { fitLaw } from '../../pipeline/regression/fit-law.ts';
import { type RobustRefit, robustRefits } from '../../pipeline/regression/robust.ts';
import { robustNotes } from '../../pipeline/regression/robust-notes.ts';
import type { LawToFit } from '../../pipeline/regression/solve-law.ts';
import { agree, data, fixture, law, options } from './laws.ts';

const r = fixture('robust.json'); // fixtures/robust.R: rlm of MASS 7.3 on stack loss (Brownlee 1965), accuracy 1e-12
const absolute = options({ scale: 'absolute', weights: 'equal' });
const straight = law('loss = b0 + b1 * air + b2 * water + b3 * acid', ['air', 'water', 'acid']);
const loss = data({ y: r.loss, x: [r.air, r.water, r.acid], weight: r.prior }, 'absolute');

function both(form: LawToFit, trials: FitData, settings: FitOptions): { sd: number; of: Record<RobustRefit['method'], RobustRefit> } {
  const fit = fitLaw(form, trials, settings);
  const found = robustRefits(form, fit, trials, settings);
  const of = (method: RobustRefit['method']): RobustRefit => found.find((one) => one.method === method)!;
  return { sd: fit.statistics.residualSd, of: { Huber: of('Huber'), bisquare: of('bisquare') } };
}

describe('stack loss, beside rlm', () => {
  test('Huber at accuracy 1e-12: -41.026485, scale 2.440489', () => {
    const { sd, of } = both(straight, loss, absolute);
    expect(of.Huber.values.b0).toBeCloseTo(-41.026485, 5);
    expect(of.Huber.scale * sd).toBeCloseTo(2.440489, 5);
  });

  test.each([
    ['Huber', 'huber', absolute],
    ['bisquare', 'bisquare', absolute],
    ['Huber', 'huber_weighted', { ...absolute, weights: 'column' }],
    ['bisquare', 'bisquare_weighted', { ...absolute, weights: 'column' }],
  ] as const)('%s (%s): estimates, scale and weights', (method, name, settings) => {
    const { sd, of } = both(straight, loss, settings);
    const got = of[method];
    expect(got.stop).toBe('converged');
    r[name].estimate.forEach((value: number, k: number) => {
      agree(got.values[`b${k}`]!, value, 6);
    });
    agree(got.scale * sd, r[name].scale, 6);
    r[name].weights.forEach((value: number, i: number) => {
      expect(got.weights[i]!).toBeCloseTo(value, 6);
    });
  });
});

describe('a wrong trial among right ones', () => {
  const n = 24;
  const x = Array.from({ length: n }, (_, i) => 7 + (2.5 * i) / (n - 1));
  const noise = (i: number): number => 0.03 * Math.sin(12.9898 * (i + 1) ** 2);
  const wrong = 21;
  const y = x.map((value, i) => -1 + 0.6 * value + noise(i) + (i === wrong ? -1 : 0));
  const power = law('Sh = C * Re^a', ['Re']);

  test('pulls least squares away, and the robust refits hardly', () => {
    const trials = data({ y, x: [x] });
    const fit = fitLaw(power, trials, options());
    const { of } = both(power, trials, options());
    expect(Math.abs(fit.values.a! - 0.6)).toBeGreaterThan(0.08);
    expect(Math.abs(of.Huber.values.a! - 0.6)).toBeLessThan(0.02);
    const rest = fitLaw(
      power,
      subset(
        trials,
        [...x.keys()].filter((i) => i !== wrong),
      ),
      options(),
    );
    expect(Math.abs(of.bisquare.values.a! - rest.values.a!)).toBeLessThan(rest.parameters[1]!.standardError);
    expect(of.bisquare.weights[wrong]).toBeLessThan(1e-6);
    expect(trials.y[wrong]).toBe(y[wrong]);
  });

  test('also with campaigns and with errors in the group', () => {
    const campaign = x.map((_, i) => i % 4);
    const sigma = x.map(() => [0.02 ** 2, 0, 0, 0.05 ** 2]);
    const trials = data({ y: y.map((value, i) => value + 0.05 * (campaign[i]! - 1.5)), x: [x], campaign, sigma });
    const { of } = both(power, trials, options());
    expect(of.bisquare.stop).toBe('converged');
    expect(Math.abs(of.bisquare.values.a! - 0.6)).toBeLessThan(0.03);
    expect(of.bisquare.weights[wrong]).toBeLessThan(0.01);
  });

  test('a whole campaign that is shifted is the campaign’s effect, not a row of outliers', () => {
    const campaign = x.map((_, i) => i % 4);
    const clean = x.map((value, i) => -1 + 0.6 * value + noise(i) + [0.3, -0.1, -0.4, 0.2][campaign[i]!]!);
    const { of } = both(power, data({ y: clean, x: [x], campaign }), options());
    for (let c = 0; c < 4; c++) {
      const own = of.bisquare.weights.filter((_, i) => campaign[i] === c);
      expect(own.reduce((sum, value) => sum + value, 0) / own.length).toBeGreaterThan(0.7);
    }
  });
});

test('residuals that are mostly zero have no scale, and that is the reason given', () => {
  const x = Array.from({ length: 9 }, (_, i) => i);
  const y = x.map((value) => 2 * value + (value === 4 ? 1 : 0));
  const line = law('y = b0 + b1 * x', ['x']);
  const found = both(line, data({ y, x: [x] }, 'absolute'), absolute).of;
  expect(found.bisquare.stop).toBe('more than half of the residuals are zero');
  expect(found.bisquare.values).toEqual({});
});

describe('what is said of it', () => {
  test('stack loss: both refits move the slope of water by more than its standard error, and trial 21 is named', () => {
    const fit = fitLaw(straight, loss, absolute);
    const refits = robustRefits(straight, fit, loss, absolute);
    const [huber, bisquare] = robustNotes(fit, refits, loss.trials);
    const water = fit.parameters.find(({ name }) => name === 'b2')!;
    // (0.926059 - 1.295286)/0.368024 = -1.003 and (0.650711 - 1.295286)/0.368024 = -1.751: rlm above, lm's standard error (R)
    expect(Math.abs(refits[0]!.values.b2! - water.estimate) / water.standardError).toBeCloseTo(1.0033, 3);
    expect([huber!.code, huber!.level]).toEqual(['robust-moves', 'warning']);
    expect(bisquare!.text).toContain('1.8 standard errors');
    expect(bisquare!.text).toContain('trial T21 (weight 0)');
  });

  test('a fit without far trials is told to agree, and a refit that cannot be made is told too', () => {
    const x = Array.from({ length: 12 }, (_, i) => 7 + i / 5);
    const y = x.map((value, i) => 0.6 * value + 0.02 * (i % 2 === 0 ? 1 : -1) * (1 + (i % 3)));
    const power = law('Sh = C * Re^a', ['Re']);
    const trials = data({ y, x: [x] });
    const fit = fitLaw(power, trials, options());
    const refits = robustRefits(power, fit, trials, options());
    expect(robustNotes(fit, refits, trials.trials).map(({ code }) => code)).toEqual(['robust-agrees', 'robust-agrees']);
    const stopped = refits.map((one) => ({ ...one, values: {}, weights: [], stop: 'not finite' as const }));
    expect(robustNotes(fit, stopped, trials.trials).map(({ code }) => code)).toEqual(['robust-not-made', 'robust-not-made']);
  });
});
