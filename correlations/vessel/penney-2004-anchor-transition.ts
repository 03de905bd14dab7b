import { published } from '../published.ts';

export const penney2004AnchorTransition = published({
  id: 'penney-2004-anchor-transition',
  authors: 'Penney and Atiemo-Obeng',
  year: 2004,
  title: 'Jacketed wall, anchor, Re 12 to 100',
  family: 'vessel',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^b * viscosity_ratio^c',
  values: { C: 0.69, a: 0.5, b: 1 / 3, c: 0.14 },
  groups: { Nu: 'Nu@vessel', Re: 'Re@impeller', Pr: 'Pr', viscosity_ratio: 'viscosity_ratio' },
  limits: ['12 <= Re <= 100'],
  accuracy: 'not stated',
  source:
    'W. R. Penney, V. A. Atiemo-Obeng, Heat Transfer, ch. 14 of Handbook of Industrial Mixing, Wiley 2004, doi 10.1002/0471451452.ch14',
  where: 'anchor',
  constantsFrom: 'page read',
  use: 'Close-clearance anchor; power by the same Re.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 50, Pr: 5000, viscosity_ratio: 1.5 },
      value: 88.303287,
      tolerance: 0.00018,
      source: 'H. Vale 2024, open code transport/heat.py, Nu_tank after chapter 14.4 of the handbook',
      where: 'constant 0.69, exponents 0.5 and 1 / 3, 0.14, evaluated at this point',
    },
  ],
});
