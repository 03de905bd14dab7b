import { published } from '../published.ts';

export const kta1983 = published({
  id: 'kta-1983',
  authors: 'KTA 3102.2',
  year: 1983,
  title: 'Pebble bed of a gas-cooled reactor',
  family: 'packed-bed',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Pr^(1/3) / voidage^m * Re^a + D * Pr^0.5 / voidage^n * Re^b',
  values: { C: 1.27, m: 1.18, a: 0.36, D: 0.033, n: 1.07, b: 0.86 },
  groups: { Nu: 'Nu@particle', Re: 'Re@particle', Pr: 'Pr', voidage: 'voidage' },
  limits: ['100 <= Re <= 1e5', '0.36 <= voidage <= 0.42'],
  accuracy: 'not stated',
  source:
    'KTA 3102.2, Reactor Core Design of High-Temperature Gas-Cooled Reactors, Part 2: Heat Transfer in Spherical Fuel Elements, June 1983',
  where: 'equation of the rule',
  constantsFrom: 'page read',
  use: 'Beds wider than 20 and deeper than 4 particle diameters; superficial velocity.',
  analogy: true,
  printed: [
    {
      kind: 'worked example',
      at: { Re: 2000.0, Pr: 0.7, voidage: 0.4 },
      value: 102.0851648,
      tolerance: 5e-8,
      source: 'C. Bell 2016, open code conv_packed_bed.py',
      where: 'value printed for Re 2000, Pr 0.7, voidage 0.4: 102.08516480718129',
    },
  ],
});
