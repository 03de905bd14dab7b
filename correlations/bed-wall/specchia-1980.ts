import { published } from '../published.ts';

export const specchia1980 = published({
  id: 'specchia-1980',
  authors: 'Specchia, Baldi and Sicardi',
  year: 1980,
  title: 'Wall film of a packed tube, with the bed at rest',
  family: 'bed-wall',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = A * voidage + (1 - voidage) / (B * (vessel_diameter / particle_diameter)^m + D * thermal_conductivity / solid_conductivity) + C * Re^a',
  values: { A: 2, B: 0.0024, m: 1.58, D: 1 / 3, C: 0.0835, a: 0.91 },
  groups: {
    Nu: 'Nu@particle',
    Re: 'Re@particle',
    voidage: 'voidage',
    vessel_diameter: 'vessel_diameter',
    particle_diameter: 'particle_diameter',
    thermal_conductivity: 'thermal_conductivity',
    solid_conductivity: 'solid_conductivity',
  },
  limits: ['Re <= 190'],
  accuracy: 'not stated',
  source:
    'V. Specchia, G. Baldi, S. Sicardi, Chem. Eng. Commun. 4 (1980) 361-380, doi 10.1080/00986448008935916; as in Bareschino et al. 2023, eq. S.10',
  where: 'part of the bed at rest and part of the flow; another page prints 2 voidage + 0.0835 Re^0.91 alone, Re 10 to 1200',
  constantsFrom: 'page read',
  use: 'Film at the wall beside an effective conductivity of the bed, gas.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 30, voidage: 0.4, vessel_diameter: 0.05, particle_diameter: 0.003, thermal_conductivity: 0.05, solid_conductivity: 0.4 },
      value: 5.0816411,
      tolerance: 1e-5,
      source: 'open code of a methanation tube, bed-to-wall coefficient after Bareschino 2023',
      where: '2 e + (1 - e)/(0.0024 (d_t/d_p)^1.58 + lambda/lambda_s/3) + 0.0835 Re^0.91, Re < 190, evaluated at this point',
    },
  ],
});
