import { describe, expect, test } from 'vitest';
import { studentQuantile } from '../../pipeline/numerics/distributions.ts';
import { fitLaw } from '../../pipeline/regression/fit-law.ts';
import { predictor } from '../../pipeline/regression/predict-ln.ts';
import { agree, data, fixture, law, options } from './laws.ts';

describe('calibration of a thermometer, GUM (JCGM 100:2008) example H.3', () => {
  // Table H.6: observed temperatures and corrections, degC; printed results in H.3.3 to H.3.4 (data typed from memory; they return the printed results)
  const t = [21.521, 22.012, 22.512, 23.003, 23.507, 23.999, 24.513, 25.002, 25.503, 26.01, 26.511];
  const b = [-0.171, -0.169, -0.166, -0.159, -0.164, -0.165, -0.156, -0.157, -0.159, -0.161, -0.16];
  const fit = fitLaw(law('b = y1 + y2 * (t - 20)', ['t']), data({ y: b, x: [t] }, 'absolute'), options({ scale: 'absolute' }));

  test('intercept and slope with their standard uncertainties and correlation', () => {
    expect(fit.values.y1).toBeCloseTo(-0.1712, 5);
    expect(fit.parameters[0]!.standardError).toBeCloseTo(0.00288, 5);
    expect(fit.values.y2).toBeCloseTo(0.002183, 6);
    expect(fit.parameters[1]!.standardError).toBeCloseTo(0.000668, 6);
    const [[v1, c], [, v2]] = fit.covarianceRandom as [[number, number], [number, number]];
    expect(c / Math.sqrt(v1 * v2)).toBeCloseTo(-0.9304, 4);
  });

  test('the correction predicted at 30 degC: -0.1494 with u = 0.0041, covariance kept (printed -0.14938, 0.00414)', () => {
    const at30 = predictor(fit)({ at: { t: 30 } });
    expect(at30.value).toBeCloseTo(-0.14938, 5);
    expect(Math.sqrt(at30.variance.law)).toBeCloseTo(0.00414, 5);
    expect(at30.lawDegreesOfFreedom).toBeCloseTo(9, 6);
    const half = studentQuantile(0.975, 9) * Math.sqrt(at30.variance.law);
    expect(at30.lawUpper - at30.value).toBeCloseTo(half, 10);
  });
});

describe('systematic sources of rig and plant', () => {
  // Sh = k L/D and Sc = mu/(rho D): one error s of ln D moves ln Sh and ln Sc by -s at the rig, and at the plant ln Sc by -s and ln(k/Sh) by +s
  const n = 14;
  const re = Array.from({ length: n }, (_, i) => 3 + 0.37 * i - 0.01 * i * i);
  const sc = Array.from({ length: n }, (_, i) => 5.8 + 0.21 * ((i * 5) % n));
  const noise = [3, -2, 5, -6, 1, 4, -3, -1, 2, -5, 6, 0, -4, 2].map((value) => value / 100);
  const y = re.map((value, i) => Math.log(0.4) + 0.55 * value + sc[i]! / 3 + noise[i]!);
  const u = 0.08;
  const systematic = re.map(() => [-u, 0, -u]);
  const sigma = re.map((_, i) => [0.0009, 0.0002 * (i % 3), -0.0001, 0.0002 * (i % 3), 0.003, 0.0001, -0.0001, 0.0001, 0.001]);
  const plant = { at: { Re: 2e5, Sc: 900 }, lnFactor: Math.log(1e-9 / 2), sources: { diffusivity: { groups: { Sc: -u }, factor: u } } };

  test.each([
    ['as exact readings', undefined],
    ['with errors in x and y that share readings', sigma],
  ])('a shared diffusivity cancels exactly at exponent 1/3 held, %s', (_name, random) => {
    const fit = fitLaw(
      law('Sh = C * Re^a * Sc^(1/3)', ['Re', 'Sc']),
      data({ y, x: [re, sc], sources: ['diffusivity'], systematic, ...(random === undefined ? {} : { sigma: random }) }),
      options(),
    );
    agree(fit.shifts.diffusivity![0]! / fit.values.C!, (-2 / 3) * u, 10);
    const shared = predictor(fit)(plant);
    expect(Math.abs(shared.sources.diffusivity!)).toBeLessThan(1e-14);
    agree(shared.standardDeviation ** 2, shared.variance.law + shared.variance.scatter, 12);
  });

  test('a diffusivity of the plant itself does not cancel: law and plant add in quadrature', () => {
    const fit = fitLaw(
      law('Sh = C * Re^a * Sc^(1/3)', ['Re', 'Sc']),
      data({ y, x: [re, sc], sources: ['diffusivity'], systematic }),
      options(),
    );
    const own = predictor(fit)({ ...plant, sources: { 'plant diffusivity': plant.sources.diffusivity } });
    agree(Math.abs(own.sources.diffusivity!), (2 / 3) * u, 10);
    agree(Math.abs(own.sources['plant diffusivity']!), (2 / 3) * u, 10);
    const shared = predictor(fit)(plant);
    expect(own.standardDeviation ** 2 - shared.standardDeviation ** 2).toBeCloseTo(2 * (u * (2 / 3)) ** 2, 12);
  });

  test('K_s u_s is what a refit on shifted readings gives', () => {
    const base = fitLaw(
      law('Sh = C * Re^a * Sc^c', ['Re', 'Sc']),
      data({ y, x: [re, sc], sigma, sources: ['s'], systematic: re.map((value, i) => [0.01 * value, 0.02, -0.01 * sc[i]!]) }),
      options(),
    );
    const h = 1e-3;
    const moved = fitLaw(
      law('Sh = C * Re^a * Sc^c', ['Re', 'Sc']),
      data({
        y: y.map((value, i) => value + h * 0.01 * re[i]!),
        x: [re.map((value) => value + h * 0.02), sc.map((value) => value - h * 0.01 * value)],
        sigma,
      }),
      options(),
    );
    // the components move with the shift too, which K_s leaves out: agreement to the order of the noise, not of h
    (['C', 'a', 'c'] as const).forEach((name, j) => {
      const slope = (moved.values[name]! - base.values[name]!) / h;
      expect(Math.abs(slope - base.shifts.s![j]!)).toBeLessThan(
        0.05 * Math.max(Math.abs(base.shifts.s![j]!), base.parameters[j]!.standardError * 0.02),
      );
    });
  });
});

