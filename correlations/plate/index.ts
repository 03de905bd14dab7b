import { benitez2009Turbulent } from './benitez-2009-turbulent.ts';
import { gnielinski1975PlateTurbulent } from './gnielinski-1975-plate-turbulent.ts';
import { kaysCrawford1980FluxLocal } from './kays-crawford-1980-flux-local.ts';
import { kaysCrawford1980LowPrLocal } from './kays-crawford-1980-low-pr-local.ts';
import { kaysCrawford1980LowPrMean } from './kays-crawford-1980-low-pr-mean.ts';
import { pohlhausen1921HighPrLocal } from './pohlhausen-1921-high-pr-local.ts';
import { pohlhausen1921HighPrMean } from './pohlhausen-1921-high-pr-mean.ts';
import { pohlhausen1921Local } from './pohlhausen-1921-local.ts';
import { pohlhausen1921Mean } from './pohlhausen-1921-mean.ts';
import { turbulentPlate1934Local } from './turbulent-plate-1934-local.ts';
import { turbulentPlate1934Mixed } from './turbulent-plate-1934-mixed.ts';
import { turbulentPlate1934Tripped } from './turbulent-plate-1934-tripped.ts';

export const plate = [
  benitez2009Turbulent,
  gnielinski1975PlateTurbulent,
  kaysCrawford1980FluxLocal,
  kaysCrawford1980LowPrLocal,
  kaysCrawford1980LowPrMean,
  pohlhausen1921HighPrLocal,
  pohlhausen1921HighPrMean,
  pohlhausen1921Local,
  pohlhausen1921Mean,
  turbulentPlate1934Local,
  turbulentPlate1934Mixed,
  turbulentPlate1934Tripped,
];
