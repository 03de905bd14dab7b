import { type Random, seeded, seedFor } from '../numerics/random.ts';
import { type Small, zeros } from './dense.ts';
import { equations } from './equations.ts';
import { bind } from './model.ts';
import { collectResamples, REFIT, type Resamples } from './resamples.ts';
import type { Solved } from './solve-law.ts';
import { solveTheta } from './theta.ts';

/**
 * Studies drawn from the fit (its adjusted points as the true ones, errors of the readings, campaigns, scatter), refitted at the fit's own variance
 * components.
 */
export function parametricResamples(solved: Solved, count: number, seed: number): Resamples {
  const { settled, search, eq } = solved;
  const { problem } = eq;
  const own = { ...problem, y: problem.y.slice(), x: problem.x.map((column) => column.slice()) };
  const drawn = equations(own, REFIT.step);
  const draw = drawer(solved, seeded(seedFor(seed, 'parametric')), own.y, own.x);
  return collectResamples(count, () => {
    draw();
    drawn.restart();
    return solveTheta(drawn, settled.theta, settled.components, { ...search, ...REFIT });
  });
}

/** Writes a new study into y and x each time it is called. */
function drawer(solved: Solved, random: Random, y: Float64Array, x: readonly Float64Array[]): () => void {
  const { eq, settled } = solved;
  const { n, sigma, response, scatter, block, blocks } = eq.problem;
  const width = 1 + x.length;
  const truth = adjustedPoints(solved);
  const law = lawAt(solved, truth);
  const roots =
    sigma === undefined
      ? undefined
      : Array.from({ length: n }, (_, i) => lowerRoot(sigma.subarray(i * width * width, (i + 1) * width * width), width));
  const normal = zeros(width);
  const shift = zeros(blocks);
  const error = (i: number, row: number): number => {
    let sum = 0;
    if (roots !== undefined) for (let k = 0; k <= row; k++) sum += roots[i]![row * width + k]! * normal[k]!;
    return sum;
  };
  return () => {
    for (let c = 0; c < blocks; c++) shift[c] = Math.sqrt(settled.components.campaign) * random.normal();
    for (let i = 0; i < n; i++) {
      if (roots !== undefined) for (let k = 0; k < width; k++) normal[k] = random.normal();
      y[i] =
        law[i]! +
        shift[block[i]!]! +
        Math.sqrt(settled.components.scatter * scatter[i]! + (response?.[i] ?? 0)) * random.normal() +
        error(i, 0);
      for (let k = 0; k < x.length; k++) x[k]![i] = truth[k]![i]! + error(i, k + 1);
    }
  };
}

/** x - (Sigma g)_x w. */
function adjustedPoints({ eq }: Solved): readonly Float64Array[] {
  const { problem, covariance, w } = eq;
  if (problem.sigma === undefined) return problem.x;
  return problem.x.map((column, k) => column.map((value, i) => value - covariance[k]![i]! * w[i]!));
}

/** h at some points, fixed shifts included. */
function lawAt({ eq, settled }: Solved, points: readonly Float64Array[]): Float64Array {
  const { model, n, shifts } = eq.problem;
  const p = model.constants.length;
  const bound = bind(model, points, n, false);
  bound.run(settled.theta.subarray(0, p), false);
  return bound.h.map((value, i) => shifts.reduce((sum, shift, k) => sum + settled.theta[p + k]! * shift[i]!, value));
}

/** A lower root of a covariance that may be singular (groups that share readings): a pivot of nothing gives a column of nothing. */
function lowerRoot(matrix: Float64Array, width: number): Small {
  const root = zeros(width * width);
  for (let j = 0; j < width; j++) {
    let pivot = matrix[j * width + j]!;
    for (let k = 0; k < j; k++) pivot -= root[j * width + k]! ** 2;
    if (!(pivot > 1e-12 * matrix[j * width + j]!)) continue;
    root[j * width + j] = Math.sqrt(pivot);
    for (let i = j + 1; i < width; i++) {
      let sum = matrix[i * width + j]!;
      for (let k = 0; k < j; k++) sum -= root[i * width + k]! * root[j * width + k]!;
      root[i * width + j] = sum / root[j * width + j]!;
    }
  }
  return root;
}
