import { seeded, seedFor } from '../numerics/random.ts';
import { collectResamples, REFIT, type Resamples } from './resamples.ts';
import type { Solved } from './solve-law.ts';
import { type Solution, solveTheta } from './theta.ts';
import { resampler } from './warm-resamples.ts';

/** Trials drawn with replacement; only where there is no campaign effect. */
export function trialResamples(solved: Solved, count: number, seed: number): Resamples {
  const { eq, settled } = solved;
  const { n } = eq.problem;
  const random = seeded(seedFor(seed, 'trials'));
  const copies = new Float64Array(n);
  const refit = isPlain(solved) ? kernel(solved) : general(solved);
  const found = collectResamples(count, () => {
    copies.fill(0);
    for (let i = 0; i < n; i++) copies[random.integer(n)]! += 1;
    return refit(copies);
  });
  eq.evaluate(settled.theta, settled.components);
  return found;
}

type Refit = (copies: Float64Array) => Solution;

const general =
  ({ eq, settled, search }: Solved): Refit =>
  (copies) =>
    solveTheta(eq, settled.theta, settled.components, { ...search, ...REFIT, copies });

/** Nothing but weights: no errors in the groups, no shifts, nothing held or bounded. */
function isPlain({ eq, search }: Solved): boolean {
  const { problem } = eq;
  const open = [...search.lower, ...search.upper].every((bound) => !Number.isFinite(bound));
  return problem.sigma === undefined && problem.shifts.length === 0 && search.free.length === problem.model.constants.length && open;
}

function kernel({ eq, settled }: Solved): Refit {
  const { model, y, x } = eq.problem;
  const refits = resampler(model, y, x, eq.variance.inverse.slice(), settled.theta);
  return (copies) => {
    const theta = new Float64Array(settled.theta.length);
    const why = refits.fit(copies, theta) ? 'converged' : 'no further descent';
    return { theta, q: Number.NaN, stop: { why, value: Number.NaN, limit: Number.NaN, iterations: 0 }, onBound: [] };
  };
}
