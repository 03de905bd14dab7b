import { describe, expect, test } from 'vitest';
import { fluidRules } from '../../pipeline/fluids/fluid-rules.ts';
import { vapourFraction } from '../../pipeline/fluids/gases/humid-air.ts';
import { mixtureViscosity } from '../../pipeline/fluids/gases/mixing.ts';
import { derive, fixture } from './derive.ts';

const PROPERTIES = ['density', 'heat_capacity', 'thermal_expansion', 'viscosity', 'thermal_conductivity'] as const;
const rules = (name: string) => fluidRules({ name, stream: 'own', at: {} });

describe('reference equations of state and transport (CoolProp, version in the file)', () => {
  const states = fixture('gas-states.csv');

  test.each([...new Set(states.map(({ gas }) => gas!))])(
    '%s: within three of its stated standard uncertainties where nothing is warned',
    (gas) => {
      const own = rules(gas);
      for (const state of states.filter((one) => one.gas === gas && Number(one.denseness) <= 0.06)) {
        const { values, failed, recipe } = derive(own, { temperature: Number(state.T), pressure: Number(state.p) }, PROPERTIES);
        expect(failed).toEqual([]);
        PROPERTIES.forEach((property, k) => {
          const share = recipe.steps.find(({ rule }) => rule.gives === property)!.rule.accuracy!.share;
          expect(Math.abs(values[k]! / Number(state[property]) - 1), `${property} at ${state.T} K, ${state.p} Pa`).toBeLessThan(3 * share);
        });
      }
    },
  );

  test('the root-mean-square distance is no larger than the stated standard uncertainty', () => {
    for (const gas of new Set(states.map((one) => one.gas!))) {
      const rows = states.filter((one) => one.gas === gas && Number(one.denseness) <= 0.06);
      const own = rules(gas);
      for (const property of PROPERTIES) {
        const share = own.find(({ gives }) => gives === property)!.accuracy!.share;
        const squares = rows.map(
          (one) =>
            (derive(own, { temperature: Number(one.T), pressure: Number(one.p) }, [property]).values[0]! / Number(one[property]) - 1) ** 2,
        );
        expect(Math.sqrt(squares.reduce((sum, square) => sum + square, 0) / rows.length), `${property} of ${gas}`).toBeLessThanOrEqual(
          share,
        );
      }
    }
  });

  test('denser gas is warned of, a dense gas refused', () => {
    const far = states.filter((one) => Number(one.denseness) > 0.06 && one.gas !== 'air');
    expect(far.length).toBeGreaterThan(10);
    for (const one of far) {
      const { values, failed } = derive(rules(one.gas!), { temperature: Number(one.T), pressure: Number(one.p) }, ['thermal_conductivity']);
      expect(failed.map(({ check }) => check.otherwise)).toEqual(['warning']);
      expect(Math.abs(values[0]! / Number(one.thermal_conductivity) - 1)).toBeLessThan(0.06);
    }
    const { values, failed } = derive(rules('carbon-dioxide'), { temperature: 300, pressure: 3e6 }, ['density']);
    expect(values[0]).toBeNaN();
    expect(failed[0]!.text).toMatch(/too dense for the equations of a gas at low pressure, which hold up to 1.092 MPa/);
  });
});

// Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, Table A.4 (from memory; printed digits, its sources are older than Lemmon and Jacobsen 2004).
test.each([
  [250, 1.3947, 1006, 159.6e-7, 22.3e-3],
  [300, 1.1614, 1007, 184.6e-7, 26.3e-3],
  [350, 0.995, 1009, 208.2e-7, 30.0e-3],
  [400, 0.8711, 1014, 230.1e-7, 33.8e-3],
  [500, 0.6964, 1030, 270.1e-7, 40.7e-3],
])('air at %d K and 1 atm against a textbook table', (T, density, heatCapacity, viscosity, conductivity) => {
  const { values } = derive(rules('air'), { temperature: T }, ['density', 'heat_capacity', 'viscosity', 'thermal_conductivity']);
  expect(Math.abs(values[0]! / density - 1)).toBeLessThan(0.02);
  expect(Math.abs(values[1]! / heatCapacity - 1)).toBeLessThan(0.002);
  expect(Math.abs(values[2]! / viscosity - 1)).toBeLessThan(0.01);
  expect(Math.abs(values[3]! / conductivity - 1)).toBeLessThan(0.04);
});

