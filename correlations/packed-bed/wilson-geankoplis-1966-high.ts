import { published } from '../published.ts';

export const wilsonGeankoplis1966High = published({
  id: 'wilson-geankoplis-1966-high',
  authors: 'Wilson and Geankoplis',
  year: 1966,
  title: 'Liquid through a bed of spheres, higher Re',
  family: 'packed-bed',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'j_mass = C / voidage * Re^a',
  values: { C: 0.25, a: -0.31 },
  groups: { j_mass: 'j_mass', Re: 'Re@particle', voidage: 'voidage', Sc: 'Sc' },
  limits: ['55 <= Re <= 1500', '165 <= Sc <= 10690', '0.35 <= voidage <= 0.75'],
  accuracy: 'not stated',
  source: 'E. J. Wilson, C. J. Geankoplis, Ind. Eng. Chem. Fundam. 5 (1966) 9-14, doi 10.1021/i160017a002',
  where: 'voidage j = 0.250 Re^-0.31; limits from memory, the page read ends at 1050',
  constantsFrom: 'page read',
  use: 'Dissolving spheres in liquid; superficial velocity.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 200, voidage: 0.4 },
      value: 0.12093743,
      tolerance: 2.4e-7,
      source: 'open code of a chromatography bed, convective_mt_coeff',
      where: 'Sh = 0.25/e Re^0.69 Sc^0.33 for 55 < Re < 1050, turned to j at Sc 1',
    },
  ],
});
