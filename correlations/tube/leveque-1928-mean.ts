import { published } from '../published.ts';

export const leveque1928Mean = published({
  id: 'leveque-1928-mean',
  authors: 'Leveque',
  year: 1928,
  title: 'Thermal entry of a laminar tube, constant wall temperature, mean',
  family: 'tube',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Gz_heat^a',
  values: { C: 1.615, a: 1 / 3 },
  groups: { Nu: 'Nu@pipe', Gz_heat: 'Gz_heat@pipe', Re: 'Re@pipe' },
  limits: ['Re <= 2300', 'Gz_heat >= 100'],
  accuracy: 'asymptote for short tubes',
  source: 'M. A. Leveque, Ann. Mines 13 (1928) 201-299, 305-362, 381-415',
  where: 'mean asymptote',
  constantsFrom: 'memory',
  use: 'Short tubes with developed flow, high Pr or Sc.',
  analogy: true,
  printed: [
    {
      kind: 'analytic limit',
      at: { Gz_heat: 1000.0 },
      value: 16.150982,
      tolerance: 0.005,
      source: 'closed form 3/2 (8/9)^(1/3)/Gamma(4/3)',
      where: 'Leveque solution, see Shah and London 1978',
    },
  ],
});
