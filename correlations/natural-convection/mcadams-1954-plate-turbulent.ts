import { published } from '../published.ts';

export const mcadams1954PlateTurbulent = published({
  id: 'mcadams-1954-plate-turbulent',
  authors: 'McAdams',
  year: 1954,
  title: 'Vertical plate, free convection, turbulent',
  family: 'natural-convection',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Ra^a',
  values: { C: 0.1, a: 1 / 3 },
  groups: { Nu: 'Nu@plate,film', Ra: 'Ra@plate,film' },
  limits: ['1e9 <= Ra <= 1e13'],
  accuracy: 'not stated',
  source: 'W. H. McAdams, Heat Transmission, 3rd ed., McGraw-Hill 1954; textbook constant',
  where: 'power law of its range',
  constantsFrom: 'page read',
  use: 'Quick estimate; McAdams himself gives 0.13.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Ra: 100000000000 },
      value: 464.1588834,
      tolerance: 0.00046,
      source: 'open study notes on free convection with their ranges',
      where: 'vertical plate, rough calculation: 0.1',
    },
  ],
});
