import { bases } from './basis.ts';
import type { Group } from './group.ts';

const h = 'heat_transfer_coefficient';
const k = 'mass_transfer_coefficient';

export const Nu: Group = {
  name: 'Nu',
  symbol: 'Nu',
  title: 'Nusselt number',
  bases,
  properties: true,
  ways: ({ at, length, symbol }) => [
    { from: [h, length, at('thermal_conductivity')], of: (h, d, lambda) => (h! * d!) / lambda!, formula: `Nu = h ${symbol}/lambda` },
  ],
  source: 'definition',
};

export const Sh: Group = {
  name: 'Sh',
  symbol: 'Sh',
  title: 'Sherwood number',
  bases,
  properties: true,
  ways: ({ at, length, symbol }) => [
    { from: [k, length, at('diffusivity')], of: (k, d, diffusivity) => (k! * d!) / diffusivity!, formula: `Sh = k ${symbol}/D` },
  ],
  source: 'definition',
};

export const stantonHeat: Group = {
  name: 'St_heat',
  symbol: 'St',
  title: 'Stanton number of heat transfer',
  bases: [],
  properties: true,
  ways: ({ at }) => [
    {
      from: [h, at('density'), 'velocity', at('heat_capacity')],
      of: (h, rho, u, c) => h! / (rho! * u! * c!),
      formula: 'St = h/(rho u c_p)',
    },
  ],
  where: () => 'u = velocity, superficial in a bed',
  source: 'definition',
};

export const stantonMass: Group = {
  name: 'St_mass',
  symbol: 'St_m',
  title: 'Stanton number of mass transfer',
  bases: [],
  properties: false,
  ways: () => [{ from: [k, 'velocity'], of: (k, u) => k! / u!, formula: 'St = k/u' }],
  where: () => 'u = velocity, superficial in a bed',
  source: 'definition',
};

const suffixed = (name: string, temperature: string): string => (temperature === 'bulk' ? name : `${name}@${temperature}`);

export const factorHeat: Group = {
  name: 'j_heat',
  symbol: 'j_h',
  title: 'transfer factor of heat',
  bases: [],
  properties: true,
  ways: ({ temperature }) => [
    {
      from: [suffixed('St_heat', temperature), suffixed('Pr', temperature)],
      of: (st, pr) => st! * Math.cbrt(pr! * pr!),
      formula: 'j = h/(rho u c_p) Pr^(2/3)',
    },
  ],
  where: stantonHeat.where!,
  source: 'Chilton & Colburn 1934',
};

export const factorMass: Group = {
  name: 'j_mass',
  symbol: 'j_m',
  title: 'transfer factor of mass',
  bases: [],
  properties: true,
  ways: ({ temperature }) => [
    { from: ['St_mass', suffixed('Sc', temperature)], of: (st, sc) => st! * Math.cbrt(sc! * sc!), formula: 'j = k/u Sc^(2/3)' },
  ],
  where: stantonMass.where!,
  source: 'Chilton & Colburn 1934',
};

export const Bi: Group = {
  name: 'Bi',
  symbol: 'Bi',
  title: 'Biot number',
  bases: [],
  properties: false,
  ways: () => [
    {
      from: [h, 'volume_per_area', 'solid_conductivity'],
      of: (h, size, lambda) => (h! * size!) / lambda!,
      formula: 'Bi = h (V/A)/lambda_s',
    },
  ],
  where: () => 'V/A = volume over surface of the body, lambda_s = conductivity of the solid',
  source: 'definition, on V/A',
};

export const Fo: Group = {
  name: 'Fo',
  symbol: 'Fo',
  title: 'Fourier number',
  bases: [],
  properties: false,
  ways: () => [
    {
      from: ['solid_conductivity', 'solid_density', 'solid_heat_capacity', 'time', 'volume_per_area'],
      of: (lambda, rho, c, t, size) => (lambda! * t!) / (rho! * c! * size! * size!),
      formula: 'Fo = lambda_s t/(rho_s c_s (V/A)^2)',
    },
  ],
  where: () => 'V/A = volume over surface of the body',
  source: 'definition, on V/A',
};
