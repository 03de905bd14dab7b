import { published } from '../published.ts';

export const gillilandSherwood1934 = published({
  id: 'gilliland-sherwood-1934',
  authors: 'Gilliland and Sherwood',
  year: 1934,
  title: 'Gas in a wetted-wall column',
  family: 'wetted-wall',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'Sh = C * Re^a * Sc^b',
  values: { C: 0.023, a: 0.83, b: 0.44 },
  groups: { Sh: 'Sh@pipe', Re: 'Re@pipe', Sc: 'Sc' },
  limits: ['2000 <= Re <= 35000', '0.6 <= Sc <= 2.5'],
  accuracy: 'not stated',
  source: 'E. R. Gilliland, T. K. Sherwood, Ind. Eng. Chem. 26 (1934) 516-523, doi 10.1021/ie50293a010',
  where: 'as printed in Benitez, Principles and Modern Applications of Mass Transfer Operations, 2nd ed., Wiley 2009',
  constantsFrom: 'page read',
  use: 'Gas side of wetted walls; some books print Sc^(1/3).',
  analogy: true,
  printed: [
    {
      kind: 'worked example',
      at: { Re: 13229.16667, Sc: 0.692 },
      value: 51.413071,
      tolerance: 0.277,
      source: 'Benitez, Principles and Modern Applications of Mass Transfer Operations, 2nd ed., Wiley 2009',
      where: 'Example 2.12: printed outlet pressure 1.94 kPa, turned back to Sh',
    },
  ],
});