describe('a new campaign', () => {
  const r = fixture('sleepstudy.json'); // fixtures/sleepstudy.R, lme4
  const fit = fitLaw(
    law('Reaction = A + b * Days', ['Days']),
    data({ y: r.reaction, x: [r.days], campaign: r.subject.map((s: number) => s - 1) }, 'absolute'),
    options({ scale: 'absolute' }),
  );

  test('has law, campaign and scatter variance, with the degrees of freedom of their sum', () => {
    const days = 4.5;
    const { variance, standardDeviation, degreesOfFreedom, value, lower } = predictor(fit)({ at: { Days: days } });
    const [[aa, ab], [, bb]] = r.covariance;
    const [s2, t2] = [r.sigma ** 2, r.tau ** 2];
    agree(value, r.fixed[0] + days * r.fixed[1], 9);
    agree(variance.law, aa + 2 * days * ab + days * days * bb, 6);
    agree(standardDeviation ** 2, variance.law + s2 + t2, 5);
    // at the mean of Days the law's variance is (tau^2 + sigma^2/10)/18: d/d sigma^2 = 1 + 1/180, d/d tau^2 = 1 + 1/18
    const gamma = [1 + 1 / 180, 1 + 1 / 18];
    const w = r.information_inverse;
    const spread = gamma[0]! ** 2 * w[0][0] + 2 * gamma[0]! * gamma[1]! * w[0][1] + gamma[1]! ** 2 * w[1][1];
    agree(degreesOfFreedom, (2 * standardDeviation ** 4) / spread, 5);
    agree(value - lower, studentQuantile(0.975, degreesOfFreedom) * standardDeviation, 10);
  });

  test('is told to be missing where the trials cannot know it', () => {
    const one = fitLaw(
      law('Reaction = A + b * Days', ['Days']),
      data({ y: r.reaction, x: [r.days] }, 'absolute'),
      options({ scale: 'absolute' }),
    );
    expect(predictor(one)({ at: { Days: 1 } }).withoutCampaigns).toBe(true);
    expect(predictor(fit)({ at: { Days: 1 } }).withoutCampaigns).toBe(false);
    expect(one.notes.map((note) => note.code)).toContain('one-campaign');
  });

  test('one-sided limits are Student quantiles on the same standard deviation', () => {
    const p = predictor(fit)({ at: { Days: 9 } });
    agree(p.value - p.limit('low', 0.9), studentQuantile(0.9, p.degreesOfFreedom) * p.standardDeviation, 12);
    expect(p.limit('high', 0.9)).toBeGreaterThan(p.value);
  });
});
