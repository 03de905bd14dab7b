import { published } from '../published.ts';

export const churchillBernstein1977 = published({
  id: 'churchill-bernstein-1977',
  authors: 'Churchill and Bernstein',
  year: 1977,
  title: 'Circular cylinder in cross flow, mean around it',
  family: 'cylinder',
  transfer: 'heat',
  average: 'mean',
  reads: 'lower bound',
  form: 'Nu = A + B * Re^0.5 * Pr^(1/3) / (1 + (D / Pr)^(2/3))^0.25 * (1 + (Re / E)^(5/8))^0.8',
  values: { A: 0.3, B: 0.62, D: 0.4, E: 282000 },
  groups: { Nu: 'Nu@cylinder,film', Re: 'Re@cylinder,film', Pr: 'Pr@film' },
  limits: ['Re * Pr >= 0.2', 'Re <= 1e7'],
  accuracy: 'not stated',
  source: 'S. W. Churchill, M. Bernstein, J. Heat Transfer 99 (1977) 300-306, doi 10.1115/1.3450685',
  where: 'eq. (9)',
  constantsFrom: 'memory',
  use: 'All Re and Pr; free-stream turbulence and end effects raise the measured rate above it.',
  analogy: true,
  printed: [
    {
      kind: 'worked example',
      at: { Re: 6071.0, Pr: 0.7 },
      value: 40.6,
      tolerance: 0.05,
      source: 'Incropera, DeWitt, Bergman and Lavine, Fundamentals of Heat and Mass Transfer, 6th ed., Wiley 2007',
      where: 'Example 7.4 (memory)',
    },
  ],
});
