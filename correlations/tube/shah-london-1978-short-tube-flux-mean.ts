import { published } from '../published.ts';

export const shahLondon1978ShortTubeFluxMean = published({
  id: 'shah-london-1978-short-tube-flux-mean',
  authors: 'Shah and London',
  year: 1978,
  title: 'Thermal entry of a laminar tube, constant wall flux, mean',
  family: 'tube',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Gz_heat^a',
  values: { C: 1.953, a: 1 / 3 },
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
      value: 19.52976016,
      tolerance: 0.005,
      source: 'closed form (8/9)^(1/3) Gamma(2/3) times 3/2',
      where: 'Leveque solution for constant flux',
    },
  ],
});
