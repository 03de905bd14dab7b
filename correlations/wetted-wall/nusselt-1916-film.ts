import { published } from '../published.ts';

export const nusselt1916Film = published({
  id: 'nusselt-1916-film',
  authors: 'Nusselt',
  year: 1916,
  title: 'Smooth laminar film, evaporating or condensing',
  family: 'wetted-wall',
  transfer: 'heat',
  average: 'local',
  reads: 'lower bound',
  form: 'Nu = C * Re^a',
  values: { C: Math.cbrt(4 / 3), a: -1 / 3 },
  groups: { Nu: 'Nu@film', Re: 'Re@film' },
  limits: ['Re <= 30'],
  accuracy: 'exact without waves',
  source: 'W. Nusselt, Z. VDI 60 (1916) 541-546, 569-575',
  where: 'h = lambda/thickness; limit of the smooth film is common practice',
  constantsFrom: 'memory',
  use: 'Conduction through the film; waves raise it from Re of about 30.',
  analogy: false,
  printed: [
    {
      kind: 'analytic limit',
      at: { Re: 12 },
      value: 0.4807498567691362,
      tolerance: 1e-9,
      source: 'thickness (3 nu G/(rho g))^(1/3) of a laminar film',
      where: 'h L/lambda = L/thickness = (3 Re/4)^(-1/3)',
    },
  ],
});
