import { published } from '../published.ts';

export const shulman1955Gas = published({
  id: 'shulman-1955-gas',
  authors: 'Shulman, Ullrich, Proulx and Zimmerman',
  year: 1955,
  title: 'Gas side of rings and saddles, naphthalene packing',
  family: 'packed-column',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'j_mass = C * (Re / (1 - voidage))^a',
  values: { C: 1.195, a: -0.36 },
  groups: { j_mass: 'j_mass', Re: 'Re@particle', voidage: 'voidage' },
  limits: ['100 <= Re / (1 - voidage) <= 1e4'],
  accuracy: 'not stated',
  source: 'H. L. Shulman, C. F. Ullrich, A. Z. Proulx, J. O. Zimmerman, AIChE J. 1 (1955) 253-258, doi 10.1002/aic.690010223',
  where: 'as quoted in Onda 1968, eq. (5)',
  constantsFrom: 'page read',
  use: 'Per whole surface; particle_diameter is that of a sphere of the same surface as a piece of packing.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 400, voidage: 0.7 },
      value: 0.089616909,
      tolerance: 1.8e-7,
      source: 'open pymrm gallery, transcription of the constants printed in the paper',
      where: 'j = 1.195 (G d/(mu (1 - e)))^-0.36, 100 to 10,000, evaluated at this point',
    },
  ],
});
