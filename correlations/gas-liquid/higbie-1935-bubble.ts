import { published } from '../published.ts';

export const higbie1935Bubble = published({
  id: 'higbie-1935-bubble',
  authors: 'Higbie; Boussinesq',
  year: 1935,
  title: 'Bubble with a freely moving surface',
  family: 'gas-liquid',
  transfer: 'mass',
  average: 'mean',
  reads: 'upper bound',
  form: 'Sh = C * Pe_mass^a',
  values: { C: 2 / Math.sqrt(Math.PI), a: 0.5 },
  groups: { Sh: 'Sh@bubble', Pe_mass: 'Pe_mass@bubble' },
  limits: [],
  accuracy: 'theory of short contact',
  source: 'R. Higbie, Trans. AIChE 31 (1935) 365-389; J. Boussinesq, J. Math. Pures Appl. 6 (1905) 285-332',
  where: 'contact time d/u: Sh = 2/sqrt(pi) (u d/D)^0.5',
  constantsFrom: 'memory',
  use: 'Clean bubbles at large Pe; the velocity is that of rise against the liquid.',
  analogy: true,
  printed: [
    {
      kind: 'worked example',
      at: { Pe_mass: 753424.6575 },
      value: 977.280320748,
      tolerance: 4.18,
      source: 'Bird, Stewart and Lightfoot, Transport Phenomena, 2nd ed., Wiley 2002',
      where: 'Problem 18A.7(a), carbon dioxide bubble of 5 mm in water: printed flux 1.17e-6 mol/(cm2 s), turned to Sh',
    },
  ],
});
