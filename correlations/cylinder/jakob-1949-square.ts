import { published } from '../published.ts';

export const jakob1949Square = published({
  id: 'jakob-1949-square',
  authors: 'Jakob',
  year: 1949,
  title: 'Square bar in cross flow, face to the stream',
  family: 'cylinder',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^b',
  values: { C: 0.102, a: 0.675, b: 1 / 3 },
  groups: { Nu: 'Nu@cylinder,film', Re: 'Re@cylinder,film', Pr: 'Pr@film' },
  limits: ['5e3 <= Re <= 1e5', 'Pr >= 0.7'],
  accuracy: 'not stated',
  source: 'M. Jakob, Heat Transfer, vol. 1, Wiley 1949',
  where: 'table of non-circular bars',
  constantsFrom: 'page read',
  use: 'The side of the square stands for the diameter; gases.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 20000, Pr: 0.7 },
      value: 72.47052912,
      tolerance: 7.2e-5,
      source: 'open textbook script of a square bar in air',
      where: '0.102, 0.675, 1/3',
    },
  ],
});
