import { published } from '../published.ts';

export const demirel2000 = published({
  id: 'demirel-2000',
  authors: 'Demirel, Sharma and Al-Ali',
  year: 2000,
  title: 'Wall film of a packed channel of low ratio',
  family: 'bed-wall',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Re^a',
  values: { C: 0.047, a: 0.927 },
  groups: { Nu: 'Nu@particle', Re: 'Re@particle', particle_diameter: 'particle_diameter', vessel_diameter: 'vessel_diameter' },
  limits: ['200 <= Re <= 1450', '4 <= vessel_diameter / particle_diameter <= 7.5'],
  accuracy: 'not stated',
  source: 'Y. Demirel, R. N. Sharma, H. H. Al-Ali, Int. J. Heat Mass Transfer 43 (2000) 327-332',
  where: 'wall coefficient',
  constantsFrom: 'page read',
  use: 'Film at the wall beside an effective conductivity of the bed.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 300 },
      value: 9.297994,
      tolerance: 1.9e-5,
      source: 'open reference on wall coefficients of fixed beds (in Chinese), table of correlations',
      where: '0.047 Re^0.927, evaluated at this point',
    },
  ],
});
