import { published } from '../published.ts';

export const calderbankMooYoung1961LargeBubbles = published({
  id: 'calderbank-moo-young-1961-large-bubbles',
  authors: 'Calderbank and Moo-Young',
  year: 1961,
  title: 'Large bubbles with a moving surface',
  family: 'gas-liquid',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'Sh = C * Ar^a * Sc^b',
  values: { C: 0.42, a: 1 / 3, b: 0.5 },
  groups: { Sh: 'Sh@bubble', Ar: 'Ar@bubble', Sc: 'Sc', bubble_diameter: 'bubble_diameter' },
  limits: ['bubble_diameter >= 0.0025'],
  accuracy: 'not stated',
  source: 'P. H. Calderbank, M. B. Moo-Young, Chem. Eng. Sci. 16 (1961) 39-54, doi 10.1016/0009-2509(61)87005-X',
  where: 'eq. (2)',
  constantsFrom: 'page read',
  use: 'Swarms of bubbles above about 2.5 mm in clean liquid; k does not depend on size.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Ar: 250000.0, Sc: 500 },
      value: 591.62651,
      tolerance: 0.0012,
      source: 'open pymrm gallery, transcription of the constants printed in the paper',
      where: 'k Sc^(1/2) = 0.42 (drho mu g/rho^2)^(1/3), turned to Sh = 0.42 Ar^(1/3) Sc^(1/2)',
    },
  ],
});
