import { published } from '../published.ts';

export const linek2004 = published({
  id: 'linek-2004',
  authors: 'Linek, Kordac, Fujasova and Moucha',
  year: 2004,
  title: 'Bubbles in a stirred vessel, by the power dissipated',
  family: 'gas-liquid',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'mass_transfer_coefficient = C * (power_per_mass * kinematic_viscosity)^a * Sc^b',
  values: { C: 0.523, a: 0.25, b: -0.5 },
  groups: {
    mass_transfer_coefficient: 'mass_transfer_coefficient',
    power_per_mass: 'power_per_mass',
    kinematic_viscosity: 'kinematic_viscosity',
    Sc: 'Sc',
  },
  limits: [],
  accuracy: 'mean deviation 4.7 % (authors)',
  source: 'V. Linek, M. Kordac, M. Fujasova, T. Moucha, Chem. Eng. Process. 43 (2004) 1511-1517, doi 10.1016/j.cep.2004.02.009',
  where: 'abstract: eddy model of Lamont and Scott (1970)',
  constantsFrom: 'page read',
  use: 'Two Rushton turbines, water and 0.5 M sodium sulphate; power per volume as dissipated in the liquid.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { power_per_mass: 1.5, kinematic_viscosity: 1e-6, Sc: 450 },
      value: 0.00086281611,
      tolerance: 1.7e-9,
      source: 'abstract of the paper, stored page',
      where: '0.523 (e nu/rho)^0.25 (D/nu)^0.5, e in W/m3, evaluated at 1500 W/m3 in water',
    },
  ],
});
