import { published } from '../published.ts';

export const gnielinski1995Entry = published({
  id: 'gnielinski-1995-entry',
  authors: 'Gnielinski',
  year: 1995,
  title: 'Turbulent flow in a smooth tube with thermal entry, mean over the length',
  family: 'tube',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = (A * log10(Re) - B)^-2 / 8 * Re * Pr / (1 + E * ((A * log10(Re) - B)^-2 / 8)^0.5 * (Pr^(2/3) - 1)) * (1 + (d / L)^(2/3))',
  values: { A: 1.8, B: 1.5, E: 12.7 },
  groups: { Nu: 'Nu@pipe', Re: 'Re@pipe', Pr: 'Pr', d: 'diameter', L: 'length' },
  limits: ['1e4 <= Re <= 1e6', '0.6 <= Pr <= 1000', 'd / L <= 1'],
  accuracy: 'not stated',
  source: 'V. Gnielinski, Forsch. Ingenieurwes. 61 (1995) 240-248; VDI-Waermeatlas, 9th ed., Springer 2002',
  where: 'section Ga',
  constantsFrom: 'page read',
  use: 'Turbulent flow; below Re 1e4 interpolate to the laminar value.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 30000, Pr: 0.7, d: 0.02, L: 0.5 },
      value: 79.70545583,
      tolerance: 8e-5,
      source: 'Modelica Association, documentation of the library functions of heat transfer',
      where: 'straight pipe, turbulent, pressure loss considered: 1.8, 1.5, 12.7 and exponent 2/3',
    },
  ],
});
