import { published } from '../published.ts';

export const achenbach1995 = published({
  id: 'achenbach-1995',
  authors: 'Achenbach',
  year: 1995,
  title: 'Pebble bed in gas',
  family: 'packed-bed',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = ((C * Re^a)^4 + (D * (Re / (1 - voidage))^b)^4)^0.25',
  values: { C: 1.18, a: 0.58, D: 0.23, b: 0.75 },
  groups: { Nu: 'Nu@particle', Re: 'Re@particle', Pr: 'Pr', voidage: 'voidage' },
  limits: ['Re / voidage <= 7.7e5', '0.6 <= Pr <= 0.8'],
  accuracy: 'not stated',
  source: 'E. Achenbach, Exp. Therm. Fluid Sci. 10 (1995) 17-27, doi 10.1016/0894-1777(94)00077-L',
  where: 'equation for the bed',
  constantsFrom: 'page read',
  use: 'Measured in a wind tunnel up to 30 bar; gases only, since Pr is not in it (the limit on Pr is ours).',
  analogy: true,
  printed: [
    {
      kind: 'worked example',
      at: { Re: 2000.0, Pr: 0.7, voidage: 0.4 },
      value: 117.703436086,
      tolerance: 5e-8,
      source: 'C. Bell 2016, open code conv_packed_bed.py',
      where: 'value printed for Re 2000, Pr 0.7, voidage 0.4: 117.70343608599121',
    },
  ],
});
