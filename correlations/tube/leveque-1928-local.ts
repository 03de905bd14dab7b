import { published } from '../published.ts';

export const leveque1928Local = published({
  id: 'leveque-1928-local',
  authors: 'Leveque',
  year: 1928,
  title: 'Thermal entry of a laminar tube, constant wall temperature, local at the length',
  family: 'tube',
  transfer: 'heat',
  average: 'local',
  reads: 'mean line',
  form: 'Nu = C * Gz_heat^a',
  values: { C: 1.077, a: 1 / 3 },
  groups: { Nu: 'Nu@pipe', Gz_heat: 'Gz_heat@pipe', Re: 'Re@pipe' },
  limits: ['Re <= 2300', 'Gz_heat >= 100'],
  accuracy: 'asymptote for short tubes',
  source: 'M. A. Leveque, Ann. Mines 13 (1928) 201-299, 305-362, 381-415',
  where: 'local asymptote',
  constantsFrom: 'memory',
  use: 'Local value at the distance given as length; developed velocity profile.',
  analogy: true,
  printed: [
    {
      kind: 'analytic limit',
      at: { Gz_heat: 1000 },
      value: 10.7673211,
      tolerance: 0.005,
      source: 'closed form (8/9)^(1/3)/Gamma(4/3)',
      where: 'Leveque solution, see Shah and London 1978',
    },
  ],
});
