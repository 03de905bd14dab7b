import { published } from '../published.ts';

export const labik2017 = published({
  id: 'labik-2017',
  authors: 'Labik, Moucha, Petricek, Rejl, Valenz and Haidl',
  year: 2017,
  title: 'Stirred vessel, viscous liquid that does not coalesce',
  family: 'gas-liquid',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'volumetric_coefficient = C * (rotation_speed * impeller_diameter)^a * gas_velocity^b * power_number^m',
  values: { C: 0.295, a: 2.083, b: 0.461, m: 0.737 },
  groups: {
    volumetric_coefficient: 'volumetric_coefficient',
    rotation_speed: 'rotation_speed',
    impeller_diameter: 'impeller_diameter',
    gas_velocity: 'gas_velocity',
    power_number: 'power_number',
  },
  limits: ['0.00212 <= gas_velocity <= 0.00848', '4.17 <= rotation_speed <= 14.17'],
  accuracy: 'not stated',
  source:
    'L. Labik, T. Moucha, R. Petricek, J. F. Rejl, L. Valenz, J. Haidl, Chem. Eng. Sci. 170 (2017) 451-463, doi 10.1016/j.ces.2017.04.006',
  where: 'correlation on tip speed',
  constantsFrom: 'page read',
  use: 'N d in m/s without pi; power number without gas.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { rotation_speed: 8, impeller_diameter: 0.1, gas_velocity: 0.004, power_number: 5 },
      value: 0.04760461,
      tolerance: 9.5e-8,
      source: 'Y. Cortes-Pena and others 2023, open code design_tools/aeration.py',
      where: '0.295 (N d)^2.083 u^0.461 P0^0.737, evaluated at this point',
    },
  ],
});
