import { armenanteKirwan1989 } from './armenante-kirwan-1989.ts';
import { calderbankMooYoung1961RigidSpheres } from './calderbank-moo-young-1961-rigid-spheres.ts';
import { calderbankMooYoung1961Turbulent } from './calderbank-moo-young-1961-turbulent.ts';
import { levinsGlastonbury1972 } from './levins-glastonbury-1972.ts';
import { levinsGlastonbury1972Slip } from './levins-glastonbury-1972-slip.ts';

export const suspendedSolids = [
  armenanteKirwan1989,
  calderbankMooYoung1961RigidSpheres,
  calderbankMooYoung1961Turbulent,
  levinsGlastonbury1972,
  levinsGlastonbury1972Slip,
];
