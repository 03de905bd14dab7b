import { published } from '../published.ts';

export const hilpert1933Middle = published({
  id: 'hilpert-1933-middle',
  authors: 'Hilpert',
  year: 1933,
  title: 'Circular cylinder in cross flow, Re 40 to 4000',
  family: 'cylinder',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^b',
  values: { C: 0.683, a: 0.466, b: 1 / 3 },
  groups: { Nu: 'Nu@cylinder,film', Re: 'Re@cylinder,film', Pr: 'Pr@film' },
  limits: ['40 <= Re <= 4000', 'Pr >= 0.7'],
  accuracy: 'not stated',
  source: 'R. Hilpert, Forsch. Geb. Ingenieurwes. 4 (1933) 215-224, doi 10.1007/BF02719754; Pr^(1/3) after J. D. Knudsen, D. L. Katz 1958',
  where: 'table of bands as textbooks print it',
  constantsFrom: 'page read',
  use: 'One band of the table.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 400, Pr: 1 },
      value: 11.14244912,
      tolerance: 1.1e-5,
      source: 'open code of heat loss of a body, Nu_cylinder',
      where: 'bands of Re; exponent of Pr printed .3333, hence taken at Pr 1',
    },
  ],
});
