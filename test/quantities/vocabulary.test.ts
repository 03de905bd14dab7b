import { expect, test } from 'vitest';
import { dimensionText, sameDimension } from '../../pipeline/quantities/dimension.ts';
import { isFault } from '../../pipeline/quantities/fault.ts';
import { unitFor } from '../../pipeline/quantities/unit-for.ts';
import { quantities, quantityNames, quantityOf } from '../../pipeline/quantities/vocabulary.ts';

/** SI base units of quantities as the ISO 80000 parts define them: 3 space and time, 4 mechanics, 5 thermodynamics, 6 electricity, 9 physical chemistry. */
const dimensions: Readonly<Record<string, string>> = {
  temperature: 'K',
  pressure: 'kg/(m s^2)',
  viscosity: 'kg/(m s)',
  kinematic_viscosity: 'm^2/s',
  thermal_conductivity: 'm kg/(s^3 K)',
  heat_capacity: 'm^2/(s^2 K)',
  diffusivity: 'm^2/s',
  thermal_expansion: '1/K',
  surface_tension: 'kg/s^2',
  latent_heat: 'm^2/s^2',
  volume_flow: 'm^3/s',
  mass_flow: 'kg/s',
  film_flow_per_width: 'kg/(m s)',
  rotation_speed: '1/s',
  power: 'm^2 kg/s^3',
  power_per_mass: 'm^2/s^3',
  power_per_volume: 'kg/(m s^3)',
  overall_coefficient: 'kg/(s^3 K)',
  fouling_resistance: 's^3 K/kg',
  equipment_heat_capacity: 'm^2 kg/(s^2 K)',
  loss_conductance: 'm^2 kg/(s^3 K)',
  molar_mass: 'kg/mol',
  saturation_concentration: 'kg/m^3',
  mass_rate: 'kg/s',
  volumetric_coefficient: '1/s',
  limiting_current: 'A',
  permeability: 'm^2/s',
  mass_transfer_coefficient: 'm/s',
  emissivity: '1',
  electrons: '1',
};

test.each(Object.entries(dimensions))('%s is %s', (name, text) => {
  expect(dimensionText(quantities[name]!.dimension)).toBe(text);
});

test('every quantity is named once, lower case, with words, symbol and units that fit it', () => {
  expect(new Set(quantityNames).size).toBe(quantityNames.length);
  for (const one of Object.values(quantities)) {
    expect(one.name).toMatch(/^[a-z]+(_[a-z]+)*$/);
    expect(one.says.length).toBeGreaterThan(3);
    if (one.kind === 'text') continue;
    expect(one.symbol).not.toBe('');
    for (const text of [one.unit, ...one.friendly]) expect(isFault(unitFor(one, text)), `${one.name} in ${text}`).toBe(false);
  }
});

test('symbols are told apart', () => {
  const symbols = Object.values(quantities).flatMap((one) => (one.kind === 'text' ? [] : [one.symbol]));
  expect(symbols.filter((symbol, k) => symbols.indexOf(symbol) !== k)).toEqual([]);
});

test('concentrations and rates may count moles', () => {
  for (const name of ['saturation_concentration', 'bulk_concentration', 'inlet_concentration', 'outlet_concentration', 'mass_rate']) {
    const { molar, dimension } = quantities[name]!;
    expect(molar).toBeDefined();
    expect(sameDimension(molar!.dimension, dimension)).toBe(false);
  }
});

test('the second stream has the same quantities', () => {
  expect(quantityOf('inlet_temperature_other')).toMatchObject({
    name: 'inlet_temperature_other',
    unit: 'K',
    kind: 'temperature',
    symbol: 'T_in,2',
  });
  expect(quantityOf('viscosity_other')!.symbol).toBe('μ_2');
  expect(quantityOf('inlet_temperature_other_other')).toBeUndefined();
  expect(quantityOf('_other')).toBeUndefined();
  expect(quantityOf('toString')).toBeUndefined();
});
