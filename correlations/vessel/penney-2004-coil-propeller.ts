import { published } from '../published.ts';

export const penney2004CoilPropeller = published({
  id: 'penney-2004-coil-propeller',
  authors: 'Penney and Atiemo-Obeng',
  year: 2004,
  title: 'Helical coil in the vessel, propeller',
  family: 'vessel',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Re^a * Pr^b * viscosity_ratio^c * (3 * impeller_diameter / vessel_diameter)^m * (25 * outer_diameter / vessel_diameter)^n',
  values: { C: 0.016, a: 0.67, b: 0.37, c: 0.14, m: 0.1, n: 0.5 },
  groups: {
    Nu: 'Nu@cylinder',
    Re: 'Re@impeller',
    Pr: 'Pr',
    viscosity_ratio: 'viscosity_ratio',
    impeller_diameter: 'impeller_diameter',
    vessel_diameter: 'vessel_diameter',
    outer_diameter: 'outer_diameter',
  },
  limits: [],
  accuracy: 'not stated',
  source:
    'W. R. Penney, V. A. Atiemo-Obeng, Heat Transfer, ch. 14 of Handbook of Industrial Mixing, Wiley 2004, doi 10.1002/0471451452.ch14',
  where: 'helical coil',
  constantsFrom: 'page read',
  use: 'Outside of the coil; Nu on the outer diameter of its tube. Liquid as deep as the vessel is wide, blades of standard height. No range on the page read.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 50000.0, Pr: 20, viscosity_ratio: 1.2, impeller_diameter: 0.5, vessel_diameter: 1.2, outer_diameter: 0.03 },
      value: 56.56234,
      tolerance: 0.00011,
      source: 'H. Vale 2024, open code transport/heat.py, Nu_tank after chapter 14.4 of the handbook',
      where: '0.016 Re^0.67 Pr^0.37, times (d/D/(1/3))^0.1 (d_o/D/0.04)^0.5, evaluated at this point',
    },
  ],
});
