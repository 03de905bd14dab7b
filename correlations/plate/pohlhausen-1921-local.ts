import { published } from '../published.ts';

export const pohlhausen1921Local = published({
  id: 'pohlhausen-1921-local',
  authors: 'Pohlhausen',
  year: 1921,
  title: 'Flat plate, laminar, constant wall temperature, local at the length',
  family: 'plate',
  transfer: 'heat',
  average: 'local',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^b',
  values: { C: 0.332, a: 0.5, b: 1 / 3 },
  groups: { Nu: 'Nu@plate', Re: 'Re@plate,film', Pr: 'Pr@film' },
  limits: ['Re <= 5e5', '0.6 <= Pr <= 50'],
  accuracy: 'within 3 % of the exact solution over the range of Pr',
  source: 'E. Pohlhausen, Z. Angew. Math. Mech. 1 (1921) 115-121',
  where: 'similarity solution',
  constantsFrom: 'memory',
  use: 'Local value at the distance given as length; the mean is twice as large.',
  analogy: true,
  printed: [
    {
      kind: 'analytic limit',
      at: { Re: 10000, Pr: 1 },
      value: 33.206,
      tolerance: 0.01,
      source: 'Blasius profile: wall slope 0.332057',
      where: 'at Pr 1 the profiles of velocity and temperature coincide',
    },
  ],
});
