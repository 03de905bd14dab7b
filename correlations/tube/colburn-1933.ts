import { published } from '../published.ts';

export const colburn1933 = published({
  id: 'colburn-1933',
  authors: 'Colburn',
  year: 1933,
  title: 'Turbulent flow in a smooth tube',
  family: 'tube',
  transfer: 'heat',
  average: 'fully developed',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^b',
  values: { C: 0.023, a: 0.8, b: 1 / 3 },
  groups: { Nu: 'Nu@pipe', Re: 'Re@pipe', Pr: 'Pr' },
  limits: ['Re >= 1e4', '0.5 <= Pr <= 100'],
  accuracy: 'not stated',
  source:
    'A. P. Colburn, Trans. AIChE 29 (1933) 174-210; bulk properties as in the form that VDI-Waermeatlas, 9th ed., Springer 2002 and later codes print',
  where: 'smooth tube',
  constantsFrom: 'page read',
  use: 'Textbook form at bulk temperature; the original paper takes properties at film temperature.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 20000, Pr: 3 },
      value: 91.53606752,
      tolerance: 9.2e-5,
      source: 'Modelica Association, documentation of the library functions of heat transfer',
      where: 'straight pipe, turbulent, pressure loss neglected: 0.023, 0.8, 1/3',
    },
  ],
});
