import { describe, expect, test } from 'vitest';
import { routes } from '../../pipeline/reduction/routes.ts';
import { lagged } from '../../pipeline/reduction/series/gassing.ts';
import curves from './fixtures/curves.json' with { type: 'json' };
import streams from './fixtures/streams.json' with { type: 'json' };
import { C, runRoute } from './run-route.ts';

describe('mass-rate', () => {
  test('benzoic acid sphere: the coefficient of the printed rate', () => {
    // Tosun, Modelling in Transport Phenomena (2002), pp. 86-87: 8.43e-8 kg/s = pi D^2 k c_s with D 12 mm, k 5.46e-5, c_s 3.412
    const { of } = runRoute('mass-rate', {
      given: { mass_rate: 8.43e-8, particle_diameter: 0.012, saturation_concentration: 3.412 },
      context: { equipment: 'sphere' },
    });
    expect(of('mass_transfer_coefficient') * 1e5).toBeCloseTo(5.46, 2);
  });

  test('rates by mass, concentrations by amount', () => {
    const given = { mass_rate: 0.122e-6, area: 0.01, saturation_concentration: 20, bulk_concentration: 10, molar_mass: 0.122 };
    const { of, assumes } = runRoute('mass-rate', { given, context: { concentrations: 'amount' } });
    expect(of('mass_transfer_coefficient')).toBeCloseTo(1e-6 / (0.01 * 10), 15);
    expect(assumes.join(' ')).toContain('molar_mass');
  });

  test('no difference: refused', () => {
    const given = { mass_rate: 1e-6, area: 0.01, saturation_concentration: 5, bulk_concentration: 5 };
    expect(runRoute('mass-rate', { given }).refused).toBe(true);
  });
});

describe('log-mean-concentration and bed-exposure', () => {
  test('wetted wall: back to the Sherwood number of the printed outlet', () => {
    // Benitez, 2nd ed., Example 2.12: G_y 10 kg/(m2 s), d 25.4 mm, Z 1.5 m, mu 1.92e-5, Sc 0.692, D 2.42e-5, 101.3 kPa, 308 K: p_out 1.94 of 2.64 kPa (page);
    // its own correlation gives Sh = 0.023 Re^0.83 Sc^0.44
    const c = 101.3 / (8.314 * 308);
    const Sh = 0.023 * ((10 * 0.0254) / 1.92e-5) ** 0.83 * 0.692 ** 0.44;
    const { of } = runRoute('log-mean-concentration', {
      given: {
        velocity: 10 / 29 / c,
        diameter: 0.0254,
        length: 1.5,
        saturation_concentration: 2.64,
        inlet_concentration: 0,
        outlet_concentration: 1.94,
        diffusivity: 2.42e-5,
      },
      context: { equipment: 'wetted-wall' },
      also: ['Sh@pipe'],
    });
    // p_out to three digits is worth 0.5 % of Sh
    expect(Math.abs(of('Sh@pipe') / Sh - 1)).toBeLessThan(0.006);
  });

  test('packed bed: transfer units over the depth of the printed bed', () => {
    // Benitez, 2nd ed., Example 2.13: 99 % saturation in 0.078 m of 3.5 mm spheres (page), Sh by j_D = 0.052 as rounded there
    const [Gy, dp, D, mu, Dab, Sc, c, Gm] = [10, 0.0035, 0.0254, 1.92e-5, 2.42e-5, 0.692, 0.04, 0.345];
    const eps = 0.485;
    const Sh = (0.052 / Sc ** (2 / 3)) * ((Gy * dp) / mu) * Sc;
    const { of, codes } = runRoute('bed-exposure', {
      given: {
        velocity: Gm / c,
        voidage: eps,
        particle_diameter: dp,
        length: 0.0776,
        saturation_concentration: 1,
        outlet_concentration: 0.99,
        diffusivity: Dab,
        vessel_diameter: D,
      },
      context: { equipment: 'packed-bed' },
      also: ['Sh@particle'],
    });
    expect(Math.abs(of('Sh@particle') / Sh - 1)).toBeLessThan(0.003);
    expect(codes).toEqual(['near-equilibrium']);
  });

  test('a short bed is told; an outlet beyond saturation is refused', () => {
    const given = {
      velocity: 0.1,
      voidage: 0.4,
      particle_diameter: 0.005,
      length: 0.05,
      saturation_concentration: 1,
      outlet_concentration: 0.5,
    };
    expect(runRoute('bed-exposure', { given }).codes).toEqual(['short-bed']);
    expect(runRoute('bed-exposure', { given: { ...given, outlet_concentration: 1.1 } }).refused).toBe(true);
  });
});

