import { published } from '../published.ts';

export const yagiWakao1959High = published({
  id: 'yagi-wakao-1959-high',
  authors: 'Yagi and Wakao',
  year: 1959,
  title: 'Wall film of a packed tube, Re 40 to 2000',
  family: 'bed-wall',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Re^a',
  values: { C: 0.2, a: 0.8 },
  groups: { Nu: 'Nu@particle', Re: 'Re@particle', particle_diameter: 'particle_diameter', vessel_diameter: 'vessel_diameter' },
  limits: ['40 <= Re <= 2000', '6 <= vessel_diameter / particle_diameter <= 47'],
  accuracy: 'not stated',
  source: 'S. Yagi, N. Wakao, AIChE J. 5 (1959) 79-85',
  where: 'branch from Re 40',
  constantsFrom: 'page read',
  use: 'Film at the wall beside an effective conductivity of the bed.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 300 },
      value: 19.17463,
      tolerance: 3.8e-5,
      source: 'open reference on wall coefficients of fixed beds (in Chinese), table of correlations',
      where: '0.2 Re^0.8 from Re 40, evaluated at this point',
    },
  ],
});
