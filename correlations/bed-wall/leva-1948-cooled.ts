import { published } from '../published.ts';

export const leva1948Cooled = published({
  id: 'leva-1948-cooled',
  authors: 'Leva, Weintraub, Grummer and Clark',
  year: 1948,
  title: 'Wall of a packed tube, gas cooled',
  family: 'bed-wall',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * exp(-B * particle_diameter / vessel_diameter) * Re^a',
  values: { C: 3.5, B: 4.6, a: 0.7 },
  groups: { Nu: 'Nu@vessel', Re: 'Re@particle', particle_diameter: 'particle_diameter', vessel_diameter: 'vessel_diameter' },
  limits: ['250 <= Re <= 3000', '3.7 <= vessel_diameter / particle_diameter <= 12.5'],
  accuracy: 'not stated',
  source: 'M. Leva, M. Weintraub, M. Grummer, E. L. Clark, Ind. Eng. Chem. 40 (1948) 747-752',
  where: 'h D/lambda = 3.5 exp(-4.6 d_p/D) Re^0.7',
  constantsFrom: 'page read',
  use: 'Overall coefficient between bed and wall; Nu on the bore of the tube. That it is the one for cooling is from memory.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 300, particle_diameter: 0.006, vessel_diameter: 0.05 },
      value: 109.22508,
      tolerance: 0.00022,
      source: 'open reference on wall coefficients of fixed beds (in Chinese), table of correlations',
      where: 'h d_p/lambda = 3.5 (d_p/D) exp(-4.6 d_p/D) Re^0.7, turned to Nu on D',
    },
  ],
});
