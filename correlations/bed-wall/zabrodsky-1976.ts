import { published } from '../published.ts';

export const zabrodsky1976 = published({
  id: 'zabrodsky-1976',
  authors: 'Zabrodsky, Antonishin and Parnas',
  year: 1976,
  title: 'Surface in a bubbling fluidised bed, at the best gas velocity',
  family: 'bed-wall',
  transfer: 'heat',
  average: 'mean',
  reads: 'upper bound',
  form: 'heat_transfer_coefficient = C * solid_density^a * thermal_conductivity^b * particle_diameter^m',
  values: { C: 35.8, a: 0.2, b: 0.6, m: -0.36 },
  groups: {
    heat_transfer_coefficient: 'heat_transfer_coefficient',
    solid_density: 'solid_density',
    thermal_conductivity: 'thermal_conductivity',
    particle_diameter: 'particle_diameter',
  },
  limits: [],
  accuracy: 'not stated',
  source: 'S. S. Zabrodsky, N. V. Antonishin, A. L. Parnas, Can. J. Chem. Eng. 54 (1976) 52-58, doi 10.1002/cjce.5450540107',
  where: 'equation in SI units',
  constantsFrom: 'page read',
  use: 'Largest coefficient of fine particles; gas conduction counts, not its velocity. No range on the page read.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { solid_density: 2650, thermal_conductivity: 0.027, particle_diameter: 0.000146 },
      value: 476.63226,
      tolerance: 0.00095,
      source: 'software of Thanheiser, Haider and Schwarzmayr 2021, doi 10.5281/zenodo.5500329',
      where: '35.8 rho_p^0.2 lambda^0.6 d_p^-0.36, evaluated for sand in air',
    },
  ],
});
