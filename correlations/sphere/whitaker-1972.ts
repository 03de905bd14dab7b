import { published } from '../published.ts';

export const whitaker1972 = published({
  id: 'whitaker-1972',
  authors: 'Whitaker',
  year: 1972,
  title: 'Single sphere in a stream',
  family: 'sphere',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = A + (B * Re^0.5 + D * Re^(2/3)) * Pr^0.4 * viscosity_ratio^0.25',
  values: { A: 2, B: 0.4, D: 0.06 },
  groups: { Nu: 'Nu@particle', Re: 'Re@particle', Pr: 'Pr', viscosity_ratio: 'viscosity_ratio' },
  limits: ['3.5 <= Re <= 7.6e4', '0.71 <= Pr <= 380', '1 <= viscosity_ratio <= 3.2'],
  accuracy: 'within 30 % (memory)',
  source: 'S. Whitaker, AIChE J. 18 (1972) 361-371, doi 10.1002/aic.690180219',
  where: 'sphere',
  constantsFrom: 'page read',
  use: 'Properties at the temperature of the stream but for the viscosity at the wall.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 1000, Pr: 0.71, viscosity_ratio: 1 },
      value: 18.26153226,
      tolerance: 1.8e-5,
      source: 'open classroom code of convection after the tables of Incropera and DeWitt',
      where: 'sphere: 2, 0.4, 0.06, exponents 1/2, 2/3, 0.4, 1/4',
    },
  ],
});
