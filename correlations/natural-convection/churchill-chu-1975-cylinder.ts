import { published } from '../published.ts';

export const churchillChu1975Cylinder = published({
  id: 'churchill-chu-1975-cylinder',
  authors: 'Churchill and Chu',
  year: 1975,
  title: 'Horizontal cylinder, free convection, all Ra',
  family: 'natural-convection',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = (A + B * Ra^(1/6) / (1 + (D / Pr)^(9/16))^(8/27))^2',
  values: { A: 0.6, B: 0.387, D: 0.559 },
  groups: { Nu: 'Nu@cylinder,film', Ra: 'Ra@cylinder,film', Pr: 'Pr@film' },
  limits: ['Ra <= 1e12'],
  accuracy: 'not stated',
  source: 'S. W. Churchill, H. H. S. Chu, Int. J. Heat Mass Transfer 18 (1975) 1049-1053, doi 10.1016/0017-9310(75)90222-7',
  where: 'eq. for the cylinder',
  constantsFrom: 'memory',
  use: 'Long isothermal horizontal cylinders.',
  analogy: false,
  printed: [
    {
      kind: 'worked example',
      at: { Ra: 5075924.663, Pr: 0.697 },
      value: 23.095293,
      tolerance: 0.0358,
      source: 'Incropera, DeWitt, Bergman and Lavine, Fundamentals of Heat and Mass Transfer, 6th ed., Wiley 2007',
      where: 'Example 9.4: printed 763 W/m of the companion notebook (integer part) less radiation at emissivity 0.85, turned to Nu',
    },
  ],
});