describe('counter-current-transfer', () => {
  test('stripping factor 0.6, solute-free liquid, gas from 0.02 to 0.002: 3.82 transfer units', () => {
    // recomputed by hand: ln(0.4 * 10 + 0.6)/0.4 = 3.815
    const { of } = runRoute('counter-current-transfer', {
      given: {
        inlet_concentration: 0.02,
        outlet_concentration: 0.002,
        partition_coefficient: 0.012,
        gas_velocity: 0.5,
        velocity: 0.01,
        length: 2,
        specific_area: 200,
      },
      also: ['mass_transfer_coefficient'],
    });
    expect(of('capacity_ratio')).toBeCloseTo(0.6, 12);
    expect(of('transfer_units')).toBeCloseTo(3.82, 2);
    expect(of('volumetric_coefficient')).toBeCloseTo((0.5 / 2) * 3.8151, 4);
    expect(of('mass_transfer_coefficient')).toBeCloseTo(of('volumetric_coefficient') / 200, 12);
  });

  test.each(streams.columns)('Ka $Ka of a column solved by scipy.integrate.solve_bvp comes back, on either side', (run) => {
    const flows = { partition_coefficient: run.m, gas_velocity: run.gas_velocity, velocity: run.velocity, length: run.height };
    const gas = runRoute('counter-current-transfer', {
      given: { ...flows, inlet_concentration: run.gas_in, outlet_concentration: run.gas_out, inlet_concentration_other: run.liquid_in },
    });
    expect(gas.of('volumetric_coefficient') / run.Ka).toBeCloseTo(1, 7);
    const liquid = runRoute('counter-current-transfer', {
      settings: { side: 'liquid' },
      given: { ...flows, inlet_concentration: run.liquid_in, outlet_concentration: run.liquid_out, inlet_concentration_other: run.gas_in },
    });
    // the same transfer on liquid concentrations: m times Ka
    expect(liquid.of('volumetric_coefficient') / (run.m * run.Ka)).toBeCloseTo(1, 7);
  });

  test('an outlet that no column reaches is refused', () => {
    const given = {
      inlet_concentration: 0.02,
      outlet_concentration: 0.004,
      partition_coefficient: 0.03,
      gas_velocity: 0.5,
      velocity: 0.01,
      length: 2,
    };
    expect(runRoute('counter-current-transfer', { given }).refused).toBe(true);
  });
});

describe('limiting-current', () => {
  const electrode = { limiting_current: 5e-3, electrons: 1, area: 1e-4, bulk_concentration: 10 };

  test('5 mA on 1 cm2 at 10 mol/m3', () => {
    // recomputed by hand: 5e-3/(96485 * 1e-4 * 10) = 5.182e-5
    const { of } = runRoute('limiting-current', { given: electrode, context: { concentrations: 'amount' } });
    expect(of('mass_transfer_coefficient') * 1e5).toBeCloseTo(5.18, 2);
  });

  test('concentrations by mass through molar_mass', () => {
    const given = { ...electrode, bulk_concentration: 10 * 0.2119, molar_mass: 0.2119 };
    expect(runRoute('limiting-current', { given }).of('mass_transfer_coefficient') * 1e5).toBeCloseTo(5.18, 2);
  });
});

