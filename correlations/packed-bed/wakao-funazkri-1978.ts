import { published } from '../published.ts';

export const wakaoFunazkri1978 = published({
  id: 'wakao-funazkri-1978',
  authors: 'Wakao and Funazkri',
  year: 1978,
  title: 'Particles of a fixed bed, with axial dispersion counted apart',
  family: 'packed-bed',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'Sh = A + C * Re^a * Sc^b',
  values: { A: 2, C: 1.1, a: 0.6, b: 1 / 3 },
  groups: { Sh: 'Sh@particle', Re: 'Re@particle', Sc: 'Sc' },
  limits: ['3 <= Re <= 1e4'],
  accuracy: 'not stated',
  source: 'N. Wakao, T. Funazkri, Chem. Eng. Sci. 33 (1978) 1375-1384, doi 10.1016/0009-2509(78)85120-3',
  where: 'eq. (12)',
  constantsFrom: 'page read',
  use: 'To be used with the axial dispersion of the same paper; with plug flow it overstates the rate of gases below Re 70.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 50, Sc: 1000 },
      value: 117.02035,
      tolerance: 0.00023,
      source: 'open pymrm gallery, transcription of the constants printed in the paper',
      where: 'Sh = 2 + 1.1 Sc^(1/3) Re^0.6, liquids 3 <= Re <= 1e4, evaluated at this point',
    },
  ],
});
