import { dittusBoelter1930Cooling } from './dittus-boelter-1930-cooling.ts';
import { dittusBoelter1930Heating } from './dittus-boelter-1930-heating.ts';
import { graetz1885WallTemperature } from './graetz-1885-wall-temperature.ts';
import { laminarTubeWallFlux } from './laminar-tube-wall-flux.ts';
import { leveque1928Mean } from './leveque-1928-mean.ts';
import { siederTate1936Laminar } from './sieder-tate-1936-laminar.ts';

export const tube = [
  dittusBoelter1930Heating,
  dittusBoelter1930Cooling,
  siederTate1936Laminar,
  graetz1885WallTemperature,
  laminarTubeWallFlux,
  leveque1928Mean,
];
