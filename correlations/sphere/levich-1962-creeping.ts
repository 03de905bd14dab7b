import { published } from '../published.ts';

export const levich1962Creeping = published({
  id: 'levich-1962-creeping',
  authors: 'Levich',
  year: 1962,
  title: 'Solid sphere in creeping flow, high Pe',
  family: 'sphere',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'Sh = C * Pe_mass^a',
  values: { C: 0.991, a: 1 / 3 },
  groups: { Sh: 'Sh@particle', Pe_mass: 'Pe_mass@particle', Re: 'Re@particle' },
  limits: ['Re <= 0.1', 'Pe_mass >= 100'],
  accuracy: 'limit',
  source: 'V. G. Levich, Physicochemical Hydrodynamics, Prentice-Hall 1962',
  where: 'thin concentration layer',
  constantsFrom: 'memory',
  use: 'Fine particles in liquids; 2 for a sphere at rest is the floor below Pe 100.',
  analogy: true,
  printed: [
    {
      kind: 'analytic limit',
      at: { Pe_mass: 1000000 },
      value: 99.14464616,
      tolerance: 0.1,
      source: 'thin layer on the shear 3/2 (u/a) sin(theta) of Stokes flow, integrated in closed form',
      where: 'axisymmetric form of the Leveque solution',
    },
  ],
});
