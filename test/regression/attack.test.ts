import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { seeded } from '../../pipeline/numerics/random.ts';
import type { Fit, FitData } from '../../pipeline/regression/fit.ts';
import { subset } from '../../pipeline/regression/fit-data.ts';
import { fitLaw } from '../../pipeline/regression/fit-law.ts';
import { bind, inCoordinates, modelOf } from '../../pipeline/regression/model.ts';
import { agree, data, law, options } from './laws.ts';

/** A synthetic study with everything in it: two groups, campaigns, errors that share readings, one systematic source. */
function study(seed: number, n = 24, campaigns = 4): FitData {
  const random = seeded(seed);
  const shift = Array.from({ length: campaigns }, () => 0.1 * random.normal());
  const rows = Array.from({ length: n }, (_, i) => {
    const [re, sc] = [7 + 2.5 * random.uniform(), 6 + 1.5 * random.uniform()];
    const [u, v, w] = [0.05 * random.normal(), 0.03 * random.normal(), 0.02 * random.normal()];
    return {
      y: -1 + 0.6 * re + 0.35 * sc + shift[i % campaigns]! + 0.05 * random.normal() + w + 0.5 * v,
      x: [re + u + v, sc - v],
    };
  });
  const d = [0.02 ** 2 + (0.5 * 0.03) ** 2, 0.5 * 0.03 ** 2, -0.5 * 0.03 ** 2];
  return data({
    y: rows.map((row) => row.y),
    x: [0, 1].map((k) => rows.map((row) => row.x[k]!)),
    campaign: rows.map((_, i) => i % campaigns),
    sigma: rows.map(() => [d[0]!, d[1]!, d[2]!, d[1]!, 0.05 ** 2 + 0.03 ** 2, -(0.03 ** 2), d[2]!, -(0.03 ** 2), 0.03 ** 2]),
    sources: ['D'],
    systematic: rows.map(() => [-0.05, 0, -0.05]),
  });
}

const power = law('Sh = C * Re^a * Sc^c', ['Re', 'Sc']);
const settings = options();
const seeds = fc.integer({ min: 1, max: 1e6 });
const check = (property: fc.IProperty<unknown>, runs = 12): void => fc.assert(property, { seed: 2718, numRuns: runs });

function same(a: Fit, b: Fit, digits = 10): void {
  for (const [name, value] of Object.entries(a.values)) agree(b.values[name]!, value, digits);
  const by = Object.fromEntries(b.parameters.map((parameter) => [parameter.name, parameter]));
  for (const parameter of a.parameters) {
    agree(by[parameter.name]!.standardError, parameter.standardError, digits - 2);
    agree(by[parameter.name]!.lower, parameter.lower, digits - 2);
  }
  expect(b.statistics.residualSd).toBeCloseTo(a.statistics.residualSd, digits - 2);
}

