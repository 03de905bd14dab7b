import { says } from '../../base/says/reduction.ts';
import type { Check, Rule } from '../../rules/rule.ts';
import { farFromEquilibrium, wellKnown } from '../checks.ts';
import { heatLoss } from '../defaults.ts';
import { logMean } from '../log-mean.ts';
import { gain, streamKeys } from './duty.ts';

const ends = ['wall_temperature', 'inlet_temperature', 'outlet_temperature'] as const;

const oneSign: Check = {
  code: 'temperatures-cross',
  from: ends,
  holds: (wall, a, b) => (wall! - a!) * (wall! - b!) > 0,
  otherwise: 'refuse',
  says: (wall, a, b) => says.temperaturesCross(wall! - a!, wall! - b!),
};

const towardsWall: Check = {
  code: 'away-from-wall',
  from: ends,
  holds: (wall, a, b) => Math.abs(wall! - b!) < Math.abs(wall! - a!),
  otherwise: 'refuse',
  says: (wall, a, b) => says.awayFromWall(a!, b!, wall!),
};

/** One stream along a wall of known temperature: h by its own duty. */
export const alongWall: readonly Rule[] = [
  {
    gives: 'heat_duty',
    from: streamKeys('own'),
    of: (flow, c, a, b) => Math.abs(gain(flow!, c!, a!, b!)),
    formula: 'Q = q_m c_p |T_out - T_in|',
    source: 'definition',
  },
  {
    gives: 'heat_duty',
    from: ['heat_rate', 'heat_loss'],
    of: (q, loss) => Math.abs(q!) - loss!,
    formula: 'Q = heat_rate - heat_loss',
    source: 'definition',
  },
  ...heatLoss('wall_temperature'),
  {
    gives: 'log_mean_difference',
    from: ends,
    of: (wall, a, b) => Math.abs(logMean(wall! - a!, wall! - b!)),
    formula: 'dT_lm = ((T_w - T_in) - (T_w - T_out))/ln((T_w - T_in)/(T_w - T_out))',
    source: 'definition',
  },
  {
    gives: 'heat_transfer_coefficient',
    from: ['heat_duty', 'area', 'log_mean_difference'],
    of: (q, area, difference) => q! / (area! * difference!),
    formula: 'h = Q/(A dT_lm)',
    source: 'definition',
    checks: [
      oneSign,
      towardsWall,
      farFromEquilibrium('inlet_temperature', 'outlet_temperature', 'wall_temperature'),
      wellKnown('log_mean_difference', 'the log-mean difference', ' K'),
      wellKnown('heat_duty', 'the duty', ' W'),
    ],
  },
];
