import { published } from '../published.ts';

export const gnielinski1976 = published({
  id: 'gnielinski-1976',
  authors: 'Gnielinski',
  year: 1976,
  title: 'Turbulent and transition flow in a smooth tube',
  family: 'tube',
  transfer: 'heat',
  average: 'fully developed',
  reads: 'mean line',
  form: 'Nu = (A * ln(Re) - B)^-2 / 8 * (Re - D) * Pr / (1 + E * ((A * ln(Re) - B)^-2 / 8)^0.5 * (Pr^(2/3) - 1))',
  values: { A: 0.79, B: 1.64, D: 1000, E: 12.7 },
  groups: { Nu: 'Nu@pipe', Re: 'Re@pipe', Pr: 'Pr' },
  limits: ['3000 <= Re <= 5e6', '0.5 <= Pr <= 2000'],
  accuracy: 'within 10 % (memory)',
  source: 'V. Gnielinski, Int. Chem. Eng. 16 (1976) 359-368; friction factor of Petukhov 1970 as textbooks print it',
  where: 'developed flow, without the factors of entry length and wall temperature',
  constantsFrom: 'page read',
  use: 'Long smooth tubes; L/d of 10 or more.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 50000, Pr: 5 },
      value: 285.173281,
      tolerance: 0.00029,
      source: 'Oak Ridge National Laboratory, open code of closure relations, Nu_Gnielinski',
      where: 'formula printed with 0.79, 1.64, 1000 and 12.7',
    },
  ],
});
