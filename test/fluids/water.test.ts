import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { backgroundConductivity } from '../../pipeline/fluids/water/conductivity.ts';
import { region1 } from '../../pipeline/fluids/water/region-1.ts';
import { region2 } from '../../pipeline/fluids/water/region-2.ts';
import { saturationPressure, saturationTemperature } from '../../pipeline/fluids/water/saturation.ts';
import { waterSurfaceTension } from '../../pipeline/fluids/water/surface-tension.ts';
import { conductivityOf } from '../../pipeline/fluids/water/transport.ts';
import { waterViscosity } from '../../pipeline/fluids/water/viscosity.ts';
import { isLiquid, isSteam, latentHeat, superheat } from '../../pipeline/fluids/water/water-state.ts';

/** Agreement with a printed number to half a unit of its last digit. */
const printed = (value: number, text: string, scale = 1): void => {
  const [mantissa, exponent = '0'] = text.split('e');
  const decimals = mantissa!.split('.')[1]?.length ?? 0;
  expect(Math.abs(value / scale - Number(text))).toBeLessThanOrEqual(0.5001 * 10 ** (Number(exponent) - decimals));
};

describe('IAPWS R7-97(2012), Table 5: region 1', () => {
  // T K, p MPa, v m3/kg, h, u kJ/kg, s, cp kJ/(kg K), w m/s
  test.each([
    [300, 3, '0.100215168e-2', '0.115331273e3', '0.112324818e3', '0.392294792', '0.417301218e1', '0.150773921e4'],
    [300, 80, '0.971180894e-3', '0.184142828e3', '0.106448356e3', '0.368563852', '0.401008987e1', '0.163469054e4'],
    [500, 3, '0.120241800e-2', '0.975542239e3', '0.971934985e3', '0.258041912e1', '0.465580682e1', '0.124071337e4'],
  ])('%d K, %d MPa', (T, p, v, h, u, s, cp, w) => {
    const state = region1(T, p * 1e6);
    printed(1 / state.density, v);
    printed(state.enthalpy, h, 1e3);
    printed(state.internalEnergy, u, 1e3);
    printed(state.entropy, s, 1e3);
    printed(state.heatCapacity, cp, 1e3);
    printed(state.speedOfSound, w);
  });
});

describe('IAPWS R7-97(2012), Table 15: region 2', () => {
  test.each([
    [300, 0.0035, '0.394913866e2', '0.254991145e4', '0.241169160e4', '0.852238967e1', '0.191300162e1', '0.427920172e3'],
    [700, 0.0035, '0.923015898e2', '0.333568375e4', '0.301262819e4', '0.101749996e2', '0.208141274e1', '0.644289068e3'],
    [700, 30, '0.542946619e-2', '0.263149474e4', '0.246861076e4', '0.517540298e1', '0.103505092e2', '0.480386523e3'],
  ])('%d K, %d MPa', (T, p, v, h, u, s, cp, w) => {
    const state = region2(T, p * 1e6);
    printed(1 / state.density, v);
    printed(state.enthalpy, h, 1e3);
    printed(state.internalEnergy, u, 1e3);
    printed(state.entropy, s, 1e3);
    printed(state.heatCapacity, cp, 1e3);
    printed(state.speedOfSound, w);
  });
});

test.each([
  [300, '0.353658941e-2'],
  [500, '0.263889776e1'],
  [600, '0.123443146e2'],
])('IAPWS R7-97(2012), Table 35: saturation pressure at %d K is %s MPa', (T, p) => {
  printed(saturationPressure(T), p, 1e6);
});

test.each([
  [0.1, '0.372755919e3'],
  [1, '0.453035632e3'],
  [10, '0.584149488e3'],
])('IAPWS R7-97(2012), Table 36: saturation temperature at %d MPa is %s K', (p, T) => {
  printed(saturationTemperature(p * 1e6), T);
});

