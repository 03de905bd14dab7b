import { published } from '../published.ts';

export const skupinski1965 = published({
  id: 'skupinski-1965',
  authors: 'Skupinski, Tortel and Vautrey',
  year: 1965,
  title: 'Liquid metal in turbulent tube flow, constant wall flux',
  family: 'tube',
  transfer: 'heat',
  average: 'fully developed',
  reads: 'mean line',
  form: 'Nu = A + B * Pe_heat^a',
  values: { A: 4.82, B: 0.0185, a: 0.827 },
  groups: { Nu: 'Nu@pipe', Pe_heat: 'Pe_heat@pipe', Re: 'Re@pipe', Pr: 'Pr' },
  limits: ['3.6e3 <= Re <= 9.05e5', '100 <= Pe_heat <= 1e4'],
  accuracy: 'not stated',
  source: 'E. Skupinski, J. Tortel, L. Vautrey, Int. J. Heat Mass Transfer 8 (1965) 937-951',
  where: 'liquid metals',
  constantsFrom: 'page read',
  use: 'Liquid metals only; never for water, oils or gases.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Pe_heat: 1000 },
      value: 10.41978984,
      tolerance: 1e-5,
      source: 'Holman, Heat Transfer, worked companion script',
      where: 'liquid bismuth in a tube: 4.82, 0.0185, 0.827',
    },
  ],
});
