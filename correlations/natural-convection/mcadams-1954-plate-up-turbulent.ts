import { published } from '../published.ts';

export const mcadams1954PlateUpTurbulent = published({
  id: 'mcadams-1954-plate-up-turbulent',
  authors: 'McAdams',
  year: 1954,
  title: 'Horizontal plate, hot side up or cold side down, turbulent',
  family: 'natural-convection',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Ra^a',
  values: { C: 0.15, a: 1 / 3 },
  groups: { Nu: 'Nu@length,film', Ra: 'Ra@length,film' },
  limits: ['1e7 <= Ra <= 1e11'],
  accuracy: 'not stated',
  source: 'W. H. McAdams, Heat Transmission, 3rd ed., McGraw-Hill 1954; length after Goldstein 1973',
  where: 'power law of its range',
  constantsFrom: 'page read',
  use: 'Length is area over perimeter of the plate: give that as length.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Ra: 1000000000 },
      value: 150,
      tolerance: 0.00015,
      source: 'open classroom code of convection after the tables of Incropera and DeWitt',
      where: 'horizontal plate, hot side up: 0.15',
    },
  ],
});
