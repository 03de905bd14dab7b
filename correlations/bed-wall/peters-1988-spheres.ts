import { published } from '../published.ts';

export const peters1988Spheres = published({
  id: 'peters-1988-spheres',
  authors: 'Peters, Schiffino and Harriott',
  year: 1988,
  title: 'Wall film of a tube packed with spheres',
  family: 'bed-wall',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * (particle_diameter / vessel_diameter)^m * Re^a * Pr^b',
  values: { C: 4.9, m: 0.26, a: 0.45, b: 1 / 3 },
  groups: { Nu: 'Nu@particle', Re: 'Re@particle', Pr: 'Pr', particle_diameter: 'particle_diameter', vessel_diameter: 'vessel_diameter' },
  limits: ['200 <= Re <= 8000', '3 <= vessel_diameter / particle_diameter <= 11'],
  accuracy: 'not stated',
  source: 'P. E. Peters, R. S. Schiffino, P. Harriott, Ind. Eng. Chem. Res. 27 (1988) 226-233, doi 10.1021/ie00074a003',
  where: 'spheres',
  constantsFrom: 'page read',
  use: 'Film at the wall beside an effective conductivity of the bed. Another page begins at Re 800.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 900, Pr: 0.7, particle_diameter: 0.006, vessel_diameter: 0.05 },
      value: 53.525206,
      tolerance: 0.00011,
      source: 'open reference on wall coefficients of fixed beds (in Chinese), table of correlations',
      where: '4.9 (d_p/D)^0.26 Pr^(1/3) Re^0.45, evaluated at this point',
    },
  ],
});
