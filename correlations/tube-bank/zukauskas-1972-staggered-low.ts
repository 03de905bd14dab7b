import { published } from '../published.ts';

export const zukauskas1972StaggeredLow = published({
  id: 'zukauskas-1972-staggered-low',
  authors: 'Zukauskas',
  year: 1972,
  title: 'Staggered tube bank, Re 10 to 100',
  family: 'tube-bank',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^m * (Pr / Prw)^n',
  values: { C: 0.9, a: 0.4, m: 0.36, n: 0.25 },
  groups: { Nu: 'Nu@tube-bank', Re: 'Re@tube-bank', Pr: 'Pr', Prw: 'Pr@wall' },
  limits: ['10 <= Re <= 100', '0.7 <= Pr <= 500'],
  accuracy: 'not stated',
  source:
    'A. Zukauskas, Adv. Heat Transfer 8 (1972) 93-160, doi 10.1016/S0065-2717(08)70038-8; constants as in Incropera, DeWitt, Bergman and Lavine, Fundamentals of Heat and Mass Transfer, 6th ed., Wiley 2007',
  where: 'table of C1 and m',
  constantsFrom: 'page read',
  use: 'Twenty rows or more; fewer rows lower it by up to 30 %. Largest velocity between the tubes.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 31.6227766, Pr: 5, Prw: 4 },
      value: 6.762374437,
      tolerance: 6.8e-6,
      source: 'open classroom code of convection after the tables of Incropera and DeWitt',
      where: 'tube bank: C1, m, 0.36 and 1/4',
    },
  ],
});
