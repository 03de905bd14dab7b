import { published } from '../published.ts';

export const laminarTubeWallFlux = published({
  id: 'laminar-tube-wall-flux',
  authors: 'Nusselt',
  year: 1910,
  title: 'Developed laminar flow in a tube, constant wall flux',
  family: 'tube',
  transfer: 'heat',
  average: 'fully developed',
  reads: 'mean line',
  form: 'Nu = C',
  values: { C: 48 / 11 },
  groups: { Nu: 'Nu@pipe', Re: 'Re@pipe', Gz_heat: 'Gz_heat@pipe' },
  limits: ['Re <= 2300', 'Gz_heat <= 12'],
  accuracy: 'exact for constant properties',
  source: 'W. Nusselt, Z. VDI 54 (1910) 1154-1158',
  where: 'Nu = 48/11',
  constantsFrom: 'memory',
  use: 'Electrically heated or balanced counter-current tubes at low Re.',
  analogy: true,
  printed: [
    {
      kind: 'analytic limit',
      at: {},
      value: 4.364,
      tolerance: 0.0005,
      source: 'Incropera, DeWitt, Bergman and Lavine, Fundamentals of Heat and Mass Transfer, 6th ed., Wiley 2007',
      where: 'value used in Example 8.4',
    },
  ],
});
