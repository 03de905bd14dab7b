import type { Group } from './group.ts';

export const Pr: Group = {
  name: 'Pr',
  symbol: 'Pr',
  title: 'Prandtl number',
  bases: [],
  properties: true,
  ways: ({ at }) => [
    {
      from: [at('heat_capacity'), at('viscosity'), at('thermal_conductivity')],
      of: (c, mu, lambda) => (c! * mu!) / lambda!,
      formula: 'Pr = c_p mu/lambda',
    },
    {
      from: [at('kinematic_viscosity'), at('thermal_diffusivity')],
      of: (nu, a) => nu! / a!,
      formula: 'Pr = nu/a',
    },
  ],
  source: 'definition',
};

export const Sc: Group = {
  name: 'Sc',
  symbol: 'Sc',
  title: 'Schmidt number',
  bases: [],
  properties: true,
  ways: ({ at }) => [
    { from: [at('kinematic_viscosity'), at('diffusivity')], of: (nu, diffusivity) => nu! / diffusivity!, formula: 'Sc = mu/(rho D)' },
  ],
  source: 'definition',
};

export const Le: Group = {
  name: 'Le',
  symbol: 'Le',
  title: 'Lewis number',
  bases: [],
  properties: true,
  ways: ({ at }) => [
    { from: [at('thermal_diffusivity'), at('diffusivity')], of: (a, diffusivity) => a! / diffusivity!, formula: 'Le = lambda/(rho c_p D)' },
  ],
  source: 'definition; some authors use its inverse',
};

export const viscosityRatio: Group = {
  name: 'viscosity_ratio',
  symbol: 'mu/mu_w',
  title: 'viscosity ratio',
  bases: [],
  properties: false,
  ways: () => [
    {
      from: ['viscosity', 'viscosity@wall'],
      of: (mu, wall) => mu! / wall!,
      formula: 'viscosity_ratio = mu/mu_w, mu at bulk and mu_w at wall temperature',
    },
  ],
  source: 'definition',
};
