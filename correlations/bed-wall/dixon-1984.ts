import { published } from '../published.ts';

export const dixon1984 = published({
  id: 'dixon-1984',
  authors: 'Dixon, DiCostanzo and Soucy',
  year: 1984,
  title: 'Wall film of a packed tube',
  family: 'bed-wall',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = (1 - C * (particle_diameter / vessel_diameter)^m) * Re^a * Pr^b',
  values: { C: 1.5, m: 1.5, a: 0.59, b: 1 / 3 },
  groups: { Nu: 'Nu@particle', Re: 'Re@particle', Pr: 'Pr', particle_diameter: 'particle_diameter', vessel_diameter: 'vessel_diameter' },
  limits: ['50 <= Re <= 500', '3 <= vessel_diameter / particle_diameter <= 12'],
  accuracy: 'not stated',
  source: 'A. G. Dixon, M. A. DiCostanzo, B. A. Soucy, Int. J. Heat Mass Transfer 27 (1984) 1701-1713',
  where: 'wall coefficient',
  constantsFrom: 'page read',
  use: 'Film at the wall beside an effective conductivity of the bed.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 300, Pr: 0.7, particle_diameter: 0.006, vessel_diameter: 0.05 },
      value: 24.093869,
      tolerance: 4.8e-5,
      source: 'open reference on wall coefficients of fixed beds (in Chinese), table of correlations',
      where: '(1 - 1.5 (d_p/D)^1.5) Pr^(1/3) Re^0.59, evaluated at this point',
    },
  ],
});
