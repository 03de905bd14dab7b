import { published } from '../published.ts';

export const mcadams1954PlateDown = published({
  id: 'mcadams-1954-plate-down',
  authors: 'McAdams',
  year: 1954,
  title: 'Horizontal plate, hot side down or cold side up',
  family: 'natural-convection',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Ra^a',
  values: { C: 0.27, a: 0.25 },
  groups: { Nu: 'Nu@length,film', Ra: 'Ra@length,film' },
  limits: ['1e5 <= Ra <= 1e10'],
  accuracy: 'not stated',
  source: 'W. H. McAdams, Heat Transmission, 3rd ed., McGraw-Hill 1954; length after Goldstein 1973',
  where: 'power law of its range',
  constantsFrom: 'page read',
  use: 'Length is area over perimeter of the plate: give that as length.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Ra: 31622776.6 },
      value: 20.24714365,
      tolerance: 2e-5,
      source: 'open study notes on free convection with their ranges',
      where: 'horizontal plate, hot side down: 0.27',
    },
  ],
});
