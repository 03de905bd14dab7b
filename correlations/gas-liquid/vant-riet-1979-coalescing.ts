import { published } from '../published.ts';

export const vantRiet1979Coalescing = published({
  id: 'vant-riet-1979-coalescing',
  authors: "van 't Riet",
  year: 1979,
  title: 'Stirred vessel, pure water',
  family: 'gas-liquid',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'volumetric_coefficient = C * power_per_volume^a * gas_velocity^b',
  values: { C: 0.026, a: 0.4, b: 0.5 },
  groups: { volumetric_coefficient: 'volumetric_coefficient', power_per_volume: 'power_per_volume', gas_velocity: 'gas_velocity' },
  limits: ['500 <= power_per_volume <= 1e4'],
  accuracy: 'within 20 to 40 % (author)',
  source: "K. van 't Riet, Ind. Eng. Chem. Process Des. Dev. 18 (1979) 357-364, doi 10.1021/i260071a001",
  where: 'eq. (8)',
  constantsFrom: 'page read',
  use: 'Water without salts or surfactants, up to 2.6 m3; power as gassed per volume of liquid.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { power_per_volume: 2000, gas_velocity: 0.02 },
      value: 0.076895397,
      tolerance: 1.5e-7,
      source: 'open pymrm gallery, transcription of the constants printed in the paper',
      where: 'K 2.6e-2, exponents 0.4 and 0.5, 500 to 10,000 W/m3, evaluated at this point',
    },
  ],
});
