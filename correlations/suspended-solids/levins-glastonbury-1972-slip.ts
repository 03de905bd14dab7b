import { published } from '../published.ts';

export const levinsGlastonbury1972Slip = published({
  id: 'levins-glastonbury-1972-slip',
  authors: 'Levins and Glastonbury',
  year: 1972,
  title: 'Particles in a stirred vessel, by their slip velocity',
  family: 'suspended-solids',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'Sh = A + C * Re^a * Sc^b',
  values: { A: 2, C: 0.44, a: 0.5, b: 0.38 },
  groups: { Sh: 'Sh@particle', Re: 'Re@particle', Sc: 'Sc' },
  limits: [],
  accuracy: 'not stated',
  source: 'D. M. Levins, J. R. Glastonbury, Trans. Inst. Chem. Eng. 50 (1972) 132-146',
  where: 'slip velocity theory, Sh = 2 + 0.44 Re^0.5 Sc^0.38',
  constantsFrom: 'page read',
  use: 'The velocity is that between particle and liquid, which must be had from elsewhere. No range on the page read.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 80, Sc: 900 },
      value: 54.192707,
      tolerance: 0.00011,
      source: 'J. Kolar 2021, open code calc_G.m',
      where: 'branches by slip velocity: Sh = 2 + 0.44 Re^0.5 Sc^0.38, evaluated at this point',
    },
  ],
});
