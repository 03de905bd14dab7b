import { describe, expect, test } from 'vitest';
import { seeded } from '../../pipeline/numerics/random.ts';
import { breakNotes } from '../../pipeline/regression/break-notes.ts';
import { type BreakSearch, breakSearches } from '../../pipeline/regression/break-search.ts';
import type { FitData, FitOptions } from '../../pipeline/regression/fit.ts';
import { fitLaw } from '../../pipeline/regression/fit-law.ts';
import type { LawToFit } from '../../pipeline/regression/solve-law.ts';
import { agree, data, fixture, law, options } from './laws.ts';

const r = fixture('breakpoints.json'); // fixtures/breakpoints.R: lm over the break by optimize, segmented 1.6.2, 40,000 simulations of the largest F
const power = law('Sh = C * Re^a * Sc^c', ['Re', 'Sc']);

type Found = Extract<BreakSearch, { looked: true }>;
const look = (form: LawToFit, trials: FitData, settings: FitOptions = options()): readonly BreakSearch[] =>
  breakSearches(form, fitLaw(form, trials, settings), trials, settings);
const one = (form: LawToFit, trials: FitData, settings?: FitOptions): Found => look(form, trials, settings)[0] as Found;

describe('a break in Re, beside R', () => {
  test.each(['broken', 'weak', 'straight'] as const)('%s: place, its interval, exponents, AICc, largest F and its chance', (name) => {
    const want = r[name];
    const got = one(power, data({ y: r[`${name}_y`], x: [r.re, r.sc] }));
    expect(got.looked).toBe(true);
    expect(Math.log(got.at)).toBeCloseTo(want.at, 6);
    agree(got.change, want.coefficients[3], 6);
    agree(got.below, want.coefficients[1], 6);
    agree(got.above, want.coefficients[1] + want.coefficients[3], 6);
    agree(got.largestF, want.sup_f, 8);
    expect(got.aicc).toBeCloseTo(want.aicc, 5);
    expect(got.lower === 0 ? null : Number(Math.log(got.lower).toFixed(5))).toBe(want.lower && Number(want.lower.toFixed(5)));
    expect(got.upper === Number.POSITIVE_INFINITY ? null : Number(Math.log(got.upper).toFixed(5))).toBe(
      want.upper && Number(want.upper.toFixed(5)),
    );
    expect(Math.abs(got.chance - want.p)).toBeLessThan(4 * Math.sqrt((want.p * (1 - want.p)) / 1999) + 0.0006);
  });

  test('the break and slopes that segmented finds', () => {
    const got = one(power, data({ y: r.broken_y, x: [r.re, r.sc] }));
    expect(Math.log(got.at)).toBeCloseTo(r.segmented.at, 6);
    expect(got.below).toBeCloseTo(r.segmented.slopes[0], 5); // slope() prints five digits
    expect(got.above).toBeCloseTo(r.segmented.slopes[1], 5);
  });

  // Bacon and Watts 1971, Biometrika 58, 525; posterior means as Carlin, Gelfand and Smith 1992 have them (from memory): slopes -0.42 and -1.01, break about 0.03
  test('band height against flow (data from memory): one law does not hold, and the break is where it is published', () => {
    const got = one(law('h = C * Re^a', ['Re']), data({ y: r.band_y, x: [r.band_x] }));
    expect(Math.log(got.at)).toBeCloseTo(r.band.at, 6);
    expect(got.below).toBeCloseTo(-0.42, 2);
    expect(got.above).toBeCloseTo(-1.01, 1);
    expect(got.chance).toBe(1 / 2000);
    expect(got.aicc).toBeCloseTo(r.band.aicc, 5);
  });
});

/** Trials of a power law without a break. */
function straight(seed: number, n: number, more: (x: number) => number = () => 0): { y: number[]; x: number[] } {
  const random = seeded(seed);
  const x = Array.from({ length: n }, () => 7 + 3 * random.uniform());
  return { x, y: x.map((value) => -1 + 0.6 * value + more(value) + 0.05 * random.normal()) };
}
const single = law('Sh = C * Re^a', ['Re']);

