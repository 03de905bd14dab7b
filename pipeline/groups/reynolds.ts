import { bases, flowBases } from './basis.ts';
import type { Group, Setting, Way } from './group.ts';

const TURN = 2 * Math.PI; // rad in a revolution

/** Definitions of Re that are not velocity times length over kinematic viscosity. */
const special: Readonly<Record<string, (setting: Setting) => Way>> = {
  'particle-interstitial': ({ at, length }) => ({
    from: ['velocity', 'voidage', length, at('kinematic_viscosity')],
    of: (u, voidage, d, nu) => (u! * d!) / (voidage! * nu!),
    formula: 'Re = rho u d_p/(voidage mu)',
  }),
  impeller: ({ at, length }) => ({
    from: ['rotation_speed', length, at('kinematic_viscosity')],
    of: (n, d, nu) => (n! * d! * d!) / nu!,
    formula: 'Re = rho N d^2/mu',
  }),
  film: ({ at }) => ({
    from: ['film_flow_per_width', at('viscosity')],
    of: (flow, mu) => (4 * flow!) / mu!,
    formula: 'Re = 4 G/mu',
  }),
  disk: ({ at, length }) => ({
    from: ['rotation_speed', length, at('kinematic_viscosity')],
    of: (n, r, nu) => (TURN * n! * r! * r!) / nu!,
    formula: 'Re = omega r^2/nu, omega = 2 pi N',
  }),
  'rotating-cylinder': ({ at, length }) => ({
    from: ['rotation_speed', length, at('kinematic_viscosity')],
    of: (n, d, nu) => (Math.PI * n! * d! * d!) / nu!,
    formula: 'Re = pi N d^2/nu (peripheral velocity times diameter)',
  }),
  'energy-dissipation': ({ at, length }) => ({
    from: ['power_per_mass', length, at('kinematic_viscosity')],
    of: (power, d, nu) => (Math.cbrt(power!) * d! ** (4 / 3)) / nu!,
    formula: 'Re = (P/m)^(1/3) d_p^(4/3)/nu',
  }),
};

const flowing = ({ at, length, symbol }: Setting): Way => ({
  from: ['velocity', length, at('kinematic_viscosity')],
  of: (u, d, nu) => (u! * d!) / nu!,
  formula: `Re = rho u ${symbol}/mu`,
});

/** Where the density is not known a round tube's mass flow does as well. */
const byMassFlow = ({ at, length }: Setting): Way => ({
  from: ['mass_flow', length, at('viscosity')],
  of: (flow, d, mu) => (4 * flow!) / (Math.PI * d! * mu!),
  formula: 'Re = 4 q_m/(pi d mu)',
});

const letters: Readonly<Record<string, string>> = {
  impeller: 'N = rotation speed',
  film: 'G = film flow per width',
  'energy-dissipation': 'P/m = power per mass',
};

export const Re: Group = {
  name: 'Re',
  symbol: 'Re',
  title: 'Reynolds number',
  bases: bases.filter((name) => special[name] !== undefined || (flowBases.includes(name) && name !== 'layer')),
  properties: true,
  ways: (setting) => {
    const own = special[setting.basis];
    if (own !== undefined) return [own(setting)];
    return setting.basis === 'pipe' ? [flowing(setting), byMassFlow(setting)] : [flowing(setting)];
  },
  where: (basis) => (basis?.velocity === undefined ? (letters[basis?.name ?? ''] ?? '') : `u = ${basis.velocity}`),
  source: 'definition',
};
