import { compile } from '../algebra/tape.ts';
import { combine } from './basis.ts';
import { choleskyOf, inverseOfUpper, type Small, solveWith, triangularise, zeros } from './dense.ts';
import type { Model } from './model.ts';

/** Refits of one law to the same trials with other weights, from the fit of all: for laws without errors in the groups and without campaigns. */
export interface Resampler {
  /** Least squares with `copies` of each trial; theta (p, the model's coordinates) holds the result. False where it did not converge. */
  fit(copies: Float64Array, theta: Float64Array): boolean;
}

/** Iterations, halvings of a step, and the drop of the sum of squares that ends a refit, as a share of it (the square of a step). */
const LIMITS = { iterations: 40, halvings: 20, drop: 1e-10 };

/**
 * Gauss-Newton in coordinates that make the design of the full fit orthonormal, so that the small Gram matrix of each refit is safe to factor;
 * the first step needs only rows stored once. `inverse`: 1/variance of each trial; `theta`: the full fit, with R of full rank there.
 */
export function resampler(
  model: Model,
  y: Float64Array,
  x: readonly Float64Array[],
  inverse: Float64Array,
  theta: Float64Array,
): Resampler {
  const n = y.length;
  const p = model.constants.length;
  const none = x.length === 0;
  const tape = compile([model.value, ...model.byConstant], none ? [''] : model.groups, model.constants, none ? [new Float64Array(n)] : x);
  tape.load();
  tape.run(theta);
  const columns = tape.out.slice(1);
  const root = inverse.map(Math.sqrt);
  const { r } = triangularise(
    columns.map((column) => column.map((value, i) => value * root[i]!)),
    new Float64Array(n),
  );
  const back = inverseOfUpper(r, p);
  const scaled = (column: Float64Array): Float64Array => column.map((value, i) => value * root[i]!);
  const stored = combine(columns.map(scaled), back, n);
  const storedResidual = scaled(y.map((value, i) => value - tape.out[0]![i]!));
  const basis = Array.from({ length: p }, () => new Float64Array(n));
  const residual = new Float64Array(n);
  const weighted = new Float64Array(n);
  const gram = zeros(p * p);
  const right = zeros(p);

  const evaluate = (at: Float64Array): void => {
    tape.run(at);
    const h = tape.out[0]!;
    for (let i = 0; i < n; i++) residual[i] = root[i]! * (y[i]! - h[i]!);
    for (let k = 0; k < p; k++) {
      const out = basis[k]!;
      const own = columns[k]!;
      const diagonal = back[k * p + k]!;
      for (let i = 0; i < n; i++) out[i] = diagonal * own[i]!;
      for (let j = 0; j < k; j++) {
        const share = back[j * p + k]!;
        const other = columns[j]!;
        for (let i = 0; i < n; i++) out[i]! += share * other[i]!;
      }
      for (let i = 0; i < n; i++) out[i]! *= root[i]!;
    }
  };

  /** Gram matrix and right side of rows, returns the weighted sum of squares. */
  const gather = (rows: readonly Float64Array[], rest: Float64Array, copies: Float64Array): number => {
    for (let k = 0; k < p; k++) {
      const own = rows[k]!;
      for (let i = 0; i < n; i++) weighted[i] = copies[i]! * own[i]!;
      for (let j = 0; j <= k; j++) gram[k * p + j] = gram[j * p + k] = dot(weighted, rows[j]!);
      right[k] = dot(weighted, rest);
    }
    let cost = 0;
    for (let i = 0; i < n; i++) cost += copies[i]! * rest[i]! * rest[i]!;
    return cost;
  };

  return {
    fit: (copies, out) => {
      out.set(theta);
      let cost = gather(stored, storedResidual, copies);
      const from = new Float64Array(p);
      for (let iteration = 0; iteration < LIMITS.iterations; iteration++) {
        const factor = choleskyOf(gram, p);
        if (factor === undefined) return false;
        const step = solveWith(factor, right, p, 1);
        const move = backTo(back, step, p);
        from.set(out);
        let drop = 0;
        for (let k = 0; k < p; k++) {
          drop += step[k]! * right[k]!;
          out[k]! += move[k]!;
        }
        if (drop <= LIMITS.drop * cost) return true;
        evaluate(out);
        let next = gather(basis, residual, copies);
        for (let halving = 0, share = 0.5; !(next <= cost); halving++, share /= 2) {
          if (halving === LIMITS.halvings) return false;
          for (let k = 0; k < p; k++) out[k] = from[k]! + share * move[k]!;
          evaluate(out);
          next = gather(basis, residual, copies);
        }
        cost = next;
      }
      return false;
    },
  };
}

function dot(a: Float64Array, b: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < a.length; i++) sum += a[i]! * b[i]!;
  return sum;
}

/** T step, T upper triangular. */
function backTo(back: Small, step: Small, p: number): Small {
  const out = zeros(p);
  for (let k = 0; k < p; k++) for (let j = k; j < p; j++) out[k]! += back[k * p + j]! * step[j]!;
  return out;
}
