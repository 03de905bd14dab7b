import { published } from '../published.ts';

export const lintonSherwood1950 = published({
  id: 'linton-sherwood-1950',
  authors: 'Linton and Sherwood',
  year: 1950,
  title: 'Turbulent flow in a tube, mass transfer',
  family: 'tube',
  transfer: 'mass',
  average: 'fully developed',
  reads: 'mean line',
  form: 'Sh = C * Re^a * Sc^b',
  values: { C: 0.023, a: 0.83, b: 1 / 3 },
  groups: { Sh: 'Sh@pipe', Re: 'Re@pipe', Sc: 'Sc' },
  limits: ['4e3 <= Re <= 7e4', '0.6 <= Sc <= 3000'],
  accuracy: 'not stated',
  source: 'W. H. Linton, T. K. Sherwood, Chem. Eng. Prog. 46 (1950) 258-264',
  where: 'with the wetted-wall data of Gilliland and Sherwood',
  constantsFrom: 'page read',
  use: 'Dissolving tubes and wetted walls; the exponent 0.44 of Sc belongs to gases only.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 20000, Sc: 1000 },
      value: 854.2455644,
      tolerance: 0.00085,
      source: 'open course notes on mass transfer coefficients, sec. 3.4.4',
      where: '0.023, 0.83, 1/3, ranges of Re and Sc',
    },
  ],
});
