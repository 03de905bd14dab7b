import { published } from '../published.ts';

export const olbrichPotter1972 = published({
  id: 'olbrich-potter-1972',
  authors: 'Olbrich and Potter',
  year: 1972,
  title: 'Wall film of a packed tube',
  family: 'bed-wall',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^b',
  values: { C: 8.9, a: 0.34, b: 1 / 3 },
  groups: { Nu: 'Nu@particle', Re: 'Re@particle', Pr: 'Pr', particle_diameter: 'particle_diameter', vessel_diameter: 'vessel_diameter' },
  limits: ['100 <= Re <= 3000', '4.06 <= vessel_diameter / particle_diameter <= 26.6'],
  accuracy: 'not stated',
  source: 'W. E. Olbrich, O. E. Potter, Chem. Eng. Sci. 27 (1972) 1723-1732',
  where: 'wall coefficient',
  constantsFrom: 'page read',
  use: 'Film at the wall beside an effective conductivity of the bed.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 300, Pr: 0.7 },
      value: 54.951208,
      tolerance: 0.00011,
      source: 'open reference on wall coefficients of fixed beds (in Chinese), table of correlations',
      where: '8.9 Pr^(1/3) Re^0.34, evaluated at this point',
    },
  ],
});
