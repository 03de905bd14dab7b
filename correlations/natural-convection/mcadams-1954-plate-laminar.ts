import { published } from '../published.ts';

export const mcadams1954PlateLaminar = published({
  id: 'mcadams-1954-plate-laminar',
  authors: 'McAdams',
  year: 1954,
  title: 'Vertical plate, free convection, laminar',
  family: 'natural-convection',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Ra^a',
  values: { C: 0.59, a: 0.25 },
  groups: { Nu: 'Nu@plate,film', Ra: 'Ra@plate,film' },
  limits: ['1e4 <= Ra <= 1e9'],
  accuracy: 'not stated',
  source: 'W. H. McAdams, Heat Transmission, 3rd ed., McGraw-Hill 1954',
  where: 'power law of its range',
  constantsFrom: 'page read',
  use: 'Quick estimate.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Ra: 3162277.66 },
      value: 24.8800937,
      tolerance: 2.5e-5,
      source: 'open study notes on free convection with their ranges',
      where: 'vertical plate, rough calculation: 0.59',
    },
  ],
});
