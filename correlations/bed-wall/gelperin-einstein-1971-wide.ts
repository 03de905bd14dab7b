import { published } from '../published.ts';

export const gelperinEinstein1971Wide = published({
  id: 'gelperin-einstein-1971-wide',
  authors: 'Gelperin and Einstein',
  year: 1971,
  title: 'Horizontal tubes far apart in a bubbling bed, at the best gas velocity',
  family: 'bed-wall',
  transfer: 'heat',
  average: 'mean',
  reads: 'upper bound',
  form: 'Nu = C * Ar^a',
  values: { C: 0.74, a: 0.22 },
  groups: { Nu: 'Nu@particle', Ar: 'Ar@particle' },
  limits: [],
  accuracy: 'not stated',
  source:
    'N. I. Gelperin, V. G. Einstein, Heat Transfer in Fluidized Beds, in Davidson and Harrison (eds), Fluidization, Academic Press 1971, 471-540',
  where: 'tube bundle equation with its pitch factor at 1',
  constantsFrom: 'page read',
  use: 'Largest coefficient; pitches below about five tube diameters lower it. No range on the page read.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Ar: 300 },
      value: 2.5953647,
      tolerance: 5.2e-6,
      source: 'software of Thanheiser, Haider and Schwarzmayr 2021, doi 10.5281/zenodo.5500329',
      where: '0.74 Ar^0.22 times a pitch factor that tends to 1, evaluated at this point',
    },
  ],
});
