import { published } from '../published.ts';

export const laguerre2006 = published({
  id: 'laguerre-2006',
  authors: 'Laguerre, Ben Amara and Flick',
  year: 2006,
  title: 'Wall film of a packed bed of large spheres in air',
  family: 'bed-wall',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^b',
  values: { C: 1.56, a: 0.42, b: 1 / 3 },
  groups: { Nu: 'Nu@particle', Re: 'Re@particle', Pr: 'Pr', particle_diameter: 'particle_diameter', vessel_diameter: 'vessel_diameter' },
  limits: ['100 <= Re <= 400', '4.5 <= vessel_diameter / particle_diameter <= 5.5'],
  accuracy: 'not stated',
  source: 'O. Laguerre, S. Ben Amara, D. Flick, Appl. Therm. Eng. 26 (2006) 1951-1960',
  where: 'wall coefficient',
  constantsFrom: 'page read',
  use: 'Measured at 5 spheres across the bed; the half diameter either side is ours.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 300, Pr: 0.7 },
      value: 15.201328,
      tolerance: 3e-5,
      source: 'open reference on wall coefficients of fixed beds (in Chinese), table of correlations',
      where: '1.56 Pr^(1/3) Re^0.42, D/d_p 5.0, evaluated at this point',
    },
  ],
});
