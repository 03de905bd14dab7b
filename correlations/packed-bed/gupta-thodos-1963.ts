import { published } from '../published.ts';

export const guptaThodos1963 = published({
  id: 'gupta-thodos-1963',
  authors: 'Gupta and Thodos',
  year: 1963,
  title: 'Gas through a bed of spheres',
  family: 'packed-bed',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'j_heat = C / voidage * Re^a',
  values: { C: 2.06, a: -0.575 },
  groups: { j_heat: 'j_heat', Re: 'Re@particle', voidage: 'voidage', Pr: 'Pr' },
  limits: ['90 <= Re <= 4000', '0.6 <= Pr <= 0.8'],
  accuracy: 'not stated',
  source: 'A. S. Gupta, G. Thodos, AIChE J. 9 (1963) 751-754, doi 10.1002/aic.690090609; as restated in Incropera and DeWitt',
  where: 'voidage j = 2.06 Re^-0.575',
  constantsFrom: 'page read',
  use: 'Gases (Pr about 0.7); times 0.79 for cylinders as long as wide, 0.71 for cubes.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 500, voidage: 0.4 },
      value: 0.14451052,
      tolerance: 2.9e-7,
      source: 'open code of catalyst pellets, turb_Nu_text',
      where: 'Nu = 2.06 Re^(1 - 0.575) Pr^(1/3)/e, turned to j = Nu/(Re Pr^(1/3))',
    },
  ],
});
