import { published } from '../published.ts';

export const turbulentPlate1934Local = published({
  id: 'turbulent-plate-1934-local',
  authors: 'Prandtl and Karman',
  year: 1934,
  title: 'Flat plate, turbulent, local at the length',
  family: 'plate',
  transfer: 'heat',
  average: 'local',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^b',
  values: { C: 0.0296, a: 0.8, b: 1 / 3 },
  groups: { Nu: 'Nu@plate', Re: 'Re@plate,film', Pr: 'Pr@film' },
  limits: ['5e5 <= Re <= 1e7', '0.6 <= Pr <= 60'],
  accuracy: 'not stated',
  source: 'Incropera and DeWitt, Fundamentals of Heat and Mass Transfer',
  where: 'turbulent local value',
  constantsFrom: 'page read',
  use: 'Local value at the distance given as length; books print 0.0288 to 0.0296.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 1000000, Pr: 1 },
      value: 1867.63374,
      tolerance: 0.0019,
      source: 'Rules of Thumb for Mechanical Engineers, p. 24',
      where: '0.0296 and 0.8; exponent of Pr printed 0.33, hence taken at Pr 1',
    },
  ],
});
