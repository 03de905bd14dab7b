import { published } from '../published.ts';

export const gnielinski2002EntryWallTemperature = published({
  id: 'gnielinski-2002-entry-wall-temperature',
  authors: 'Gnielinski',
  year: 2002,
  title: 'Laminar flow, both profiles developing, constant wall temperature, mean',
  family: 'tube',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = (A^3 + B^3 + (D * Gz_heat^(1/3) - B)^3 + ((E / (1 + F * Pr))^(1/6) * Gz_heat^0.5)^3)^(1/3)',
  values: { A: 3.66, B: 0.7, D: 1.615, E: 2, F: 22 },
  groups: { Nu: 'Nu@pipe', Gz_heat: 'Gz_heat@pipe', Re: 'Re@pipe', Pr: 'Pr' },
  limits: ['Re <= 2300', '0.6 <= Pr <= 1000'],
  accuracy: 'not stated',
  source: 'V. Gnielinski, in VDI-Waermeatlas, 9th ed., Springer 2002',
  where: 'p. Ga 2, eq. 12',
  constantsFrom: 'page read',
  use: 'Flat velocity profile at the inlet.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Gz_heat: 50, Pr: 0.7 },
      value: 6.822161795,
      tolerance: 6.8e-6,
      source: 'Modelica Association, documentation of the library functions of heat transfer',
      where: 'straight pipe, laminar, eq. Nu_TU',
    },
  ],
});
