import { says } from '../base/says/reduction.ts';
import { wellKnown } from './checks.ts';
import { where } from './defaults.ts';
import type { Route } from './route.ts';
import { gassing } from './series/gassing.ts';

/** kLa from the curve of dissolved gas after a step of the gas, the probe's lag taken into account. */
export const gassingIn: Route = {
  name: 'gassing-in',
  transfer: 'mass',
  title: 'Dissolved gas after a step of the gas, read by a probe with a lag',
  formula: 'c = c* - (c* - c_0) (exp(-kLa t) - kLa tau exp(-t/tau))/(1 - kLa tau)',
  source: 'first-order absorption read by a first-order probe; common practice, no source',
  settings: {},
  result: () => 'kLa',
  gives: () => 'volumetric_coefficient',
  needs: () => [
    { key: 'bulk_concentration', says: 'logged, as coefficient.series; in any unit that is linear in concentration' },
    { key: 'probe_time', says: 'time constant of the probe (63 %)', without: 'a probe without lag' },
    { key: 'interfacial_area', says: 'for k from kLa', without: 'kLa only' },
  ],
  rules: () => [
    where('probe_time', 0, says.noLag),
    {
      gives: 'volumetric_coefficient',
      from: ['curve_rate', 'curve_rate_per_lag', 'curve_lag', 'probe_time'],
      of: (rate, slope, fitted, tau) => rate! + slope! * (tau! - fitted!),
      formula: 'kLa by least squares on the curve convolved with the lag of the probe',
      source: 'definition',
      assumes: says.stepAtStart,
      checks: [
        {
          code: 'slow-probe',
          from: ['volumetric_coefficient', 'probe_time'],
          holds: (kLa, tau) => kLa! * tau! <= 1,
          otherwise: 'warning',
          says: (kLa, tau) => says.slowProbe(kLa!, tau!),
        },
        wellKnown('volumetric_coefficient', 'kLa', ' 1/s'),
      ],
    },
  ],
  series: () => gassing,
  ledger: ['curve_saturation'],
  numbers: {
    curve_saturation: { unit: '1', symbol: 'c*', says: 'saturation that the curve heads for, in its own unit' },
  },
  caution:
    'Well-mixed liquid and gas of constant composition: where the gas is depleted, or its hold-up builds up during the curve, kLa reads low.',
};
