import { baehrStephan2006Entry } from './baehr-stephan-2006-entry.ts';
import { colburn1933 } from './colburn-1933.ts';
import { dittusBoelter1930Cooling } from './dittus-boelter-1930-cooling.ts';
import { dittusBoelter1930Heating } from './dittus-boelter-1930-heating.ts';
import { gnielinski1976 } from './gnielinski-1976.ts';
import { gnielinski1995Entry } from './gnielinski-1995-entry.ts';
import { gnielinski2002EntryWallFlux } from './gnielinski-2002-entry-wall-flux.ts';
import { gnielinski2002EntryWallTemperature } from './gnielinski-2002-entry-wall-temperature.ts';
import { gnielinski2002WallFlux } from './gnielinski-2002-wall-flux.ts';
import { gnielinski2002WallTemperature } from './gnielinski-2002-wall-temperature.ts';
import { graetz1885WallTemperature } from './graetz-1885-wall-temperature.ts';
import { hausen1943Laminar } from './hausen-1943-laminar.ts';
import { laminarTubeWallFlux } from './laminar-tube-wall-flux.ts';
import { leveque1928Local } from './leveque-1928-local.ts';
import { leveque1928Mean } from './leveque-1928-mean.ts';
import { lintonSherwood1950 } from './linton-sherwood-1950.ts';
import { lyon1951 } from './lyon-1951.ts';
import { petukhovPopov1963 } from './petukhov-popov-1963.ts';
import { sebanShimazaki1951 } from './seban-shimazaki-1951.ts';
import { shahLondon1978FluxLocal } from './shah-london-1978-flux-local.ts';
import { shahLondon1978ShortTubeFluxLocal } from './shah-london-1978-short-tube-flux-local.ts';
import { shahLondon1978ShortTubeFluxMean } from './shah-london-1978-short-tube-flux-mean.ts';
import { siederTate1936Laminar } from './sieder-tate-1936-laminar.ts';
import { siederTate1936Turbulent } from './sieder-tate-1936-turbulent.ts';
import { skupinski1965 } from './skupinski-1965.ts';
import { sleicherRouse1975 } from './sleicher-rouse-1975.ts';

export const tube = [
  baehrStephan2006Entry,
  colburn1933,
  dittusBoelter1930Cooling,
  dittusBoelter1930Heating,
  gnielinski1976,
  gnielinski1995Entry,
  gnielinski2002EntryWallFlux,
  gnielinski2002EntryWallTemperature,
  gnielinski2002WallFlux,
  gnielinski2002WallTemperature,
  graetz1885WallTemperature,
  hausen1943Laminar,
  laminarTubeWallFlux,
  leveque1928Local,
  leveque1928Mean,
  lintonSherwood1950,
  lyon1951,
  petukhovPopov1963,
  sebanShimazaki1951,
  shahLondon1978FluxLocal,
  shahLondon1978ShortTubeFluxLocal,
  shahLondon1978ShortTubeFluxMean,
  siederTate1936Laminar,
  siederTate1936Turbulent,
  skupinski1965,
  sleicherRouse1975,
];
