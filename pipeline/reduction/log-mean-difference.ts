import type { Arrangement } from './exchange/differences.ts';
import { type Duty, twoStreamRules } from './exchange/two-streams.ts';
import { alongWall } from './exchange/wall.ts';
import { readShare } from './read-share.ts';
import type { Need, Route, Settings } from './route.ts';
import { plainContext, settingOf } from './route.ts';
import { tubeArea } from './tube-area.ts';

const say = (settings: Settings, key: string): string => settingOf(logMeanDifference, settings, key);
const byWall = (settings: Settings): boolean => say(settings, 'arrangement') === 'wall';

const wallNeeds: readonly Need[] = [
  { key: 'mass_flow', says: 'or volume_flow and density' },
  { key: 'heat_capacity', says: 'at bulk temperature' },
  { key: 'inlet_temperature', says: 'of the stream' },
  { key: 'outlet_temperature', says: 'of the stream' },
  { key: 'wall_temperature', says: 'the same all along' },
  { key: 'area', says: 'or diameter and length of one tube' },
];

const otherNeeds: readonly Need[] = [
  {
    key: 'mass_flow_other',
    says: 'or volume_flow_other and density_other',
    without: 'duty: own is the only choice, and the heat balance is not tested',
  },
  { key: 'heat_capacity_other', says: 'at bulk temperature', without: 'as for mass_flow_other' },
  { key: 'inlet_temperature_other', says: 'of the second stream' },
  { key: 'outlet_temperature_other', says: 'of the second stream' },
  { key: 'heat_loss', says: 'or loss_conductance and ambient_temperature', without: 'no loss' },
];

/** A coefficient from a stream's duty and the log-mean difference: h against a wall of known temperature, U between two streams. */
export const logMeanDifference: Route = {
  name: 'log-mean-difference',
  transfer: 'heat',
  title: 'Duty over area and log-mean temperature difference',
  formula: 'h or U = Q/(A dT_lm)',
  source: 'definition; cross flow: Mason 1955',
  settings: {
    arrangement: {
      says: 'against a wall of known temperature, or how the two streams run',
      allowed: ['wall', 'counter', 'parallel', 'cross', 'well-stirred'],
      default: 'wall',
    },
    duty: {
      says: 'whose heat counts; weighted: by the inverse variances of the stated uncertainties',
      allowed: ['own', 'other', 'mean', 'weighted'],
      default: 'mean',
    },
    balance: {
      says: 'open heat balance beyond which a trial is refused where no uncertainty is stated',
      default: '25 %',
      reads: (text) => readShare(text) > 0,
    },
    loses: { says: 'the stream that touches the surroundings and loses heat_loss', allowed: ['own', 'other'], default: 'other' },
  },
  result: (settings) => (byWall(settings) ? 'h' : 'U'),
  gives: (settings) => (byWall(settings) ? 'heat_transfer_coefficient' : 'overall_coefficient'),
  needs: (settings) => (byWall(settings) ? wallNeeds : [...wallNeeds.filter(({ key }) => key !== 'wall_temperature'), ...otherNeeds]),
  rules: (settings, context = plainContext) =>
    byWall(settings)
      ? [...alongWall, ...tubeArea(context.equipment, false)]
      : [
          ...twoStreamRules(
            {
              arrangement: say(settings, 'arrangement') as Arrangement,
              duty: say(settings, 'duty') as Duty,
              loses: say(settings, 'loses') as 'own' | 'other',
              balance: readShare(say(settings, 'balance')),
            },
            context,
          ),
          ...tubeArea(context.equipment, true),
        ],
  ledger: ['heat_duty', 'log_mean_difference', 'duty_own', 'duty_other', 'imbalance', 'mean_difference'],
  numbers: {
    heat_duty: { unit: 'W', symbol: 'Q', says: 'duty that the coefficient rests on' },
    log_mean_difference: { unit: 'K', symbol: 'dT_lm', says: 'log-mean temperature difference' },
    mean_difference: { unit: 'K', symbol: 'dT_m', says: 'mean temperature difference of the arrangement' },
    duty_own: { unit: 'W', symbol: 'Q_own', says: 'heat into the own stream by its own balance' },
    duty_other: { unit: 'W', symbol: 'Q_other', says: "heat into the own stream by the second stream's balance" },
    imbalance: { unit: '1', symbol: 'imbalance', says: 'own less other duty over their mean' },
    stirred_temperature: { unit: 'K', symbol: 'T', says: 'temperature of the well-stirred contents' },
  },
  caution:
    'Constant coefficient and heat capacity along the wall; no phase change in a stream that has a temperature difference. A coefficient of a wall whose temperature varies along it is another one.',
};
