import { published } from '../published.ts';

export const leveque1928Fibre = published({
  id: 'leveque-1928-fibre',
  authors: 'Leveque',
  year: 1928,
  title: 'Laminar flow inside a hollow fibre, short, mean',
  family: 'membrane',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'Sh = C * Gz_mass^a',
  values: { C: 1.615, a: 1 / 3 },
  groups: { Sh: 'Sh@pipe', Gz_mass: 'Gz_mass@pipe', Re: 'Re@pipe' },
  limits: ['Re <= 2300', 'Gz_mass >= 100'],
  accuracy: 'asymptote',
  source: 'M. A. Leveque, Ann. Mines 13 (1928) 201-299, 305-362, 381-415',
  where: 'mean asymptote; 1.62 in membrane papers',
  constantsFrom: 'memory',
  use: 'Lumen of hollow fibres at high flow.',
  analogy: true,
  printed: [
    {
      kind: 'analytic limit',
      at: { Gz_mass: 1000 },
      value: 16.15098165,
      tolerance: 0.005,
      source: 'closed form 3/2 (8/9)^(1/3)/Gamma(4/3)',
      where: 'Leveque solution',
    },
  ],
});
