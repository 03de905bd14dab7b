import { published } from '../published.ts';

export const hilpert1933High = published({
  id: 'hilpert-1933-high',
  authors: 'Hilpert',
  year: 1933,
  title: 'Circular cylinder in cross flow, Re 4e4 to 4e5',
  family: 'cylinder',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^b',
  values: { C: 0.0266, a: 0.805, b: 1 / 3 },
  groups: { Nu: 'Nu@cylinder,film', Re: 'Re@cylinder,film', Pr: 'Pr@film' },
  limits: ['4e4 <= Re <= 4e5', 'Pr >= 0.7'],
  accuracy: 'not stated',
  source:
    'R. Hilpert, Forsch. Geb. Ingenieurwes. 4 (1933) 215-224, doi 10.1007/BF02719754; Pr^(1/3) after J. D. Knudsen, D. L. Katz 1958; constants as in Holman, Heat Transfer, 10th ed., McGraw-Hill 2010',
  where: 'table 6-2 of Holman',
  constantsFrom: 'memory',
  use: 'Highest band of the table; other books print 0.027.',
  analogy: true,
  printed: [
    {
      kind: 'worked example',
      at: { Re: 112850.4673, Pr: 0.695 },
      value: 275.16026,
      tolerance: 0.0801,
      source: 'Holman, Heat Transfer, 10th ed., McGraw-Hill 2010',
      where: 'cylinder in air at 50 m/s: printed h 171.7 (memory), turned to Nu',
    },
  ],
});
