import { published } from '../published.ts';

export const sherwoodPigfordWilke1975 = published({
  id: 'sherwood-pigford-wilke-1975',
  authors: 'Sherwood, Pigford and Wilke',
  year: 1975,
  title: 'Packed bed of spheres, gas',
  family: 'packed-bed',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'j_mass = C * Re^a',
  values: { C: 1.17, a: -0.415 },
  groups: { j_mass: 'j_mass', Re: 'Re@particle' },
  limits: ['10 <= Re <= 2500'],
  accuracy: 'not stated',
  source: 'T. K. Sherwood, R. L. Pigford, C. R. Wilke, Mass Transfer, McGraw-Hill 1975',
  where: 'j factor of beds of spheres',
  constantsFrom: 'page read',
  use: 'Spheres in gas; superficial velocity.',
  analogy: true,
  printed: [
    {
      kind: 'worked example',
      at: { Re: 1822.916667 },
      value: 0.052,
      tolerance: 0.0005,
      source: 'Benitez, Principles and Modern Applications of Mass Transfer Operations, 2nd ed., Wiley 2009',
      where: 'Example 2.13: j rounded to 0.052 in the solution',
    },
  ],
});
