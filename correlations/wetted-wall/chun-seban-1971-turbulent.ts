import { published } from '../published.ts';

export const chunSeban1971Turbulent = published({
  id: 'chun-seban-1971-turbulent',
  authors: 'Chun and Seban',
  year: 1971,
  title: 'Evaporating film, turbulent',
  family: 'wetted-wall',
  transfer: 'heat',
  average: 'local',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^b',
  values: { C: 0.0038, a: 0.4, b: 0.65 },
  groups: { Nu: 'Nu@film', Re: 'Re@film', Pr: 'Pr' },
  limits: ['Re * Pr^1.06 >= 5840'],
  accuracy: 'not stated',
  source: 'K. R. Chun, R. A. Seban, J. Heat Transfer 93 (1971) 391-396, doi 10.1115/1.3449836',
  where: 'turbulent, from Re = 5840 Pr^-1.06',
  constantsFrom: 'page read',
  use: 'Water evaporating from a vertical wall.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 6000, Pr: 1.75 },
      value: 0.17742664,
      tolerance: 3.5e-7,
      source: 'open process code, falling_film_h after Chun and Seban',
      where: 'Nu = 3.8e-3 Re^0.4 Pr^0.65, transition at 5840 Pr^-1.06, evaluated at this point',
    },
  ],
});
