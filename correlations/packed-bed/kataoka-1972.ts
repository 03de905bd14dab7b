import { published } from '../published.ts';

export const kataoka1972 = published({
  id: 'kataoka-1972',
  authors: 'Kataoka, Yoshida and Ueyama',
  year: 1972,
  title: 'Liquid through an ion exchange bed, laminar',
  family: 'packed-bed',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'Sh = C * ((1 - voidage) / voidage)^m * Re^a * Sc^b',
  values: { C: 1.85, m: 1 / 3, a: 1 / 3, b: 1 / 3 },
  groups: { Sh: 'Sh@particle', Re: 'Re@particle', Sc: 'Sc', voidage: 'voidage' },
  limits: [],
  accuracy: 'not stated',
  source: 'T. Kataoka, H. Yoshida, K. Ueyama, J. Chem. Eng. Japan 5 (1972) 132-136, doi 10.1252/jcej.5.132',
  where: 'laminar region',
  constantsFrom: 'page read',
  use: 'Re/(1 - voidage) below about 100 (memory; no range on the page read); superficial velocity.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 5, Sc: 900, voidage: 0.4 },
      value: 34.962809,
      tolerance: 7e-5,
      source: 'US EPA, open adsorber code, kf_calc after the list of Xu et al. 2013',
      where: '1.85 ((1 - e)/e)^(1/3) Re^(1/3) Sc^(1/3), evaluated at this point',
    },
  ],
});
