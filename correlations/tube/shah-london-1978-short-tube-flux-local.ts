import { published } from '../published.ts';

export const shahLondon1978ShortTubeFluxLocal = published({
  id: 'shah-london-1978-short-tube-flux-local',
  authors: 'Shah and London',
  year: 1978,
  title: 'Thermal entry of a laminar tube, constant wall flux, local',
  family: 'tube',
  transfer: 'heat',
  average: 'local',
  reads: 'mean line',
  form: 'Nu = C * Gz_heat^a',
  values: { C: 1.302, a: 1 / 3 },
  groups: { Nu: 'Nu@pipe', Gz_heat: 'Gz_heat@pipe', Re: 'Re@pipe' },
  limits: ['Re <= 2300', 'Gz_heat >= 1000'],
  accuracy: 'asymptote for short tubes',
  source: 'R. K. Shah, A. L. London, Laminar Flow Forced Convection in Ducts, Academic Press 1978',
  where: 'asymptote of the short tube',
  constantsFrom: 'memory',
  use: 'Short tubes with a developed velocity profile, high Pr or Sc.',
  analogy: true,
  printed: [
    {
      kind: 'analytic limit',
      at: { Gz_heat: 1000 },
      value: 13.01984011,
      tolerance: 0.005,
      source: 'closed form (8/9)^(1/3) Gamma(2/3)',
      where: 'Leveque solution for constant flux',
    },
  ],
});
