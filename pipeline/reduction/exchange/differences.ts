import { says } from '../../base/says/reduction.ts';
import type { Check, Key, Rule } from '../../rules/rule.ts';
import { logMean } from '../log-mean.ts';
import { crossFlowCorrection } from './cross-flow.ts';

export type Arrangement = 'counter' | 'parallel' | 'cross' | 'well-stirred';

const four: readonly Key[] = ['inlet_temperature', 'outlet_temperature', 'inlet_temperature_other', 'outlet_temperature_other'];

type Ends = (...x: number[]) => readonly [number, number];

const counterEnds: Ends = (a, b, c, d) => [d! - a!, c! - b!];
const parallelEnds: Ends = (a, b, c, d) => [c! - a!, d! - b!];
const stirredEnds: Ends = (contents, c, d) => [c! - contents!, d! - contents!];

const oneSign = (from: readonly Key[], ends: Ends): Check => ({
  code: 'temperatures-cross',
  from,
  holds: (...x) => {
    const [p, q] = ends(...x);
    return p * q > 0;
  },
  otherwise: 'refuse',
  says: (...x) => says.temperaturesCross(...ends(...x)),
});

const logMeanRule = (from: readonly Key[], ends: Ends, formula: string): Rule => ({
  gives: 'mean_difference',
  from,
  of: (...x) => Math.abs(logMean(...ends(...x))),
  formula,
  source: 'definition',
  checks: [oneSign(from, ends)],
});

/** Effectiveness of the own stream and its capacity ratio, by temperatures alone. */
const effectiveness = (a: number, b: number, c: number, d: number): readonly [number, number] => [(b - a) / (c - a), (c - d) / (b - a)];

const crossFlow: Rule = {
  gives: 'mean_difference',
  from: four,
  of: (a, b, c, d) => {
    const [P, R] = effectiveness(a!, b!, c!, d!);
    return crossFlowCorrection(P, R) * Math.abs(logMean(...counterEnds(a!, b!, c!, d!)));
  },
  formula: 'dT_m = F dT_lm (counter flow), F by the series for both streams unmixed',
  source: 'Mason 1955',
  assumes: says.bothUnmixed,
  checks: [
    oneSign(four, counterEnds),
    {
      code: 'no-cross-flow',
      from: four,
      holds: (a, b, c, d) => crossFlowCorrection(...effectiveness(a!, b!, c!, d!)) > 0,
      otherwise: 'refuse',
      says: (a, b, c, d) => says.noCrossFlow(...effectiveness(a!, b!, c!, d!)),
    },
  ],
};

/** A well-stirred stream is at its outlet temperature, and its properties are taken there. */
const contents: readonly Rule[] = [
  {
    gives: 'stirred_temperature',
    from: ['outlet_temperature'],
    of: (t) => t!,
    formula: 'T = T_out',
    source: 'definition',
    assumes: says.outletIsContents,
  },
  { gives: 'stirred_temperature', from: ['temperature'], of: (t) => t!, formula: 'T = temperature', source: 'definition' },
  { gives: 'temperature', from: ['stirred_temperature'], of: (t) => t!, formula: 'T = T_out', source: 'definition' },
];

/** Mean temperature difference of an arrangement of two streams. */
export function differenceRules(arrangement: Arrangement): readonly Rule[] {
  if (arrangement === 'counter') return [logMeanRule(four, counterEnds, 'dT_lm of T_out,other - T_in and T_in,other - T_out')];
  if (arrangement === 'parallel') return [logMeanRule(four, parallelEnds, 'dT_lm of T_in,other - T_in and T_out,other - T_out')];
  if (arrangement === 'cross') return [crossFlow];
  return [
    ...contents,
    logMeanRule(
      ['stirred_temperature', 'inlet_temperature_other', 'outlet_temperature_other'],
      stirredEnds,
      'dT_lm of T_in,other - T and T_out,other - T',
    ),
  ];
}
