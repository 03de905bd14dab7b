import { zukauskas1972AlignedHigh } from './zukauskas-1972-aligned-high.ts';
import { zukauskas1972AlignedLow } from './zukauskas-1972-aligned-low.ts';
import { zukauskas1972AlignedMiddle } from './zukauskas-1972-aligned-middle.ts';
import { zukauskas1972StaggeredClose } from './zukauskas-1972-staggered-close.ts';
import { zukauskas1972StaggeredHigh } from './zukauskas-1972-staggered-high.ts';
import { zukauskas1972StaggeredLow } from './zukauskas-1972-staggered-low.ts';
import { zukauskas1972StaggeredWide } from './zukauskas-1972-staggered-wide.ts';

export const tubeBank = [
  zukauskas1972AlignedHigh,
  zukauskas1972AlignedLow,
  zukauskas1972AlignedMiddle,
  zukauskas1972StaggeredClose,
  zukauskas1972StaggeredHigh,
  zukauskas1972StaggeredLow,
  zukauskas1972StaggeredWide,
];
