import { colledgePaterson1984 } from './colledge-paterson-1984.ts';
import { das2017 } from './das-2017.ts';
import { demirel2000 } from './demirel-2000.ts';
import { dixon1984 } from './dixon-1984.ts';
import { gelperinEinstein1971Wide } from './gelperin-einstein-1971-wide.ts';
import { laguerre2006 } from './laguerre-2006.ts';
import { leva1947Heated } from './leva-1947-heated.ts';
import { leva1948Cooled } from './leva-1948-cooled.ts';
import { liFinlayson1977Cylinders } from './li-finlayson-1977-cylinders.ts';
import { liFinlayson1977Spheres } from './li-finlayson-1977-spheres.ts';
import { molerus1995Fine } from './molerus-1995-fine.ts';
import { olbrichPotter1972 } from './olbrich-potter-1972.ts';
import { peters1988Cylinders } from './peters-1988-cylinders.ts';
import { peters1988Spheres } from './peters-1988-spheres.ts';
import { specchia1980 } from './specchia-1980.ts';
import { yagiWakao1959High } from './yagi-wakao-1959-high.ts';
import { yagiWakao1959Low } from './yagi-wakao-1959-low.ts';
import { zabrodsky1976 } from './zabrodsky-1976.ts';

export const bedWall = [
  colledgePaterson1984,
  das2017,
  demirel2000,
  dixon1984,
  gelperinEinstein1971Wide,
  laguerre2006,
  leva1947Heated,
  leva1948Cooled,
  liFinlayson1977Cylinders,
  liFinlayson1977Spheres,
  molerus1995Fine,
  olbrichPotter1972,
  peters1988Cylinders,
  peters1988Spheres,
  specchia1980,
  yagiWakao1959High,
  yagiWakao1959Low,
  zabrodsky1976,
];
