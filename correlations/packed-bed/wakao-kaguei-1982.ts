import { published } from '../published.ts';

export const wakaoKaguei1982 = published({
  id: 'wakao-kaguei-1982',
  authors: 'Wakao and Kaguei',
  year: 1982,
  title: 'Particles of a fixed bed',
  family: 'packed-bed',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = A + C * Re^a * Pr^b',
  values: { A: 2, C: 1.1, a: 0.6, b: 1 / 3 },
  groups: { Nu: 'Nu@particle', Re: 'Re@particle', Pr: 'Pr' },
  limits: ['3 <= Re <= 3000'],
  accuracy: 'not stated; a rough fit without voidage',
  source: 'N. Wakao, S. Kaguei, Heat and Mass Transfer in Packed Beds, Gordon and Breach 1982',
  where: 'particle-to-fluid heat transfer',
  constantsFrom: 'page read',
  use: 'Fitted over Re 3 to 3000; superficial velocity.',
  analogy: true,
  printed: [
    {
      kind: 'worked example',
      at: { Re: 2000.0, Pr: 0.7 },
      value: 95.40641328,
      tolerance: 5e-8,
      source: 'C. Bell 2016, open code conv_packed_bed.py',
      where: 'value printed for Re 2000, Pr 0.7: 95.40641328041248',
    },
  ],
});
