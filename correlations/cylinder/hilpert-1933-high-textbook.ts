import { published } from '../published.ts';

export const hilpert1933HighTextbook = published({
  id: 'hilpert-1933-high-textbook',
  authors: 'Hilpert',
  year: 1933,
  title: 'Circular cylinder in cross flow, Re 40000 to 400000, textbook constant',
  family: 'cylinder',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^b',
  values: { C: 0.027, a: 0.805, b: 1 / 3 },
  groups: { Nu: 'Nu@cylinder,film', Re: 'Re@cylinder,film', Pr: 'Pr@film' },
  limits: ['40000 <= Re <= 400000', 'Pr >= 0.7'],
  accuracy: 'not stated',
  source: 'R. Hilpert, Forsch. Geb. Ingenieurwes. 4 (1933) 215-224, doi 10.1007/BF02719754; Pr^(1/3) after J. D. Knudsen, D. L. Katz 1958',
  where: 'table of bands as textbooks print it',
  constantsFrom: 'page read',
  use: 'One band of the table; Holman prints 0.0266.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 126491.1064, Pr: 1 },
      value: 345.5588796,
      tolerance: 0.00035,
      source: 'open code of heat loss of a body, Nu_cylinder',
      where: 'bands of Re; exponent of Pr printed .3333, hence taken at Pr 1',
    },
  ],
});
