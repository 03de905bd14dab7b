import { published } from '../published.ts';

export const froessling1938 = published({
  id: 'froessling-1938',
  authors: 'Froessling',
  year: 1938,
  title: 'Evaporating drop or sphere in a gas stream',
  family: 'sphere',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'Sh = A + C * Re^a * Sc^b',
  values: { A: 2, C: 0.552, a: 0.5, b: 1 / 3 },
  groups: { Sh: 'Sh@particle,film', Re: 'Re@particle,film', Sc: 'Sc@film' },
  limits: ['2 <= Re <= 800', '0.6 <= Sc <= 2.7'],
  accuracy: 'not stated',
  source: 'N. Froessling, Gerlands Beitr. Geophys. 52 (1938) 170-216',
  where: 'drop evaporation',
  constantsFrom: 'page read',
  use: 'Drops in gas; some books print Re^0.53 for a wider range.',
  analogy: true,
  printed: [
    {
      kind: 'worked example',
      at: { Re: 191.0564753, Sc: 0.6959547629 },
      value: 8.8082878,
      tolerance: 0.0489,
      source: 'Benitez, Principles and Modern Applications of Mass Transfer Operations, 2nd ed., Wiley 2009',
      where: 'Example 2.9: printed falling distance 90 m of the companion notebook, turned back to Sh',
    },
  ],
});
