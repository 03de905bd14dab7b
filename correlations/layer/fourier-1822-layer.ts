import { published } from '../published.ts';

export const fourier1822Layer = published({
  id: 'fourier-1822-layer',
  authors: 'Fourier',
  year: 1822,
  title: 'Plane layer at rest',
  family: 'layer',
  transfer: 'heat',
  average: 'mean',
  reads: 'mean line',
  form: 'Nu = C',
  values: { C: 1 },
  groups: { Nu: 'Nu@layer' },
  limits: [],
  accuracy: 'exact',
  source: 'J. Fourier, Theorie analytique de la chaleur, Paris 1822',
  where: 'h = lambda/s',
  constantsFrom: 'memory',
  use: 'Still layer, gel, membrane or deposit; nothing moves inside it.',
  analogy: true,
  printed: [
    {
      kind: 'analytic limit',
      at: {},
      value: 1,
      tolerance: 1e-12,
      source: 'definition of conduction through a slab',
      where: 'h s/lambda = 1',
    },
  ],
});
