import { published } from '../published.ts';

export const brooksSu1959RetreatBlade = published({
  id: 'brooks-su-1959-retreat-blade',
  authors: 'Brooks and Su',
  year: 1959,
  title: 'Jacketed vessel, retreat-blade impeller',
  family: 'vessel',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^b * viscosity_ratio^c',
  values: { C: 0.33, a: 2 / 3, b: 1 / 3, c: 0.14 },
  groups: { Nu: 'Nu@vessel', Re: 'Re@impeller', Pr: 'Pr', viscosity_ratio: 'viscosity_ratio' },
  limits: [],
  accuracy: 'not stated',
  source: 'G. Brooks, G.-J. Su, Chem. Eng. Prog. 55 (10) (1959) 54-57',
  where: 'jacket, retreat blade',
  constantsFrom: 'page read',
  use: 'Glass-lined vessels. No range on the page read.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 50000.0, Pr: 20, viscosity_ratio: 1.2 },
      value: 1247.1614,
      tolerance: 0.0025,
      source: 'open code of stirred vessels with its list of references, 2026',
      where: 'constant 0.33, exponents 2 / 3 and 1 / 3, 0.14, evaluated at this point',
    },
  ],
});
