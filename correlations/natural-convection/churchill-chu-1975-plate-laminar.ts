import { published } from '../published.ts';

export const churchillChu1975PlateLaminar = published({
  id: 'churchill-chu-1975-plate-laminar',
  authors: 'Churchill and Chu',
  year: 1975,
  title: 'Vertical plate, free convection, laminar',
  family: 'natural-convection',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = A + B * Ra^0.25 / (1 + (D / Pr)^(9/16))^(4/9)',
  values: { A: 0.68, B: 0.67, D: 0.492 },
  groups: { Nu: 'Nu@plate,film', Ra: 'Ra@plate,film', Pr: 'Pr@film' },
  limits: ['Ra <= 1e9'],
  accuracy: 'not stated',
  source: 'S. W. Churchill, H. H. S. Chu, Int. J. Heat Mass Transfer 18 (1975) 1323-1329, doi 10.1016/0017-9310(75)90243-4',
  where: 'laminar equation',
  constantsFrom: 'page read',
  use: 'Isothermal plates; more exact than the equation for all Ra.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Ra: 100000000, Pr: 0.7 },
      value: 52.02258524,
      tolerance: 5.2e-5,
      source: 'open classroom code of convection after the tables of Incropera and DeWitt',
      where: 'vertical plate, laminar: 0.68, 0.670, 0.492',
    },
  ],
});
