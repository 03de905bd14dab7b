import { published } from '../published.ts';

export const petukhovPopov1963 = published({
  id: 'petukhov-popov-1963',
  authors: 'Petukhov and Popov',
  year: 1963,
  title: 'Turbulent flow in a smooth tube',
  family: 'tube',
  transfer: 'heat',
  average: 'fully developed',
  reads: 'mean line',
  form: 'Nu = (A * log10(Re) - B)^-2 / 8 * Re * Pr / (1 + D * (A * log10(Re) - B)^-2 + (E + H / Pr^(1/3)) * ((A * log10(Re) - B)^-2 / 8)^0.5 * (Pr^(2/3) - 1))',
  values: { A: 1.82, B: 1.64, D: 3.4, E: 11.7, H: 1.8 },
  groups: { Nu: 'Nu@pipe', Re: 'Re@pipe', Pr: 'Pr' },
  limits: ['1e4 <= Re <= 5e6', '0.5 <= Pr <= 2000'],
  accuracy: 'within 6 % (memory)',
  source:
    'B. S. Petukhov, V. N. Popov, High Temp. 1 (1963) 69-83; as in Kreith, Manglik and Bohn, Principles of Heat Transfer, 7th ed., Cengage 2011',
  where: 'eq. (6.63) of the book',
  constantsFrom: 'page read',
  use: 'Developed flow, moderate differences of temperature.',
  analogy: true,
  printed: [
    {
      kind: 'worked example',
      at: { Re: 125000, Pr: 1.923076923 },
      value: 370,
      tolerance: 0.5,
      source: 'Kreith, Manglik and Bohn, Principles of Heat Transfer, 7th ed., Cengage 2011',
      where: 'Example 6.5 (companion script): printed Nu 370',
    },
  ],
});
