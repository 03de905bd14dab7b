import { published } from '../published.ts';

export const peters1988Cylinders = published({
  id: 'peters-1988-cylinders',
  authors: 'Peters, Schiffino and Harriott',
  year: 1988,
  title: 'Wall film of a tube packed with cylinders',
  family: 'bed-wall',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * (particle_diameter / vessel_diameter)^m * Re^a * Pr^b',
  values: { C: 3.8, m: 0.39, a: 0.5, b: 1 / 3 },
  groups: { Nu: 'Nu@particle', Re: 'Re@particle', Pr: 'Pr', particle_diameter: 'particle_diameter', vessel_diameter: 'vessel_diameter' },
  limits: ['800 <= Re <= 8000', '3 <= vessel_diameter / particle_diameter <= 11'],
  accuracy: 'not stated',
  source: 'P. E. Peters, R. S. Schiffino, P. Harriott, Ind. Eng. Chem. Res. 27 (1988) 226-233, doi 10.1021/ie00074a003',
  where: 'cylinders',
  constantsFrom: 'page read',
  use: 'Film at the wall beside an effective conductivity of the bed.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 900, Pr: 0.7, particle_diameter: 0.006, vessel_diameter: 0.05 },
      value: 44.274284,
      tolerance: 8.9e-5,
      source: 'open code of a hydrogen exchanger, packed_bed_heat_transfer',
      where: '3.8 (d_p/D)^0.39 Re^0.5 Pr^(1/3), as printed by two codes for this paper, evaluated at this point',
    },
  ],
});
