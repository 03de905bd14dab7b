import { published } from '../published.ts';

export const langmuir1918Sphere = published({
  id: 'langmuir-1918-sphere',
  authors: 'Langmuir',
  year: 1918,
  title: 'Sphere in a large body at rest',
  family: 'layer',
  transfer: 'mass',
  average: 'mean',
  reads: 'lower bound',
  form: 'Sh = C',
  values: { C: 2 },
  groups: { Sh: 'Sh@particle' },
  limits: [],
  accuracy: 'exact for spheres',
  source: 'I. Langmuir, Phys. Rev. 12 (1918) 368-370, doi 10.1103/PhysRev.12.368',
  where: 'k = 2 D/d',
  constantsFrom: 'memory',
  use: 'Floor for particles, drops and bubbles whatever the flow.',
  analogy: true,
  printed: [
    {
      kind: 'analytic limit',
      at: {},
      value: 2,
      tolerance: 1e-12,
      source: 'steady diffusion from a sphere: flux D (c_s - c)/r',
      where: 'k d/D = d/r = 2',
    },
  ],
});
