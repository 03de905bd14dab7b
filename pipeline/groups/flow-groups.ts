import { STANDARD_GRAVITY as g } from '../rules/derived/physical-constants.ts';
import { bases, flowBases } from './basis.ts';
import type { Group, Setting, Way } from './group.ts';
import { Re } from './reynolds.ts';

const groupAt = (name: string, { basis, temperature }: Setting): string =>
  `${name}@${basis}${temperature === 'bulk' ? '' : `,${temperature}`}`;
const propertyGroup = (name: string, { temperature }: Setting): string => (temperature === 'bulk' ? name : `${name}@${temperature}`);

/** Re times Pr or Sc. */
function peclet(name: string, symbol: string, title: string, other: 'Pr' | 'Sc'): Group {
  return {
    name,
    symbol,
    title,
    bases: Re.bases,
    properties: true,
    ways: (setting) => [
      { from: [groupAt('Re', setting), propertyGroup(other, setting)], of: (re, pr) => re! * pr!, formula: `${name} = Re ${other}` },
    ],
    where: (basis) => (basis?.velocity === undefined ? '' : `u = ${basis.velocity}`),
    source: 'definition',
  };
}

export const pecletHeat = peclet('Pe_heat', 'Pe', 'Peclet number of heat transfer', 'Pr');
export const pecletMass = peclet('Pe_mass', 'Pe_m', 'Peclet number of mass transfer', 'Sc');

/** Re times Pr or Sc times bore over length. */
function graetz(name: string, symbol: string, title: string, other: 'Pr' | 'Sc'): Group {
  return {
    name,
    symbol,
    title,
    bases: ['pipe', 'hydraulic'],
    properties: true,
    ways: (setting) => [
      {
        from: [groupAt('Re', setting), propertyGroup(other, setting), setting.length, 'length'],
        of: (re, pr, d, length) => (re! * pr! * d!) / length!,
        formula: `${name} = Re ${other} ${setting.symbol}/L`,
      },
    ],
    where: () => 'L = length',
    source: 'definition; some authors put pi/4 in front',
  };
}

export const graetzHeat = graetz('Gz_heat', 'Gz', 'Graetz number of heat transfer', 'Pr');
export const graetzMass = graetz('Gz_mass', 'Gz_m', 'Graetz number of mass transfer', 'Sc');

const turning = (basis: string): boolean => basis === 'impeller';
const inertial = bases.filter((name) => turning(name) || (flowBases.includes(name) && name !== 'layer'));

const froude = ({ basis, length, symbol }: Setting): Way =>
  turning(basis)
    ? { from: ['rotation_speed', length], of: (n, d) => (n! * n! * d!) / g, formula: 'Fr = N^2 d/g' }
    : basis === 'particle-interstitial'
      ? { from: ['velocity', 'voidage', length], of: (u, e, d) => (u! / e!) ** 2 / (g * d!), formula: 'Fr = (u/voidage)^2/(g d_p)' }
      : { from: ['velocity', length], of: (u, d) => (u! * u!) / (g * d!), formula: `Fr = u^2/(g ${symbol})` };

const weber = ({ basis, length, symbol, at }: Setting): Way =>
  turning(basis)
    ? {
        from: [at('density'), 'rotation_speed', length, at('surface_tension')],
        of: (rho, n, d, sigma) => (rho! * n! * n! * d! ** 3) / sigma!,
        formula: 'We = rho N^2 d^3/sigma',
      }
    : basis === 'particle-interstitial'
      ? {
          from: [at('density'), 'velocity', 'voidage', length, at('surface_tension')],
          of: (rho, u, e, d, sigma) => (rho! * (u! / e!) ** 2 * d!) / sigma!,
          formula: 'We = rho (u/voidage)^2 d_p/sigma',
        }
      : {
          from: [at('density'), 'velocity', length, at('surface_tension')],
          of: (rho, u, d, sigma) => (rho! * u! * u! * d!) / sigma!,
          formula: `We = rho u^2 ${symbol}/sigma`,
        };

export const Fr: Group = {
  name: 'Fr',
  symbol: 'Fr',
  title: 'Froude number',
  bases: inertial,
  properties: false,
  ways: (setting) => [froude(setting)],
  where: (basis) => (basis?.velocity === undefined ? 'N = rotation speed' : `u = ${basis.velocity}`),
  source: 'definition; some authors use its square root',
};

export const We: Group = {
  name: 'We',
  symbol: 'We',
  title: 'Weber number',
  bases: inertial,
  properties: true,
  ways: (setting) => [weber(setting)],
  where: (basis) => (basis?.velocity === undefined ? 'N = rotation speed' : `u = ${basis.velocity}`),
  source: 'definition',
};
