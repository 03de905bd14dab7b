import { svd } from '../numerics/svd.ts';

/** Collinearity of a design, Belsley, Kuh and Welsch (1980), Regression Diagnostics, chapter 3: scaled condition indices and variance proportions. */
export interface Collinearity {
  /** Largest singular value over each, ascending: the last one is the condition index of the design. */
  readonly indices: readonly number[];
  /** One row for each index, one column for each parameter; every column sums to 1. */
  readonly proportions: readonly (readonly number[])[];
}

/** p columns of n (whitened where errors differ); each is scaled to unit length, not centred. */
export function collinearity(columns: readonly ArrayLike<number>[]): Collinearity {
  const scaled = columns.map((column) => {
    const size = Math.sqrt(Array.from(column).reduce((sum, v) => sum + v * v, 0));
    return Array.from(column, (v) => (size > 0 ? v / size : 0));
  });
  const { values, v } = svd(scaled);
  const largest = values[0] ?? 0;
  const shares = v.map((row) => row.map((one, k) => (one / values[k]!) ** 2));
  const totals = shares.map((row) => row.reduce((sum, one) => sum + one, 0));
  return {
    indices: values.map((value) => largest / value),
    proportions: values.map((_, k) => shares.map((row, j) => row[k]! / totals[j]!)),
  };
}

/** From this index on a design is told to be weak (Belsley, Kuh and Welsch 1980, section 3.2: 30 to 100 and above). */
const WEAK_INDEX = 30;

/** Parameters that take part in the weakest direction: variance proportion above one half. */
export function entangled({ indices, proportions }: Collinearity): readonly number[] {
  const last = indices.length - 1;
  if (!(indices[last]! >= WEAK_INDEX)) return [];
  return proportions[last]!.flatMap((share, j) => (share > 0.5 ? [j] : []));
}
