import { describe, expect, test } from 'vitest';
import { degreesOfFreedom } from '../../pipeline/regression/degrees-of-freedom.ts';
import { fitLaw } from '../../pipeline/regression/fit-law.ts';
import { agree, data, fixture, law, options } from './laws.ts';

const estimates = (fit: ReturnType<typeof fitLaw>): number[] => fit.parameters.map((parameter) => parameter.estimate);

// Every reduction of the one model to a published method, against a program or a publication outside this project.

describe('no uncertainties, one campaign: least squares', () => {
  const r = fixture('profiles.json'); // fixtures/profiles.R: lm, nls, confint of R 4.2.2
  const lnRe = r.Re.map(Math.log);
  const lnSc = r.Sc.map(Math.log);

  test('a power law is lm on the logarithms: estimates, standard errors, sigma, intervals', () => {
    const fit = fitLaw(law('Sh = C * Re^a * Sc^c', ['Re', 'Sc']), data({ y: r.Sh.map(Math.log), x: [lnRe, lnSc] }), options());
    const [lnC, a, c] = r.power.estimate;
    agree(Math.log(fit.values.C!), lnC, 10);
    agree(fit.values.a!, a, 12);
    agree(fit.values.c!, c, 12);
    agree(fit.statistics.residualSd, r.power.sigma, 12);
    agree(fit.parameters[1]!.standardError, Math.sqrt(r.power.covariance[1][1]), 12);
    agree(fit.parameters[0]!.standardError / fit.values.C!, Math.sqrt(r.power.covariance[0][0]), 11);
    expect(fit.parameters.map((parameter) => parameter.degreesOfFreedom)).toEqual([21, 21, 21].map((df) => expect.closeTo(df, 9)));
    agree(Math.log(fit.parameters[0]!.lower), r.power.confint[0][0], 10);
    agree(fit.parameters[1]!.upper, r.power.confint[1][1], 11);
    agree(fit.parameters[2]!.lower, r.power.confint[2][0], 10);
    expect(fit.stop.why).toBe('direct solution');
  });

  test('its diagnostics are those of lm: hat values, rstudent, cooks.distance, R squared, AIC and BIC', () => {
    const fit = fitLaw(law('Sh = C * Re^a * Sc^c', ['Re', 'Sc']), data({ y: r.Sh.map(Math.log), x: [lnRe, lnSc] }), options());
    r.power.leverage.forEach((value: number, i: number) => {
      agree(fit.diagnostics.leverage[i]!, value, 10);
      agree(fit.diagnostics.studentised[i]!, r.power.studentised[i], 9);
      agree(fit.diagnostics.cook[i]!, r.power.cook[i], 9);
    });
    agree(fit.statistics.rSquared, r.power.rSquared, 12);
    agree(fit.statistics.bic, r.power.bic, 10);
    const k = 4;
    agree(fit.statistics.aicc, r.power.aic + (2 * k * (k + 1)) / (24 - k - 1), 10);
  });

  test('prior weights are those of lm(weights)', () => {
    const fit = fitLaw(
      law('Sh = C * Re^a * Sc^c', ['Re', 'Sc']),
      data({ y: r.Sh.map(Math.log), x: [lnRe, lnSc], weight: r.weight }),
      options({ weights: 'column' }),
    );
    agree(fit.values.a!, r.weighted.estimate[1], 11);
    agree(fit.parameters[2]!.standardError, Math.sqrt(r.weighted.covariance[2][2]), 11);
    agree(fit.statistics.residualSd, r.weighted.sigma, 11);
  });

  // nls of R stops at a relative offset of 1e-7, so estimates agree to about that share of a standard error; confint interpolates its profile (about 2e-4 of the width)
  test.each([
    ['offset', 'Nu = A + C * (Re/100)^a', 'relative', ['A', 'C', 'a'], 'Re', 'Nu'],
    ['plain', 'Nu = A + C * (Re/100)^a', 'absolute', ['A', 'C', 'a'], 'Re', 'Nu'],
    ['cannon', 'temp = Ta + D * exp(-theta * time)', 'absolute', ['Ta', 'D', 'theta'], 'time', 'temp'],
    ['cannon1', 'temp = 60 + 70 * exp(-theta * time)', 'absolute', ['theta'], 'time', 'temp'],
  ] as const)('%s: nls from no start value, standard errors and profile intervals of confint', (name, form, scale, names, x, y) => {
    const on = (values: number[]): number[] => (scale === 'relative' ? values.map(Math.log) : values);
    const fit = fitLaw(law(form, [x]), data({ y: on(r[y]), x: [on(r[x])] }, scale), options({ scale }));
    const want = r[name];
    names.forEach((parameter, j) => {
      const got = fit.parameters.find((one) => one.name === parameter)!;
      const estimate = [want.estimate].flat()[j];
      const se = Math.sqrt([want.covariance].flat(2)[j * (names.length + 1)]);
      expect(Math.abs(got.estimate - estimate) / se).toBeLessThan(1e-5);
      agree(got.standardError, se, 4);
      const [low, high] = want.profile[j];
      expect(Math.abs(got.lower - low) / (high - low)).toBeLessThan(3e-4);
      expect(Math.abs(got.upper - high) / (high - low)).toBeLessThan(3e-4);
      expect(got.intervalBy).toBe('profile');
    });
    agree(fit.statistics.residualSd, want.sigma, 8);
  });
});

