import { published } from '../published.ts';

export const kaysCrawford1980LowPrMean = published({
  id: 'kays-crawford-1980-low-pr-mean',
  authors: 'Kays and Crawford',
  year: 1980,
  title: 'Flat plate, laminar, liquid metals, mean',
  family: 'plate',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C * Pe_heat^a',
  values: { C: 1.13, a: 0.5 },
  groups: { Nu: 'Nu@plate', Re: 'Re@plate,film', Pe_heat: 'Pe_heat@plate,film', Pr: 'Pr@film' },
  limits: ['Re <= 5e5', 'Pe_heat >= 100', 'Pr <= 0.05'],
  accuracy: 'limit',
  source: 'W. M. Kays, M. E. Crawford, Convective Heat and Mass Transfer, McGraw-Hill 1980',
  where: 'limit of low Pr',
  constantsFrom: 'memory',
  use: 'Liquid metals.',
  analogy: false,
  printed: [
    {
      kind: 'analytic limit',
      at: { Pe_heat: 10000 },
      value: 112.8379167,
      tolerance: 0.2,
      source: 'closed form 2/sqrt(pi)',
      where: 'plug flow past a wall',
    },
  ],
});
