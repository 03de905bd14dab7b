import { published } from '../published.ts';

export const armenanteKirwan1989 = published({
  id: 'armenante-kirwan-1989',
  authors: 'Armenante and Kirwan',
  year: 1989,
  title: 'Microparticles in a stirred vessel',
  family: 'suspended-solids',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'Sh = A + C * Re^a * Sc^b',
  values: { A: 2, C: 0.52, a: 0.52, b: 1 / 3 },
  groups: { Sh: 'Sh@particle', Re: 'Re@energy-dissipation', Sc: 'Sc' },
  limits: [],
  accuracy: 'not stated',
  source: 'P. M. Armenante, D. J. Kirwan, Chem. Eng. Sci. 44 (1989) 2781-2796, doi 10.1016/0009-2509(89)85088-2',
  where: 'correlation on energy dissipation',
  constantsFrom: 'page read',
  use: "Particles near or below Kolmogorov's length (Re of about 1 and below). No range on the page read.",
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 0.8, Sc: 600 },
      value: 5.9053553,
      tolerance: 1.2e-5,
      source: 'J. Kolar 2021, open code calc_G.m',
      where: 'branch by Kolmogorov theory: constants 0.52, 0.52 and 1/3, evaluated at this point',
    },
  ],
});
