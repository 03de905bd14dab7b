import { published } from '../published.ts';

export const yagiWakao1959Low = published({
  id: 'yagi-wakao-1959-low',
  authors: 'Yagi and Wakao',
  year: 1959,
  title: 'Wall film of a packed tube, Re 20 to 40',
  family: 'bed-wall',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Re^a',
  values: { C: 0.6, a: 0.5 },
  groups: { Nu: 'Nu@particle', Re: 'Re@particle', particle_diameter: 'particle_diameter', vessel_diameter: 'vessel_diameter' },
  limits: ['20 <= Re <= 40', '6 <= vessel_diameter / particle_diameter <= 47'],
  accuracy: 'not stated',
  source: 'S. Yagi, N. Wakao, AIChE J. 5 (1959) 79-85',
  where: 'branch below Re 40',
  constantsFrom: 'page read',
  use: 'Film at the wall beside an effective conductivity of the bed.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 30 },
      value: 3.2863353,
      tolerance: 6.6e-6,
      source: 'open reference on wall coefficients of fixed beds (in Chinese), table of correlations',
      where: '0.6 Re^0.5 below Re 40, evaluated at this point',
    },
  ],
});
