import { published } from '../published.ts';

export const benitez2009Turbulent = published({
  id: 'benitez-2009-turbulent',
  authors: 'Benitez',
  year: 2009,
  title: 'Flat plate, turbulent from the leading edge, mass transfer, mean',
  family: 'plate',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'Sh = C * Re^a * Sc^b',
  values: { C: 0.036, a: 0.8, b: 1 / 3 },
  groups: { Sh: 'Sh@plate', Re: 'Re@plate,film', Sc: 'Sc@film' },
  limits: ['Re >= 3e5', 'Sc >= 0.6'],
  accuracy: 'not stated',
  source: 'Benitez, Principles and Modern Applications of Mass Transfer Operations, 2nd ed., Wiley 2009',
  where: 'flat plate',
  constantsFrom: 'page read',
  use: 'Evaporation into a stream; other books print 0.037 or 0.0366.',
  analogy: true,
  printed: [
    {
      kind: 'worked example',
      at: { Re: 559006.2112, Sc: 1.3 },
      value: 1557.170184,
      tolerance: 0.53,
      source: 'Benitez, Principles and Modern Applications of Mass Transfer Operations, 2nd ed., Wiley 2009',
      where: 'Example 2.8: printed 1473 mL/min of the companion notebook, turned to Sh',
    },
  ],
});
