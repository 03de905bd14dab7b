import { seeded, seedFor } from '../numerics/random.ts';
import { applyInverse } from './campaign-variance.ts';
import { inverse, multiply, zeros } from './dense.ts';
import { type Equations, equations } from './equations.ts';
import { hasEnded, REFIT, type Resamples } from './resamples.ts';
import type { Solved } from './solve-law.ts';
import { solveTheta } from './theta.ts';

/** Resamples of whole campaigns with the cluster-robust standard error of each estimated column at each. */
export interface CampaignResamples extends Resamples {
  readonly standardErrors: readonly (readonly number[])[];
}

/** Campaigns drawn with replacement, refitted at the fit's own variance components. */
export function campaignResamples(solved: Solved, count: number, seed: number): CampaignResamples {
  const { settled, search } = solved;
  const { block, blocks, n } = solved.eq.problem;
  const eq = equations(solved.eq.problem, REFIT.step);
  const random = seeded(seedFor(seed, 'campaigns'));
  const copies = new Float64Array(n);
  const theta: Float64Array[] = [];
  const standardErrors: (readonly number[])[] = [];
  for (let resample = 0; resample < count; resample++) {
    const drawn = zeros(blocks);
    for (let c = 0; c < blocks; c++) drawn[random.integer(blocks)]! += 1;
    for (let i = 0; i < n; i++) copies[i] = drawn[block[i]!]!;
    const found = solveTheta(eq, settled.theta, settled.components, { ...search, ...REFIT, copies });
    const errors = clusterErrors(eq, solved.columns, drawn);
    if (!hasEnded(found) || !errors.every((error) => error > 0)) continue;
    theta.push(found.theta);
    standardErrors.push(errors);
  }
  return { theta, standardErrors, failed: count - theta.length };
}

/**
 * Root of the diagonal of B^-1 [sum_c k_c s_c s_c^T] B^-1, s_c = Xhat_c^T w_c, campaign c counted k_c times (Liang and Zeger 1986, Biometrika 73, 13),
 * where the equations stand.
 */
export function clusterErrors(eq: Equations, columns: readonly number[], counted: readonly number[]): readonly number[] {
  const { problem, variance, w, design } = eq;
  const q = columns.length;
  const gram = zeros(q * q);
  const scores = Array.from({ length: problem.blocks }, () => zeros(q));
  const weighted = new Float64Array(problem.n);
  columns.forEach((ka, a) => {
    applyInverse(variance, design[ka]!, weighted);
    for (let i = 0; i < problem.n; i++) {
      const c = problem.block[i]!;
      scores[c]![a]! += design[ka]![i]! * w[i]!;
      for (let b = 0; b < q; b++) gram[a * q + b]! += counted[c]! * weighted[i]! * design[columns[b]!]![i]!;
    }
  });
  const meat = zeros(q * q);
  scores.forEach((score, c) => {
    for (let a = 0; a < q; a++) for (let b = 0; b < q; b++) meat[a * q + b]! += counted[c]! * score[a]! * score[b]!;
  });
  const bread = inverse(gram, q);
  const covariance = multiply(multiply(bread, meat, q, q), bread, q, q);
  return columns.map((_, a) => Math.sqrt(covariance[a * q + a]!));
}
