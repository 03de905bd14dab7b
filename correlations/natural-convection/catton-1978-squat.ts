import { published } from '../published.ts';

export const catton1978Squat = published({
  id: 'catton-1978-squat',
  authors: 'Catton',
  year: 1978,
  title: 'Vertical enclosure, height 1 to 2 gaps',
  family: 'natural-convection',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * (Pr / (D + Pr) * Ra)^a',
  values: { C: 0.18, D: 0.2, a: 0.29 },
  groups: { Nu: 'Nu@gap,film', Ra: 'Ra@gap,film', Pr: 'Pr@film', H: 'length', s: 'gap' },
  limits: ['Ra * Pr / (0.2 + Pr) >= 1e3', '1e-3 <= Pr <= 1e5', '1 <= H / s <= 2'],
  accuracy: 'not stated',
  source: 'I. Catton, Proc. 6th Int. Heat Transfer Conf. 6 (1978) 13-31',
  where: 'enclosure',
  constantsFrom: 'page read',
  use: 'Between two walls: give the colder wall as temperature of the fluid, so that film is their mean.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Ra: 1000000, Pr: 0.7 },
      value: 9.196458364,
      tolerance: 9.2e-6,
      source: 'open classroom code of convection after the tables of Incropera and DeWitt',
      where: 'rectangular cavity: 0.18, 0.2, 0.29',
    },
  ],
});
