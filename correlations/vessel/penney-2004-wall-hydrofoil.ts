import { published } from '../published.ts';

export const penney2004WallHydrofoil = published({
  id: 'penney-2004-wall-hydrofoil',
  authors: 'Penney and Atiemo-Obeng',
  year: 2004,
  title: 'Jacketed wall, three-blade hydrofoil',
  family: 'vessel',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^b * viscosity_ratio^c',
  values: { C: 0.31, a: 2 / 3, b: 1 / 3, c: 0.14 },
  groups: { Nu: 'Nu@vessel', Re: 'Re@impeller', Pr: 'Pr', viscosity_ratio: 'viscosity_ratio' },
  limits: [],
  accuracy: 'not stated',
  source:
    'W. R. Penney, V. A. Atiemo-Obeng, Heat Transfer, ch. 14 of Handbook of Industrial Mixing, Wiley 2004, doi 10.1002/0471451452.ch14',
  where: 'jacketed wall, turbulent',
  constantsFrom: 'page read',
  use: 'Liquid as deep as the vessel is wide, blades of standard height. No range on the page read.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 50000.0, Pr: 20, viscosity_ratio: 1.2 },
      value: 1171.5758,
      tolerance: 0.0023,
      source: 'H. Vale 2024, open code transport/heat.py, Nu_tank after chapter 14.4 of the handbook',
      where: 'constant 0.31, exponents 2 / 3 and 1 / 3, 0.14, evaluated at this point',
    },
  ],
});
