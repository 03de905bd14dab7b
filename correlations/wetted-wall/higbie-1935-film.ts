import { published } from '../published.ts';

export const higbie1935Film = published({
  id: 'higbie-1935-film',
  authors: 'Higbie; Pigford',
  year: 1935,
  title: 'Gas absorbed by a smooth laminar film, short contact, mean over the length',
  family: 'wetted-wall',
  transfer: 'mass',
  average: 'mean',
  reads: 'lower bound',
  form: 'Sh = C * Re^a * Sc^b * Ga^m',
  values: { C: Math.sqrt(1.5 / (Math.PI * Math.cbrt(3 / 4))), a: 1 / 3, b: 0.5, m: -1 / 6 },
  groups: { Sh: 'Sh@film', Re: 'Re@film', Sc: 'Sc', Ga: 'Ga@length' },
  limits: ['Re <= 30'],
  accuracy: 'theory of short contact, without waves',
  source:
    'R. Higbie, Trans. AIChE 31 (1935) 365-389; R. B. Bird, W. E. Stewart, E. N. Lightfoot, Transport Phenomena, 2nd ed., Wiley 2002, eq. 18.5-18',
  where: 'k = (4 D u_max/(pi L))^(1/2), u_max 1.5 times the mean; limit of the smooth film is common practice',
  constantsFrom: 'memory',
  use: 'Liquid side of a short wetted wall; Ga on the wetted length.',
  analogy: false,
  printed: [
    {
      kind: 'worked example',
      at: { Re: 157.0810653, Sc: 873.015873, Ga: 17805958720.0 },
      value: 2.25976979219,
      tolerance: 0.00414,
      source: 'Bird, Stewart and Lightfoot, Transport Phenomena, 2nd ed., Wiley 2002',
      where:
        'Problem 18A.4, chlorine in a water film of 17.7 cm/s over 13 cm: printed rate 0.273 mol/h, turned to Sh at nu 1.1e-6 m2/s (which cancels), water 0.9989 g/cm3',
    },
  ],
});
