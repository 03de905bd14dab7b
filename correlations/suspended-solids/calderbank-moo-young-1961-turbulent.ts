import { published } from '../published.ts';

export const calderbankMooYoung1961Turbulent = published({
  id: 'calderbank-moo-young-1961-turbulent',
  authors: 'Calderbank and Moo-Young',
  year: 1961,
  title: 'Particles and small bubbles in a stirred vessel',
  family: 'suspended-solids',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'Sh = C * Re^a * Sc^b',
  values: { C: 0.13, a: 0.75, b: 1 / 3 },
  groups: { Sh: 'Sh@particle', Re: 'Re@energy-dissipation', Sc: 'Sc' },
  limits: [],
  accuracy: 'standard deviation 66 % over a 10^7-fold change of the variables (authors)',
  source: 'P. H. Calderbank, M. B. Moo-Young, Chem. Eng. Sci. 16 (1961) 39-54, doi 10.1016/0009-2509(61)87005-X',
  where: 'eq. (4), k Sc^(2/3) = 0.13 (P/V mu/rho^2)^(1/4), here in Sh: (P/V mu/rho^2)^(1/4) d_p/nu = Re^(3/4)',
  constantsFrom: 'page read',
  use: 'k does not depend on the size of the particle; turbulent, P/V the mean of the vessel. No range on the page read.',
  analogy: true,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 79.370053, Sc: 1000 },
      value: 34.568923,
      tolerance: 6.9e-5,
      source: 'open pymrm gallery, transcription of the constants printed in the paper',
      where: 'eq. (4), k Sc^(2/3) = 0.13 (P/V mu/rho^2)^(1/4) at 500 W/m3, 1 mPa s, 1000 kg/m3, 1 mm, D 1e-9 m2/s, turned to Sh',
    },
  ],
});
