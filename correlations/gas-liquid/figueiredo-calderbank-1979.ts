import { published } from '../published.ts';

export const figueiredoCalderbank1979 = published({
  id: 'figueiredo-calderbank-1979',
  authors: 'Figueiredo and Calderbank',
  year: 1979,
  title: 'Stirred vessel, air and water',
  family: 'gas-liquid',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'volumetric_coefficient = C * power_per_volume^a * gas_velocity^b',
  values: { C: 0.026, a: 0.6, b: 0.8 },
  groups: { volumetric_coefficient: 'volumetric_coefficient', power_per_volume: 'power_per_volume', gas_velocity: 'gas_velocity' },
  limits: [],
  accuracy: 'not stated',
  source:
    'M. M. L. de Figueiredo, P. H. Calderbank, Chem. Eng. Sci. 34 (1979) 1333-1338; as in F. Garcia-Ochoa, E. Gomez, Biotechnol. Adv. 27 (2009) 153-176, doi 10.1016/j.biotechadv.2008.10.006',
  where: 'table of exponents in the review',
  constantsFrom: 'page read',
  use: 'Larger exponents than others find for water. No range on the page read.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { power_per_volume: 2000, gas_velocity: 0.02 },
      value: 0.10874651,
      tolerance: 2.2e-7,
      source: 'Y. Cortes-Pena and others 2023, open code design_tools/aeration.py',
      where: '0.026 (P/V)^0.6 u^0.8, evaluated at this point',
    },
  ],
});
