import { published } from '../published.ts';

export const zukauskas1972StaggeredClose = published({
  id: 'zukauskas-1972-staggered-close',
  authors: 'Zukauskas',
  year: 1972,
  title: 'Staggered tube bank, Re 1000 to 200000',
  family: 'tube-bank',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * (S_T / S_L)^p * Re^a * Pr^m * (Pr / Prw)^n',
  values: { C: 0.35, a: 0.6, m: 0.36, n: 0.25, p: 0.2 },
  groups: { Nu: 'Nu@tube-bank', Re: 'Re@tube-bank', Pr: 'Pr', Prw: 'Pr@wall', S_T: 'transverse_pitch', S_L: 'longitudinal_pitch' },
  limits: ['1000 <= Re <= 200000', '0.7 <= Pr <= 500', 'S_T / S_L <= 2'],
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
      at: { Re: 14142.13562, Pr: 5, Prw: 4, S_T: 1.2, S_L: 1 },
      value: 211.8702588,
      tolerance: 0.00021,
      source: 'open classroom code of convection after the tables of Incropera and DeWitt',
      where: 'tube bank: C1, m, 0.36 and 1/4',
    },
    {
      kind: 'worked example',
      at: { Re: 13947.776, Pr: 0.71, Prw: 0.701, S_T: 0.0313, S_L: 0.0343 },
      value: 93.66664758,
      tolerance: 0.27,
      source: 'Incropera, DeWitt, Bergman and Lavine, Fundamentals of Heat and Mass Transfer, 6th ed., Wiley 2007',
      where: 'Example 7.7: printed 19.6 kW/m of the companion notebook, turned to Nu and freed of the row factor 0.95',
    },
  ],
});
