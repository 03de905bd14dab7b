import { published } from '../published.ts';

export const fourier1822TubeLayer = published({
  id: 'fourier-1822-tube-layer',
  authors: 'Fourier',
  year: 1822,
  title: 'Layer around a tube, at rest',
  family: 'layer',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C / ln(outer_diameter / diameter)',
  values: { C: 2 },
  groups: { Nu: 'Nu@cylinder', outer_diameter: 'outer_diameter', diameter: 'diameter' },
  limits: [],
  accuracy: 'exact',
  source: 'J. Fourier, Theorie analytique de la chaleur, Paris 1822',
  where: 'h d_o/lambda = 2/ln(d_o/d)',
  constantsFrom: 'memory',
  use: 'Insulation, deposit or gel on a tube; coefficient per outer area, Nu on the outer diameter.',
  analogy: true,
  printed: [
    {
      kind: 'analytic limit',
      at: { outer_diameter: 1.001, diameter: 1.0 },
      value: 2001.9999999999998,
      tolerance: 2,
      source: 'limit of a thin layer: h = lambda/s',
      where: '2/ln(d_o/d) approaches d_o/s, s = (d_o - d)/2',
    },
  ],
});
