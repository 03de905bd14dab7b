import { chiSquaredCdf } from '../numerics/distributions.ts';
import { equations } from './equations.ts';
import type { StatedUncertaintyTest } from './fit.ts';
import type { Problem } from './problem.ts';
import { settle } from './settle.ts';
import type { Solved } from './solve-law.ts';
import { solveTheta } from './theta.ts';

/** sigma = tau = 0: theta refitted on the stated uncertainties alone. Undefined where a trial has none. */
export function statedAlone(solved: Solved): { readonly chiSquared: number; readonly degreesOfFreedom: number } | undefined {
  return chiSquared(solved, solved.prepared.problem.shifts);
}

/** The same with a level for each campaign, so that what campaigns add cannot pass for wrong uncertainties. */
export function statedUncertaintyTest(solved: Solved, campaign: readonly number[]): StatedUncertaintyTest | undefined {
  const found = chiSquared(solved, levels(campaign));
  if (found === undefined || !(found.degreesOfFreedom > 0)) return undefined;
  const below = chiSquaredCdf(found.chiSquared, found.degreesOfFreedom);
  return { ...found, below, above: 1 - below };
}

function chiSquared(
  solved: Solved,
  shifts: readonly Float64Array[],
): { readonly chiSquared: number; readonly degreesOfFreedom: number } | undefined {
  const { eq, settled, search } = solved;
  const { problem } = eq;
  if (!eq.measured.every((d) => d > 0)) return undefined;
  const p = problem.model.constants.length;
  const alone: Problem = { ...problem, shifts, block: new Int32Array(problem.n), blocks: 1, estimate: { scatter: false, campaign: false } };
  const theta = Float64Array.from([...settled.theta.subarray(0, p), ...shifts.map(() => 0)]);
  const open = (side: Float64Array, value: number): Float64Array => Float64Array.from([...side.subarray(0, p), ...shifts.map(() => value)]);
  const free = [...search.free.filter((k) => k < p), ...shifts.map((_, k) => p + k)];
  const wide = { free, lower: open(search.lower, Number.NEGATIVE_INFINITY), upper: open(search.upper, Number.POSITIVE_INFINITY) };
  const found = solveTheta(equations(alone), theta, { scatter: 0, campaign: 0 }, wide);
  return { chiSquared: found.q, degreesOfFreedom: problem.n - free.length };
}

/** One column for each campaign but the last, their levels summing to zero. */
function levels(campaign: readonly number[]): readonly Float64Array[] {
  const present = [...new Set(campaign)].sort((a, b) => a - b);
  const last = present.at(-1);
  return present.slice(0, -1).map((one) => Float64Array.from(campaign, (own) => (own === one ? 1 : own === last ? -1 : 0)));
}

/** theta if errors of the groups were ignored: the same campaigns and scatter, no Sigma. */
export function uncorrectedTheta(solved: Solved): Float64Array {
  const { eq, settled, search } = solved;
  if (eq.problem.sigma === undefined) return settled.theta;
  const { sigma, ...rest } = eq.problem;
  const size = sigma.length / eq.problem.n;
  const response = Float64Array.from({ length: eq.problem.n }, (_, i) => sigma[i * size]!);
  const spread = settled.components.scatter + eq.measured.reduce((sum, d) => sum + d, 0) / eq.problem.n;
  const estimate = { ...eq.problem.estimate, scatter: true };
  return settle(
    equations({ ...rest, response, estimate }),
    settled.theta,
    { scatter: spread, campaign: settled.components.campaign },
    search,
  ).theta;
}
