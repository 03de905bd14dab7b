import { published } from '../published.ts';

export const leva1947Heated = published({
  id: 'leva-1947-heated',
  authors: 'Leva',
  year: 1947,
  title: 'Wall of a packed tube, gas heated',
  family: 'bed-wall',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * exp(-B * particle_diameter / vessel_diameter) * Re^a',
  values: { C: 0.813, B: 6, a: 0.9 },
  groups: { Nu: 'Nu@vessel', Re: 'Re@particle', particle_diameter: 'particle_diameter', vessel_diameter: 'vessel_diameter' },
  limits: ['250 <= Re <= 3000', '3.3 <= vessel_diameter / particle_diameter <= 20'],
  accuracy: 'not stated',
  source: 'M. Leva, Ind. Eng. Chem. 39 (1947) 857-862',
  where: 'h D/lambda = 0.813 exp(-6 d_p/D) Re^0.9',
  constantsFrom: 'page read',
  use: 'Overall coefficient between bed and wall; Nu on the bore of the tube. Some date it 1948 (Leva and Grummer).',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 300, particle_diameter: 0.006, vessel_diameter: 0.05 },
      value: 67.113154,
      tolerance: 0.00013,
      source: 'open reference on wall coefficients of fixed beds (in Chinese), table of correlations',
      where: 'h d_p/lambda = 0.813 (d_p/D) exp(-6 d_p/D) Re^0.9, turned to Nu on D',
    },
  ],
});
