import { studentQuantile } from '../numerics/distributions.ts';
import { sandwich } from './covariance.ts';
import { satterthwaite, withKnownPart } from './degrees-of-freedom.ts';
import { rowsOf, type Small } from './dense.ts';
import type { FitOptions, Parameter } from './fit.ts';
import { inNature, scaleOf } from './model.ts';
import { profileLimit } from './profile.ts';
import type { Solved } from './solve-law.ts';
import type { Shifts } from './systematic.ts';

/** One free parameter on the model's coordinates. */
export interface Coordinate {
  readonly estimate: number;
  readonly random: number;
  readonly systematic: number;
  readonly degreesOfFreedom: number;
}

/** Estimates with their intervals, in the order of form.constants, in natural units; `onlyT`: no profiles. */
export function parametersOf(solved: Solved, shifts: Shifts, options: FitOptions, onlyT = false): readonly Parameter[] {
  const { eq, settled, columns, search, held } = solved;
  const { model } = eq.problem;
  const values = inNature(model, settled.theta);
  const scale = scaleOf(model, settled.theta);
  return model.constants.map((name, j) => {
    const onBound = settled.onBound.includes(j);
    const fixed = held.some((one) => one.parameter === name) || !search.free.includes(j);
    const base = { name, estimate: failedEstimate(solved) ? Number.NaN : values[j]!, fixed, onBound };
    if (onBound) return { ...base, ...without(false), ...onBoundInterval(solved, j, options) };
    const position = columns.indexOf(j);
    const at = position < 0 ? undefined : coordinate(solved, shifts, position);
    if (at === undefined) return { ...base, ...without(fixed) };
    const total = Math.hypot(at.random, at.systematic);
    const limits = limitsOf(solved, at, position, options, onlyT);
    const natural = (value: number): number => (model.asLogarithm[j] ? Math.exp(value) : value);
    return {
      ...base,
      standardError: total * scale[j]!,
      standardErrorRandom: at.random * scale[j]!,
      degreesOfFreedom: withKnownPart(at.degreesOfFreedom, at.random, total),
      lower: natural(limits.lower),
      upper: natural(limits.upper),
      intervalBy: limits.by,
    };
  });
}

const failedEstimate = ({ settled }: Solved): boolean => settled.stop.why === 'rank deficient' || settled.stop.why === 'not finite';

/** A held parameter has no error of its own to show; one that could not be told has an unknown one. */
const without = (fixed: boolean): Omit<Parameter, 'name' | 'estimate' | 'fixed' | 'onBound'> => ({
  standardError: fixed ? 0 : Number.NaN,
  standardErrorRandom: fixed ? 0 : Number.NaN,
  degreesOfFreedom: Number.NaN,
  lower: Number.NEGATIVE_INFINITY,
  upper: Number.POSITIVE_INFINITY,
  intervalBy: 'none',
});

/** On a bound: open on the side where the data press, one-sided by the profile on the other. */
function onBoundInterval(solved: Solved, j: number, { confidence }: FitOptions): Pick<Parameter, 'lower' | 'upper' | 'intervalBy'> {
  const { eq, settled, search, columns } = solved;
  const { model } = eq.problem;
  const inward = settled.theta[j]! <= search.lower[j]! ? 1 : -1;
  const all = [...columns, j].sort((a, b) => a - b);
  const position = all.indexOf(j);
  if (eq.problem.n <= all.length) return { lower: Number.NEGATIVE_INFINITY, upper: Number.POSITIVE_INFINITY, intervalBy: 'none' };
  const freed: Solved = { ...solved, columns: all, sandwich: sandwich(eq, all, settled.components) };
  const at = coordinate(freed, { columns: [] }, position);
  const limit =
    at === undefined
      ? inward * Number.POSITIVE_INFINITY
      : profileLimit(freed, position, inward, studentQuantile(confidence, at.degreesOfFreedom));
  const natural = model.asLogarithm[j] ? Math.exp(limit) : limit;
  const [lower, upper] = inward > 0 ? [Number.NEGATIVE_INFINITY, natural] : [natural, Number.POSITIVE_INFINITY];
  return { lower, upper, intervalBy: 'profile' };
}

export function coordinate({ sandwich: found, settled, columns, eq }: Solved, shifts: Shifts, position: number): Coordinate | undefined {
  const phi = found?.phi;
  if (found === undefined || phi === undefined) return undefined;
  const q = columns.length;
  const diagonal = (matrix: Small): number => matrix[position * q + position]!;
  const variance = diagonal(phi);
  const most = eq.problem.n - q;
  return {
    estimate: settled.theta[columns[position]!]!,
    random: Math.sqrt(variance),
    systematic: Math.sqrt(shifts.columns.reduce((sum, shift) => sum + shift[position]! ** 2, 0)),
    degreesOfFreedom: satterthwaite(variance, found.derivatives.map(diagonal), rowsOf(found.components), most),
  };
}

/** t where the law is linear in its parameters; else the profile of Q for the random part, widened by the systematic one. */
function limitsOf(
  solved: Solved,
  at: Coordinate,
  position: number,
  { confidence }: FitOptions,
  onlyT: boolean,
): { readonly lower: number; readonly upper: number; readonly by: 't' | 'profile' } {
  const total = Math.hypot(at.random, at.systematic);
  const t = studentQuantile((1 + confidence) / 2, withKnownPart(at.degreesOfFreedom, at.random, total));
  const k = solved.columns[position]!;
  const [least, most] = [solved.search.lower[k]!, solved.search.upper[k]!];
  const within = (value: number): number => Math.min(most, Math.max(least, value));
  if (onlyT || solved.eq.problem.model.linear)
    return { lower: within(at.estimate - t * total), upper: within(at.estimate + t * total), by: 't' };
  const tRandom = studentQuantile((1 + confidence) / 2, at.degreesOfFreedom);
  const side = (sign: -1 | 1): number => {
    const limit = profileLimit(solved, position, sign, tRandom);
    return within(at.estimate + sign * Math.hypot(limit - at.estimate, t * at.systematic));
  };
  return { lower: side(-1), upper: side(1), by: 'profile' };
}
