import { published } from '../published.ts';

export const ranzMarshall1952 = published({
  id: 'ranz-marshall-1952',
  authors: 'Ranz and Marshall',
  year: 1952,
  title: 'Single sphere or drop in a stream',
  family: 'sphere',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = A + C * Re^a * Pr^b',
  values: { A: 2, C: 0.6, a: 0.5, b: 1 / 3 },
  groups: { Nu: 'Nu@particle,film', Re: 'Re@particle,film', Pr: 'Pr@film' },
  limits: ['Re <= 200', '0.6 <= Pr <= 400'],
  accuracy: 'not stated',
  source: 'W. E. Ranz, W. R. Marshall, Chem. Eng. Prog. 48 (1952) 141-146, 173-180',
  where: 'part I and II',
  constantsFrom: 'memory',
  use: 'Drops and particles; 2 is the stagnant limit.',
  analogy: true,
  printed: [
    {
      kind: 'worked example',
      at: { Re: 23.3, Pr: 0.71 },
      value: 4.586,
      tolerance: 0.0025,
      source: 'Z. Berk, Food Process Engineering and Technology, Academic Press 2009',
      where: 'p. 87 (Re printed to three digits, exponent printed 0.33)',
    },
  ],
});
