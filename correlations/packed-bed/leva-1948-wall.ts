import { published } from '../published.ts';

export const leva1948Wall = published({
  id: 'leva-1948-wall',
  authors: 'Leva and Grummer',
  year: 1948,
  title: 'Wall of a packed tube, gas heated',
  family: 'packed-bed',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * exp(-B * particle_diameter / vessel_diameter) * Re^a',
  values: { C: 0.813, B: 6, a: 0.9 },
  groups: { Nu: 'Nu@vessel', Re: 'Re@particle', particle_diameter: 'particle_diameter', vessel_diameter: 'vessel_diameter' },
  limits: [],
  accuracy: 'not stated',
  source: 'M. Leva, M. Grummer, Ind. Eng. Chem. 40 (1948) 415-419, doi 10.1021/ie50459a012',
  where: 'as in Latham et al. 2011, eq. (20)',
  constantsFrom: 'page read',
  use: 'Overall coefficient between bed and wall, gas heated; Nu on the bore of the tube. No range on the page read.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 800, particle_diameter: 0.006, vessel_diameter: 0.1 },
      value: 232.55491,
      tolerance: 0.00047,
      source: 'open code of a reforming tube, leva_grummer_alpha after Latham 2011',
      where: '0.813 exp(-6 d_p/d_i) Re^0.9, evaluated at this point',
    },
  ],
});
