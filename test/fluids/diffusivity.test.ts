import { describe, expect, test } from 'vitest';
import { diffusivityRules } from '../../pipeline/fluids/diffusivity/diffusivity-rules.ts';
import { fuller, haydukLaudie, stokesEinstein, wilkeChang } from '../../pipeline/fluids/diffusivity/estimators.ts';
import { fluidRules } from '../../pipeline/fluids/fluid-rules.ts';
import { derive } from './derive.ts';

// Geankoplis, Transport Processes and Separation Process Principles, 4th ed., Example 6.3-2: acetone in water (from memory).
test.each([
  [298, 0.8937e-3, 1.277e-9, 0.0005e-9],
  [323, 0.5494e-3, 2.251e-9, 0.001e-9],
])('Wilke and Chang at %d K', (T, viscosity, printed, tolerance) => {
  expect(Math.abs(wilkeChang(T, viscosity, 74e-6, 0.01802, 2.6) - printed)).toBeLessThan(tolerance);
});

// Reid, Prausnitz, Poling, The Properties of Gases and Liquids, 4th ed., Example 11-3: allyl chloride in air at 298 K and 1 bar, 0.096 cm^2/s (from memory).
test('Fuller, Schettler and Giddings', () => {
  expect(fuller(298, 1e5, 0.07653, 0.02897, 80.25, 19.7) * 1e4).toBeCloseTo(0.096, 3);
});

describe('Hayduk and Laudie against measured values at 25 degC in water, 0.8903 mPa s (Cussler, Diffusion, Table 5.2-1, from memory): within 10 %', () => {
  test.each([
    ['oxygen', 25.6e-6, 2.1e-9],
    ['carbon dioxide', 34e-6, 1.92e-9],
    ['acetone', 74e-6, 1.16e-9],
    ['benzene', 96e-6, 1.02e-9],
  ])('%s', (_, volume, measured) => {
    expect(Math.abs(haydukLaudie(0.8903e-3, volume) / measured - 1)).toBeLessThan(0.1);
  });
});

// Serum albumin in water at 20 degC: hydrodynamic radius 3.5 nm, measured 6.1e-11 m^2/s (from memory).
test('Stokes and Einstein', () => {
  expect(stokesEinstein(293.15, 1.002e-3, 3.5e-9)).toBeCloseTo(6.1e-11, 12);
});

describe('as rules', () => {
  test('water needs only the molar volume; an association factor asks for Wilke and Chang', () => {
    const water = fluidRules({ name: 'water', stream: 'own', at: {} });
    const bare = derive(water, { temperature: 298.15, solute_molar_volume: 74e-6 }, ['diffusivity', 'diffusivity@film']);
    expect(bare.values[0]).toBeCloseTo(haydukLaudie(0.89e-3, 74e-6), 11);
    expect(bare.missing.map(({ key }) => key)).toEqual(['diffusivity@film']);
    const full = derive(water, { temperature: 298.15, solute_molar_volume: 74e-6, solvent_molar_mass: 0.01802, association_factor: 2.6 }, [
      'diffusivity',
    ]);
    expect(full.recipe.steps.at(-1)!.rule.accuracy).toEqual({ source: 'property: diffusivity (Wilke and Chang 1955)', share: 0.1 });
  });

  test('in a gas the pressure of the stream counts', () => {
    const solute = {
      temperature_other: 298,
      molar_mass_other: 0.07653,
      carrier_molar_mass_other: 0.02897,
      diffusion_volume_other: 80.25,
      carrier_diffusion_volume_other: 19.7,
    };
    const air = fluidRules({ name: 'air', stream: 'other', at: {} });
    const [low] = derive(air, { ...solute, pressure_other: 1e5 }, ['diffusivity_other']).values;
    const [high] = derive(air, { ...solute, pressure_other: 2e5 }, ['diffusivity_other']).values;
    expect(low! / high!).toBeCloseTo(2, 12);
  });

  test('what cannot be is refused, what is unusual is said', () => {
    const rules = diffusivityRules('own', 'liquid', {});
    const zero = derive(rules, { temperature: 300, viscosity: 0, solute_radius: 1e-9 }, ['diffusivity']);
    expect(zero.failed.map(({ check }) => check.code)).toEqual(['no-diffusivity']);
    const small = derive(rules, { temperature: 300, viscosity: 1e-3, solute_radius: 1e-10 }, ['diffusivity']);
    expect(small.failed.map(({ check }) => check.code)).toEqual(['small-for-stokes-einstein']);
    const large = derive(
      rules,
      { temperature: 300, viscosity: 1e-3, solute_molar_volume: 74e-3, solvent_molar_mass: 0.018, association_factor: 1 },
      ['diffusivity'],
    );
    expect(large.failed.map(({ check }) => check.code)).toEqual(['unusual-molar-volume']);
  });
});
