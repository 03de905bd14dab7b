import { published } from '../published.ts';

export const martin1977Round = published({
  id: 'martin-1977-round',
  authors: 'Martin',
  year: 1977,
  title: 'Single round nozzle against a plate, mean over a disk',
  family: 'impinging-jet',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = d / r * (1 - A * d / r) / (1 + B * (H / d - D) * d / r) * E * Re^0.5 * (1 + F * Re^0.55)^0.5 * Pr^m',
  values: { A: 1.1, B: 0.1, D: 6, E: 2, F: 0.005, m: 0.42 },
  groups: { Nu: 'Nu@jet,film', Re: 'Re@jet,film', Pr: 'Pr@film', d: 'diameter', H: 'nozzle_distance', r: 'target_radius' },
  limits: ['2e3 <= Re <= 4e5', '2 <= H / d <= 12', '2.5 <= r / d <= 7.5'],
  accuracy: 'not stated',
  source: 'H. Martin, Adv. Heat Transfer 13 (1977) 1-60, doi 10.1016/S0065-2717(08)70221-1',
  where: 'round nozzle',
  constantsFrom: 'page read',
  use: 'Mean over the disk of radius r around the axis of the jet.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 32946.75804, Pr: 0.696, d: 0.025, H: 0.1, r: 0.15 },
      value: 69.77982995,
      tolerance: 7e-5,
      source: 'open textbook script of a round jet at 60 degC',
      where: '1.1, 0.1, 6, 2, 0.005, 0.55, 0.42, with all three ranges',
    },
  ],
});
