import { published } from '../published.ts';

export const liFinlayson1977Cylinders = published({
  id: 'li-finlayson-1977-cylinders',
  authors: 'Li and Finlayson',
  year: 1977,
  title: 'Wall film of a tube packed with cylinders',
  family: 'bed-wall',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Re^a',
  values: { C: 0.16, a: 0.93 },
  groups: { Nu: 'Nu@particle', Re: 'Re@particle', particle_diameter: 'particle_diameter', vessel_diameter: 'vessel_diameter' },
  limits: ['20 <= Re <= 7600', '3.3 <= vessel_diameter / particle_diameter <= 20'],
  accuracy: 'not stated',
  source: 'C.-H. Li, B. A. Finlayson, Chem. Eng. Sci. 32 (1977) 1055-1066',
  where: 'cylinders',
  constantsFrom: 'page read',
  use: 'Film at the wall beside an effective conductivity of the bed. The range is printed for both shapes together.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 300 },
      value: 32.199027,
      tolerance: 6.4e-5,
      source: 'open code of catalyst pellets in a tube, turb_Nu_Li and turb_Nu_Peters',
      where: '0.16 Re^0.93 for cylinders, evaluated at this point',
    },
  ],
});
