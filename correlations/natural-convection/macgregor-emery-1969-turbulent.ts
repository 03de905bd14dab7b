import { published } from '../published.ts';

export const macgregorEmery1969Turbulent = published({
  id: 'macgregor-emery-1969-turbulent',
  authors: 'MacGregor and Emery',
  year: 1969,
  title: 'Vertical enclosure, height 1 to 40 gaps, high Ra',
  family: 'natural-convection',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Ra^a',
  values: { C: 0.046, a: 1 / 3 },
  groups: { Nu: 'Nu@gap,film', Ra: 'Ra@gap,film', Pr: 'Pr@film', H: 'length', s: 'gap' },
  limits: ['1e6 <= Ra <= 1e9', '1 <= Pr <= 20', '1 <= H / s <= 40'],
  accuracy: 'not stated',
  source: 'R. K. MacGregor, A. F. Emery, J. Heat Transfer 91 (1969) 391-403',
  where: 'enclosure',
  constantsFrom: 'page read',
  use: 'Between two walls: give the colder wall as temperature of the fluid, so that film is their mean.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Ra: 1000000, Pr: 0.7 },
      value: 4.6,
      tolerance: 4.6e-6,
      source: 'open classroom code of convection after the tables of Incropera and DeWitt',
      where: 'rectangular cavity: 0.046, 1/3',
    },
  ],
});
