import type { Random } from '../../numerics/random.ts';
import { choleskyOf, inverse, lnDeterminantOf } from '../../regression/dense.ts';

/** One trial that could be run: gradient of the law on the scale of the fit for its p free parameters, and its residual's slope times u to each of s sources. */
export interface Candidate {
  readonly x: readonly number[];
  readonly d: readonly number[];
}

/** The campaign that new trials join: weighted sums over the trials it has already (all zero in a new one). */
export interface Campaign {
  /** p: sum x/v. */
  readonly h: readonly number[];
  /** sum 1/v. */
  readonly s: number;
  /** s sources: sum d/v. */
  readonly e: readonly number[];
}

/** One prediction to be narrowed: gradient at the plant, and the plant's own part of each source's shift. */
export interface Asked {
  readonly w: readonly number[];
  readonly plant: readonly number[];
}

/** Everything that a plan of trials is judged by. Matrices row-major p x p. */
export interface DesignProblem {
  /** Inverse of Phi as the trials stand. */
  readonly information: readonly number[];
  /** Per source, p: X^T V^-1 d as the trials stand. */
  readonly pulls: readonly (readonly number[])[];
  readonly candidates: readonly Candidate[];
  /** Variance of one more trial within its campaign. */
  readonly variance: number;
  /** Share of a campaign's sum that its own level takes: tau^2/(1 + tau^2 s), 1/s for a fixed level, 0 without campaigns. */
  readonly shrink: (s: number) => number;
  readonly campaign: Campaign;
  /** Predictions; without any, the determinant of Phi is made small. */
  readonly asked: readonly Asked[];
}

/**
 * What a plan leaves: sum over predictions of w^T Phi w + sum_s T_s^2, or ln det Phi. `plan`: indices of candidates, all in the one campaign.
 * Phi(plan)^-1 = sum_c [sum x x^T/v - tau^2/(1 + tau^2 sum 1/v) h h^T], h = sum x/v; a joined campaign's old term is exchanged for the new one.
 */
export function criterion(problem: DesignProblem, plan: readonly number[]): number {
  const { information, pulls, candidates, variance, shrink, campaign, asked } = problem;
  const p = Math.sqrt(information.length);
  const matrix = Array.from(information);
  const h = Array.from(campaign.h);
  const e = Array.from(campaign.e);
  let s = campaign.s;
  const moved = pulls.map((pull) => Array.from(pull));
  for (const index of plan) {
    const { x, d } = candidates[index]!;
    for (let i = 0; i < p; i++) {
      const xi = x[i]! / variance;
      h[i]! += xi;
      for (let j = 0; j < p; j++) matrix[i * p + j]! += xi * x[j]!;
      for (let q = 0; q < d.length; q++) moved[q]![i]! += xi * d[q]!;
    }
    for (let q = 0; q < d.length; q++) e[q]! += d[q]! / variance;
    s += 1 / variance;
  }
  const [before, after] = [campaign.s > 0 ? shrink(campaign.s) : 0, s > 0 ? shrink(s) : 0];
  for (let i = 0; i < p; i++) {
    for (let j = 0; j < p; j++) matrix[i * p + j]! += before * campaign.h[i]! * campaign.h[j]! - after * h[i]! * h[j]!;
    for (let q = 0; q < moved.length; q++) moved[q]![i]! += before * campaign.h[i]! * campaign.e[q]! - after * h[i]! * e[q]!;
  }
  return judged(matrix, moved, asked, p);
}

function judged(matrix: readonly number[], pulls: readonly (readonly number[])[], asked: readonly Asked[], p: number): number {
  const factor = choleskyOf(matrix, p);
  if (factor === undefined) return Number.POSITIVE_INFINITY;
  if (asked.length === 0) return -lnDeterminantOf(factor, p);
  const phi = inverse(Array.from(matrix), p);
  let total = 0;
  for (const { w, plant } of asked) {
    const phiW = w.map((_, i) => w.reduce((sum, wj, j) => sum + phi[i * p + j]! * wj, 0));
    total += w.reduce((sum, wi, i) => sum + wi * phiW[i]!, 0);
    pulls.forEach((pull, q) => {
      const t = pull.reduce((sum, b, i) => sum + b * phiW[i]!, 0) + plant[q]!;
      total += t * t;
    });
  }
  return total;
}

/** Starts of the exchange beside the greedy one. */
const STARTS = 4;

/**
 * The plan of `count` trials with the smallest `loss`, by exchange (Fedorov 1972): one trial after another is replaced by whichever candidate does best
 * until none does better; from a greedy start and a few random ones. `loss` defaults to the criterion.
 */
export function bestPlan(
  problem: DesignProblem,
  count: number,
  random: Random,
  loss: (plan: readonly number[]) => number = (plan) => criterion(problem, plan),
): readonly number[] {
  const n = problem.candidates.length;
  const starts = [greedy(n, count, loss), ...Array.from({ length: STARTS }, () => Array.from({ length: count }, () => random.integer(n)))];
  const ends = starts.map((start) => exchanged(start, n, loss));
  const best = ends.reduce((a, b) => (b.value < a.value ? b : a));
  return inOrder(best.plan, loss);
}

function greedy(n: number, count: number, loss: (plan: readonly number[]) => number): number[] {
  const plan: number[] = [];
  for (let k = 0; k < count; k++) plan.push(bestOf(n, (index) => loss([...plan, index])).index);
  return plan;
}

function exchanged(
  start: readonly number[],
  n: number,
  loss: (plan: readonly number[]) => number,
): { readonly plan: number[]; readonly value: number } {
  const plan = [...start];
  let value = loss(plan);
  for (let round = 0; round < 50; round++) {
    const before = value;
    for (let k = 0; k < plan.length; k++) {
      const found = bestOf(n, (index) => loss(plan.with(k, index)));
      if (found.value < value) {
        plan[k] = found.index;
        value = found.value;
      }
    }
    if (!(value < before)) break;
  }
  return { plan, value };
}

function bestOf(n: number, loss: (index: number) => number): { readonly index: number; readonly value: number } {
  let [index, value] = [0, Number.POSITIVE_INFINITY];
  for (let k = 0; k < n; k++) {
    const here = loss(k);
    if (here < value) [index, value] = [k, here];
  }
  return { index, value };
}

/** Most useful trial first. */
function inOrder(plan: readonly number[], loss: (plan: readonly number[]) => number): readonly number[] {
  const left = [...plan];
  const ordered: number[] = [];
  while (left.length > 0) {
    const { index } = bestOf(left.length, (k) => loss([...ordered, left[k]!]));
    ordered.push(left[index]!);
    left.splice(index, 1);
  }
  return ordered;
}
