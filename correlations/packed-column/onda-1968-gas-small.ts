import { published } from '../published.ts';

export const onda1968GasSmall = published({
  id: 'onda-1968-gas-small',
  authors: 'Onda, Takeuchi and Okumoto',
  year: 1968,
  title: 'Gas side of wetted random packing, below 15 mm',
  family: 'packed-column',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'Sh = C * Re^a * Sc^b * (specific_area * particle_diameter)^m',
  values: { C: 2.0, a: 0.7, b: 1 / 3, m: -2 },
  groups: { Sh: 'Sh@packing', Re: 'Re@packing', Sc: 'Sc', specific_area: 'specific_area', particle_diameter: 'particle_diameter' },
  limits: ['particle_diameter <= 0.015'],
  accuracy: 'within 30 % for vaporisation (authors)',
  source: 'K. Onda, H. Takeuchi, Y. Okumoto, J. Chem. Eng. Japan 1 (1968) 56-62, doi 10.1252/jcej.1.56',
  where: 'eq. (3)',
  constantsFrom: 'page read',
  use: 'Per wetted area; particle_diameter is the nominal size of the packing, velocity that of the gas.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 300, Sc: 0.7, specific_area: 480, particle_diameter: 0.01 },
      value: 4.1773264,
      tolerance: 8.4e-6,
      source: 'open pymrm gallery, transcription of the constants printed in the paper',
      where: '2 Re^0.7 Sc^(1/3) (a d)^-2, evaluated at this point',
    },
  ],
});
