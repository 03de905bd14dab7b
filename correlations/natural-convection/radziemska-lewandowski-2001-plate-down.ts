import { published } from '../published.ts';

export const radziemskaLewandowski2001PlateDown = published({
  id: 'radziemska-lewandowski-2001-plate-down',
  authors: 'Radziemska and Lewandowski',
  year: 2001,
  title: 'Horizontal plate, hot side down or cold side up',
  family: 'natural-convection',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Ra^a',
  values: { C: 0.52, a: 0.2 },
  groups: { Nu: 'Nu@length,film', Ra: 'Ra@length,film' },
  limits: ['1e4 <= Ra <= 1e9'],
  accuracy: 'not stated',
  source: 'E. Radziemska, W. M. Lewandowski, Appl. Energy 68 (2001) 347-366',
  where: 'power law of its range',
  constantsFrom: 'page read',
  use: 'Length is area over perimeter of the plate: give that as length.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Ra: 3162277.66 },
      value: 10.37536404,
      tolerance: 1e-5,
      source: 'open classroom code of convection after the tables of Incropera and DeWitt',
      where: 'horizontal plate, hot side down: 0.52 and 1/5',
    },
  ],
});
