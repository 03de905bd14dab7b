import { whiten } from './campaign-variance.ts';
import { inverseOfUpper, type Small, triangularise } from './dense.ts';
import type { Equations } from './equations.ts';

/** The design in coordinates that make it orthonormal under the present V: X T, with T = R^-1 of its whitened columns. */
export interface Basis {
  /** q columns of n. */
  readonly design: readonly Float64Array[];
  /** T, q x q upper triangular, row-major: theta = T times the basis coordinates. */
  readonly back: Small;
  /** ln |R^T R|: what the change of basis takes from ln |X^T V^-1 X|. */
  readonly lnDeterminant: number;
}

/** `columns`: which of the design's columns take part; their rank must be full. */
export function basisOf(eq: Equations, columns: readonly number[]): Basis {
  const q = columns.length;
  const white = columns.map((k) => {
    const out = new Float64Array(eq.problem.n);
    whiten(eq.variance, eq.design[k]!, out);
    return out;
  });
  const { r } = triangularise(white, new Float64Array(eq.problem.n));
  const back = inverseOfUpper(r, q);
  const design = combine(
    columns.map((k) => eq.design[k]!),
    back,
    eq.problem.n,
  );
  let lnDeterminant = 0;
  for (let j = 0; j < q; j++) lnDeterminant += 2 * Math.log(Math.abs(r[j * q + j]!));
  return { design, back, lnDeterminant };
}

/** columns (n x q) times an upper triangular matrix. */
export function combine(columns: readonly Float64Array[], upper: Small, n: number): readonly Float64Array[] {
  const q = columns.length;
  return columns.map((_, j) => {
    const out = new Float64Array(n);
    for (let k = 0; k <= j; k++) {
      const share = upper[k * q + j]!;
      const column = columns[k]!;
      for (let i = 0; i < n; i++) out[i]! += share * column[i]!;
    }
    return out;
  });
}