describe('campaigns, no uncertainties: REML', () => {
  test('sleepstudy of lme4: fixed effects, both standard deviations, criterion, degrees of freedom', () => {
    const r = fixture('sleepstudy.json'); // fixtures/sleepstudy.R, data and model of lme4 (Belenky et al. 2003)
    const fit = fitLaw(
      law('Reaction = A + b * Days', ['Days']),
      data({ y: r.reaction, x: [r.days], campaign: r.subject.map((s: number) => s - 1) }, 'absolute'),
      options({ scale: 'absolute' }),
    );
    const [A, b] = estimates(fit);
    agree(A!, 251.405105, 8);
    agree(b!, 10.467286, 7);
    agree(A!, r.fixed[0], 11);
    agree(b!, r.fixed[1], 11);
    agree(fit.statistics.campaignSd, r.tau, 6);
    agree(fit.statistics.residualSd, r.sigma, 7);
    expect(fit.statistics.campaignSd).toBeCloseTo(37.12383, 4);
    expect(fit.statistics.residualSd).toBeCloseTo(30.99123, 5);
    expect(fit.components.criterion).toBeCloseTo(1786.46509, 5);
    agree(fit.covarianceRandom[0]![1]!, r.covariance[0][1], 6);
    agree(fit.parameters[0]!.standardError, Math.sqrt(r.covariance[0][0]), 6);
    // Satterthwaite with the expected information, dense matrices in the script; 161 = 180 - 18 - 1 for the slope of a balanced study
    agree(fit.parameters[0]!.degreesOfFreedom, r.satterthwaite[0], 5);
    expect(fit.parameters[1]!.degreesOfFreedom).toBeCloseTo(161, 4);
    agree(fit.components.covariance[1]![1]!, r.information_inverse[1][1], 5);
    fit.campaigns.shifts.forEach((shift, c) => {
      agree(shift, r.shifts[c], 5);
    });
  });

  test('a nonlinear law of nlme: the fixed point of its linear mixed step, where the restricted likelihood is greater than where nlme() itself ends', () => {
    const r = fixture('mixed-nonlinear.json'); // fixtures/mixed-nonlinear.R: lme of nlme 3.1.162, iterated on the linearised law
    const fit = fitLaw(
      law('Sh = A + C * Re^a', ['Re']),
      data({ y: r.y, x: [r.x], campaign: r.campaign.map((c: number) => c - 1) }),
      options(),
    );
    fit.parameters.forEach((parameter, j) => {
      agree(parameter.estimate, r.fixed[j], 8);
      agree(parameter.standardError, Math.sqrt(r.covariance[j][j]), 7);
    });
    agree(fit.statistics.residualSd, r.sigma, 7);
    agree(fit.statistics.campaignSd, r.tau, 7);
    agree(fit.components.criterion, -2 * r.logLik, 9);
    expect(-fit.components.criterion / 2).toBeGreaterThan(r.directLogLik);
  });
});

