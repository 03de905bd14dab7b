import { published } from '../published.ts';

export const macgregorEmery1969Laminar = published({
  id: 'macgregor-emery-1969-laminar',
  authors: 'MacGregor and Emery',
  year: 1969,
  title: 'Vertical enclosure, height 10 to 40 gaps, moderate Ra',
  family: 'natural-convection',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Ra^a * Pr^b * (H / s)^m',
  values: { C: 0.42, a: 0.25, b: 0.012, m: -0.3 },
  groups: { Nu: 'Nu@gap,film', Ra: 'Ra@gap,film', Pr: 'Pr@film', H: 'length', s: 'gap' },
  limits: ['1e4 <= Ra <= 1e7', '1 <= Pr <= 2e4', '10 <= H / s <= 40'],
  accuracy: 'not stated',
  source: 'R. K. MacGregor, A. F. Emery, J. Heat Transfer 91 (1969) 391-403',
  where: 'enclosure',
  constantsFrom: 'page read',
  use: 'Between two walls: give the colder wall as temperature of the fluid, so that film is their mean.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Ra: 1000000, Pr: 0.7, H: 5, s: 1 },
      value: 8.160174869,
      tolerance: 8.2e-6,
      source: 'open classroom code of convection after the tables of Incropera and DeWitt',
      where: 'rectangular cavity: 0.42, 0.25, 0.012, -0.3',
    },
  ],
});
