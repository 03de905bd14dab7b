import { type Equations, equations } from './equations.ts';
import type { Fit, FitData, FitOptions } from './fit.ts';
import { inNature } from './model.ts';
import type { Problem } from './problem.ts';
import { failed } from './settle.ts';
import { type LawToFit, type Solved, solveLaw } from './solve-law.ts';
import { solveTheta } from './theta.ts';

/** A law refitted with less weight on trials far from it: a look at how much the fit hangs on them. Takes the place of no fit and of no trial. */
export interface RobustRefit {
  readonly law: string;
  readonly method: 'Huber' | 'bisquare';
  /** Natural units; empty where there is no refit. */
  readonly values: Readonly<Record<string, number>>;
  /** Spread of the middle of the residuals (median absolute value over 0.6745), as a share of the standard deviation that the fit gives them. */
  readonly scale: number;
  /** n, in the order of the fit's data: 1 is a whole trial. */
  readonly weights: readonly number[];
  readonly stop: 'converged' | 'iterations used up' | 'more than half of the residuals are zero' | 'not finite';
  readonly iterations: number;
}

/** Weight of a trial by its residual u in units of the scale. Tuning for 95 % efficiency at normal errors (Huber 1964; Beaton and Tukey 1974). */
const weightings: readonly { readonly method: RobustRefit['method']; readonly weight: (u: number) => number }[] = [
  { method: 'Huber', weight: (u) => Math.min(1, 1.345 / Math.abs(u)) },
  { method: 'bisquare', weight: (u) => Math.max(0, 1 - (u / 4.685) ** 2) ** 2 },
];

/** The change of any weight that ends the iteration; the least weight, which keeps variances finite; a scale below this is rounding. */
const LIMITS = { iterations: 500, change: 1e-10, weight: 1e-12, scale: 1e-9 };

/** Median absolute value of a standard normal number. */
const NORMAL_MEDIAN = 0.6745; // as MASS's rlm rounds it

/**
 * M-estimates by iteratively reweighted least squares from the fit, each trial's variance over its weight, sigma and tau held; residuals from the law and their
 * campaign's shift. For V = sigma^2 I these are rlm's of MASS. Empty where the law has no fit.
 */
export function robustRefits(law: LawToFit, fit: Fit, data: FitData, options: FitOptions): readonly RobustRefit[] {
  const solved = solveLaw({ ...law, start: fit.values, trusted: true }, data, options);
  if (failed(solved.settled.stop) || solved.sandwich === undefined) return [];
  return weightings.map(({ method, weight }) => ({ law: law.name, method, ...refit(solved, weight) }));
}

function refit(solved: Solved, weight: (u: number) => number): Omit<RobustRefit, 'law' | 'method'> {
  const { settled, search, prepared } = solved;
  const base = prepared.problem;
  const problem: Problem = {
    ...base,
    scatter: base.scatter.slice(),
    ...(base.sigma === undefined ? {} : { sigma: base.sigma.slice() }),
  };
  const eq = equations(problem);
  const weights = new Float64Array(base.n).fill(1);
  let theta = settled.theta;
  eq.evaluate(theta, settled.components);
  for (let iterations = 1; iterations <= LIMITS.iterations; iterations++) {
    const standard = standardised(eq, weights, settled.components);
    const scale = medianAbsolute(standard) / NORMAL_MEDIAN;
    if (!(scale > LIMITS.scale)) return without('more than half of the residuals are zero', scale, iterations);
    const change = reweigh(eq, base, weights, (i) => weight(standard[i]! / scale));
    const found = solveTheta(eq, theta, settled.components, search);
    if (failed(found.stop)) return without('not finite', scale, iterations);
    theta = found.theta;
    if (change < LIMITS.change) return told(solved, theta, scale, weights, 'converged', iterations);
    if (iterations === LIMITS.iterations) return told(solved, theta, scale, weights, 'iterations used up', iterations);
  }
  throw new Error('unreachable');
}

const without = (stop: RobustRefit['stop'], scale: number, iterations: number) => ({ values: {}, scale, weights: [], stop, iterations });

function told(
  { prepared }: Solved,
  theta: Float64Array,
  scale: number,
  weights: Float64Array,
  stop: RobustRefit['stop'],
  iterations: number,
) {
  const { model } = prepared.problem;
  const natural = inNature(model, theta);
  const values = Object.fromEntries(model.constants.map((name, j) => [name, natural[j]!]));
  return { values, scale, weights: [...weights], stop, iterations };
}

/** Residual from the law and the campaign's shift, over the standard deviation it has without its weight. */
function standardised(eq: Equations, weights: Float64Array, { scatter, campaign }: Solved['settled']['components']): Float64Array {
  const { problem, r, w, measured } = eq;
  const shift = new Float64Array(problem.blocks);
  for (let i = 0; i < r.length; i++) shift[problem.block[i]!]! += campaign * w[i]!;
  return r.map((value, i) => {
    const variance = (measured[i]! + scatter * problem.scatter[i]!) * weights[i]!;
    return (value - shift[problem.block[i]!]!) / Math.sqrt(variance);
  });
}

/** Writes every trial's variances over its new weight into the equations; returns the largest change of a weight. */
function reweigh(eq: Equations, base: Problem, weights: Float64Array, of: (i: number) => number): number {
  const { problem, measured } = eq;
  const size = base.sigma === undefined ? 0 : base.sigma.length / base.n;
  let change = 0;
  for (let i = 0; i < base.n; i++) {
    const weight = Math.max(LIMITS.weight, of(i));
    change = Math.max(change, Math.abs(weight - weights[i]!));
    weights[i] = weight;
    problem.scatter[i] = base.scatter[i]! / weight;
    if (base.response !== undefined) measured[i] = base.response[i]! / weight;
    for (let k = i * size; k < (i + 1) * size; k++) problem.sigma![k] = base.sigma![k]! / weight;
  }
  return change;
}

function medianAbsolute(values: Float64Array): number {
  const sorted = values.map(Math.abs).sort();
  const half = sorted.length >> 1;
  return sorted.length % 2 === 1 ? sorted[half]! : (sorted[half - 1]! + sorted[half]!) / 2;
}
