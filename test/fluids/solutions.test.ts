import { expect, test } from 'vitest';
import { fluidRules } from '../../pipeline/fluids/fluid-rules.ts';
import { glycerolDensity, glycerolViscosity } from '../../pipeline/fluids/liquids/glycerol-water.ts';
import { ethyleneGlycol, freezingPoint, secondary, secondarySlope } from '../../pipeline/fluids/liquids/secondary-liquids.ts';
import { derive, fixture } from './derive.ts';

const rules = (name: string) => fluidRules({ name, stream: 'own', at: {} });
const PROPERTIES = ['density', 'heat_capacity', 'thermal_conductivity', 'viscosity'] as const;

test('glycol: the polynomials as CoolProp carries them (MEG, version in the file), to 1e-7', () => {
  const rows = fixture('solution-states.csv').filter(({ table }) => table === 'MEG');
  expect(rows).toHaveLength(24);
  for (const row of rows) {
    const { values } = derive(rules('glycol-water'), { temperature: Number(row.T), mass_fraction: Number(row.mass_fraction) }, PROPERTIES);
    PROPERTIES.forEach(
      (property, k) =>
        void expect(Math.abs(values[k]! / Number(row[property]) - 1), `${property} ${row.T} ${row.mass_fraction}`).toBeLessThan(1e-4),
    );
  }
});

test('glycol: another source, the ASHRAE tables of inhibited glycol (AEG), within two stated standard uncertainties', () => {
  for (const row of fixture('solution-states.csv').filter(({ table }) => table === 'AEG')) {
    const { values, recipe } = derive(
      rules('glycol-water'),
      { temperature: Number(row.T), mass_fraction: Number(row.mass_fraction) },
      PROPERTIES,
    );
    PROPERTIES.forEach((property, k) => {
      const share = recipe.steps.find(({ rule }) => rule.gives === property)!.rule.accuracy!.share;
      expect(Math.abs(values[k]! / Number(row[property]) - 1), `${property} ${row.T} ${row.mass_fraction}`).toBeLessThan(2.5 * share);
    });
  }
});

test('glycerol: heat capacity and conductivity as CoolProp carries them (MGL)', () => {
  for (const row of fixture('solution-states.csv').filter(({ table }) => table === 'MGL')) {
    const { values } = derive(rules('glycerol-water'), { temperature: Number(row.T), mass_fraction: Number(row.mass_fraction) }, [
      'heat_capacity',
      'thermal_conductivity',
    ]);
    expect(values[0]! / Number(row.heat_capacity)).toBeCloseTo(1, 4);
    expect(values[1]! / Number(row.thermal_conductivity)).toBeCloseTo(1, 4);
    // Another source for the density: within its 0.2 %.
    expect(Math.abs(glycerolDensity(Number(row.T), Number(row.mass_fraction)) / Number(row.density) - 1)).toBeLessThan(2e-3);
  }
});

// Bosart and Snoddy 1928 as a glycerine manufacturer's table prints them, g/cm^3 at 15, 20, 25, 30 degC; 0.07 % stated by Volk and Kaehler.
test.each([
  [1, [1.26415, 1.26108, 1.25802, 1.25495]],
  [0.8, [1.2116, 1.2085, 1.20545, 1.2024]],
  [0.5, [1.1287, 1.1263, 1.12375, 1.1211]],
  [0.3, [1.07455, 1.0727, 1.0707, 1.06855]],
  [0.1, [1.02325, 1.0221, 1.0207, 1.01905]],
  [0, [0.99913, 0.99823, 0.99708, 0.99568]],
])('density at a mass fraction of %d of glycerol', (w, table) => {
  table.forEach((density, k) => void expect(Math.abs(glycerolDensity(288.15 + 5 * k, w) / (1e3 * density) - 1)).toBeLessThan(7e-4));
});

// Segur and Oberstar 1951 as the same table prints them, mPa s at 0, 10, 20, 30, 40 degC. Cheng: within some percent.
test.each([
  [0, [1.792, 1.308, 1.005, 0.8007, 0.656]],
  [0.3, [5.14, 3.49, 2.5, 1.87, 1.46]],
  [0.5, [14.6, 9.01, 6, 4.21, 3.1]],
  [0.8, [255, 116, 60.1, 33.9, 20.8]],
  [1, [12070, 3900, 1410, 612, 284]],
])('viscosity at a mass fraction of %d of glycerol', (w, table) => {
  table.forEach(
    (viscosity, k) =>
      void expect(Math.abs(glycerolViscosity(273.15 + 10 * k, w) / (1e-3 * viscosity) - 1), `${10 * k} degC`).toBeLessThan(0.08),
  );
});

test('the slope is the derivative of the polynomial', () => {
  for (const [T, w] of [
    [280, 0.2],
    [330, 0.5],
  ] as const) {
    const difference = (secondary(ethyleneGlycol, 'density', T + 0.01, w) - secondary(ethyleneGlycol, 'density', T - 0.01, w)) / 0.02;
    expect(secondarySlope(ethyleneGlycol, 'density', T, w)).toBeCloseTo(difference, 6);
  }
});

// Handbooks print -37 degC or so for equal masses of ethylene glycol and water (from memory).
test('freezing points, and what is frozen is refused', () => {
  expect(freezingPoint(ethyleneGlycol, 0.5) - 273.15).toBeCloseTo(-36, 0);
  const { values, failed } = derive(rules('glycol-water'), { temperature: 260, mass_fraction: 0.2 }, ['viscosity']);
  expect(values[0]).toBeNaN();
  expect(failed[0]!.text).toMatch(/below the freezing point of -7.95 degC/);
});

test('a density outside the range of its stated accuracy is said', () => {
  const { values, failed } = derive(rules('glycerol-water'), { temperature: 333.15, mass_fraction: 0.6 }, ['density']);
  expect(values[0]).toBeGreaterThan(1100);
  expect(failed.map(({ check }) => check.otherwise)).toEqual(['warning']);
});