describe('evaporation', () => {
  test('water in a tube of stagnant air: the coefficient is diffusivity over depth', () => {
    // Geankoplis, 4th ed., Example 6.2-2: N 1.595e-7 kmol/(s m2), D 0.250e-4, 0.1524 m, p_A1 2.341 kPa, dry air, 293 K (from memory)
    const { of, codes } = runRoute('evaporation', {
      given: { mass_rate: 1.595e-4, area: 1, vapour_pressure: 2341, temperature: 293, wall_temperature: 293, pressure: 101_325 },
      context: { rates: 'amount', concentrations: 'amount' },
    });
    expect(Math.abs((of('mass_transfer_coefficient') * 0.1524) / 0.25e-4 - 1)).toBeLessThan(0.001);
    expect(codes).toEqual([]);
  });

  test('water: vapour pressures by IAPWS-IF97, the bulk by relative humidity', () => {
    // saturation at 20 and 30 degC: 2339.3 and 4246.9 Pa (IAPWS-IF97 region 4, python3-iapws)
    const { of } = runRoute('evaporation', {
      settings: { vapour: 'water' },
      given: { mass_rate: 1e-5, area: 0.1, wall_temperature: C(20), temperature: C(30), relative_humidity: 0.4, molar_mass: 0.018015 },
    });
    expect(of('surface_pressure')).toBeCloseTo(2339.3, 0);
    expect(of('bulk_pressure')).toBeCloseTo(0.4 * 4246.9, 0);
    const log = Math.log((101_325 - 0.4 * 4246.9) / (101_325 - 2339.3));
    expect(of('mass_transfer_coefficient')).toBeCloseTo(((1e-5 / 0.018015) * 8.314462618 * 298.15) / (0.1 * 101_325 * log), 5);
  });

  test('a strong flow of vapour is told, boiling and a wrong direction refused', () => {
    const given = { mass_rate: 1e-3, area: 1, vapour_pressure: 60_000, temperature: 360, wall_temperature: 359 };
    const context = { rates: 'amount', concentrations: 'amount' } as const;
    expect(runRoute('evaporation', { given, context }).codes).toEqual(['high-flux']);
    expect(runRoute('evaporation', { given: { ...given, vapour_pressure: 110_000 }, context }).refused).toBe(true);
    expect(runRoute('evaporation', { given: { ...given, mass_rate: -1e-3 }, context }).refused).toBe(true);
  });
});

describe('gassing-in', () => {
  const reduce = (run: { time: readonly number[]; value: readonly number[] }, tau: number | undefined) => {
    const result = routes['gassing-in']!.series!({}).reduce(
      { time: Float64Array.from(run.time), value: Float64Array.from(run.value) },
      (key) => (key === 'probe_time' ? tau : undefined),
    );
    if ('refused' in result) throw new Error(result.refused.text);
    return result.readings;
  };

  test.each(curves.gassing.filter(({ sd }) => sd === 0))('kLa $kla behind a probe of $tau s comes back from an ODE run', (run) => {
    expect(reduce(run, run.tau).curve_rate!.value / run.kla).toBeCloseTo(1, 6);
  });

  test.each(curves.gassing.filter(({ fit }) => fit !== undefined))(
    'kLa $kla from a noisy curve as scipy.optimize.curve_fit finds it',
    (run) => {
      const { curve_rate } = reduce(run, run.tau);
      expect(curve_rate!.value / run.fit!).toBeCloseTo(1, 6);
      expect(curve_rate!.u / run.u!).toBeGreaterThan(0.999);
      expect(curve_rate!.u / run.u!).toBeLessThan(1.5);
    },
  );

  test('the probe matters: kLa 0.30 behind 6 s would read 0.103 as one exponential', () => {
    expect(curves.single).toBeCloseTo(0.103, 3);
    expect(reduce(curves.gassing[0]!, undefined).curve_rate!.value).toBeLessThan(0.15);
  });

  test('the uncertainty of the probe time reaches kLa, and a slow probe is told', () => {
    const run = curves.gassing[0]!;
    const readings = Object.fromEntries(Object.entries(reduce(run, 6)).map(([key, { value }]) => [key, value]));
    const at = (probe_time: number) => runRoute('gassing-in', { given: { ...readings, probe_time } });
    expect(at(6).of('volumetric_coefficient')).toBeCloseTo(0.3, 6);
    expect(at(6).codes).toEqual(['slow-probe']);
    const moved = reduce(run, 6.05).curve_rate!.value;
    expect((at(6.05).of('volumetric_coefficient') - 0.3) / (moved - 0.3)).toBeCloseTo(1, 1);
  });

  test('the lagged response and its slope are smooth where kLa equals 1/tau', () => {
    for (const k of [0.19, 0.1999, 0.2, 0.2001, 0.23, 0.6]) {
      const [value, slope] = lagged(4, k, 5);
      const e = 1e-6;
      expect((lagged(4, k + e, 5)[0] - lagged(4, k - e, 5)[0]) / (2 * e)).toBeCloseTo(slope, 7);
      expect(value).toBeCloseTo(lagged(4, 1 / 5, 1 / k)[0], 13);
    }
  });
});

