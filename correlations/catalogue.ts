import { annulus } from './annulus/index.ts';
import { bedWall } from './bed-wall/index.ts';
import { coil } from './coil/index.ts';
import type { Correlation } from './correlation.ts';
import { cylinder } from './cylinder/index.ts';
import { fluidisedBed } from './fluidised-bed/index.ts';
import { gasLiquid } from './gas-liquid/index.ts';
import { impingingJet } from './impinging-jet/index.ts';
import { layer } from './layer/index.ts';
import { membrane } from './membrane/index.ts';
import { naturalConvection } from './natural-convection/index.ts';
import { packedBed } from './packed-bed/index.ts';
import { packedColumn } from './packed-column/index.ts';
import { plate } from './plate/index.ts';
import { plateExchanger } from './plate-exchanger/index.ts';
import { rotating } from './rotating/index.ts';
import { sphere } from './sphere/index.ts';
import { suspendedSolids } from './suspended-solids/index.ts';
import { tube } from './tube/index.ts';
import { tubeBank } from './tube-bank/index.ts';
import { vessel } from './vessel/index.ts';
import { wettedWall } from './wetted-wall/index.ts';

/** Every published correlation, family by family. */
export const catalogue: readonly Correlation[] = [
  ...tube,
  ...annulus,
  ...coil,
  ...plate,
  ...cylinder,
  ...tubeBank,
  ...sphere,
  ...naturalConvection,
  ...impingingJet,
  ...plateExchanger,
  ...membrane,
  ...packedBed,
  ...fluidisedBed,
  ...bedWall,
  ...vessel,
  ...suspendedSolids,
  ...gasLiquid,
  ...wettedWall,
  ...layer,
  ...packedColumn,
  ...rotating,
];
