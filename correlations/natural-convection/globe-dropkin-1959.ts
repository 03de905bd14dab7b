import { published } from '../published.ts';

export const globeDropkin1959 = published({
  id: 'globe-dropkin-1959',
  authors: 'Globe and Dropkin',
  year: 1959,
  title: 'Horizontal layer heated from below',
  family: 'natural-convection',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Ra^a * Pr^b',
  values: { C: 0.069, a: 1 / 3, b: 0.074 },
  groups: { Nu: 'Nu@gap,film', Ra: 'Ra@gap,film', Pr: 'Pr@film' },
  limits: ['3e5 <= Ra <= 7e9'],
  accuracy: 'not stated',
  source: 'S. Globe, D. Dropkin, J. Heat Transfer 81 (1959) 24-28',
  where: 'enclosure',
  constantsFrom: 'page read',
  use: 'Between two walls: give the colder wall as temperature of the fluid, so that film is their mean.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Ra: 1000000, Pr: 0.7 },
      value: 6.720264177,
      tolerance: 6.7e-6,
      source: 'open classroom code of convection after the tables of Incropera and DeWitt',
      where: 'rectangular cavity: 0.069, 1/3, 0.074',
    },
  ],
});
