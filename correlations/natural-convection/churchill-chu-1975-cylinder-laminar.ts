import { published } from '../published.ts';

export const churchillChu1975CylinderLaminar = published({
  id: 'churchill-chu-1975-cylinder-laminar',
  authors: 'Churchill and Chu',
  year: 1975,
  title: 'Horizontal cylinder, free convection, laminar',
  family: 'natural-convection',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = A + B * Ra^0.25 / (1 + (D / Pr)^(9/16))^(4/9)',
  values: { A: 0.36, B: 0.518, D: 0.559 },
  groups: { Nu: 'Nu@cylinder,film', Ra: 'Ra@cylinder,film', Pr: 'Pr@film' },
  limits: ['1e-6 <= Ra <= 1e9'],
  accuracy: 'not stated',
  source: 'S. W. Churchill, H. H. S. Chu, Int. J. Heat Mass Transfer 18 (1975) 1049-1053, doi 10.1016/0017-9310(75)90222-7',
  where: 'laminar equation',
  constantsFrom: 'page read',
  use: 'Long isothermal cylinders.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Ra: 1000000, Pr: 0.7 },
      value: 12.72982196,
      tolerance: 1.3e-5,
      source: 'open code of a finned pipe in air',
      where: '0.36, 0.518, 0.559 (the page applies it above Ra 1e9, against its authors)',
    },
  ],
});
