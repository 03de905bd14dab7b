import { published } from '../published.ts';

export const eisenbergTobiasWilke1954 = published({
  id: 'eisenberg-tobias-wilke-1954',
  authors: 'Eisenberg, Tobias and Wilke',
  year: 1954,
  title: 'Rotating inner cylinder, turbulent',
  family: 'rotating',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'Sh = C * Re^a * Sc^b',
  values: { C: 0.0791, a: 0.7, b: 0.356 },
  groups: { Sh: 'Sh@rotating-cylinder', Re: 'Re@rotating-cylinder', Sc: 'Sc' },
  limits: ['112 <= Re <= 162000', '2230 <= Sc <= 3650'],
  accuracy: 'not stated',
  source: 'M. Eisenberg, C. W. Tobias, C. R. Wilke, J. Electrochem. Soc. 101 (1954) 306-320, doi 10.1149/1.2781252',
  where: 'p. 313',
  constantsFrom: 'page read',
  use: 'Cylinder turning inside a wider still one; Re on its diameter and peripheral velocity.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 20000.0, Sc: 2500 },
      value: 1313.9055,
      tolerance: 0.0026,
      source: 'open study of electrochemical transport, correlations.jl and schmidt_extrapolation.py',
      where: 'Sh = 0.0791 Re^0.70 Sc^0.356, evaluated at this point',
    },
  ],
});
