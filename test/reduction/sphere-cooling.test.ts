import { describe, expect, test } from 'vitest';
import { bessel01 } from '../../pipeline/reduction/conduction/bessel.ts';
import { type BodyName, bodies, eigenvalue } from '../../pipeline/reduction/conduction/body.ts';
import { biotFrom, biotFromRate, remaining } from '../../pipeline/reduction/conduction/remaining.ts';
import conduction from './fixtures/conduction.json' with { type: 'json' };
import { C, runRoute } from './run-route.ts';

const copper = {
  diameter: 0.02,
  solid_density: 8000,
  solid_heat_capacity: 450,
  temperature: C(20),
  initial_temperature: C(100),
  time: 300,
};

describe('roots and functions', () => {
  test.each(conduction.bessel)('Bessel functions at $x against scipy.special', ({ x, j0, j1 }) => {
    const [a, b] = bessel01(x);
    expect(Math.abs(a - j0)).toBeLessThan(2e-15);
    expect(Math.abs(b - j1)).toBeLessThan(2e-15);
  });

  test.each(conduction.roots)('four roots of the $body at Bi $Bi against scipy', ({ body, Bi, zeta }) => {
    zeta.forEach((z, n) => {
      expect(Math.abs(eigenvalue(bodies[body as BodyName], n, Bi) / z - 1)).toBeLessThan(1e-12);
    });
  });

  // Incropera, DeWitt, Bergman & Lavine, 6th ed., Table 5.1 (from memory): Bi, zeta_1, C_1
  test.each([
    ['slab', 0.1, 0.3111, 1.0161],
    ['cylinder', 0.1, 0.4417, 1.0246],
    ['sphere', 0.1, 0.5423, 1.0298],
    ['slab', 1, 0.8603, 1.1191],
    ['cylinder', 1, 1.2558, 1.2071],
    ['sphere', 1, 1.5708, 1.2732],
    ['slab', 10, 1.4289, 1.262],
    ['cylinder', 10, 2.1795, 1.5677],
    ['sphere', 10, 2.8363, 1.9249],
  ] as const)('%s at Bi %d: first root and amplitude as tabulated', (body, Bi, zeta, amplitude) => {
    const first = eigenvalue(bodies[body], 0, Bi);
    expect(Math.abs(first - zeta)).toBeLessThan(6e-5);
    expect(Math.abs(bodies[body].amplitude(first, 'centre') - amplitude)).toBeLessThan(1.1e-4);
  });
});

describe('the exact series', () => {
  test.each(conduction.cooling)('$body at Bi $Bi and Fo $Fo against finite volumes', ({ body, Bi, Fo, left }) => {
    (['centre', 'mean', 'surface'] as const).forEach((where, i) => {
      expect(Math.abs(remaining(bodies[body as BodyName], where, Bi, Fo) - left[i]!)).toBeLessThan(2e-6);
    });
  });

  test.each(conduction.cooling)('$body: Bi $Bi comes back from what is left at Fo $Fo', ({ body, Bi, Fo }) => {
    for (const where of ['mean', 'surface'] as const) {
      const theta = remaining(bodies[body as BodyName], where, Bi, Fo);
      expect(Math.abs(biotFrom(bodies[body as BodyName], where, theta, Fo) / Bi - 1)).toBeLessThan(1e-9);
    }
  });

  test('heat given up by a sphere at Bi = 1, as tabulated', () => {
    // Tosun, Modelling in Transport Phenomena (2002), Table 10.5, column Exact, Fo 0.1 to 0.7
    [0.229, 0.398, 0.53, 0.633, 0.713, 0.776, 0.825].forEach((printed, k) => {
      expect(Math.abs(1 - remaining(bodies.sphere, 'mean', 1, (k + 1) / 10) - printed)).toBeLessThan(0.0005);
    });
  });

  test.each([
    ['sphere', 5.8],
    ['cylinder', 4.8],
    ['slab', 3.2],
  ] as const)('lumped late slope of a %s at Bi(V/A) = 0.1 reads %d %% low, the series does not', (body, low) => {
    const Bi = 0.1 * bodies[body].shape;
    const rate = eigenvalue(bodies[body], 0, Bi) ** 2;
    expect(100 * (1 - rate / (bodies[body].shape * Bi))).toBeCloseTo(low, 1);
    expect(biotFromRate(bodies[body], rate)).toBeCloseTo(Bi, 12);
  });
});

