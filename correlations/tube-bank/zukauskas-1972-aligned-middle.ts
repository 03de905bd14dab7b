import { published } from '../published.ts';

export const zukauskas1972AlignedMiddle = published({
  id: 'zukauskas-1972-aligned-middle',
  authors: 'Zukauskas',
  year: 1972,
  title: 'Aligned tube bank, Re 1000 to 200000',
  family: 'tube-bank',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^m * (Pr / Prw)^n',
  values: { C: 0.27, a: 0.63, m: 0.36, n: 0.25 },
  groups: { Nu: 'Nu@tube-bank', Re: 'Re@tube-bank', Pr: 'Pr', Prw: 'Pr@wall', S_T: 'transverse_pitch', S_L: 'longitudinal_pitch' },
  limits: ['1000 <= Re <= 200000', '0.7 <= Pr <= 500', 'S_T / S_L >= 0.7'],
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
      at: { Re: 14142.13562, Pr: 5, Prw: 4 },
      value: 209.9156981,
      tolerance: 0.00021,
      source: 'open classroom code of convection after the tables of Incropera and DeWitt',
      where: 'tube bank: C1, m, 0.36 and 1/4',
    },
  ],
});