test.each([
  [298.15, 998, '889.735100'],
  [298.15, 1200, '1437.649467'],
  [373.15, 1000, '307.883622'],
  [433.15, 1, '14.538324'],
  [433.15, 1000, '217.685358'],
  [873.15, 1, '32.619287'],
  [873.15, 100, '35.802262'],
  [873.15, 600, '77.430195'],
  [1173.15, 1, '44.217245'],
  [1173.15, 100, '47.640433'],
  [1173.15, 400, '64.154608'],
])('IAPWS R12-08, Table 4: %d K, %d kg/m3: %s uPa s', (T, density, mu) => {
  printed(waterViscosity(T, density), mu, 1e-6);
});

test.each([
  [298.15, 0, '18.4341883'],
  [298.15, 998, '607.712868'],
  [298.15, 1200, '799.038144'],
  [873.15, 0, '79.1034659'],
])('IAPWS R15-11, Table 4: %d K, %d kg/m3: %s mW/(m K) without critical term', (T, density, lambda) => {
  printed(backgroundConductivity(T, density), lambda, 1e-3);
});

test('IAPWS R15-11, Tables 7 and 8: with the critical term in its industrial form', () => {
  printed(conductivityOf(620, region1(620, 20e6)), '481.485195', 1e-3);
  printed(conductivityOf(650, region2(650, 0.3e6)), '52.2311024', 1e-3);
});

test.each([
  [0.01, '75.65'],
  [20, '72.74'],
  [25, '71.97'],
  [50, '67.94'],
  [100, '58.91'],
  [200, '37.67'],
  [300, '14.36'],
  [370, '0.39'],
])('IAPWS R1-76(2014), table of calculated values: %d degC: %s mN/m', (t, sigma) => {
  printed(waterSurfaceTension(t + 273.15), sigma, 1e-3);
});

test('enthalpy of evaporation: steam tables print 2256.5 kJ/kg at 100 degC and 2500.9 kJ/kg at 0.01 degC (from memory)', () => {
  expect(latentHeat(373.15) / 1e3).toBeCloseTo(2256.5, 0);
  expect(latentHeat(273.16) / 1e3).toBeCloseTo(2500.9, 0);
  expect(latentHeat(630)).toBeNaN();
});

describe('python3-iapws (version in the file): 1,000 states', () => {
  const lines = readFileSync(join(import.meta.dirname, 'fixtures/water-states.csv'), 'utf8')
    .trim()
    .split('\n')
    .slice(2);

  test('the fixture is whole', () => {
    expect(lines).toHaveLength(1000);
  });

  test('all properties agree to 1e-9, the stated digits of the coefficients', () => {
    for (const line of lines) {
      const [phase, ...texts] = line.split(',');
      const [T, p, density, heatCapacity, expansion, viscosity, conductivity] = texts.map(Number) as [
        number,
        number,
        number,
        number,
        number,
        number,
        number,
      ];
      expect(phase === 'liquid' ? isLiquid(T, p) : isSteam(T, p), line).toBe(true);
      const state = phase === 'liquid' ? region1(T, p) : region2(T, p);
      const here = [state.density, state.heatCapacity, state.thermalExpansion, waterViscosity(T, state.density), conductivityOf(T, state)];
      const there = [density, heatCapacity, expansion, viscosity, conductivity];
      const worst = Math.max(...here.map((value, k) => Math.abs(value - there[k]!) / Math.max(Math.abs(there[k]!), 1e-5)));
      expect(worst, line).toBeLessThan(1e-9);
    }
  });
});

test('distance to saturation has the sign of superheat, also below the triple point and above the critical pressure', () => {
  expect(superheat(373.15, 101_325)).toBeCloseTo(0.026, 2); // IF97 boils at 373.1243 K
  expect(superheat(280, 500)).toBeGreaterThan(0);
  expect(superheat(600, 30e6)).toBe(Number.NEGATIVE_INFINITY);
  expect(isLiquid(390, 101_325)).toBe(false);
  expect(isLiquid(390, 3e5)).toBe(true);
  expect(isSteam(390, 3e5)).toBe(false);
  expect(isSteam(Number.NaN, 1e5)).toBe(false);
  expect(isSteam(640, 20e6)).toBe(false); // region 3
});
