import { bedExposure } from './bed-exposure.ts';
import { counterCurrentTransfer } from './counter-current-transfer.ts';
import { evaporation } from './evaporation.ts';
import { gassingIn } from './gassing-in.ts';
import { heatRate } from './heat-rate.ts';
import { layerPermeation } from './layer-permeation.ts';
import { limitingCurrent } from './limiting-current.ts';
import { logMeanConcentration } from './log-mean-concentration.ts';
import { logMeanDifference } from './log-mean-difference.ts';
import { massRate } from './mass-rate.ts';
import { measured } from './measured.ts';
import { otherSidePlot } from './other-side-plot.ts';
import { pelletDissolution } from './pellet-dissolution.ts';
import type { Route } from './route.ts';
import { seriesResistance, thenSeriesResistance } from './series-resistance.ts';
import { sphereCooling } from './sphere-cooling.ts';
import { vesselHeating } from './vessel-heating.ts';

const list: readonly Route[] = [
  thenSeriesResistance(measured),
  heatRate,
  thenSeriesResistance(logMeanDifference),
  seriesResistance,
  sphereCooling,
  thenSeriesResistance(vesselHeating),
  otherSidePlot,
  massRate,
  logMeanConcentration,
  bedExposure,
  counterCurrentTransfer,
  pelletDissolution,
  gassingIn,
  limitingCurrent,
  evaporation,
  layerPermeation,
];

/** Every route by name. */
export const routes: Readonly<Record<string, Route>> = Object.fromEntries(list.map((route) => [route.name, route]));

/** Names of the routes for one kind of transfer. */
export const routeNames = (transfer: 'heat' | 'mass'): readonly string[] =>
  list.filter((route) => route.transfer === transfer || route.transfer === 'either').map(({ name }) => name);
