import { published } from '../published.ts';

export const dewesSchumpe1997 = published({
  id: 'dewes-schumpe-1997',
  authors: 'Dewes and Schumpe',
  year: 1997,
  title: 'Bubble column, effect of the density of the gas',
  family: 'gas-liquid',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'volumetric_coefficient = C * gas_velocity^a * (viscosity / 0.001)^b * density_other^m',
  values: { C: 1, a: 0.9, b: -0.55, m: 0.46 },
  groups: {
    volumetric_coefficient: 'volumetric_coefficient',
    gas_velocity: 'gas_velocity',
    viscosity: 'viscosity',
    density_other: 'density_other',
  },
  limits: ['0.01 <= gas_velocity <= 0.08', '1.35 <= viscosity / 0.001 <= 583', '0.4 <= density_other <= 18.8'],
  accuracy: 'not stated',
  source: 'I. Dewes, A. Schumpe, Chem. Eng. Sci. 52 (1997) 4105-4109, doi 10.1016/S0009-2509(97)00252-2',
  where: 'equation in m/s, mPa s and kg/m3',
  constantsFrom: 'page read',
  use: 'Slurry column of 0.115 m; the gas is the second stream.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { gas_velocity: 0.05, viscosity: 0.005, density_other: 1.2 },
      value: 0.030273517,
      tolerance: 6.1e-8,
      source: 'Y. Cortes-Pena and others 2023, open code design_tools/aeration.py',
      where: 'u^0.90 mu^-0.55 rho_g^0.46 with mu in mPa s, evaluated at this point',
    },
  ],
});