describe('route', () => {
  test('copper-like sphere: 100 degC in 20 degC is at 42.9 degC after 300 s with h 50', () => {
    // lumped: 80 exp(-50 * 300/(8000 * 450 * 0.02/6)) = 22.92 K
    const left = 80 * Math.exp((-50 * 300) / ((8000 * 450 * 0.02) / 6));
    expect(20 + left).toBeCloseTo(42.9, 1);
    const { of, assumes } = runRoute('sphere-cooling', { given: { ...copper, final_temperature: C(20 + left) } });
    expect(of('heat_transfer_coefficient')).toBeCloseTo(50, 8);
    expect(assumes.join(' ')).toContain('lumped');
  });

  test('with its conductivity the same sphere has Bi, and the series hardly differs', () => {
    const { of, assumes } = runRoute('sphere-cooling', {
      given: { ...copper, final_temperature: C(42.92), solid_conductivity: 390 },
      also: ['Bi'],
    });
    expect(of('Bi')).toBeCloseTo((50 * 0.02) / 6 / 390, 6);
    expect(of('heat_transfer_coefficient')).toBeCloseTo(50, 1);
    expect(assumes.join(' ')).toContain('exact series');
  });

  test.each(conduction.cooling.filter(({ Bi, Fo }) => Bi >= 1 && Fo >= 0.3))(
    '$body at Bi $Bi, Fo $Fo: h of the finite-volume run comes back from centre, mean and surface',
    ({ body, Bi, Fo, left }) => {
      const R = 0.01;
      const lambda = 0.5;
      const size: Record<string, number> = body === 'slab' ? { wall_thickness: 2 * R } : { diameter: 2 * R };
      const given = {
        solid_conductivity: lambda,
        solid_density: 1000,
        solid_heat_capacity: 4000,
        temperature: C(5),
        initial_temperature: C(85),
      };
      (['centre', 'mean', 'surface'] as const).forEach((read, i) => {
        const { of } = runRoute('sphere-cooling', {
          settings: { body, read },
          given: { ...given, ...size, time: (Fo * R * R * 4e6) / lambda, final_temperature: C(5 + 80 * left[i]!) },
        });
        expect(Math.abs((of('heat_transfer_coefficient') * R) / lambda / Bi - 1)).toBeLessThan(2e-4);
      });
    },
  );

  test('exponential decay of a sphere: rate 6 Nu lambda/(rho c d^2)', () => {
    const Nu = 2;
    const [lambda, d] = [0.026, 0.004];
    const rate = (6 * Nu * lambda) / (8000 * 450 * d * d);
    const { of } = runRoute('sphere-cooling', {
      given: { ...copper, diameter: d, final_temperature: C(20 + 80 * Math.exp(-rate * 300)), thermal_conductivity: lambda },
      also: ['Nu@particle'],
    });
    expect(of('Nu@particle')).toBeCloseTo(2, 10);
  });

  test.each([
    ['warmer than at the start', { final_temperature: C(101) }, 'no-progress'],
    ['colder than the fluid', { final_temperature: C(19) }, 'no-progress'],
    ['faster than conduction allows', { final_temperature: C(21), solid_conductivity: 0.05 }, 'faster-than-conduction'],
  ])('%s: refused', (_, change, code) => {
    const { codes, refused } = runRoute('sphere-cooling', { given: { ...copper, ...change } });
    expect(refused).toBe(true);
    expect(codes).toContain(code);
  });

  test('resistance mainly inside is told', () => {
    const left = remaining(bodies.sphere, 'centre', 30, 0.3);
    const { codes } = runRoute('sphere-cooling', {
      given: { ...copper, solid_conductivity: 1, time: 0.3 * 1e-4 * 8000 * 450, final_temperature: C(20 + 80 * left) },
    });
    expect(codes).toContain('inside-governs');
  });
});
