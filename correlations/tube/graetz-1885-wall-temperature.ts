import { published } from '../published.ts';

export const graetz1885WallTemperature = published({
  id: 'graetz-1885-wall-temperature',
  authors: 'Graetz',
  year: 1885,
  title: 'Developed laminar flow in a tube, constant wall temperature',
  family: 'tube',
  transfer: 'heat',
  average: 'fully developed',
  reads: 'mean line',
  form: 'Nu = C',
  values: { C: 3.656793 },
  groups: { Nu: 'Nu@pipe', Re: 'Re@pipe', Gz_heat: 'Gz_heat@pipe' },
  limits: ['Re <= 2300', 'Gz_heat <= 12'],
  accuracy: 'exact for constant properties',
  source: 'L. Graetz, Ann. Phys. 261 (1885) 337-357, doi 10.1002/andp.18852610706',
  where: 'first eigenvalue 2.70436: Nu = 2.70436^2/2',
  constantsFrom: 'memory',
  use: 'Limit of long tubes at low Re; heat transfer cannot fall below it.',
  analogy: true,
  printed: [
    {
      kind: 'analytic limit',
      at: {},
      value: 3.6567935,
      tolerance: 5e-6,
      source: 'R. K. Shah, A. L. London, Laminar Flow Forced Convection in Ducts, Academic Press 1978',
      where: 'first Graetz eigenvalue 2.704364 (memory): Nu = lambda^2/2',
    },
  ],
});
