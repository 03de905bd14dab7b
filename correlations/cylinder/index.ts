import { bedingfieldDrew1950 } from './bedingfield-drew-1950.ts';
import { churchillBernstein1977 } from './churchill-bernstein-1977.ts';
import { hilpert1933High } from './hilpert-1933-high.ts';
import { hilpert1933HighTextbook } from './hilpert-1933-high-textbook.ts';
import { hilpert1933Low } from './hilpert-1933-low.ts';
import { hilpert1933Lowest } from './hilpert-1933-lowest.ts';
import { hilpert1933Middle } from './hilpert-1933-middle.ts';
import { hilpert1933Upper } from './hilpert-1933-upper.ts';
import { jakob1949Square } from './jakob-1949-square.ts';
import { squire1938Stagnation } from './squire-1938-stagnation.ts';

export const cylinder = [
  bedingfieldDrew1950,
  churchillBernstein1977,
  hilpert1933High,
  hilpert1933HighTextbook,
  hilpert1933Low,
  hilpert1933Lowest,
  hilpert1933Middle,
  hilpert1933Upper,
  jakob1949Square,
  squire1938Stagnation,
];