describe('layer-permeation', () => {
  test('50 um, D 1e-12: 2e-8 m/s times the partition coefficient, lag 417 s', () => {
    const given = { wall_thickness: 50e-6, diffusivity: 1e-12, partition_coefficient: 3 };
    const { of } = runRoute('layer-permeation', { given, also: ['permeability', 'Sh@layer', 'overall_mass_coefficient'] });
    expect(of('layer_coefficient')).toBeCloseTo(6e-8, 18);
    expect(of('overall_mass_coefficient')).toBeCloseTo(6e-8, 18);
    expect(of('Sh@layer')).toBeCloseTo(1, 14);
    expect(50e-6 ** 2 / 6e-12).toBeCloseTo(417, 0);
  });

  test('sides in series on one phase basis', () => {
    const given = {
      wall_thickness: 50e-6,
      diffusivity: 1e-12,
      partition_coefficient: 300,
      mass_transfer_coefficient: 2e-5,
      mass_transfer_coefficient_other: 1e-5,
    };
    const { of } = runRoute('layer-permeation', { given, also: ['overall_mass_coefficient'] });
    expect(1 / of('overall_mass_coefficient')).toBeCloseTo(1 / 2e-5 + 1 / 6e-6 + 1 / 1e-5, 4);
  });

  test('a measured rate through sides and layer gives the layer back', () => {
    const whole = 1 / (1 / 2e-5 + 1 / 6e-6);
    const given = {
      mass_rate: whole * 0.05 * 2,
      area: 0.05,
      saturation_concentration: 2,
      wall_thickness: 50e-6,
      mass_transfer_coefficient: 2e-5,
    };
    const { of } = runRoute('layer-permeation', { given, also: ['permeability'] });
    expect(of('layer_coefficient') / 6e-6).toBeCloseTo(1, 10);
    expect(of('permeability') / 3e-10).toBeCloseTo(1, 10);
  });

  test('without sides k itself is the layer, and Sh = 1 for concentrations inside it', () => {
    const given = { mass_rate: 2e-8 * 0.05 * 2, area: 0.05, saturation_concentration: 2, wall_thickness: 50e-6, diffusivity: 1e-12 };
    const { of } = runRoute('layer-permeation', { given, also: ['mass_transfer_coefficient', 'Sh@layer'] });
    expect(of('mass_transfer_coefficient') / 2e-8).toBeCloseTo(1, 10);
    expect(of('Sh@layer')).toBeCloseTo(1, 10);
  });

  test('rate and lag of a permeation curve by finite volumes: permeability, diffusivity and partition', () => {
    const run = curves.permeation;
    const late = run.time.findIndex((t) => t >= 2000);
    const result = routes['layer-permeation']!.series!({}).reduce(
      { time: Float64Array.from(run.time.slice(late)), value: Float64Array.from(run.amount.slice(late), (x) => 0.05 * x) },
      () => undefined,
    );
    if ('refused' in result) throw new Error(result.refused.text);
    const readings = Object.fromEntries(Object.entries(result.readings).map(([key, { value }]) => [key, value]));
    const { of } = runRoute('layer-permeation', {
      given: { ...readings, area: 0.05, saturation_concentration: run.concentration, wall_thickness: run.thickness },
      also: ['permeability', 'diffusivity', 'partition_coefficient'],
    });
    expect(of('permeability') / run.D).toBeCloseTo(1, 3);
    expect(of('diffusivity') / run.D).toBeCloseTo(1, 2);
    expect(of('partition_coefficient')).toBeCloseTo(1, 2);
    expect(result.notes).toEqual([]);
  });

  test('sides that are more than the whole: refused', () => {
    const given = { mass_rate: 1e-6, area: 0.05, saturation_concentration: 2, wall_thickness: 50e-6, mass_transfer_coefficient: 1e-6 };
    expect(runRoute('layer-permeation', { given }).refused).toBe(true);
  });
});