describe('stated uncertainties alone: errors in all variables', () => {
  // Pearson 1901 with the weights of York 1966 (Can. J. Phys. 44, 1079, doi 10.1139/p66-090); answers of York et al. 2004 and of the exact solution
  const x = [0, 0.9, 1.8, 2.6, 3.3, 4.4, 5.2, 6.1, 6.5, 7.4];
  const y = [5.9, 5.4, 4.4, 4.6, 3.5, 3.7, 2.8, 2.8, 2.4, 1.5];
  const wx = [1000, 1000, 500, 800, 200, 80, 60, 20, 1.8, 1];
  const wy = [1, 1.8, 4, 8, 20, 20, 70, 70, 100, 500];
  const york = data({ y, x: [x], sigma: x.map((_, i) => [1 / wy[i]!, 0, 0, 1 / wx[i]!]) }, 'absolute');
  const line = law('y = a + b * x', ['x']);
  const stated = options({ scale: 'absolute', scatter: 'none', campaignEffect: 'none' });

  test('the line of York: b, a, Q, and the standard errors that York prints (B^-1)', () => {
    const fit = fitLaw(line, york, stated);
    agree(fit.values.b!, -0.480533407446, 11);
    agree(fit.values.a!, 5.479910224033, 12);
    agree(fit.statistics.chiSquared, 11.866353, 7);
    expect(fit.statistics.degreesOfFreedom).toBe(8);
    const b = inverseOfB(fit);
    expect(Math.sqrt(b[0]!)).toBeCloseTo(0.294971, 6);
    expect(Math.sqrt(b[1]!)).toBeCloseTo(0.057985, 6);
  });

  test('the two wrong equations give the two known wrong slopes, so the right one is no accident', () => {
    // with ln v added to the objective -0.462449, with weights held while theta moves (no dV/dtheta) -0.463449
    const b = fitLaw(line, york, stated).values.b!;
    const v = (slope: number): number[] => x.map((_, i) => 1 / wy[i]! + slope ** 2 / wx[i]!);
    const profile = (slope: number, weights: readonly number[]): number => {
      const total = weights.reduce((sum, w) => sum + w, 0);
      const a = weights.reduce((sum, w, i) => sum + w * (y[i]! - slope * x[i]!), 0) / total;
      return weights.reduce((sum, w, i) => sum + w * (y[i]! - a - slope * x[i]!) ** 2, 0);
    };
    const joint = smallest(
      (slope) =>
        profile(
          slope,
          v(slope).map((d) => 1 / d),
        ) + v(slope).reduce((sum, d) => sum + Math.log(d), 0),
    );
    let held = -0.5;
    for (let round = 0; round < 200; round++) {
      const weights = v(held).map((d) => 1 / d);
      held = smallest((slope) => profile(slope, weights));
    }
    expect(joint).toBeCloseTo(-0.462449, 6);
    expect(held).toBeCloseTo(-0.463449, 6);
    expect(Math.abs(b - joint)).toBeGreaterThan(0.017);
    expect(Math.abs(b - held)).toBeGreaterThan(0.016);
    expect(
      smallest((slope) =>
        profile(
          slope,
          v(slope).map((d) => 1 / d),
        ),
      ),
    ).toBeCloseTo(b, 6);
  });

  test.each([
    ['one', 'Sh = A + C * P^a', ['P']],
    ['two', 'Sh = A + C * P^a * Q^c', ['P', 'Q']],
  ] as const)('a nonlinear law of scipy.odr, case %s: parameters and sum of squares', (name, form, groups) => {
    const r = fixture('odr.json')[name]; // fixtures/odr.py; ODRPACK stops at about 1e-7 of a standard error
    const columns = name === 'one' ? [r.x] : [r.x1, r.x2];
    const sigma = r.y.map((_: number, i: number) =>
      name === 'one'
        ? [r.sy[i] ** 2, 0, 0, r.sx[i] ** 2]
        : [r.sy[i] ** 2, 0, 0, 0, r.cov[i][0][0], r.cov[i][0][1], 0, r.cov[i][1][0], r.cov[i][1][1]],
    );
    const fit = fitLaw(law(form, groups), data({ y: r.y, x: columns, sigma }), options({ scatter: 'none', campaignEffect: 'none' }));
    estimates(fit).forEach((value, j) => {
      expect(Math.abs(value - r.beta[j]) / Math.sqrt(r.cov_beta[j][j])).toBeLessThan(2e-4);
    });
    agree(fit.statistics.chiSquared, r.sum_square, 7);
  });

  test('equal errors and one campaign: Fuller (1987) eq. 1.2.3, b = [s_xy - (n-2) s_xy error]/[s_xx - (n-2) error]', () => {
    // x and y errors share a reading: covariance s, u^2 on x; scatter is estimated beyond them
    const n = 12;
    const px = [0.1, 0.5, 0.72, 1.1, 1.3, 1.62, 1.9, 2.4, 2.45, 2.9, 3.1, 3.6];
    const noise = [0.11, -0.2, 0.15, 0.02, -0.13, 0.2, -0.08, -0.16, 0.21, 0.05, -0.12, -0.05];
    const py = px.map((value, i) => -1 + 0.6 * value + noise[i]!);
    const [u2, s] = [0.04, 0.006];
    const fit = fitLaw(law('Sh = C * Re^a', ['Re']), data({ y: py, x: [px], sigma: px.map(() => [0.001, s, s, u2]) }), options());
    const mean = (values: readonly number[]): number => values.reduce((sum, value) => sum + value, 0) / n;
    const [mx, my] = [mean(px), mean(py)];
    const sxx = px.reduce((sum, value) => sum + (value - mx) ** 2, 0);
    const sxy = px.reduce((sum, value, i) => sum + (value - mx) * (py[i]! - my), 0);
    const b = (sxy - (n - 2) * s) / (sxx - (n - 2) * u2);
    expect(fit.statistics.residualSd).toBeGreaterThan(0);
    agree(fit.values.a!, b, 9);
    agree(Math.log(fit.values.C!), my - b * mx, 9);
  });
});

