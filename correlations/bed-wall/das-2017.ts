import { published } from '../published.ts';

export const das2017 = published({
  id: 'das-2017',
  authors: 'Das, Deen and Kuipers',
  year: 2017,
  title: 'Wall film of a slender packed tube, computed',
  family: 'bed-wall',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = A + C * Re^a * Pr^b',
  values: { A: 1.351, C: 0.1124, a: 0.878, b: 1 / 3 },
  groups: { Nu: 'Nu@particle', Re: 'Re@particle', Pr: 'Pr', particle_diameter: 'particle_diameter', vessel_diameter: 'vessel_diameter' },
  limits: ['1 <= Re <= 500', '4 <= vessel_diameter / particle_diameter <= 8'],
  accuracy: 'not stated',
  source: 'S. Das, N. G. Deen, J. A. M. Kuipers, Chem. Eng. Sci. 160 (2017) 1-19',
  where: 'wall coefficient',
  constantsFrom: 'page read',
  use: 'From resolved simulations of spheres in gas.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 300, Pr: 0.7 },
      value: 16.280484,
      tolerance: 3.3e-5,
      source: 'open reference on wall coefficients of fixed beds (in Chinese), table of correlations',
      where: '1.351 + 0.1124 Pr^(1/3) Re^0.878, evaluated at this point',
    },
  ],
});
