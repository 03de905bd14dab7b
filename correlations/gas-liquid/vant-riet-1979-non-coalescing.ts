import { published } from '../published.ts';

export const vantRiet1979NonCoalescing = published({
  id: 'vant-riet-1979-non-coalescing',
  authors: "van 't Riet",
  year: 1979,
  title: 'Stirred vessel, strong ionic solutions',
  family: 'gas-liquid',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'volumetric_coefficient = C * power_per_volume^a * gas_velocity^b',
  values: { C: 0.002, a: 0.7, b: 0.2 },
  groups: { volumetric_coefficient: 'volumetric_coefficient', power_per_volume: 'power_per_volume', gas_velocity: 'gas_velocity' },
  limits: ['500 <= power_per_volume <= 1e4'],
  accuracy: 'within 20 to 40 % (author)',
  source: "K. van 't Riet, Ind. Eng. Chem. Process Des. Dev. 18 (1979) 357-364, doi 10.1021/i260071a001",
  where: 'eq. (9)',
  constantsFrom: 'page read',
  use: 'Salt solutions in which bubbles do not merge, 2 L to 4.4 m3; power as gassed per volume of liquid.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { power_per_volume: 2000, gas_velocity: 0.02 },
      value: 0.18704969,
      tolerance: 3.7e-7,
      source: 'open pymrm gallery, transcription of the constants printed in the paper',
      where: 'K 2.0e-3, exponents 0.7 and 0.2, 500 to 10,000 W/m3, evaluated at this point',
    },
  ],
});
