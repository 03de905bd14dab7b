import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { interpolate, monotoneSlopes } from '../../pipeline/fluids/interpolate.ts';
import { tableRules } from '../../pipeline/fluids/table-rules.ts';
import { region1 } from '../../pipeline/fluids/water/region-1.ts';
import { waterViscosity } from '../../pipeline/fluids/water/viscosity.ts';
import { derive, fixture } from './derive.ts';

/** The curves of fixtures/pchip.py. */
const curves: Readonly<Record<string, { x: readonly number[]; y: readonly number[] }>> = {
  rising: { x: [0, 1, 1.5, 4, 10], y: [1, 2, 2.1, 9, 9.5] },
  turning: { x: [-2, 0, 1, 2, 5], y: [3, 1, 4, 4, -7] },
  two: { x: [1, 3], y: [5, 2] },
  'steep end': { x: [0, 1, 1.1, 8], y: [0, 10, -1, -1.5] },
};

test('the cubic is that of scipy.interpolate.PchipInterpolator (version in the file)', () => {
  for (const { curve, x, y } of fixture('pchip.csv')) {
    const points = curves[curve!]!;
    expect(interpolate(points, monotoneSlopes(points), Number(x)), `${curve} at ${x}`).toBeCloseTo(Number(y), 12);
  }
});

test('it passes through its points and stays between neighbours', () => {
  const points = fc
    .uniqueArray(fc.integer({ min: -1000, max: 1000 }), { minLength: 2, maxLength: 12 })
    .chain((x) =>
      fc.tuple(
        fc.constant([...x].sort((a, b) => a - b)),
        fc.array(fc.integer({ min: -50, max: 50 }), { minLength: x.length, maxLength: x.length }),
      ),
    );
  fc.assert(
    fc.property(points, fc.double({ min: 0, max: 1, noNaN: true }), ([x, y], where) => {
      const slopes = monotoneSlopes({ x, y });
      x.forEach((at, k) => void expect(interpolate({ x, y }, slopes, at)).toBeCloseTo(y[k]!, 9));
      for (let k = 0; k + 1 < x.length; k++) {
        const value = interpolate({ x, y }, slopes, x[k]! + where * (x[k + 1]! - x[k]!));
        expect(value).toBeGreaterThanOrEqual(Math.min(y[k]!, y[k + 1]!) - 1e-9);
        expect(value).toBeLessThanOrEqual(Math.max(y[k]!, y[k + 1]!) + 1e-9);
      }
      expect(interpolate({ x, y }, slopes, x[0]! - 1e-9)).toBeNaN();
      expect(interpolate({ x, y }, slopes, Number.NaN)).toBeNaN();
    }),
    { seed: 3, numRuns: 300 },
  );
});

describe('a table of water by IAPWS equations gives those equations back', () => {
  const temperature = [283.15, 293.15, 303.15, 313.15, 323.15, 333.15];

  test('over the temperature: 0.2 % in viscosity between rows 10 K apart', () => {
    const columns = {
      temperature: [...temperature].reverse(),
      viscosity: [...temperature].reverse().map((T) => waterViscosity(T, region1(T, 101_325).density)),
    };
    const { rules, faults } = tableRules({ file: 'water.csv', stream: 'own', by: ['temperature'], columns, at: {} });
    expect(faults).toEqual([]);
    const { values, failed } = derive(rules, { temperature: 298.15, film_temperature: 308.15, wall_temperature: 345 }, [
      'viscosity',
      'viscosity@film',
      'viscosity@wall',
    ]);
    expect(Math.abs(values[0]! / 889.9e-6 - 1)).toBeLessThan(2e-3); // IAPWS R12-08 at 997.05 kg/m3
    expect(Math.abs(values[1]! / waterViscosity(308.15, region1(308.15, 101_325).density) - 1)).toBeLessThan(2e-3);
    expect(values[2]).toBeNaN();
    expect(failed.map(({ text }) => text)).toEqual([
      'viscosity@wall of water.csv: temperature 71.85 degC is outside the table, which runs from temperature 10 degC to temperature 60 degC; nothing is extrapolated, so add rows to it',
    ]);
  });

  test('over temperature and pressure, rows in any order', () => {
    const rows = [1e5, 5e6, 2e7]
      .flatMap((p) => temperature.map((T) => ({ p, T, density: region1(T, p).density })))
      .sort((a, b) => a.density - b.density);
    const columns = { temperature: rows.map(({ T }) => T), pressure: rows.map(({ p }) => p), density: rows.map(({ density }) => density) };
    const { rules } = tableRules({ file: 'water.csv', stream: 'other', by: ['temperature', 'pressure'], columns, at: {} });
    const { values } = derive(rules, { temperature_other: 300, pressure_other: 3e6 }, ['density_other']);
    expect(values[0]! * 0.00100215168).toBeCloseTo(1, 4); // R7-97 Table 5
  });
});

describe('a table that is none is told what is wrong', () => {
  const told = (by: readonly string[], columns: Record<string, readonly number[]>): readonly string[] =>
    tableRules({ file: 't.csv', stream: 'own', by, columns, at: {} }).faults;

  test.each([
    ['one row', told(['temperature'], { temperature: [300], density: [1] }), /at least two different values of temperature/],
    ['a row twice', told(['temperature'], { temperature: [300, 300, 310], density: [1, 2, 3] }), /two rows for temperature 26.85 degC/],
    [
      'a hole',
      told(['temperature', 'mass_fraction'], { temperature: [300, 310, 300], mass_fraction: [0.1, 0.1, 0.2], density: [1, 2, 3] }),
      /no row for temperature 36.85 degC, mass_fraction 0.2; it must give every combination/,
    ],
    [
      'an axis that is none',
      told(['velocity'], { velocity: [1, 2], density: [1, 2] }),
      /cannot run over velocity; it runs over one or two of temperature/,
    ],
    ['an axis that is missing', told(['temperature'], { density: [1, 2] }), /no column temperature/],
    [
      'a cell that is none',
      told(['temperature'], { temperature: [300, Number.NaN], density: [1, 2] }),
      /a temperature that is not a number/,
    ],
    ['nothing to look up', told(['temperature'], { temperature: [300, 310] }), /no column besides temperature/],
    ['a viscosity of zero', told(['temperature'], { temperature: [300, 310], viscosity: [1, 0] }), /a viscosity that is not above zero/],
  ])('%s', (_, faults, expected) => {
    expect(faults).toHaveLength(1);
    expect(faults[0]).toMatch(expected);
  });
});
