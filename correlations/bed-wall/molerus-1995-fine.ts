import { published } from '../published.ts';

export const molerus1995Fine = published({
  id: 'molerus-1995-fine',
  authors: 'Molerus, Burschka and Dietz',
  year: 1995,
  title: 'Surface in a bubbling bed of fine particles, at the best gas velocity',
  family: 'bed-wall',
  transfer: 'heat',
  average: 'mean',
  reads: 'upper bound',
  form: 'heat_transfer_coefficient = C / ((viscosity / (9.81^0.5 * (solid_density - density)))^(2/3) * (1 / thermal_conductivity + 1 / (solid_heat_capacity * viscosity)))',
  values: { C: 0.09 },
  groups: {
    heat_transfer_coefficient: 'heat_transfer_coefficient',
    viscosity: 'viscosity',
    solid_density: 'solid_density',
    density: 'density',
    thermal_conductivity: 'thermal_conductivity',
    solid_heat_capacity: 'solid_heat_capacity',
  },
  limits: [],
  accuracy: 'not stated',
  source: 'O. Molerus, A. Burschka, S. Dietz, Chem. Eng. Sci. 50 (1995) 879-885, doi 10.1016/0009-2509(94)00446-X',
  where: 'laminar flow regime, maximum',
  constantsFrom: 'page read',
  use: 'Fine particles (laminar regime); their size is not in it. No range on the page read.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { viscosity: 1.9e-5, solid_density: 2650, density: 1.1, thermal_conductivity: 0.027, solid_heat_capacity: 760 },
      value: 487.36166,
      tolerance: 0.00097,
      source: 'software of Thanheiser, Haider and Schwarzmayr 2021, doi 10.5281/zenodo.5500329',
      where: '1/(l/(0.09 lambda) + l/(0.09 c_s mu)), l = (mu/(g^0.5 (rho_s - rho)))^(2/3), evaluated for sand in air',
    },
  ],
});
