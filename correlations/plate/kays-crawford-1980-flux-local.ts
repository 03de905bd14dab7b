import { published } from '../published.ts';

export const kaysCrawford1980FluxLocal = published({
  id: 'kays-crawford-1980-flux-local',
  authors: 'Kays and Crawford',
  year: 1980,
  title: 'Flat plate, laminar, constant wall flux, local at the length',
  family: 'plate',
  transfer: 'heat',
  average: 'local',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^b',
  values: { C: 0.453, a: 0.5, b: 1 / 3 },
  groups: { Nu: 'Nu@plate', Re: 'Re@plate,film', Pr: 'Pr@film' },
  limits: ['Re <= 5e5', '0.6 <= Pr <= 50'],
  accuracy: 'not stated',
  source:
    'W. M. Kays, M. E. Crawford, Convective Heat and Mass Transfer, McGraw-Hill 1980; Holman, Heat Transfer, 8th ed., McGraw-Hill 1997',
  where: 'p. 270 of Holman',
  constantsFrom: 'page read',
  use: 'Electrically heated plates.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 10000, Pr: 0.7 },
      value: 40.22205128,
      tolerance: 4e-5,
      source: 'Modelica Association, documentation of the thermal convection element',
      where: '0.453, 1/2, 1/3 after Holman 1997',
    },
  ],
});
