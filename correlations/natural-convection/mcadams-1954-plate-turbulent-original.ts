import { published } from '../published.ts';

export const mcadams1954PlateTurbulentOriginal = published({
  id: 'mcadams-1954-plate-turbulent-original',
  authors: 'McAdams',
  year: 1954,
  title: 'Vertical plate, free convection, turbulent, original constant',
  family: 'natural-convection',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Ra^a',
  values: { C: 0.13, a: 1 / 3 },
  groups: { Nu: 'Nu@plate,film', Ra: 'Ra@plate,film' },
  limits: ['1e9 <= Ra <= 1e12'],
  accuracy: 'not stated',
  source: 'W. H. McAdams, Heat Transmission, 3rd ed., McGraw-Hill 1954',
  where: 'power law of its range',
  constantsFrom: 'page read',
  use: 'Quick estimate; later books print 0.10.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Ra: 31622776600 },
      value: 411.0960958,
      tolerance: 0.00041,
      source: 'Som, Introduction to Heat Transfer, worked companion script',
      where: 'Example 5.7: 0.13 and 1/3',
    },
  ],
});
