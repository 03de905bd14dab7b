import { published } from '../published.ts';

export const penney2004AnchorTurbulent = published({
  id: 'penney-2004-anchor-turbulent',
  authors: 'Penney and Atiemo-Obeng',
  year: 2004,
  title: 'Jacketed wall, anchor, Re above 100',
  family: 'vessel',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^b * viscosity_ratio^c',
  values: { C: 0.32, a: 2 / 3, b: 1 / 3, c: 0.14 },
  groups: { Nu: 'Nu@vessel', Re: 'Re@impeller', Pr: 'Pr', viscosity_ratio: 'viscosity_ratio' },
  limits: ['Re >= 100'],
  accuracy: 'not stated',
  source:
    'W. R. Penney, V. A. Atiemo-Obeng, Heat Transfer, ch. 14 of Handbook of Industrial Mixing, Wiley 2004, doi 10.1002/0471451452.ch14',
  where: 'anchor',
  constantsFrom: 'page read',
  use: 'Close-clearance anchor.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 2000, Pr: 500, viscosity_ratio: 1.5 },
      value: 426.72303,
      tolerance: 0.00085,
      source: 'H. Vale 2024, open code transport/heat.py, Nu_tank after chapter 14.4 of the handbook',
      where: 'constant 0.32, exponents 2 / 3 and 1 / 3, 0.14, evaluated at this point',
    },
  ],
});
