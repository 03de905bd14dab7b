import { published } from '../published.ts';

export const turbulentPlate1934Mixed = published({
  id: 'turbulent-plate-1934-mixed',
  authors: 'Prandtl, Karman and Schlichting',
  year: 1934,
  title: 'Flat plate, laminar to Re 5e5 and turbulent behind, mean over the length',
  family: 'plate',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = (C * Re^a - A) * Pr^b',
  values: { C: 0.037, a: 0.8, A: 871, b: 1 / 3 },
  groups: { Nu: 'Nu@plate', Re: 'Re@plate,film', Pr: 'Pr@film' },
  limits: ['5e5 <= Re <= 1e8', '0.6 <= Pr <= 60'],
  accuracy: 'within 25 % (Incropera et al.)',
  source: 'mixed boundary layer as in Incropera, DeWitt, Bergman and Lavine, Fundamentals of Heat and Mass Transfer, 6th ed., Wiley 2007',
  where: 'eq. (7.38), transition at 5e5',
  constantsFrom: 'memory',
  use: 'Smooth plates longer than the laminar length.',
  analogy: true,
  printed: [
    {
      kind: 'worked example',
      at: { Re: 567966.6793, Pr: 0.69 },
      value: 542.35664,
      tolerance: 0.0722,
      source: 'Incropera, DeWitt, Bergman and Lavine, Fundamentals of Heat and Mass Transfer, 6th ed., Wiley 2007',
      where: 'Example 7.2, heater 5: printed 1017 W/m of the companion notebook (integer part), turned back to Nu at 5 heaters',
    },
  ],
});
