import { published } from '../published.ts';

export const chilton1944JacketPaddle = published({
  id: 'chilton-1944-jacket-paddle',
  authors: 'Chilton, Drew and Jebens',
  year: 1944,
  title: 'Jacketed vessel, paddle',
  family: 'vessel',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^b * viscosity_ratio^c',
  values: { C: 0.36, a: 2 / 3, b: 1 / 3, c: 0.14 },
  groups: { Nu: 'Nu@vessel', Re: 'Re@impeller', Pr: 'Pr', viscosity_ratio: 'viscosity_ratio' },
  limits: ['Re >= 400'],
  accuracy: 'not stated',
  source: 'T. H. Chilton, T. B. Drew, R. H. Jebens, Ind. Eng. Chem. 36 (1944) 510-516, doi 10.1021/ie50414a006',
  where: 'jacket',
  constantsFrom: 'page read',
  use: 'Flat paddle; some books print 0.21 for the exponent of the viscosity ratio.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 50000.0, Pr: 20, viscosity_ratio: 1.2 },
      value: 1360.5397,
      tolerance: 0.0027,
      source: 'open code of stirred vessels with its list of references, 2026',
      where: 'constant 0.36, exponents 2 / 3 and 1 / 3, 0.14, evaluated at this point',
    },
  ],
});
