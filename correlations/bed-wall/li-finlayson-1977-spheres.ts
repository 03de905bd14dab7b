import { published } from '../published.ts';

export const liFinlayson1977Spheres = published({
  id: 'li-finlayson-1977-spheres',
  authors: 'Li and Finlayson',
  year: 1977,
  title: 'Wall film of a tube packed with spheres',
  family: 'bed-wall',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Re^a',
  values: { C: 0.17, a: 0.79 },
  groups: { Nu: 'Nu@particle', Re: 'Re@particle', particle_diameter: 'particle_diameter', vessel_diameter: 'vessel_diameter' },
  limits: ['20 <= Re <= 7600', '3.3 <= vessel_diameter / particle_diameter <= 20'],
  accuracy: 'not stated',
  source: 'C.-H. Li, B. A. Finlayson, Chem. Eng. Sci. 32 (1977) 1055-1066',
  where: 'spheres',
  constantsFrom: 'page read',
  use: 'Film at the wall beside an effective conductivity of the bed. Another page gives Re 1 to 1000.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 300 },
      value: 15.394823,
      tolerance: 3.1e-5,
      source: 'open code of catalyst pellets in a tube, turb_Nu_Li and turb_Nu_Peters',
      where: '0.17 Re^0.79 for spheres, 20 to 7600, evaluated at this point',
    },
  ],
});
