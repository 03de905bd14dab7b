import { published } from '../published.ts';

export const dittusBoelter1930Cooling = published({
  id: 'dittus-boelter-1930-cooling',
  authors: 'Dittus and Boelter',
  year: 1930,
  title: 'Turbulent flow in a smooth tube, fluid cooled (form of McAdams)',
  family: 'tube',
  transfer: 'heat',
  average: 'fully developed',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^n',
  values: { C: 0.023, a: 0.8, n: 0.3 },
  groups: { Nu: 'Nu@pipe', Re: 'Re@pipe', Pr: 'Pr' },
  limits: ['Re >= 1e4', '0.7 <= Pr <= 160'],
  accuracy: 'within 25 % (Incropera et al.)',
  source:
    'F. W. Dittus, L. M. K. Boelter, Univ. California Publ. Eng. 2 (1930) 443-461; constant 0.023 as in W. H. McAdams, Heat Transmission, 2nd ed., McGraw-Hill 1942',
  where: 'McAdams form',
  constantsFrom: 'memory',
  use: 'Moderate temperature differences, L/d above 10; the original paper has 0.0265 for cooling.',
  analogy: true,
  printed: [
    {
      kind: 'worked example',
      at: { Re: 20384.87904, Pr: 0.7 },
      value: 57.888396,
      tolerance: 0.0279,
      source: 'Incropera, DeWitt, Bergman and Lavine, Fundamentals of Heat and Mass Transfer, 6th ed., Wiley 2007',
      where: 'Example 8.6: printed flux 304.3 W/m2 of the companion notebook, turned back to Nu',
    },
  ],
});
