import { published } from '../published.ts';

export const mcadams1954PlateUpLaminar = published({
  id: 'mcadams-1954-plate-up-laminar',
  authors: 'McAdams',
  year: 1954,
  title: 'Horizontal plate, hot side up or cold side down, laminar',
  family: 'natural-convection',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Ra^a',
  values: { C: 0.54, a: 0.25 },
  groups: { Nu: 'Nu@length,film', Ra: 'Ra@length,film' },
  limits: ['1e4 <= Ra <= 1e7'],
  accuracy: 'not stated',
  source: 'W. H. McAdams, Heat Transmission, 3rd ed., McGraw-Hill 1954; length after Goldstein 1973',
  where: 'power law of its range',
  constantsFrom: 'page read',
  use: 'Length is area over perimeter of the plate: give that as length.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Ra: 316227.766 },
      value: 12.80541801,
      tolerance: 1.3e-5,
      source: 'open classroom code of convection after the tables of Incropera and DeWitt',
      where: 'horizontal plate, hot side up: 0.54',
    },
  ],
});
