import { published } from '../published.ts';

export const gnielinski1975PlateTurbulent = published({
  id: 'gnielinski-1975-plate-turbulent',
  authors: 'Gnielinski',
  year: 1975,
  title: 'Flat plate, turbulent from the leading edge, mean',
  family: 'plate',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr / (1 + D * Re^-0.1 * (Pr^(2/3) - 1))',
  values: { C: 0.037, a: 0.8, D: 2.443 },
  groups: { Nu: 'Nu@plate', Re: 'Re@plate,film', Pr: 'Pr@film' },
  limits: ['5e5 <= Re <= 1e7', '0.6 <= Pr <= 2000'],
  accuracy: 'not stated',
  source: 'V. Gnielinski, Forsch. Ingenieurwes. 41 (1975) 145-153; VDI-Waermeatlas, 9th ed., Springer 2002',
  where: 'p. Gd 1, eq. 2',
  constantsFrom: 'page read',
  use: 'Also for high Pr and Sc, where the power 1/3 is too low.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 2000000, Pr: 0.7 },
      value: 3237.563158,
      tolerance: 0.0032,
      source: 'Modelica Association, documentation of the library functions of heat transfer',
      where: 'plate, turbulent: 0.037, 2.443',
    },
  ],
});
