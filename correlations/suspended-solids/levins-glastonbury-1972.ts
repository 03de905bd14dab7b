import { published } from '../published.ts';

export const levinsGlastonbury1972 = published({
  id: 'levins-glastonbury-1972',
  authors: 'Levins and Glastonbury',
  year: 1972,
  title: 'Particles of the density of the liquid in a stirred vessel',
  family: 'suspended-solids',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'Sh = A + C * (Re * (impeller_diameter / vessel_diameter)^m)^a * Sc^b',
  values: { A: 2, C: 0.47, m: 0.28, a: 0.62, b: 0.36 },
  groups: {
    Sh: 'Sh@particle',
    Re: 'Re@energy-dissipation',
    Sc: 'Sc',
    impeller_diameter: 'impeller_diameter',
    vessel_diameter: 'vessel_diameter',
  },
  limits: [],
  accuracy: 'not stated',
  source: 'D. M. Levins, J. R. Glastonbury, Trans. Inst. Chem. Eng. 50 (1972) 132-146',
  where: 'Sh = 2 + 0.47 Re^0.62 (d/D)^0.17 Sc^0.36 in books; 0.28 inside the bracket gives 0.174',
  constantsFrom: 'page read',
  use: 'Particles that follow the flow; Re on power per mass. No range on the page read.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 150, impeller_diameter: 0.12, vessel_diameter: 0.42, Sc: 800 },
      value: 95.742519,
      tolerance: 0.00019,
      source: 'J. Kolar 2021, open code calc_G.m',
      where: 'branch for Levins and Glastonbury 1972: Shp = 2 + 0.47 (Re D^0.28)^0.62 Sc^0.36, evaluated at this point',
    },
  ],
});
