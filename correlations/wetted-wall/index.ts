import { chunSeban1971Laminar } from './chun-seban-1971-laminar.ts';
import { chunSeban1971Turbulent } from './chun-seban-1971-turbulent.ts';
import { gillilandSherwood1934 } from './gilliland-sherwood-1934.ts';
import { higbie1935Film } from './higbie-1935-film.ts';
import { laminarFilmHeated } from './laminar-film-heated.ts';
import { nusselt1916Film } from './nusselt-1916-film.ts';
import { pigford1941Long } from './pigford-1941-long.ts';

export const wettedWall = [
  chunSeban1971Laminar,
  chunSeban1971Turbulent,
  gillilandSherwood1934,
  higbie1935Film,
  laminarFilmHeated,
  nusselt1916Film,
  pigford1941Long,
];