describe('what must not change a fit', () => {
  test('the order of the trials', () => {
    check(
      fc.property(seeds, (seed) => {
        const whole = study(seed);
        const order = whole.trials.map((_, i) => i).sort((a, b) => ((a * 7 + seed) % 24) - ((b * 7 + seed) % 24));
        same(fitLaw(power, whole, settings), fitLaw(power, subset(whole, order), settings));
      }),
    );
  });

  test('the order of the parameters and of the groups', () => {
    check(
      fc.property(seeds, (seed) => {
        const whole = study(seed);
        const swap = (m: Float64Array): Float64Array => Float64Array.from([0, 2, 1].flatMap((a) => [0, 2, 1].map((b) => m[a * 3 + b]!)));
        const turned: FitData = {
          ...whole,
          x: [whole.x[1]!, whole.x[0]!],
          sigma: whole.sigma.map(swap),
          systematic: whole.systematic.map((s) => Float64Array.from([s[0]!, s[2]!, s[1]!])),
        };
        const other = law('Sh = Sc^c * Re^a * C', ['Sc', 'Re']);
        same(fitLaw(power, whole, settings), fitLaw(other, turned, settings));
      }),
    );
  });

  test('numbers of campaigns: gaps and names', () => {
    const whole = study(5);
    same(
      fitLaw(power, whole, settings),
      fitLaw(
        power,
        { ...whole, campaign: whole.campaign.map((c) => 3 * (3 - c)), campaigns: Array.from({ length: 10 }, (_, c) => `w${c}`) },
        settings,
      ),
    );
  });

  test('prior weights times a factor: same estimates and errors', () => {
    check(
      fc.property(seeds, fc.double({ min: 0.01, max: 100, noNaN: true }), (seed, factor) => {
        const random = seeded(seed);
        const weight = Float64Array.from({ length: 24 }, () => 0.5 + random.uniform());
        const heavier = (k: number): Fit =>
          fitLaw(power, { ...study(seed), weight: weight.map((w) => w * k) }, options({ weights: 'column', campaignEffect: 'none' }));
        const [one, two] = [heavier(1), heavier(factor)];
        agree(two.values.a!, one.values.a!, 9);
        agree(two.parameters[1]!.standardError, one.parameters[1]!.standardError, 8);
        agree(two.statistics.residualSd ** 2, factor * one.statistics.residualSd ** 2, 7);
      }),
    );
  });

  test('another unit of a group: same exponents and errors, the factor in front takes it up', () => {
    check(
      fc.property(seeds, fc.double({ min: -7, max: 7, noNaN: true }), (seed, shift) => {
        const whole = study(seed);
        const [one, two] = [
          fitLaw(power, whole, settings),
          fitLaw(power, { ...whole, x: [whole.x[0]!.map((v) => v + shift), whole.x[1]!] }, settings),
        ];
        agree(two.values.a!, one.values.a!, 8);
        agree(two.parameters[1]!.standardError, one.parameters[1]!.standardError, 7);
        expect(Math.log(two.values.C!)).toBeCloseTo(Math.log(one.values.C!) - one.values.a! * shift, 7);
      }),
    );
  });

  test('another unit of the response of an absolute law: everything in proportion', () => {
    const line = law('y = A + b * x', ['x']);
    const absolute = options({ scale: 'absolute' });
    const raw = study(31);
    const base = {
      ...raw,
      x: [raw.x[0]!],
      sigma: raw.sigma.map((m) => Float64Array.of(m[0]!, m[1]!, m[3]!, m[4]!)),
      systematic: raw.systematic.map((s) => s.slice(0, 2)),
      scale: 'absolute' as const,
    };
    const k = 3600;
    const scaled = {
      ...base,
      y: base.y.map((v) => k * v),
      sigma: base.sigma.map((m) => Float64Array.of(k * k * m[0]!, k * m[1]!, k * m[2]!, m[3]!)),
      systematic: base.systematic.map((s) => Float64Array.of(k * s[0]!, s[1]!)),
    };
    const [one, two] = [fitLaw(line, base, absolute), fitLaw(line, scaled, absolute)];
    agree(two.values.b!, k * one.values.b!, 8);
    agree(two.parameters[0]!.upper, k * one.parameters[0]!.upper, 7);
    agree(two.statistics.campaignSd, k * one.statistics.campaignSd, 6);
  });

  test('the inputs are as they were', () => {
    const whole = study(8);
    const before = structuredClone(whole);
    const form = structuredClone(power);
    fitLaw(power, whole, options({ resamples: 10 }));
    expect(whole).toEqual(before);
    expect(power).toEqual(form);
  });
});

describe('what must change a fit, and how', () => {
  test('a trial counted twice is a trial of weight two', () => {
    const whole = study(12);
    const none = options({ weights: 'column', campaignEffect: 'none' });
    const unit = { ...whole, weight: new Float64Array(24).fill(1) };
    const twice = fitLaw(power, subset(unit, [...unit.trials.map((_, i) => i), 7]), none);
    const heavy = fitLaw(power, { ...unit, weight: unit.weight.map((w, i) => (i === 7 ? 2 : w)) }, none);
    agree(twice.values.a!, heavy.values.a!, 10);
    agree(twice.values.C!, heavy.values.C!, 9);
    expect(twice.residualDegreesOfFreedom).toBe(heavy.residualDegreesOfFreedom + 1);
  });

  test('leaving out a campaign is a fit of the rest', () => {
    const whole = study(3, 30, 5);
    const rest = whole.trials.flatMap((_, i) => (whole.campaign[i] === 2 ? [] : [i]));
    const a = fitLaw(power, subset(whole, rest), settings);
    const b = fitLaw(
      power,
      data({
        y: rest.map((i) => whole.y[i]!),
        x: whole.x.map((column) => rest.map((i) => column[i]!)),
        campaign: rest.map((i) => [0, 1, -1, 2, 3][whole.campaign[i]!]!),
        sigma: rest.map((i) => [...whole.sigma[i]!]),
        sources: ['D'],
        systematic: rest.map((i) => whole.systematic[i]!),
      }),
      settings,
    );
    same(b, a, 10);
    expect(a.campaigns.names).toEqual(['week 1', 'week 2', 'week 4', 'week 5']);
  });

  test('twice the stated uncertainties of the groups, twice the correction to first order', () => {
    const whole = study(77, 60, 6);
    const times = (k: number): FitData => ({
      ...whole,
      sigma: whole.sigma.map((m) => m.map((v, at) => (at > 2 && at % 3 > 0 ? k * v : v))),
    });
    const none = fitLaw(power, times(0), settings).values.a!;
    const [one, two] = [fitLaw(power, times(0.5), settings).values.a! - none, fitLaw(power, times(1), settings).values.a! - none];
    expect(one).toBeGreaterThan(0);
    expect(two / one).toBeGreaterThan(1.9);
    expect(two / one).toBeLessThan(2.3);
  });
});

