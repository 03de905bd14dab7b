import { published } from '../published.ts';

export const gnielinski1981 = published({
  id: 'gnielinski-1981',
  authors: 'Gnielinski',
  year: 1981,
  title: 'Fixed bed of equal spheres',
  family: 'packed-bed',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = (1 + F * (1 - voidage)) * (A + ((C * Re^0.5 * Pr^(1/3))^2 + (D * Re^0.8 * Pr / (1 + E * Re^-0.1 * (Pr^(2/3) - 1)))^2)^0.5)',
  values: { F: 1.5, A: 2, C: 0.664, D: 0.037, E: 2.443 },
  groups: { Nu: 'Nu@particle', Re: 'Re@particle-interstitial', Pr: 'Pr', voidage: 'voidage' },
  limits: ['0.1 <= Re <= 1000', '0.4 <= Pr <= 1000'],
  accuracy: 'not stated',
  source: 'V. Gnielinski, Int. Chem. Eng. 21 (1981) 378-383; VDI Heat Atlas, 2nd ed., Springer 2010',
  where: 'sphere equation times the arrangement factor 1 + 1.5 (1 - voidage)',
  constantsFrom: 'page read',
  use: 'Re on the interstitial velocity; factors 1.6 for cylinders and cubes, 2.1 for Raschig rings, 2.3 for Berl saddles stand in place of the bracket.',
  analogy: true,
  printed: [
    {
      kind: 'worked example',
      at: { Re: 2000.0, Pr: 0.7, voidage: 0.4 },
      value: 61.378232025,
      tolerance: 5e-8,
      source: 'C. Bell 2016, open code conv_packed_bed.py',
      where: 'value printed for d 0.8 mm, voidage 0.4, 1 m/s, 1000 kg/m3, 1 mPa s, Pr 0.7: 61.37823202546954 (outside the confirmed range)',
    },
  ],
});
