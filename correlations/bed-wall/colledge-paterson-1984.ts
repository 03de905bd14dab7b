import { published } from '../published.ts';

export const colledgePaterson1984 = published({
  id: 'colledge-paterson-1984',
  authors: 'Colledge and Paterson',
  year: 1984,
  title: 'Wall film of a packed tube',
  family: 'bed-wall',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * (1 - particle_diameter / vessel_diameter) * Re^a * Pr^b',
  values: { C: 0.523, a: 0.738, b: 1 / 3 },
  groups: { Nu: 'Nu@particle', Re: 'Re@particle', Pr: 'Pr', particle_diameter: 'particle_diameter', vessel_diameter: 'vessel_diameter' },
  limits: [],
  accuracy: 'not stated',
  source: 'R. A. Colledge, W. R. Paterson, Proc. 11th Annual Research Meeting (1984) 103-108',
  where: 'wall coefficient',
  constantsFrom: 'page read',
  use: 'Film at the wall beside an effective conductivity of the bed. No range on the page read.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 300, Pr: 0.7, particle_diameter: 0.006, vessel_diameter: 0.05 },
      value: 27.508434,
      tolerance: 5.5e-5,
      source: 'open reference on wall coefficients of fixed beds (in Chinese), table of correlations',
      where: '0.523 (1 - d_p/D) Pr^(1/3) Re^0.738, evaluated at this point',
    },
  ],
});
