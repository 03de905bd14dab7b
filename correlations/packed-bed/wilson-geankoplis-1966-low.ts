import { published } from '../published.ts';

export const wilsonGeankoplis1966Low = published({
  id: 'wilson-geankoplis-1966-low',
  authors: 'Wilson and Geankoplis',
  year: 1966,
  title: 'Liquid through a bed of spheres, low Re',
  family: 'packed-bed',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'j_mass = C / voidage * Re^a',
  values: { C: 1.09, a: -2 / 3 },
  groups: { j_mass: 'j_mass', Re: 'Re@particle', voidage: 'voidage', Sc: 'Sc' },
  limits: ['0.0016 <= Re <= 55', '165 <= Sc <= 70600', '0.35 <= voidage <= 0.75'],
  accuracy: 'not stated',
  source: 'E. J. Wilson, C. J. Geankoplis, Ind. Eng. Chem. Fundam. 5 (1966) 9-14, doi 10.1021/i160017a002',
  where: 'voidage j = 1.09 Re^(-2/3); limits from memory',
  constantsFrom: 'page read',
  use: 'Dissolving spheres in liquid; superficial velocity.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 10, voidage: 0.4 },
      value: 0.58708345,
      tolerance: 1.2e-6,
      source: 'US EPA, open adsorber code, kf_calc after the list of Xu et al. 2013',
      where: '1.09/e (Re Sc)^(1/3), turned to j = Sh/(Re Sc^(1/3))',
    },
  ],
});
