import { published } from '../published.ts';

export const churchillChu1975Plate = published({
  id: 'churchill-chu-1975-plate',
  authors: 'Churchill and Chu',
  year: 1975,
  title: 'Vertical plate, free convection, all Ra',
  family: 'natural-convection',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = (A + B * Ra^(1/6) / (1 + (D / Pr)^(9/16))^(8/27))^2',
  values: { A: 0.825, B: 0.387, D: 0.492 },
  groups: { Nu: 'Nu@plate,film', Ra: 'Ra@plate,film', Pr: 'Pr@film' },
  limits: ['0.1 <= Ra <= 1e12'],
  accuracy: 'not stated',
  source: 'S. W. Churchill, H. H. S. Chu, Int. J. Heat Mass Transfer 18 (1975) 1323-1329, doi 10.1016/0017-9310(75)90243-4',
  where: 'eq. (9)',
  constantsFrom: 'memory',
  use: 'Isothermal vertical plates.',
  analogy: false,
  printed: [
    {
      kind: 'worked example',
      at: { Ra: 1814377483.0, Pr: 0.69 },
      value: 147.17956,
      tolerance: 0.0694,
      source: 'Incropera, DeWitt, Bergman and Lavine, Fundamentals of Heat and Mass Transfer, 6th ed., Wiley 2007',
      where: 'Example 9.2: printed 1060 W (integer part), turned to Nu',
    },
  ],
});
