import { published } from '../published.ts';

export const shahLondon1978ChannelOneWall = published({
  id: 'shah-london-1978-channel-one-wall',
  authors: 'Shah and London',
  year: 1978,
  title: 'Developed laminar flow in a flat membrane channel, one wall permeable',
  family: 'membrane',
  transfer: 'mass',
  average: 'fully developed',
  reads: 'mean line',
  form: 'Sh = C',
  values: { C: 4.861 },
  groups: { Sh: 'Sh@hydraulic', Gz_mass: 'Gz_mass@hydraulic', Re: 'Re@hydraulic' },
  limits: ['Re <= 2000', 'Gz_mass <= 12'],
  accuracy: 'exact for constant properties',
  source: 'R. K. Shah, A. L. London, Laminar Flow Forced Convection in Ducts, Academic Press 1978',
  where: 'parallel plates, constant wall concentration',
  constantsFrom: 'memory',
  use: 'Long empty channel; a floor.',
  analogy: true,
  printed: [
    {
      kind: 'analytic limit',
      at: {},
      value: 4.8608,
      tolerance: 0.001,
      source: 'R. K. Shah, A. L. London, Laminar Flow Forced Convection in Ducts, Academic Press 1978',
      where: 'value from memory; finite differences in test/correlations/fixtures/channel-eigenvalues.py give the same',
    },
  ],
});