describe('derivatives of a law on the scale of the fit', () => {
  const forms: readonly (readonly [string, 'relative' | 'absolute'])[] = [
    ['Sh = C * Re^a * Sc^(1/3)', 'relative'],
    ['Sh = A + C * Re^a * Sc^c', 'relative'],
    ['Sh = ((A * Re^a)^n + (C * Sc^c)^n)^(1/n)', 'relative'],
    ['Sh = A * max(Re / 40, 1)^a * Sc^c', 'relative'],
    ['Sh = C * min(Re, 40)^a * Sc^c', 'relative'],
    ['Sh = A * exp(-a / Re) * sqrt(C + Sc)', 'relative'],
    ['Sh = A - C * ln(Re) + a * tanh(c * Sc)', 'absolute'],
    ['Sh = A + C * Re^2 + a * Re * Sc', 'absolute'],
  ];
  test.each(forms)('%s (%s): analytic against central differences on both sides of every switch', (text, scale) => {
    const { form } = law(text, ['Re', 'Sc']);
    const model = modelOf(form, scale);
    const natural = [20, 15, 33, 60, 120];
    const on = (values: number[]): Float64Array => Float64Array.from(values, (v) => (scale === 'relative' ? Math.log(v) : v / 50));
    const x = form.groups.map((name) => on(natural.map((v) => (name === 'Re' ? v : v * 3 + 1))));
    const values: Record<string, number> = { C: 1.7, a: 0.55, A: 8, c: 0.3, n: 2.2 };
    const theta = inCoordinates(
      model,
      form.constants.map((name) => values[name]!),
    );
    const h = (t: Float64Array, columns: readonly Float64Array[]): Float64Array => {
      const bound = bind(model, columns, natural.length, false);
      bound.run(t, false);
      return bound.h.slice();
    };
    const bound = bind(model, x, natural.length, true);
    bound.run(theta, false);
    const step = 1e-6;
    const central = (up: Float64Array, down: Float64Array, i: number): number => (up[i]! - down[i]!) / (2 * step);
    const moved = (column: Float64Array, by: number): Float64Array => column.map((v) => v + by);
    form.constants.forEach((_, j) => {
      const at = (by: number): Float64Array => theta.map((v, k) => (k === j ? v + by : v));
      natural.forEach((_n, i) => {
        expect(bound.byConstant[j]![i]!).toBeCloseTo(central(h(at(step), x), h(at(-step), x), i), 6);
      });
      form.groups.forEach((_g, k) => {
        const slope = (by: number): Float64Array => {
          const one = bind(
            model,
            x.map((column, l) => (l === k ? moved(column, by) : column)),
            natural.length,
            false,
          );
          one.run(theta, false);
          return one.byConstant[j]!.slice();
        };
        const [up, down] = [slope(step), slope(-step)];
        natural.forEach((_n, i) => {
          expect(bound.cross[j]![k]![i]!).toBeCloseTo(central(up, down, i), 5);
        });
      });
    });
    form.groups.forEach((_g, k) => {
      const [up, down] = [step, -step].map((by) =>
        h(
          theta,
          x.map((column, l) => (l === k ? moved(column, by) : column)),
        ),
      ) as [Float64Array, Float64Array];
      natural.forEach((_n, i) => {
        expect(bound.byGroup[k]![i]!).toBeCloseTo(central(up, down, i), 6);
      });
    });
  });

  test('a power law is linear and straight; its factor enters as a logarithm', () => {
    const model = modelOf(law('Sh = C * Re^a * Sc^(1/3)', ['Re', 'Sc']).form, 'relative');
    expect([model.linear, model.straight, model.asLogarithm]).toEqual([true, true, [true, false]]);
    const offset = modelOf(law('Sh = A + C * Re^a', ['Re']).form, 'relative');
    expect([offset.linear, offset.straight, offset.asLogarithm]).toEqual([false, false, [false, false, false]]);
  });
});
