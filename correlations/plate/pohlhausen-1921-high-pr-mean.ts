import { published } from '../published.ts';

export const pohlhausen1921HighPrMean = published({
  id: 'pohlhausen-1921-high-pr-mean',
  authors: 'Pohlhausen',
  year: 1921,
  title: 'Flat plate, laminar, high Pr or Sc, mean',
  family: 'plate',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^b',
  values: { C: 0.678, a: 0.5, b: 1 / 3 },
  groups: { Nu: 'Nu@plate', Re: 'Re@plate,film', Pr: 'Pr@film' },
  limits: ['Re <= 5e5', 'Pr >= 50'],
  accuracy: 'limit',
  source: 'E. Pohlhausen, Z. Angew. Math. Mech. 1 (1921) 115-121',
  where: 'limit of high Pr',
  constantsFrom: 'memory',
  use: 'Liquids in mass transfer and viscous oils.',
  analogy: true,
  printed: [
    {
      kind: 'analytic limit',
      at: { Re: 10000, Pr: 1000 },
      value: 677.4318825,
      tolerance: 1,
      source: 'closed form 2 (0.332057/12)^(1/3)/Gamma(4/3)',
      where: 'thin thermal layer in the linear part of the Blasius profile',
    },
  ],
});
