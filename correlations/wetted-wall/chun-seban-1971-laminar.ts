import { published } from '../published.ts';

export const chunSeban1971Laminar = published({
  id: 'chun-seban-1971-laminar',
  authors: 'Chun and Seban',
  year: 1971,
  title: 'Evaporating film, wavy laminar',
  family: 'wetted-wall',
  transfer: 'heat',
  average: 'local',
  reads: 'mean line',
  form: 'Nu = C * Re^a',
  values: { C: 0.822, a: -0.22 },
  groups: { Nu: 'Nu@film', Re: 'Re@film', Pr: 'Pr' },
  limits: ['Re >= 30', 'Re * Pr^1.06 <= 5840'],
  accuracy: 'not stated',
  source: 'K. R. Chun, R. A. Seban, J. Heat Transfer 93 (1971) 391-396, doi 10.1115/1.3449836',
  where: 'wavy laminar; lower limit from memory',
  constantsFrom: 'page read',
  use: 'Water evaporating from a vertical wall; some print 0.821, or 0.606 with Re = G/mu.',
  analogy: false,
  printed: [
    {
      kind: 'worked example',
      at: { Re: 256.9593148 },
      value: 0.242499347769,
      tolerance: 0.000435,
      source: 'open code of a falling-film evaporator, check by hand with NIST properties',
      where: 'water at 60 C, 0.03 kg/(m s): 0.822 x 22,998 x 257.0^(-0.22) = 5577 W/(m2 K), power rounded to 3.390',
    },
  ],
});
