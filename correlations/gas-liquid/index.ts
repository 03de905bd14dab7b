import { akitaYoshida1973 } from './akita-yoshida-1973.ts';
import { calderbankMooYoung1961LargeBubbles } from './calderbank-moo-young-1961-large-bubbles.ts';
import { calderbankMooYoung1961SmallBubbles } from './calderbank-moo-young-1961-small-bubbles.ts';
import { dewesSchumpe1997 } from './dewes-schumpe-1997.ts';
import { figueiredoCalderbank1979 } from './figueiredo-calderbank-1979.ts';
import { higbie1935Bubble } from './higbie-1935-bubble.ts';
import { labik2017 } from './labik-2017.ts';
import { lamontScott1970 } from './lamont-scott-1970.ts';
import { linek2004 } from './linek-2004.ts';
import { posaracTekic1987 } from './posarac-tekic-1987.ts';
import { suh1991 } from './suh-1991.ts';
import { vantRiet1979Coalescing } from './vant-riet-1979-coalescing.ts';
import { vantRiet1979NonCoalescing } from './vant-riet-1979-non-coalescing.ts';

export const gasLiquid = [
  akitaYoshida1973,
  calderbankMooYoung1961LargeBubbles,
  calderbankMooYoung1961SmallBubbles,
  dewesSchumpe1997,
  figueiredoCalderbank1979,
  higbie1935Bubble,
  labik2017,
  lamontScott1970,
  linek2004,
  posaracTekic1987,
  suh1991,
  vantRiet1979Coalescing,
  vantRiet1979NonCoalescing,
];
