import { published } from '../published.ts';

export const lyon1951 = published({
  id: 'lyon-1951',
  authors: 'Lyon',
  year: 1951,
  title: 'Liquid metal in turbulent tube flow, constant wall flux',
  family: 'tube',
  transfer: 'heat',
  average: 'fully developed',
  reads: 'mean line',
  form: 'Nu = A + B * Pe_heat^a',
  values: { A: 7, B: 0.025, a: 0.8 },
  groups: { Nu: 'Nu@pipe', Pe_heat: 'Pe_heat@pipe', Re: 'Re@pipe', Pr: 'Pr' },
  limits: ['1e4 <= Re <= 1e6', 'Pr <= 0.1'],
  accuracy: 'not stated',
  source: 'R. N. Lyon, Chem. Eng. Prog. 47 (1951) 75-79',
  where: 'liquid metals',
  constantsFrom: 'page read',
  use: 'Liquid metals only; never for water, oils or gases.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Pe_heat: 1000 },
      value: 13.27971608,
      tolerance: 1.3e-5,
      source: 'open lecture notes and code on liquid sodium',
      where: '7 and 0.025 with Pe^0.8, constant flux',
    },
  ],
});
