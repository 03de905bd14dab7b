import { published } from '../published.ts';

export const jang2022 = published({
  id: 'jang-2022',
  authors: 'Jang, Ruscher, Winzely and Morales-Guio',
  year: 2022,
  title: 'Rotating cylinder in a closed cell',
  family: 'rotating',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'Sh = C * Re^a * Sc^b',
  values: { C: 0.204, a: 0.59, b: 0.33 },
  groups: { Sh: 'Sh@rotating-cylinder', Re: 'Re@rotating-cylinder', Sc: 'Sc' },
  limits: ['500 <= Re <= 12000', 'Sc >= 100'],
  accuracy: 'not stated',
  source: 'J. Jang et al., AIChE J. 68 (2022) e17605, doi 10.1002/aic.17605',
  where: 'eq. (7)',
  constantsFrom: 'page read',
  use: 'Small gas-tight cell; Re on the diameter and peripheral velocity.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 5000.0, Sc: 800 },
      value: 281.86566,
      tolerance: 0.00056,
      source: 'open study of electrochemical transport, correlations.jl and schmidt_extrapolation.py',
      where: 'Sh = 0.204 Re^0.59 Sc^0.33, Re 500 to 12,000, Sc > 100, evaluated at this point',
    },
  ],
});
