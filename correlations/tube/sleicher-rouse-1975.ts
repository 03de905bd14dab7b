import { published } from '../published.ts';

export const sleicherRouse1975 = published({
  id: 'sleicher-rouse-1975',
  authors: 'Sleicher and Rouse',
  year: 1975,
  title: 'Turbulent flow in a smooth tube, property temperatures told apart',
  family: 'tube',
  transfer: 'heat',
  average: 'fully developed',
  reads: 'mean line',
  form: 'Nu = A + B * Re^(D - E / (F + Prw)) * Prw^(1/3 + 0.5 * exp(-H * Prw))',
  values: { A: 5, B: 0.015, D: 0.88, E: 0.24, F: 4, H: 0.6 },
  groups: { Nu: 'Nu@pipe', Re: 'Re@pipe,film', Prw: 'Pr@wall' },
  limits: ['1e4 <= Re <= 1e6', '0.1 <= Prw <= 1e5'],
  accuracy: 'not stated',
  source:
    'C. A. Sleicher, M. W. Rouse, Int. J. Heat Mass Transfer 18 (1975) 677-683; as in Kreith, Manglik and Bohn, Principles of Heat Transfer, 7th ed., Cengage 2011',
  where: 'eq. (6.64) of the book; 0.88, 0.24 and 4 from memory, the rest read',
  constantsFrom: 'memory',
  use: 'Nu at bulk, Re at film, Pr at wall temperature.',
  analogy: false,
  printed: [
    {
      kind: 'worked example',
      at: { Re: 82237, Prw: 4.64 },
      value: 409.1044005,
      tolerance: 1.2,
      source: 'Kreith, Manglik and Bohn, Principles of Heat Transfer, 7th ed., Cengage 2011',
      where: 'Example 6.5 (companion script): exponent printed 0.852, rounding worth 0.3 % of Nu',
    },
  ],
});
