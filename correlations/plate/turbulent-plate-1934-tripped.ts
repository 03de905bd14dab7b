import { published } from '../published.ts';

export const turbulentPlate1934Tripped = published({
  id: 'turbulent-plate-1934-tripped',
  authors: 'Prandtl and Karman',
  year: 1934,
  title: 'Flat plate, turbulent from the leading edge, mean over the length',
  family: 'plate',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^b',
  values: { C: 0.0366, a: 0.8, b: 1 / 3 },
  groups: { Nu: 'Nu@plate', Re: 'Re@plate,film', Pr: 'Pr@film' },
  limits: ['Re >= 3e5', 'Pr >= 0.7'],
  accuracy: 'not stated',
  source: 'Geankoplis, Transport Processes and Separation Process Principles, 4th ed., Prentice Hall 2003',
  where: 'eq. (4.6-3)',
  constantsFrom: 'memory',
  use: 'Tripped or rough leading edge; other books print 0.037 or 0.036.',
  analogy: true,
  printed: [
    {
      kind: 'worked example',
      at: { Re: 35002.73846, Pr: 0.704 },
      value: 140.61429,
      tolerance: 0.0911,
      source: 'Geankoplis, Transport Processes and Separation Process Principles, 4th ed., Prentice Hall 2003',
      where: 'Example 4.6-1(b): printed h 77.2 (memory), turned to Nu',
    },
  ],
});
