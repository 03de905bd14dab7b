import { published } from '../published.ts';

export const shahLondon1978ChannelOneWallFlux = published({
  id: 'shah-london-1978-channel-one-wall-flux',
  authors: 'Shah and London',
  year: 1978,
  title: 'Developed laminar flow in a flat membrane channel, one wall, constant flux',
  family: 'membrane',
  transfer: 'mass',
  average: 'fully developed',
  reads: 'mean line',
  form: 'Sh = C',
  values: { C: 5.385 },
  groups: { Sh: 'Sh@hydraulic', Gz_mass: 'Gz_mass@hydraulic', Re: 'Re@hydraulic' },
  limits: ['Re <= 2000', 'Gz_mass <= 12'],
  accuracy: 'exact for constant properties',
  source: 'R. K. Shah, A. L. London, Laminar Flow Forced Convection in Ducts, Academic Press 1978',
  where: 'parallel plates, constant flux',
  constantsFrom: 'memory',
  use: 'Long empty channel at low recovery.',
  analogy: true,
  printed: [
    {
      kind: 'analytic limit',
      at: {},
      value: 5.384615385,
      tolerance: 0.0005,
      source: 'closed form 70/13',
      where: 'parabolic profile integrated twice',
    },
  ],
});