interface Dense {
  readonly y: number[];
  readonly x: number[][];
  readonly campaign: number[];
  readonly cov: number[][][];
  readonly shift: number[][];
  readonly theta: number[];
  readonly phi: number[];
  readonly Phi: number[][];
  readonly W: number[][];
  readonly K: number[];
  readonly df: number[];
}

describe('everything at once: dense matrices as printed, by numpy and scipy', () => {
  const cases: readonly Dense[] = fixture('dense.json').cases; // fixtures/dense.py; minimised by Nelder-Mead, so about 8 digits
  test.each(cases.map((_, k) => k))('case %i', (k) => {
    const want = cases[k]!;
    const systematic = want.shift;
    const fit = fitLaw(
      law('y = C * P^a * Q^b', ['P', 'Q']),
      data({ y: want.y, x: want.x, campaign: want.campaign, sigma: want.cov.map((m) => m.flat()), sources: ['D'], systematic }),
      options(),
    );
    const c = fit.values.C!;
    agree(Math.log(c), want.theta[0]!, 7);
    agree(fit.values.a!, want.theta[1]!, 7);
    agree(fit.values.b!, want.theta[2]!, 7);
    expect(fit.components.values[0]!).toBeCloseTo(want.phi[0]!, 7);
    expect(fit.components.values[1]!).toBeCloseTo(want.phi[1]!, 6);
    agree(fit.covarianceRandom[1]![2]!, want.Phi[1]![2]!, 6);
    agree(fit.covarianceRandom[0]![0]! / c ** 2, want.Phi[0]![0]!, 6);
    agree(fit.components.covariance[0]![0]!, want.W[0]![0]!, 6);
    agree(fit.shifts.D![0]! / c, want.K[0]!, 6);
    agree(fit.shifts.D![1]!, want.K[1]!, 6);
    const contrast = (j: number): number[] => [0, 1, 2].map((k) => (k === j ? (j === 0 ? 1 / c : 1) : 0));
    [0, 1, 2].forEach((j) => {
      agree(degreesOfFreedom(fit, contrast(j)), want.df[j]!, 3);
    });
  });
});

/** Minimum of a smooth function of one slope near -0.5, by golden section and then a parabola through close points. */
function smallest(f: (slope: number) => number): number {
  let [a, b] = [-0.6, -0.4];
  const ratio = (Math.sqrt(5) - 1) / 2;
  for (let k = 0; k < 60; k++) {
    const [c, d] = [b - ratio * (b - a), a + ratio * (b - a)];
    if (f(c) < f(d)) b = d;
    else a = c;
  }
  return (a + b) / 2;
}

/** York's squared standard errors: the diagonal of B^-1. */
function inverseOfB(fit: ReturnType<typeof fitLaw>): number[] {
  return fit.inverseOfB.map((row, j) => row[j]!);
}
