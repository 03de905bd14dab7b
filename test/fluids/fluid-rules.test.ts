import { expect, test } from 'vitest';
import { fluidNames, fluidRules } from '../../pipeline/fluids/fluid-rules.ts';
import { derive } from './derive.ts';

const water = fluidRules({ name: 'water', stream: 'own', at: {} });

test('water at 25 degC: IAPWS R12-08 Table 4 has 889.7 uPa s at 998 kg/m3; density 997.05, cp 4181 (steam tables, from memory)', () => {
  const { values } = derive(water, { temperature: 298.15 }, ['density', 'viscosity', 'heat_capacity', 'thermal_conductivity']);
  expect(values[0]).toBeCloseTo(997.05, 1);
  expect(values[1]).toBeCloseTo(890.0e-6, 6);
  expect(values[2]).toBeCloseTo(4181, -1);
  expect(values[3]).toBeCloseTo(0.6065, 3);
});

test('without a pressure the atmosphere is taken and said; ambient pressure and pressure come before it', () => {
  const alone = derive(water, { temperature: 298.15 }, ['density']);
  expect(alone.assumed.some((text) => text.includes('101.325 kPa'))).toBe(true);
  const ambient = derive(water, { temperature: 298.15, ambient_pressure: 9e4 }, ['density']);
  expect(ambient.assumed.some((text) => text.includes('ambient_pressure'))).toBe(true);
  const given = derive(water, { temperature: 298.15, pressure: 1e7 }, ['density']);
  expect(given.assumed).toEqual([]);
  expect(given.values[0]).toBeGreaterThan(alone.values[0]! + 4); // compressibility 4.5e-10 1/Pa
});

test('film and wall take their own temperature, the second stream its own quantities', () => {
  const two = [...water, ...fluidRules({ name: 'water', stream: 'other', at: {} })];
  const { values, missing } = derive(
    two,
    { temperature: 290, film_temperature: 300, wall_temperature: 310, temperature_other: 320, wall_temperature_other: 330 },
    ['viscosity', 'viscosity@film', 'viscosity@wall', 'viscosity_other', 'viscosity_other@wall'],
  );
  expect(missing).toEqual([]);
  expect([...values].sort((a, b) => b - a)).toEqual(values);
  expect(new Set(values).size).toBe(5);
});

test('the quantity that holds a condition can have another name', () => {
  const renamed = fluidRules({ name: 'water', stream: 'own', at: { temperature: 'tank_temperature', pressure: 'tank_pressure' } });
  expect(derive(renamed, { tank_temperature: 300, tank_pressure: 3e6 }, ['density']).values[0]).toBeCloseTo(1 / 0.100215168e-2, 5); // R7-97 Table 5
});

test('one accuracy source for a property wherever it is taken', () => {
  const sources = new Set(water.filter(({ gives }) => gives.startsWith('viscosity')).map(({ accuracy }) => accuracy!.source));
  expect([...sources]).toEqual(['property: viscosity of water (IAPWS R12-08)']);
});

test('liquid above its boiling point: said close to it, refused beyond, with the remedy', () => {
  const near = derive(water, { temperature: 375 }, ['viscosity']);
  expect(near.failed.map(({ check }) => check.otherwise)).toEqual(['warning']);
  expect(near.values[0]).toBeGreaterThan(0);
  const far = derive(water, { temperature: 400 }, ['viscosity']);
  expect(far.failed.map(({ check }) => check.otherwise)).toEqual(['refuse']);
  expect(far.failed[0]!.text).toMatch(/^viscosity of water: at 101.3 kPa water boils 26.9 K below 126.85 degC; give the pressure/);
  expect(far.values[0]).toBeNaN();
  expect(derive(water, { temperature: 400, pressure: 3e5 }, ['viscosity']).failed).toEqual([]);
});

test('outside the equations every property is refused and has no value', () => {
  for (const name of fluidNames) {
    const rules = fluidRules({ name, stream: 'own', at: {} });
    const properties = [...new Set(rules.map(({ gives }) => gives))].filter(
      (key) => !key.includes('@') && key !== 'fluid_pressure' && !(key === 'diffusivity' && name !== 'humid-air'),
    );
    expect(properties.length).toBeGreaterThan(3);
    for (const property of properties) {
      for (const temperature of [-5, 5000, Number.NaN]) {
        const { values, failed } = derive(rules, { temperature, pressure: 1e5, mass_fraction: 0.3, relative_humidity: 0.5 }, [property]);
        expect(values[0], `${property} of ${name} at ${temperature} K`).toBeNaN();
        expect(
          failed.filter(({ check }) => check.otherwise === 'refuse').length,
          `${property} of ${name} at ${temperature} K`,
        ).toBeGreaterThan(0);
      }
    }
  }
});

test('a name that is not in the list is a defect of the caller', () => {
  expect(() => fluidRules({ name: 'wine', stream: 'own', at: {} })).toThrow();
});