// Lemmon and Jacobsen 2004, Table V (from memory): air at 300 K, dilute: 18.5230 uPa s, 26.3529 mW/(m K).
test('air at 300 K against the check values of its transport equations', () => {
  const { values } = derive(rules('air'), { temperature: 300, pressure: 1 }, ['viscosity', 'thermal_conductivity']);
  expect(values[0]! * 1e6).toBeCloseTo(18.523, 3);
  expect(values[1]! * 1e3).toBeCloseTo(26.3529, 3);
});

describe('humid air', () => {
  const own = rules('humid-air');

  test('against CoolProp (ASHRAE RP-1485), version in the file, within two stated standard uncertainties', () => {
    for (const one of fixture('humid-air-states.csv')) {
      const [T, p, phi] = [Number(one.T), Number(one.p), Number(one.relative_humidity)];
      const { values, failed, recipe } = derive(own, { temperature: T, pressure: p, relative_humidity: phi }, [
        'density',
        'heat_capacity',
        'viscosity',
        'thermal_conductivity',
      ]);
      expect(failed).toEqual([]);
      (['density', 'heat_capacity', 'viscosity', 'thermal_conductivity'] as const).forEach((property, k) => {
        const share = recipe.steps.find(({ rule }) => rule.gives === property)!.rule.accuracy!.share;
        expect(Math.abs(values[k]! / Number(one[property]) - 1), `${property} at ${T} K, ${p} Pa, ${phi}`).toBeLessThan(2 * share);
      });
      // Without the enhancement factor: 0.5 % at 1 atm (Greenspan 1976).
      expect(vapourFraction(T, p, phi)).toBeCloseTo(Number(one.vapour_fraction), 2);
    }
  });

  test('film and wall keep the vapour of the bulk; a wall below the dew point is said', () => {
    const given = { temperature: 303.15, film_temperature: 296.15, wall_temperature: 283.15, relative_humidity: 0.6 };
    const { values, failed } = derive(own, given, ['density@film', 'density@wall']);
    // The vapour mole fraction of 30 degC and 60 % stays: density follows 1/T.
    expect(values[0]! * 296.15).toBeCloseTo(values[1]! * 283.15, 8);
    // The dew point of 30 degC and 60 % is 21.4 degC (psychrometric charts).
    expect(failed.map(({ gives, check }) => [gives, check.otherwise])).toEqual([['density@wall', 'warning']]);
  });

  test('relative humidity above 100 % is refused', () => {
    const { values, failed } = derive(own, { temperature: 300, relative_humidity: 1.2 }, ['viscosity']);
    expect(values[0]).toBeNaN();
    expect(failed[0]!.text).toMatch(/a relative humidity of 120 %/);
  });

  test('the mass fraction of water does where no humidity is given', () => {
    const x = vapourFraction(313.15, 101_325, 0.5);
    const w = (x * 0.018015) / (x * 0.018015 + (1 - x) * 0.028965);
    const byHumidity = derive(own, { temperature: 313.15, relative_humidity: 0.5 }, ['viscosity']).values[0]!;
    expect(derive(own, { temperature: 313.15, mass_fraction: w }, ['viscosity']).values[0]! / byHumidity).toBeCloseTo(1, 5);
  });

  // Cussler, Diffusion, 3rd ed., Table 5.1-1 (from memory): water vapour in air at 298.2 K and 1 atm 0.260 cm^2/s; others measured 0.242 to 0.260.
  test('diffusivity of water vapour in air', () => {
    expect(derive(own, { temperature: 298.2 }, ['diffusivity']).values[0]! * 1e4).toBeCloseTo(0.251, 2);
  });
});

test('a mixture of a gas with itself has the viscosity of that gas', () => {
  const part = { molarMass: 0.028, viscosity: 1.8e-5, conductivity: 0.026 };
  expect(
    mixtureViscosity([
      { ...part, x: 0.3 },
      { ...part, x: 0.7 },
    ]),
  ).toBeCloseTo(1.8e-5, 12);
});
