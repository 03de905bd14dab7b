import { published } from '../published.ts';

export const siederTate1936Laminar = published({
  id: 'sieder-tate-1936-laminar',
  authors: 'Sieder and Tate',
  year: 1936,
  title: 'Laminar flow in a tube, constant wall temperature, mean over the length',
  family: 'tube',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Gz_heat^a * viscosity_ratio^b',
  values: { C: 1.86, a: 1 / 3, b: 0.14 },
  groups: { Nu: 'Nu@pipe', Gz_heat: 'Gz_heat@pipe', viscosity_ratio: 'viscosity_ratio', Re: 'Re@pipe', Pr: 'Pr' },
  limits: ['Re <= 2300', '0.48 <= Pr <= 16700', '0.0044 <= viscosity_ratio <= 9.75', 'Gz_heat^(1/3) * viscosity_ratio^0.14 >= 2'],
  accuracy: 'not stated',
  source: 'E. N. Sieder, G. E. Tate, Ind. Eng. Chem. 28 (1936) 1429-1435, doi 10.1021/ie50324a027',
  where: 'laminar equation',
  constantsFrom: 'memory',
  use: 'Entry length; below the last limit the profile is developed and Nu approaches 3.66.',
  analogy: false,
  printed: [
    {
      kind: 'worked example',
      at: { Gz_heat: 11.65055793, viscosity_ratio: 1.0 },
      value: 4.2857143,
      tolerance: 0.179,
      source: 'Incropera, DeWitt, Bergman and Lavine, Fundamentals of Heat and Mass Transfer, 6th ed., Wiley 2007',
      where: 'Example 8.8 (mass transfer analogue): printed coefficient 0.012 m/s turned to Sh',
    },
  ],
});
