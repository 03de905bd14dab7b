import { published } from '../published.ts';

export const mcadams1954Cylinder = published({
  id: 'mcadams-1954-cylinder',
  authors: 'McAdams',
  year: 1954,
  title: 'Horizontal cylinder, laminar free convection',
  family: 'natural-convection',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Ra^a',
  values: { C: 0.53, a: 0.25 },
  groups: { Nu: 'Nu@cylinder,film', Ra: 'Ra@cylinder,film' },
  limits: ['1e4 <= Ra <= 1e9'],
  accuracy: 'not stated',
  source: 'W. H. McAdams, Heat Transmission, 3rd ed., McGraw-Hill 1954',
  where: 'horizontal cylinders, laminar range',
  constantsFrom: 'memory',
  use: 'Quick estimate for pipes in still fluid.',
  analogy: false,
  printed: [
    {
      kind: 'worked example',
      at: { Ra: 157100000.0 },
      value: 59.331298,
      tolerance: 0.0447,
      source: 'Holman, Heat Transfer, 10th ed., McGraw-Hill 2010',
      where: 'Example 7-5: printed h 6.63 (memory), turned to Nu',
    },
  ],
});
