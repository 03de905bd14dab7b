import { type Random, seeded } from '../numerics/random.ts';

/** An orthonormal basis of the design and further directions, all whitened, n each. */
export interface Directions {
  readonly basis: readonly Float64Array[];
  /** Unit vectors orthogonal to the basis; undefined where nothing is left of a candidate beside it. */
  readonly candidates: readonly (Float64Array | undefined)[];
}

/** Nothing is left of a candidate whose square beside the basis is below this share of the whole. */
const NOTHING = 1e-10;

/** Candidates (whitened columns of n) freed of an orthonormal basis and made unit vectors. */
export function directions(basis: readonly Float64Array[], columns: readonly Float64Array[]): Directions {
  return {
    basis,
    candidates: columns.map((column) => {
      const rest = without(basis, column);
      const square = dot(rest, rest);
      return square > NOTHING * dot(column, column) ? rest.map((value) => value / Math.sqrt(square)) : undefined;
    }),
  };
}

/** A column less its share in an orthonormal basis; twice, so that rounding leaves nothing of it. */
export function without(basis: readonly Float64Array[], column: Float64Array): Float64Array {
  const rest = column.slice();
  for (const pass of [basis, basis])
    for (const one of pass) {
      const share = dot(one, rest);
      for (let i = 0; i < rest.length; i++) rest[i]! -= share * one[i]!;
    }
  return rest;
}

export function dot(a: Float64Array, b: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < a.length; i++) sum += a[i]! * b[i]!;
  return sum;
}

/** Largest F of one further column over the candidates, and which; r is orthogonal to the basis. */
export function largestF({ basis, candidates }: Directions, r: Float64Array): { readonly f: number; readonly at: number } {
  let [largest, at] = [0, -1];
  candidates.forEach((one, k) => {
    const drop = one === undefined ? 0 : dot(one, r) ** 2;
    if (!(drop > largest)) return;
    largest = drop;
    at = k;
  });
  return { f: largest / ((dot(r, r) - largest) / (r.length - basis.length - 1)), at };
}

/**
 * How often independent normal errors about the law alone give a largest F as high: (1 + count)/(1 + draws). Exact but for the number of draws where the
 * errors' variances are known up to a factor (the ratio does not depend on it).
 */
export function chanceOf(found: Directions, f: number, draws: number, seed: number): number {
  const random: Random = seeded(seed);
  const n = found.basis[0]?.length ?? 0;
  const noise = new Float64Array(n);
  let count = 0;
  for (let b = 0; b < draws; b++) {
    for (let i = 0; i < n; i++) noise[i] = random.normal();
    if (largestF(found, without(found.basis, noise)).f >= f) count++;
  }
  return (1 + count) / (1 + draws);
}
