import { applyInverse } from './campaign-variance.ts';
import { multiply, type Small } from './dense.ts';
import type { FitData } from './fit.ts';
import { bind } from './model.ts';
import type { Solved } from './solve-law.ts';

/** What each systematic source does to the estimates: K_s u_s on the model's coordinates. */
export interface Shifts {
  /** One column of q (the estimated columns) for each source. */
  readonly columns: readonly Small[];
}

/** K_s = A^-1 Xhat^T V^-1 d_s with d_is = g_i^T S_is: a shift common to the trials moves the law and does not average out. */
export function systematicShifts(solved: Solved, data: FitData): Shifts {
  const { eq, columns, sandwich } = solved;
  const q = columns.length;
  const inverseOfA = sandwich?.inverseOfA;
  if (inverseOfA === undefined) return { columns: data.sources.map(() => new Array<number>(q).fill(Number.NaN)) };
  const slopes = slopesOf(solved);
  const weighted = new Float64Array(eq.problem.n);
  return {
    columns: data.sources.map((_, s) => {
      const d = Float64Array.from(data.systematic, (block, i) => alongResidual(block, slopes, data.sources.length, s, i));
      applyInverse(eq.variance, d, weighted);
      const right = columns.map((k) => eq.design[k]!.reduce((sum, value, i) => sum + value * weighted[i]!, 0));
      return multiply(inverseOfA, right, q, 1);
    }),
  };
}

/** dh/dx at the adjusted points, g columns of n. */
function slopesOf({ eq, settled }: Solved): readonly Float64Array[] {
  const { model, x, n } = eq.problem;
  if (eq.bound.byGroup.length === model.groups.length) return eq.bound.byGroup;
  const bound = bind(model, x, n, true);
  bound.run(settled.theta.subarray(0, model.constants.length), false);
  return bound.byGroup;
}

/** (1, -dh/dx) times the source's column of the trial's slopes. */
function alongResidual(block: Float64Array, slopes: readonly Float64Array[], width: number, s: number, i: number): number {
  return slopes.reduce((sum, slope, k) => sum - slope[i]! * block[(k + 1) * width + s]!, block[s]!);
}
