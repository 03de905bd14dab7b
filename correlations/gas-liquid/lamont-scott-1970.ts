import { published } from '../published.ts';

export const lamontScott1970 = published({
  id: 'lamont-scott-1970',
  authors: 'Lamont and Scott',
  year: 1970,
  title: 'Free surface of a stirred liquid, by the power dissipated',
  family: 'gas-liquid',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'mass_transfer_coefficient = C * (power_per_mass * kinematic_viscosity)^a * Sc^b',
  values: { C: 0.4, a: 0.25, b: -0.5 },
  groups: {
    mass_transfer_coefficient: 'mass_transfer_coefficient',
    power_per_mass: 'power_per_mass',
    kinematic_viscosity: 'kinematic_viscosity',
    Sc: 'Sc',
  },
  limits: [],
  accuracy: 'not stated',
  source: 'J. C. Lamont, D. S. Scott, AIChE J. 16 (1970) 513-519, doi 10.1002/aic.690160403',
  where: 'eddy cells, moving surface',
  constantsFrom: 'page read',
  use: 'Clean surface; power per mass at the surface, which is less than the mean of the vessel. No range on the page read.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { power_per_mass: 0.2, kinematic_viscosity: 1e-6, Sc: 450 },
      value: 0.00039875967,
      tolerance: 8e-10,
      source: 'open code of stirred vessels with its list of references, 2026',
      where: 'k = 0.4 D^(1/2) (eps/nu)^(1/4), evaluated at this point',
    },
  ],
});
