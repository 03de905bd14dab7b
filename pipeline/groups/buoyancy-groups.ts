import { STANDARD_GRAVITY as g } from '../rules/derived/physical-constants.ts';
import { bases } from './basis.ts';
import type { Group, Setting } from './group.ts';

/** Bases that are a length of the body itself; the film's length is made of viscosity and gravity, so that a group on it is a constant. */
const bodies = bases.filter((name) => name !== 'film' && name !== 'particle-interstitial' && name !== 'energy-dissipation');

const groupAt = (name: string, { basis, temperature }: Setting): string =>
  `${name}@${basis}${temperature === 'bulk' ? '' : `,${temperature}`}`;
const propertyGroup = (name: string, { temperature }: Setting): string => (temperature === 'bulk' ? name : `${name}@${temperature}`);

export const Gr: Group = {
  name: 'Gr',
  symbol: 'Gr',
  title: 'Grashof number',
  bases: bodies,
  properties: true,
  ways: ({ at, length, symbol }) => [
    {
      from: [at('thermal_expansion'), 'wall_temperature', 'temperature', length, at('kinematic_viscosity')],
      of: (beta, wall, bulk, d, nu) => (g * beta! * Math.abs(wall! - bulk!) * d! ** 3) / (nu! * nu!),
      formula: `Gr = g beta |T_w - T| ${symbol}^3/nu^2`,
    },
  ],
  source: 'definition',
};

export const Ra: Group = {
  name: 'Ra',
  symbol: 'Ra',
  title: 'Rayleigh number',
  bases: bodies,
  properties: true,
  ways: (setting) => [{ from: [groupAt('Gr', setting), propertyGroup('Pr', setting)], of: (gr, pr) => gr! * pr!, formula: 'Ra = Gr Pr' }],
  where: () => 'Gr = g beta |T_w - T| L^3/nu^2 on the same length',
  source: 'definition',
};

export const Ga: Group = {
  name: 'Ga',
  symbol: 'Ga',
  title: 'Galilei number',
  bases: bodies,
  properties: true,
  ways: ({ at, length, symbol }) => [
    {
      from: [length, at('kinematic_viscosity')],
      of: (d, nu) => (g * d! ** 3) / (nu! * nu!),
      formula: `Ga = g ${symbol}^3/nu^2`,
    },
  ],
  source: 'definition',
};

export const Bo: Group = {
  name: 'Bo',
  symbol: 'Bo',
  title: 'Bond number',
  bases: bodies,
  properties: true,
  ways: ({ at, length, symbol }) => [
    {
      from: [at('density'), length, at('surface_tension')],
      of: (rho, d, sigma) => (g * rho! * d! * d!) / sigma!,
      formula: `Bo = g rho ${symbol}^2/sigma`,
    },
  ],
  source: 'definition, on the density of the liquid',
};

export const Ar: Group = {
  name: 'Ar',
  symbol: 'Ar',
  title: 'Archimedes number',
  bases: ['particle', 'bubble'],
  properties: true,
  ways: ({ at, length, symbol, basis }) => [
    {
      from: [at('density'), basis === 'bubble' ? 'density_other' : 'solid_density', length, at('kinematic_viscosity')],
      of: (rho, other, d, nu) => (g * d! ** 3 * Math.abs(other! - rho!)) / (rho! * nu! * nu!),
      formula: `Ar = g ${symbol}^3 |rho_s - rho|/(rho nu^2)`,
    },
  ],
  where: (basis) => (basis?.name === 'bubble' ? 'rho_s = density of the second phase' : 'rho_s = density of the solid'),
  source: 'definition',
};
