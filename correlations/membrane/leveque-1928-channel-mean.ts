import { published } from '../published.ts';

export const leveque1928ChannelMean = published({
  id: 'leveque-1928-channel-mean',
  authors: 'Leveque',
  year: 1928,
  title: 'Laminar flow in a flat membrane channel, short, mean',
  family: 'membrane',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'Sh = C * Gz_mass^a',
  values: { C: 1.849, a: 1 / 3 },
  groups: { Sh: 'Sh@hydraulic', Gz_mass: 'Gz_mass@hydraulic', Re: 'Re@hydraulic' },
  limits: ['Re <= 2000', 'Gz_mass >= 100'],
  accuracy: 'asymptote',
  source: 'M. A. Leveque, Ann. Mines 13 (1928) 201-299, 305-362, 381-415; Shah and London 1978',
  where: 'asymptote of the parallel-plate channel',
  constantsFrom: 'memory',
  use: 'Empty flat channel, no spacer; the hydraulic diameter is twice the height.',
  analogy: true,
  printed: [
    {
      kind: 'analytic limit',
      at: { Gz_mass: 1000 },
      value: 18.48825872,
      tolerance: 0.006,
      source: 'closed form (12/9)^(1/3)/Gamma(4/3) times 3/2',
      where: 'Leveque solution with the wall shear 12 u/d_h of the flat channel',
    },
  ],
});
