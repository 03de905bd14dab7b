import { published } from '../published.ts';

export const pohlhausen1921Mean = published({
  id: 'pohlhausen-1921-mean',
  authors: 'Pohlhausen',
  year: 1921,
  title: 'Laminar flat plate, constant wall temperature, mean over the length',
  family: 'plate',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^b',
  values: { C: 0.664, a: 0.5, b: 1 / 3 },
  groups: { Nu: 'Nu@plate', Re: 'Re@plate,film', Pr: 'Pr@film' },
  limits: ['Re <= 5e5', 'Pr >= 0.6'],
  accuracy: 'not stated',
  source: 'E. Pohlhausen, Z. angew. Math. Mech. 1 (1921) 115-121, doi 10.1002/zamm.19210010205',
  where: 'mean of the laminar plate',
  constantsFrom: 'memory',
  use: 'Sharp leading edge, laminar throughout.',
  analogy: true,
  printed: [
    {
      kind: 'worked example',
      at: { Re: 9600.420882, Pr: 0.687 },
      value: 57.410538,
      tolerance: 0.0503,
      source: 'Incropera, DeWitt, Bergman and Lavine, Fundamentals of Heat and Mass Transfer, 6th ed., Wiley 2007',
      where: 'Example 7.1: printed 570 W/m (integer part), turned to Nu',
    },
  ],
});