describe('what chance alone does', () => {
  test('a break below 5 % is found in about 5 % of 200 studies without one', () => {
    const draws = Array.from({ length: 200 }, (_, k) => {
      const { x, y } = straight(100 + k, 24);
      return one(single, data({ y, x: [x] }), options({ seed: k })).chance;
    });
    const found = draws.filter((p) => p < 0.05).length;
    expect(found).toBeGreaterThanOrEqual(3); // 10 expected, standard deviation 3.1
    expect(found).toBeLessThanOrEqual(20);
  });

  test.each([
    ['campaign shifts', 0.1, 0],
    ['errors in Re', 0, 0.05],
    ['both', 0.1, 0.05],
  ])('%s make no break', (_, tau, u) => {
    const found = Array.from({ length: 30 }, (_, k) => {
      const { x, y } = straight(900 + k, 30);
      const random = seeded(k);
      const shifts = Array.from({ length: 5 }, () => tau * random.normal());
      const read = x.map((value) => value + u * random.normal());
      const trials = data({
        y: y.map((value, i) => value + shifts[i % 5]!),
        x: [read],
        campaign: y.map((_y, i) => i % 5),
        sigma: y.map(() => [0, 0, 0, u ** 2]),
      });
      return one(single, trials).chance;
    }).filter((p) => p < 0.05).length;
    expect(found).toBeLessThanOrEqual(5);
  });
});

describe('other laws and few trials', () => {
  test('a law with an offset: the break is in its product, and there is no single exponent to print', () => {
    const random = seeded(3);
    const x = Array.from({ length: 40 }, (_, i) => Math.log(5) + i / 7);
    const y = x.map((v) => Math.log((2 + 0.6 * Math.exp(0.5 * v)) * Math.exp(0.3 * Math.max(v - 5, 0))) + 0.02 * random.normal());
    const got = one(law('Sh = A + C * Re^a', ['Re'], { start: { A: 2, C: 0.6, a: 0.5 } }), data({ y, x: [x] }));
    expect(got.chance).toBeLessThan(0.01);
    expect(got.below).toBeNaN();
    expect(got.lower).toBeLessThan(Math.exp(5));
    expect(got.upper).toBeGreaterThan(Math.exp(5));
  });

  test('an exponent that is held has its value below the break', () => {
    const { x, y } = straight(30, 40, (v) => 0.3 * Math.max(v - 8.5, 0));
    const got = one(law('Sh = C * (Re / 100)^(3/5)', ['Re']), data({ y, x: [x] }));
    expect(got.below).toBeCloseTo(0.6, 12);
    expect(got.above - 0.6).toBeCloseTo(got.change, 12);
  });

  test('values instead of logarithms', () => {
    const { x, y } = straight(8, 30, (v) => 0.3 * Math.max(v - 8.5, 0));
    const got = one(
      law('Sh = C * Re^a', ['Re'], { start: { C: 0.4, a: 0.6 } }),
      data({ y: y.map(Math.exp), x: [x.map(Math.exp)] }, 'absolute'),
      options({ scale: 'absolute' }),
    );
    expect(got.chance).toBeLessThan(0.05);
    expect(got.change).toBeGreaterThan(0.15);
  });

  test('too few trials, too narrow a range, no Re: told, or nothing to look at', () => {
    const few = straight(1, 7);
    expect(look(single, data({ y: few.y, x: [few.x] }))).toEqual([{ law: 'law', group: 'Re', looked: false, why: 'too few trials' }]);
    const levels = [7, 7, 7, 7, 7, 9, 9, 9, 9, 9];
    const narrow = data({ y: levels.map((v, i) => v + 0.1 * Math.sin(i)), x: [levels] });
    expect(look(single, narrow)[0]).toMatchObject({ looked: false, why: 'too narrow' });
    expect(look(law('Sh = C * Sc^c', ['Sc']), data({ y: few.y, x: [few.x] }))).toEqual([]);
  });
});

describe('what is said of it', () => {
  const notes = (y: number[], x: number[]) => breakNotes(look(single, data({ y, x: [x] })))[0]!;

  test('a break is a warning with both exponents and its place; none is a note with what would not show', () => {
    const { x, y } = straight(21, 40, (v) => 0.4 * Math.max(v - 8.5, 0));
    const warned = notes(y, x);
    expect([warned.level, warned.code]).toEqual(['warning', 'break-in-range']);
    expect(warned.text).toMatch(/it goes from 0\.[56]\d* to (0\.9|1|1\.0)\d*/);
    const plain = straight(22, 40);
    const calm = notes(plain.y, plain.x);
    expect([calm.level, calm.code]).toEqual(['note', 'no-break']);
    expect(calm.text).toContain('would not show in these trials');
  });

  test('no look is told with its reason', () => {
    const few = straight(1, 7);
    expect(notes(few.y, few.x)).toMatchObject({ level: 'note', code: 'break-not-looked' });
  });
});
