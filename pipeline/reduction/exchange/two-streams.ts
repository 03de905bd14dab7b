import { says } from '../../base/says/reduction.ts';
import type { Check, Key, Rule } from '../../rules/rule.ts';
import { wellKnown } from '../checks.ts';
import { heatLoss, where } from '../defaults.ts';
import type { RouteContext } from '../route.ts';
import { type Arrangement, differenceRules } from './differences.ts';
import { type GainVariance, gain, gainVariance, type StreamName, streamKeys } from './duty.ts';

export type Duty = 'own' | 'other' | 'mean' | 'weighted';

/** What the rules of two streams depend on; `balance` is a share of 1. */
export interface TwoStreams {
  readonly arrangement: Arrangement;
  readonly duty: Duty;
  readonly loses: StreamName;
  readonly balance: number;
}

/** Heat through the wall into the own stream, W, by each stream's own balance; the stream that touches the surroundings loses heat_loss. */
function dutyOf(stream: StreamName, loses: StreamName): Rule {
  const sign = stream === 'own' ? 1 : -1;
  return {
    gives: `duty_${stream}`,
    from: [...streamKeys(stream), 'heat_loss'],
    of: (flow, c, a, b, loss) => sign * (gain(flow!, c!, a!, b!) + (loses === stream ? loss! : 0)),
    formula: `Q_${stream} = q_m c_p ${stream === 'own' ? '(T_out - T_in)' : '(T_in - T_out)'}${loses === stream ? ` ${stream === 'own' ? '+' : '-'} heat_loss` : ''}`,
    source: 'definition',
  };
}

/** The duty that the coefficient rests on, positive from the hotter to the colder stream. */
function chosenDuty({ duty, arrangement }: TwoStreams, context: RouteContext): Rule {
  const from: readonly Key[] = [arrangement === 'well-stirred' ? 'stirred_temperature' : 'inlet_temperature', 'inlet_temperature_other'];
  const gives = 'heat_duty';
  const source = 'definition';
  const towards = (own: number, other: number): number => Math.sign(other - own);
  if (duty === 'own' || duty === 'other')
    return { gives, from: [...from, `duty_${duty}`], of: (a, b, q) => towards(a!, b!) * q!, formula: `Q = Q_${duty}`, source };
  if (duty === 'mean')
    return {
      gives,
      from: [...from, 'duty_own', 'duty_other'],
      of: (a, b, p, q) => (towards(a!, b!) * (p! + q!)) / 2,
      formula: 'Q = (Q_own + Q_other)/2',
      source,
    };
  return weightedDuty(gives, from, towards, context);
}

function weightedDuty(gives: Key, from: readonly Key[], towards: (a: number, b: number) => number, context: RouteContext): Rule {
  const own = gainVariance('own', context);
  const other = gainVariance('other', context);
  const known = !Number.isNaN(own.of(1, 1, 1, 2, 1)) && !Number.isNaN(other.of(1, 1, 1, 2, 1));
  // a density that is not looked at is stood in for by the flow, so that none need be known
  const density = (name: StreamName, { needsDensity }: GainVariance): Key =>
    needsDensity ? (name === 'own' ? 'density' : 'density_other') : streamKeys(name)[0];
  const needs = [
    ...[...from, 'duty_own', 'duty_other'],
    ...[...streamKeys('own'), density('own', own)],
    ...[...streamKeys('other'), density('other', other)],
  ];
  const source = 'inverse variances, JCGM 100';
  if (!known)
    return {
      gives,
      from: [...from, 'duty_own', 'duty_other'],
      of: (a, b, p, q) => (towards(a!, b!) * (p! + q!)) / 2,
      formula: 'Q = (Q_own + Q_other)/2',
      source,
      assumes: says.equalWeights,
    };
  return {
    gives,
    from: needs,
    of: (a, b, p, q, ...x) => {
      const wOwn = 1 / own.of(x[0]!, x[1]!, x[2]!, x[3]!, x[4]!);
      const wOther = 1 / other.of(x[5]!, x[6]!, x[7]!, x[8]!, x[9]!);
      return (towards(a!, b!) * (wOwn * p! + wOther * q!)) / (wOwn + wOther);
    },
    formula: 'Q = (Q_own/u_own^2 + Q_other/u_other^2)/(1/u_own^2 + 1/u_other^2)',
    source,
  };
}

const imbalance: readonly Rule[] = [
  {
    gives: 'imbalance',
    from: ['duty_own', 'duty_other'],
    of: (p, q) => (2 * (p! - q!)) / (p! + q!),
    formula: '(Q_own - Q_other)/((Q_own + Q_other)/2)',
    source: 'definition',
  },
  { ...where('imbalance', Number.NaN, says.noBalance), formula: 'imbalance not tested' },
];

/** Note beyond 2 u; refused beyond 4 u unless a loss is stated; with no uncertainty a note, refused only beyond `balance`. */
function balanceChecks(balance: number): readonly Check[] {
  const from: readonly Key[] = ['imbalance', 'u(imbalance)', 'heat_loss'];
  const hopeless = (x: number, u: number): boolean => (u > 0 ? Math.abs(x) > 4 * u : Math.abs(x) > balance);
  return [
    {
      code: 'imbalance-too-large',
      from,
      holds: (x, u, loss) => Number.isNaN(x) || !hopeless(x!, u!) || (u! > 0 && loss !== 0),
      otherwise: 'refuse',
      says: (x, u) => says.imbalanceTooLarge(x!, u!, balance),
    },
    {
      code: 'imbalance',
      from,
      holds: (x, u) => Number.isNaN(x) || (u! > 0 && Math.abs(x!) <= 2 * u!),
      otherwise: 'note',
      says: (x, u) => says.imbalance(x!, u!),
    },
  ];
}

/** Two streams through a wall: U by the duty chosen and the mean difference of the arrangement. */
export function twoStreamRules(spec: TwoStreams, context: RouteContext): readonly Rule[] {
  return [
    dutyOf('own', spec.loses),
    dutyOf('other', spec.loses),
    ...heatLoss(spec.loses === 'own' ? 'temperature' : 'temperature_other'),
    chosenDuty(spec, context),
    ...imbalance,
    ...differenceRules(spec.arrangement),
    {
      gives: 'overall_coefficient',
      from: ['heat_duty', 'area', 'mean_difference'],
      of: (q, area, difference) => q! / (area! * difference!),
      formula: 'U = Q/(A dT_m)',
      source: 'definition',
      checks: [
        {
          code: 'duty-against-difference',
          from: ['heat_duty'],
          holds: (q) => q! > 0,
          otherwise: 'refuse',
          says: (q) => says.dutyAgainstDifference(q!),
        },
        ...balanceChecks(spec.balance),
        wellKnown('mean_difference', 'the mean temperature difference', ' K'),
        wellKnown('heat_duty', 'the duty', ' W'),
      ],
    },
  ];
}
