import { published } from '../published.ts';

export const gnielinski2002EntryWallFlux = published({
  id: 'gnielinski-2002-entry-wall-flux',
  authors: 'Gnielinski',
  year: 2002,
  title: 'Laminar flow, both profiles developing, constant wall flux, mean',
  family: 'tube',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = (A^3 + B^3 + (D * Gz_heat^(1/3) - B)^3 + (E * Pr^(1/3) * (Gz_heat / Pr)^0.5)^3)^(1/3)',
  values: { A: 4.364, B: 0.6, D: 1.953, E: 0.924 },
  groups: { Nu: 'Nu@pipe', Gz_heat: 'Gz_heat@pipe', Re: 'Re@pipe', Pr: 'Pr' },
  limits: ['Re <= 2300', '0.6 <= Pr <= 1000'],
  accuracy: 'not stated',
  source: 'V. Gnielinski, in VDI-Waermeatlas, 9th ed., Springer 2002',
  where: 'p. Ga 5, eq. 25',
  constantsFrom: 'page read',
  use: 'Flat velocity profile at the inlet.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Gz_heat: 50, Pr: 0.7 },
      value: 8.893916849,
      tolerance: 8.9e-6,
      source: 'Modelica Association, documentation of the library functions of heat transfer',
      where: 'straight pipe, laminar, eq. Nu_qU',
    },
  ],
});
