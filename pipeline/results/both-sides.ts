import { evaluate } from '../algebra/evaluate.ts';
import type { Note } from '../base/message.ts';
import * as says from '../base/says/results.ts';
import type { PlannedLaw } from '../plan/plan.ts';
import type { Fit, FitData } from '../regression/fit.ts';

/** A law of one side, fitted through overall coefficients: both sides with intervals at the study's confidence. */
export interface BothSides {
  readonly law: string;
  /** All else than the law's side, on the outer area, m^2 K/W; one for each campaign. */
  readonly others: readonly { readonly campaign: string; readonly resistance: number; readonly lower: number; readonly upper: number }[];
  /** The law's side per trial, on its own area. `share` is its part of the whole resistance. */
  readonly own: readonly {
    readonly trial: string;
    readonly coefficient: number;
    readonly lower: number;
    readonly upper: number;
    readonly share: number;
  }[];
}

/** Resistances and own side of a fitted law; undefined for a law without other side. `coefficientPer` is the coefficient of each trial for a response of 1. */
export function bothSides(
  { own }: PlannedLaw,
  fit: Fit,
  data: FitData,
  campaigns: readonly string[],
  coefficientPer: (trial: number) => number,
): BothSides | undefined {
  if (own === undefined) return undefined;
  const natural = (g: number, i: number): number => (data.scale === 'relative' ? Math.exp(data.x[g]![i]!) : data.x[g]![i]!);
  const parameter = new Map(fit.parameters.map((one) => [one.name, one]));
  const inside = own.form.constants.map((name) => fit.form.constants.indexOf(name));
  const t = widest(fit);
  return {
    law: fit.name,
    others: own.resistances.map((name, k) => {
      const { estimate, lower, upper } = parameter.get(name)!;
      return { campaign: campaigns[k] ?? '', resistance: estimate, lower: Math.max(0, lower), upper };
    }),
    own: data.trials.map((trial, i) => {
      const at = Object.fromEntries(fit.form.groups.map((name, g) => [name, natural(g, i)]));
      const response = evaluate(own.form.tree, at, fit.values);
      const slopes = own.form.constants.map((name) => logSlope((values) => evaluate(own.form.tree, at, values), fit.values, name));
      const variance = slopes.reduce(
        (sum, a, j) => sum + slopes.reduce((inner, b, k) => inner + a * b * fit.covariance[inside[j]!]![inside[k]!]!, 0),
        0,
      );
      const factor = Math.exp(t * Math.sqrt(variance));
      const coefficient = response * coefficientPer(i);
      const conductance = response * at[own.names.scale]!;
      return {
        trial,
        coefficient,
        lower: coefficient / factor,
        upper: coefficient * factor,
        share: evaluate(fit.form.tree, at, fit.values) / conductance,
      };
    }),
  };
}

/** d ln f/d parameter by central differences. */
function logSlope(f: (values: Readonly<Record<string, number>>) => number, values: Readonly<Record<string, number>>, name: string): number {
  const step = 1e-5 * Math.max(Math.abs(values[name]!), 1e-8);
  const at = (x: number): number => Math.log(f({ ...values, [name]: x }));
  return (at(values[name]! + step) - at(values[name]! - step)) / (2 * step);
}

/** The largest of the parameters' own factors from standard error to interval. */
const widest = ({ parameters }: Fit): number =>
  Math.max(
    ...parameters
      .filter((one) => one.standardError > 0 && Number.isFinite(one.upper))
      .map((one) => (one.upper - one.estimate) / one.standardError),
    2,
  );

/** The same in words, for the chosen law. */
export function bothSidesNotes({ law, others, own }: BothSides): readonly Note[] {
  const shares = own.map(({ share }) => share);
  const [low, high] = [Math.min(...shares), Math.max(...shares)];
  return [
    {
      section: 'evidence',
      level: 'note',
      code: 'both-sides',
      text: says.bothSides(
        law,
        others,
        own.map((one) => one.coefficient),
      ),
    },
    {
      section: 'evidence',
      level: low < 0.3 ? 'warning' : 'note',
      code: 'own-share',
      text: says.ownShare(low, high),
    },
    { section: 'evidence', level: 'note', code: 'one-step', text: says.oneStep() },
  ];
}
