import { published } from '../published.ts';

export const chilton1944JacketTurbine = published({
  id: 'chilton-1944-jacket-turbine',
  authors: 'Chilton, Drew and Jebens; Brooks and Su',
  year: 1959,
  title: 'Jacketed vessel, baffled, disk turbine',
  family: 'vessel',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^b * viscosity_ratio^c',
  values: { C: 0.74, a: 2 / 3, b: 1 / 3, c: 0.14 },
  groups: { Nu: 'Nu@vessel', Re: 'Re@impeller', Pr: 'Pr', viscosity_ratio: 'viscosity_ratio' },
  limits: ['40 <= Re <= 3e5'],
  accuracy: 'not stated',
  source:
    'G. Brooks, G.-J. Su, Chem. Eng. Prog. 55 (10) (1959) 54-57; constants as in Geankoplis, Transport Processes and Separation Process Principles, 4th ed., Prentice Hall 2003',
  where: 'eq. (4.13-3)',
  constantsFrom: 'memory',
  use: 'Flat-blade disk turbine with baffles, heat through the jacket.',
  analogy: false,
  printed: [
    {
      kind: 'worked example',
      at: { Re: 595.9801667, Pr: 14450.86705, viscosity_ratio: 11.9047619 },
      value: 1804.6127,
      tolerance: 2.12,
      source: 'Geankoplis, Transport Processes and Separation Process Principles, 4th ed., Prentice Hall 2003',
      where: 'Example 4.13-1: printed h 170.6 (memory), turned to Nu',
    },
  ],
});
