import { published } from '../published.ts';

export const catton1978Tall = published({
  id: 'catton-1978-tall',
  authors: 'Catton',
  year: 1978,
  title: 'Vertical enclosure, height 2 to 10 gaps',
  family: 'natural-convection',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * (Pr / (D + Pr) * Ra)^a * (H / s)^b',
  values: { C: 0.22, D: 0.2, a: 0.28, b: -0.25 },
  groups: { Nu: 'Nu@gap,film', Ra: 'Ra@gap,film', Pr: 'Pr@film', H: 'length', s: 'gap' },
  limits: ['1e3 <= Ra <= 1e10', 'Pr <= 1e5', '2 <= H / s <= 10'],
  accuracy: 'not stated',
  source: 'I. Catton, Proc. 6th Int. Heat Transfer Conf. 6 (1978) 13-31',
  where: 'enclosure',
  constantsFrom: 'page read',
  use: 'Between two walls: give the colder wall as temperature of the fluid, so that film is their mean.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Ra: 1000000, Pr: 0.7, H: 5, s: 1 },
      value: 6.563261804,
      tolerance: 6.6e-6,
      source: 'open classroom code of convection after the tables of Incropera and DeWitt',
      where: 'rectangular cavity: 0.22, 0.28, -1/4',
    },
  ],
});
