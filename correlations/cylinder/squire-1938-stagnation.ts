import { published } from '../published.ts';

export const squire1938Stagnation = published({
  id: 'squire-1938-stagnation',
  authors: 'Squire',
  year: 1938,
  title: 'Circular cylinder in cross flow, at the stagnation line',
  family: 'cylinder',
  transfer: 'heat',
  average: 'local',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^b',
  values: { C: 1.14, a: 0.5, b: 0.4 },
  groups: { Nu: 'Nu@cylinder,film', Re: 'Re@cylinder,film', Pr: 'Pr@film' },
  limits: ['Re <= 2e5', '0.6 <= Pr <= 10'],
  accuracy: 'not stated',
  source:
    'H. B. Squire, in S. Goldstein, Modern Developments in Fluid Dynamics, Oxford 1938; as in Kreith, Manglik and Bohn, Principles of Heat Transfer, 7th ed., Cengage 2011',
  where: 'eq. (7.2) of the book',
  constantsFrom: 'page read',
  use: 'Local value at the front; a film sensor facing the stream.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 10000, Pr: 0.72 },
      value: 99.96267053,
      tolerance: 0.0001,
      source: 'Kreith, Manglik and Bohn, Principles of Heat Transfer, 7th ed., Cengage 2011',
      where: 'Example 7.1 (companion script): 1.14, 0.5, 0.4',
    },
    {
      kind: 'analytic limit',
      at: { Re: 10000, Pr: 1 },
      value: 114.093,
      tolerance: 0.2,
      source: 'plane stagnation flow: wall slope 0.570465 at Pr 1, outer velocity 4 u x/d',
      where: 'Falkner and Skan, potential flow past the cylinder',
    },
  ],
});
