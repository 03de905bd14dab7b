import { published } from '../published.ts';

export const levich1942Disk = published({
  id: 'levich-1942-disk',
  authors: 'Levich',
  year: 1942,
  title: 'Rotating disk, laminar, large Sc',
  family: 'rotating',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'Sh = C * Re^a * Sc^b',
  values: { C: 0.62045, a: 0.5, b: 1 / 3 },
  groups: { Sh: 'Sh@disk', Re: 'Re@disk', Sc: 'Sc' },
  limits: ['Re <= 2e5', 'Sc >= 100'],
  accuracy: 'exact as Sc grows; about 3 % high at Sc 1000 (memory)',
  source:
    'V. G. Levich, Acta Physicochim. URSS 17 (1942) 257-307; W. G. Cochran, Proc. Camb. Phil. Soc. 30 (1934) 365-375, doi 10.1017/S0305004100012561',
  where: 'k = 0.620 D^(2/3) nu^(-1/6) w^(1/2); limit on Sc is ours',
  constantsFrom: 'memory',
  use: 'Disk facing a large volume, laminar; the rate is the same all over it.',
  analogy: true,
  printed: [
    {
      kind: 'analytic limit',
      at: { Re: 1, Sc: 1 },
      value: 0.6204499,
      tolerance: 2e-6,
      source: 'scipy, script fixtures/limits.py beside the test of the catalogue',
      where: '(a/3)^(1/3)/Gamma(4/3) with a = 0.51023',
    },
    {
      kind: 'constants on a page',
      at: { Re: 10000.0, Sc: 1000.0 },
      value: 621.11801,
      tolerance: 1.9,
      source: 'open study of electrochemical transport, correlations.jl and schmidt_extrapolation.py',
      where: 'thickness of the layer 1.61 D^(1/3) nu^(1/6) w^(-1/2), turned to Sh',
    },
  ],
});
