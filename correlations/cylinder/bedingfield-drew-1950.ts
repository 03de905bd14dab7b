import { published } from '../published.ts';

export const bedingfieldDrew1950 = published({
  id: 'bedingfield-drew-1950',
  authors: 'Bedingfield and Drew',
  year: 1950,
  title: 'Cylinder in cross flow of gas, mass transfer',
  family: 'cylinder',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'Sh = C * Re^a * Sc^b',
  values: { C: 0.281, a: 0.6, b: 0.44 },
  groups: { Sh: 'Sh@cylinder,film', Re: 'Re@cylinder,film', Sc: 'Sc@film' },
  limits: ['400 <= Re <= 25000', '0.6 <= Sc <= 2.6'],
  accuracy: 'not stated',
  source:
    'C. H. Bedingfield, T. B. Drew, Ind. Eng. Chem. 42 (1950) 1164-1173, doi 10.1021/ie50486a029; exponent of Re as printed in Benitez, Principles and Modern Applications of Mass Transfer Operations, 2nd ed., Wiley 2009',
  where: 'F = 0.281 G Re^-0.4 Sc^-0.56',
  constantsFrom: 'page read',
  use: 'Sublimation and evaporation from cylinders; another book implies Re^0.5.',
  analogy: true,
  printed: [
    {
      kind: 'worked example',
      at: { Re: 1223.0, Sc: 0.905 },
      value: 19.156413,
      tolerance: 0.0142,
      source: 'Benitez, Principles and Modern Applications of Mass Transfer Operations, 2nd ed., Wiley 2009',
      where: 'Example 2.10: printed F 6.75e-4 kmol/(m2 s) at G 0.039, Sh = F/G Re Sc',
    },
  ],
});
