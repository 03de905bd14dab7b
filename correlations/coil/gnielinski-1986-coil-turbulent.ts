import { published } from '../published.ts';

export const gnielinski1986CoilTurbulent = published({
  id: 'gnielinski-1986-coil-turbulent',
  authors: 'Gnielinski',
  year: 1986,
  title: 'Turbulent flow in a helical coil, mean',
  family: 'coil',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = (A * Re^-0.25 + B * (d / D)^0.5) / 8 * Re * Pr / (1 + E * ((A * Re^-0.25 + B * (d / D)^0.5) / 8)^0.5 * (Pr^(2/3) - 1))',
  values: { A: 0.3164, B: 0.03, E: 12.7 },
  groups: { Nu: 'Nu@pipe', Re: 'Re@pipe', Pr: 'Pr', d: 'diameter', D: 'coil_diameter' },
  limits: ['Re >= 2.2e4'],
  accuracy: 'not stated',
  source: 'V. Gnielinski, Proc. 8th Int. Heat Transfer Conf. 6 (1986) 2847-2854; VDI-Waermeatlas, 9th ed., Springer 2002',
  where: 'section Gc',
  constantsFrom: 'page read',
  use: 'Between the critical Re of the coil and 2.2e4 interpolate.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 40000, Pr: 5, d: 0.01, D: 0.2 },
      value: 293.9573711,
      tolerance: 0.00029,
      source: 'Modelica Association, documentation of the library functions of heat transfer',
      where: 'helical pipe, turbulent: 0.3164, 0.03, 12.7',
    },
  ],
});
