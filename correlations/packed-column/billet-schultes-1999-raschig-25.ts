import { published } from '../published.ts';

export const billetSchultes1999Raschig25 = published({
  id: 'billet-schultes-1999-raschig-25',
  authors: 'Billet and Schultes',
  year: 1999,
  title: 'Liquid side of ceramic Raschig rings of 25 mm, below loading',
  family: 'packed-column',
  transfer: 'mass',
  average: 'mean',
  reads: 'mean line',
  form: 'Sh = C * 12^(1/6) * (Re * Sc / (4 * voidage * (12 * Fr / Re)^(1/3)))^0.5',
  values: { C: 1.361 },
  groups: { Sh: 'Sh@packing', Re: 'Re@packing', Sc: 'Sc', Fr: 'Fr@packing', voidage: 'voidage' },
  limits: [],
  accuracy: 'not stated',
  source: 'R. Billet, M. Schultes, Trans. IChemE 77 A (1999) 498-504, doi 10.1205/026387699526520',
  where: 'eqs. (6), (7) and (11), C_L 1.361',
  constantsFrom: 'page read',
  use: 'Per interface, whose area is a law of its own; velocity that of the liquid, below the loading point.',
  analogy: false,
  printed: [
    {
      kind: 'constants on a page',
      at: { Re: 40, Sc: 600, Fr: 0.002, voidage: 0.68 },
      value: 666.06655,
      tolerance: 0.0013,
      source: 'open code of an absorber, packing.py with table 2a of the paper',
      where: 'k = C_L 12^(1/6) (u/h D/d_h)^(1/2), h = (12 mu u a^2/(g rho))^(1/3), d_h = 4 e/a, evaluated at this point',
    },
  ],
});
