import { describe, expect, test } from 'vitest';
import dissolution from './fixtures/dissolution.json' with { type: 'json' };
import { runRoute } from './run-route.ts';

const pellets = {
  particle_diameter: 5e-3,
  solid_density: 1300,
  initial_mass: 0.01,
  mass_loss: 0.002,
  time: 600,
  saturation_concentration: 3,
  bulk_concentration: 0,
};

test('pellets of 5 mm, 20 % lost in 600 s at a difference of 3 kg/m3', () => {
  // recomputed by hand: 1300 * 5e-3 (1 - 0.8^(1/3))/(2 * 3 * 600) = 1.294e-4
  const { of, assumes } = runRoute('pellet-dissolution', { given: pellets });
  expect(of('mass_transfer_coefficient') * 1e4).toBeCloseTo(1.294, 3);
  expect(assumes.join(' ')).toContain('constant');
});

test('a sphere of benzoic acid: rate of the printed example', () => {
  // Tosun, Modelling in Transport Phenomena (2002), pp. 86-87: 8.43e-8 kg/s at d 12 mm, k 5.46e-5, c_s 3.412; over a short time the route gives k back
  const mass = (1267 * Math.PI * 0.012 ** 3) / 6;
  const { of } = runRoute('pellet-dissolution', {
    given: {
      particle_diameter: 0.012,
      solid_density: 1267,
      initial_mass: mass,
      mass_loss: 8.43e-8 * 10,
      time: 10,
      saturation_concentration: 3.412,
    },
  });
  expect(of('mass_transfer_coefficient') * 1e5).toBeCloseTo(5.46, 2);
});

describe('against an ODE solver (scipy)', () => {
  test.each(dissolution.closed)('constant k $k comes back while the liquid fills up', (run) => {
    const { of, assumes } = runRoute('pellet-dissolution', {
      given: {
        particle_diameter: run.d0,
        solid_density: run.rho,
        initial_mass: run.mass,
        mass_loss: run.mass - run.left,
        time: run.time,
        saturation_concentration: run.saturation,
        bulk_concentration: run.start,
        liquid_volume: run.volume,
        sphericity: run.sphericity,
      },
    });
    expect(Math.abs(of('mass_transfer_coefficient') / run.k - 1)).toBeLessThan(1e-7);
    expect(assumes.join(' ')).toContain('rises');
  });

  test.each(dissolution.stagnant)('Sh = 2 at all times, on the mean diameter, after $time s (d^2 law)', (run) => {
    const { of } = runRoute('pellet-dissolution', {
      given: {
        particle_diameter: run.d0,
        solid_density: run.rho,
        initial_mass: run.mass,
        mass_loss: run.mass - run.left,
        time: run.time,
        saturation_concentration: run.saturation,
      },
    });
    const mean = (run.d0 + of('final_diameter')) / 2;
    expect((of('mass_transfer_coefficient') * mean) / run.D).toBeCloseTo(2, 5);
    expect(of('final_diameter') ** 2 / run.d0 ** 2).toBeCloseTo(1 - run.time / 541.67, 4);
  });

  test('a stagnant 100 um pellet is gone in 542 s', () => {
    // d0^2 rho/(8 D dc)
    expect((1e-4 ** 2 * 1300) / (8 * 1e-9 * 3)).toBeCloseTo(542, 0);
  });
});

test('much liquid: the two forms agree', () => {
  const open = runRoute('pellet-dissolution', { given: pellets }).of('mass_transfer_coefficient');
  const closed = runRoute('pellet-dissolution', { given: { ...pellets, liquid_volume: 1e6 } }).of('mass_transfer_coefficient');
  expect(closed / open).toBeCloseTo(1, 8);
});

test('concentrations by amount are turned into mass', () => {
  const given = { ...pellets, saturation_concentration: 3 / 0.122, molar_mass: 0.122 };
  const { of } = runRoute('pellet-dissolution', { given, context: { concentrations: 'amount' } });
  expect(of('mass_transfer_coefficient') * 1e4).toBeCloseTo(1.294, 3);
});

test('diameter and initial mass from each other through the number of pellets', () => {
  const mass = (100 * 1300 * Math.PI * 5e-3 ** 3) / 6;
  const by = (given: Record<string, number>): number => runRoute('pellet-dissolution', { given }).of('mass_transfer_coefficient');
  const { particle_diameter: d, initial_mass: _, ...rest } = { ...pellets, mass_loss: 0.2 * mass };
  expect(by({ ...rest, particle_count: 100, particle_diameter: d })).toBeCloseTo(
    by({ ...rest, particle_count: 100, initial_mass: mass }),
    12,
  );
});

test.each([
  ['all gone', { mass_loss: 0.01 }, 'nothing-left'],
  ['a gain', { mass_loss: -0.001 }, 'nothing-left'],
  ['supersaturated liquid', { bulk_concentration: 3.5 }, 'no-driving-force'],
  ['more dissolved than the liquid holds', { liquid_volume: 6e-4 }, 'beyond-saturation'],
])('%s: refused', (_, change, code) => {
  const { codes, refused } = runRoute('pellet-dissolution', { given: { ...pellets, ...change } });
  expect(refused).toBe(true);
  expect(codes).toContain(code);
});

test('what is worth saying is said', () => {
  const codes = (change: Record<string, number>, stated = {}): readonly string[] =>
    runRoute('pellet-dissolution', { given: { ...pellets, ...change }, stated }).codes;
  expect(codes({})).toEqual([]);
  expect(codes({ mass_loss: 0.006 })).toEqual(['shrunk']);
  expect(codes({ liquid_volume: 7e-4 })).toEqual(['near-saturation']);
  expect(codes({ bulk_concentration: 2.5 }, { saturation_concentration: { si: 0.1 } })).toEqual(['uncertain-driving-force']);
});
