import { published } from '../published.ts';

export const peters1988Wall = published({
  id: 'peters-1988-wall',
  authors: 'Peters, Schiffino and Harriott',
  year: 1988,
  title: 'Wall film of a packed tube',
  family: 'packed-bed',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Re^a',
  values: { C: 0.19, a: 0.79 },
  groups: { Nu: 'Nu@particle', Re: 'Re@particle' },
  limits: ['0.1 <= Re <= 40'],
  accuracy: 'not stated',
  source: 'P. E. Peters, R. S. Schiffino, P. Harriott, Ind. Eng. Chem. Res. 27 (1988) 226-233, doi 10.1021/ie00074a003',
  where: 'fit of the wall coefficient',
  constantsFrom: 'page read',
  use: 'Film at the wall beside an effective conductivity of the bed, gas; without the conduction of the bed at rest.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 20 },
      value: 2.0256635,
      tolerance: 4.1e-6,
      source: 'open code of a methanation tube, bed-to-wall coefficient after Bareschino 2023',
      where: 'Nu = 0.19 Re^0.79 for Re 0.1 to 40, evaluated at this point',
    },
  ],
});
