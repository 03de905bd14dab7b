import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { plainContext, type Route, type Settings } from '../../pipeline/reduction/route.ts';
import { routeNames, routes } from '../../pipeline/reduction/routes.ts';

/** Every choice of settings of a route. */
function choices(route: Route): readonly Settings[] {
  return Object.entries(route.settings).reduce<readonly Settings[]>(
    (so, [key, { allowed }]) =>
      allowed === undefined ? so : so.flatMap((one) => [one, ...allowed.map((value) => ({ ...one, [key]: value }))]),
    [{}],
  );
}

const all = Object.values(routes);
const contexts = ['tube', 'annulus', 'vessel', 'sphere', 'other'].map((equipment) => ({ ...plainContext, equipment }));
const allRules = all.flatMap((route) =>
  choices(route).flatMap((settings) => contexts.flatMap((context) => route.rules(settings, context))),
);
const distinct = [...new Map(allRules.map((rule) => [`${rule.gives}|${rule.from.join()}|${rule.formula}`, rule])).values()];

test('the routes of the contract are here', () => {
  expect(routeNames('heat').toSorted()).toEqual(
    ['measured', 'heat-rate', 'log-mean-difference', 'series-resistance', 'sphere-cooling', 'vessel-heating', 'other-side-plot'].toSorted(),
  );
  expect(routeNames('mass').toSorted()).toEqual(
    [
      ...['measured', 'mass-rate', 'log-mean-concentration', 'bed-exposure', 'counter-current-transfer', 'pellet-dissolution'],
      ...['gassing-in', 'limiting-current', 'evaporation', 'layer-permeation'],
    ].toSorted(),
  );
});

describe.each(all.map((route) => [route.name, route] as const))('%s', (_, route) => {
  test('gives a key that its rules or the study give, whatever the settings', () => {
    for (const settings of choices(route)) {
      const gives = route.gives(settings);
      const rules = route.rules(settings);
      if (route.name !== 'measured') expect(rules.some((rule) => rule.gives === gives)).toBe(true);
      expect(
        {
          heat_transfer_coefficient: 'h',
          overall_coefficient: 'U',
          mass_transfer_coefficient: 'k',
          volumetric_coefficient: 'kLa',
          layer_coefficient: 'k',
        }[gives],
      ).toBe(route.result(settings));
    }
  });

  test('documents what it needs, with formula, source and caution', () => {
    for (const settings of choices(route)) {
      const needs = route.needs(settings);
      const rules = route.rules(settings);
      expect(needs.length).toBeGreaterThan(0);
      // what is documented as needed is looked at by some rule, or is had from what is (a logged curve, a derived quantity)
      if (rules.length > 0) expect(needs.some(({ key }) => rules.some(({ from }) => from.includes(key)))).toBe(true);
    }
    for (const text of [route.title, route.formula, route.source, route.caution]) expect(text.length).toBeGreaterThan(5);
    for (const { says } of Object.values(route.settings)) expect(says.length).toBeGreaterThan(10);
  });

  test('a default is one of the allowed values', () => {
    for (const { allowed, default: first } of Object.values(route.settings))
      if (allowed !== undefined && first !== undefined) expect(allowed).toContain(first);
  });
});

describe('every rule of every route', () => {
  test('never throws, is pure, and turns NaN into NaN or a constant', () => {
    for (const { of, from, gives } of distinct) {
      fc.assert(
        fc.property(fc.array(fc.double({ noDefaultInfinity: true }), { minLength: from.length, maxLength: from.length }), (x) => {
          const before = [...x];
          const first = of(...x);
          expect(typeof first).toBe('number');
          expect(Object.is(of(...x), first)).toBe(true);
          expect(x).toEqual(before);
        }),
        { numRuns: 15, seed: 11 },
      );
      if (from.length > 0 && gives !== 'heat_duty') expect(of(...from.map(() => Number.NaN))).toBeNaN();
    }
  });

  test('every check is false for NaN or has nothing to look at, and has a sentence with its numbers', () => {
    for (const { checks = [] } of distinct) {
      for (const { holds, from, says, code } of checks) {
        const nothing = from.map(() => Number.NaN);
        // a balance that cannot be formed is told once, by the rule that stands for it
        if (!code.startsWith('imbalance') && code !== 'faster-than-conduction') expect(holds(...nothing)).toBe(false);
        expect(says(...from.map((_, i) => i + 1.5)).length).toBeGreaterThan(20);
        expect(says(...nothing)).not.toContain('NaN K');
      }
    }
  });

  test('names a formula and a source', () => {
    for (const { formula, source } of distinct) {
      expect(formula.length).toBeGreaterThan(0);
      expect(source.length).toBeGreaterThan(5);
    }
  });
});

describe('slopes', () => {
  test.each([
    ['sphere-cooling', { body: 'cylinder', read: 'surface' }, 'heat_transfer_coefficient', [0.4, 300, 0.005, 2700, 900, 2]],
    ['pellet-dissolution', {}, 'mass_transfer_coefficient', [1300, 5e-3, 4.5e-3, 3, 600, 1, 0.02, 0.01]],
    ['vessel-heating', {}, 'effective_conductance', [250e3, 293, 330, 363, 600, 300, 20, 290]],
  ] as const)('%s solves to machine precision: differences at two steps agree', (name, settings, gives, x) => {
    const rule = routes[name]!.rules(settings).find((one) => one.gives === gives && one.from.length === x.length)!;
    x.forEach((_, j) => {
      const slope = (step: number): number => {
        const moved = (sign: number): number => rule.of(...x.map((value, i) => (i === j ? value * (1 + sign * step) : value)));
        return (moved(1) - moved(-1)) / (2 * step);
      };
      const scale = Math.abs(rule.of(...x));
      expect(Math.abs(slope(1e-5) - slope(1e-4)) / (scale + Math.abs(slope(1e-5)))).toBeLessThan(2e-6);
    });
  });
});
