import { published } from '../published.ts';

export const sebanShimazaki1951 = published({
  id: 'seban-shimazaki-1951',
  authors: 'Seban and Shimazaki',
  year: 1951,
  title: 'Liquid metal in turbulent tube flow, constant wall temperature',
  family: 'tube',
  transfer: 'heat',
  average: 'fully developed',
  reads: 'mean line',
  form: 'Nu = A + B * Pe_heat^a',
  values: { A: 5, B: 0.025, a: 0.8 },
  groups: { Nu: 'Nu@pipe', Pe_heat: 'Pe_heat@pipe', Re: 'Re@pipe', Pr: 'Pr' },
  limits: ['Pe_heat >= 100'],
  accuracy: 'not stated',
  source: 'R. A. Seban, T. T. Shimazaki, Trans. ASME 73 (1951) 803-809',
  where: 'liquid metals',
  constantsFrom: 'page read',
  use: 'Liquid metals only; never for water, oils or gases.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Pe_heat: 1000 },
      value: 11.27971608,
      tolerance: 1.1e-5,
      source: 'open classroom code of convection after the tables of Incropera and DeWitt',
      where: 'liquid metal, constant wall temperature: 5.0, 0.025, 0.8',
    },
  ],
});
