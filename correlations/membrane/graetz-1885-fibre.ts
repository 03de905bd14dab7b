import { published } from '../published.ts';

export const graetz1885Fibre = published({
  id: 'graetz-1885-fibre',
  authors: 'Graetz',
  year: 1885,
  title: 'Laminar flow inside a hollow fibre, long',
  family: 'membrane',
  transfer: 'mass',
  average: 'fully developed',
  reads: 'mean line',
  form: 'Sh = C',
  values: { C: 3.656793 },
  groups: { Sh: 'Sh@pipe', Gz_mass: 'Gz_mass@pipe', Re: 'Re@pipe' },
  limits: ['Re <= 2300', 'Gz_mass <= 12'],
  accuracy: 'exact for constant properties',
  source: 'L. Graetz, Ann. Phys. 261 (1885) 337-357, doi 10.1002/andp.18852610706',
  where: 'first eigenvalue',
  constantsFrom: 'memory',
  use: 'Lumen of hollow fibres at low flow; a floor.',
  analogy: true,
  printed: [
    {
      kind: 'analytic limit',
      at: {},
      value: 3.6567935,
      tolerance: 5e-6,
      source: 'R. K. Shah, A. L. London, Laminar Flow Forced Convection in Ducts, Academic Press 1978',
      where: 'first Graetz eigenvalue 2.704364 (memory): lambda^2/2',
    },
  ],
});
