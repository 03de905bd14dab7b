import { published } from '../published.ts';

export const siederTate1936Turbulent = published({
  id: 'sieder-tate-1936-turbulent',
  authors: 'Sieder and Tate',
  year: 1936,
  title: 'Turbulent flow in a smooth tube, large temperature differences',
  family: 'tube',
  transfer: 'heat',
  average: 'fully developed',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^b * viscosity_ratio^m',
  values: { C: 0.027, a: 0.8, b: 1 / 3, m: 0.14 },
  groups: { Nu: 'Nu@pipe', Re: 'Re@pipe', Pr: 'Pr', viscosity_ratio: 'viscosity_ratio', d: 'diameter', L: 'length' },
  limits: ['Re >= 1e4', '0.7 <= Pr <= 16700', 'L / d >= 10'],
  accuracy: 'not stated',
  source:
    'E. N. Sieder, G. E. Tate, Ind. Eng. Chem. 28 (1936) 1429-1435, doi 10.1021/ie50324a027; constant as in Incropera, DeWitt, Bergman and Lavine, Fundamentals of Heat and Mass Transfer, 6th ed., Wiley 2007',
  where: 'eq. (8.61) of the book',
  constantsFrom: 'page read',
  use: 'Viscous liquids; other books print 0.023 or 0.026.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 20000, Pr: 10, viscosity_ratio: 2 },
      value: 176.8745278,
      tolerance: 0.00018,
      source: 'open classroom code of convection after the tables of Incropera and DeWitt',
      where: 'turbulent tube: 0.027, 4/5, 1/3, 0.14',
    },
  ],
});
