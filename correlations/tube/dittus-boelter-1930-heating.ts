import { published } from '../published.ts';

export const dittusBoelter1930Heating = published({
  id: 'dittus-boelter-1930-heating',
  authors: 'Dittus and Boelter',
  year: 1930,
  title: 'Turbulent flow in a smooth tube, fluid heated (form of McAdams)',
  family: 'tube',
  transfer: 'heat',
  average: 'fully developed',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^n',
  values: { C: 0.023, a: 0.8, n: 0.4 },
  groups: { Nu: 'Nu@pipe', Re: 'Re@pipe', Pr: 'Pr' },
  limits: ['Re >= 1e4', '0.7 <= Pr <= 160'],
  accuracy: 'within 25 % (Incropera et al.)',
  source:
    'F. W. Dittus, L. M. K. Boelter, Univ. California Publ. Eng. 2 (1930) 443-461; constant 0.023 as in W. H. McAdams, Heat Transmission, 2nd ed., McGraw-Hill 1942',
  where: 'McAdams form',
  constantsFrom: 'memory',
  use: 'Moderate temperature differences, L/d above 10; the original paper has 0.0243 for heating.',
  analogy: true,
  printed: [
    {
      kind: 'worked example',
      at: { Re: 59566.76233, Pr: 5.83 },
      value: 307.78284,
      tolerance: 0.575,
      source: 'Incropera, DeWitt, Bergman and Lavine, Fundamentals of Heat and Mass Transfer, 6th ed., Wiley 2007',
      where: 'Example 11.5: printed tube length 4.51 m, turned back to Nu (printed value from memory)',
    },
  ],
});
