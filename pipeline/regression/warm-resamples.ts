import { derivative } from '../algebra/derivative.ts';
import { compile } from '../algebra/tape.ts';
import { combine } from './basis.ts';
import { mix, multiplyBy, solveUpper, weightedDots } from './column-kernels.ts';
import { inverseOfUpper, type Small, triangularise, zeros } from './dense.ts';
import type { Model } from './model.ts';

/** Refits of one law to the same trials with other weights, from the fit of all: for laws without errors in the groups and without campaigns. */
export interface Resampler {
  /** Least squares with `copies` of each trial; theta (p, the model's coordinates) holds the result. False where it did not converge. */
  fit(copies: Float64Array, theta: Float64Array): boolean;
}

/** Iterations, halvings of a step, and the error left that ends a refit, in units of the scatter of theta. */
const LIMITS = { iterations: 40, halvings: 20, left: 1e-5 };

/**
 * Gauss-Newton in coordinates that make the design of the full fit orthonormal, so that the small Gram matrix of each refit is safe to factor. The first step
 * needs only rows stored once; every further one is bent by the law's second derivatives, stored beside them, so that the law itself is evaluated about once.
 * A refit ends where the bend of its last step times that step's size, which is the order of the error left, is below the limit.
 * `inverse`: 1/variance of each trial; `theta`: the full fit, the design of full rank there.
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
  const root = inverse.map(Math.sqrt);
  const law = lawOn(model, y, x, root, theta);
  const { back } = law;
  const bends = bendsOf(model, x, root, theta, back);
  const copyOf = (columns: readonly Float64Array[]): Float64Array[] => columns.map((column) => column.slice());
  const stored = copyOf(law.columns);
  const bent = copyOf(law.columns);
  const sums = { all: zeros((p + 1) ** 2), work: zeros((p + 1) ** 2), step: zeros(p), more: zeros(p) };
  const from = new Float64Array(p);

  /** Step from columns, then from the same columns bent along it; their sum in `step`. Size of the step and of what the bend added, or NaN. */
  const twoSteps = (columns: readonly Float64Array[], copies: Float64Array): { size: number; bend: number } => {
    const { all, work, step, more } = sums;
    if (!solveUpper(all, p, work, step)) return { size: Number.NaN, bend: Number.NaN };
    const size = sizeOf(all, step, n - p);
    bend(columns, bends, step, more, bent);
    gather(bent, copies, all);
    if (!solveUpper(all, p, work, more)) return { size: Number.NaN, bend: Number.NaN };
    for (let k = 0; k < p; k++) step[k]! += more[k]!;
    return { size, bend: sizeOf(all, more, n - p) };
  };

  const climb = (copies: Float64Array, out: Float64Array, bound: number): boolean => {
    let cost = bound;
    for (let iteration = 0; iteration < LIMITS.iterations; iteration++) {
      law.evaluate(out);
      gather(law.columns, copies, sums.all);
      for (let halving = 0; !(costOf(sums.all) <= cost); halving++) {
        if (halving === LIMITS.halvings) return false;
        for (let k = 0; k < p; k++) out[k] = (out[k]! + from[k]!) / 2;
        law.evaluate(out);
        gather(law.columns, copies, sums.all);
      }
      cost = costOf(sums.all);
      from.set(out);
      const taken = twoSteps(law.columns, copies);
      if (Number.isNaN(taken.size)) return false;
      move(out, back, sums.step);
      if (taken.size <= LIMITS.left || taken.bend * taken.size <= LIMITS.left) return true;
    }
    return false;
  };

  /** A law that is linear in its coordinates is solved by the stored rows alone. */
  const solved = (copies: Float64Array, out: Float64Array): boolean => {
    gather(stored, copies, sums.all);
    if (!solveUpper(sums.all, p, sums.work, sums.step)) return false;
    out.set(theta);
    move(out, back, sums.step);
    return true;
  };
  if (model.linear) return { fit: solved };

  return {
    fit: (copies, out) => {
      gather(stored, copies, sums.all);
      const bound = costOf(sums.all) * (1 + 1e-12);
      from.set(theta);
      out.set(theta);
      if (Number.isNaN(twoSteps(stored, copies).size)) return false;
      move(out, back, sums.step);
      return climb(copies, out, bound);
    },
  };
}

/** The law at any theta: weighted design in the basis T of the full fit, then the weighted residual; p + 1 columns of n. */
interface LawOn {
  readonly columns: readonly Float64Array[];
  readonly back: Small;
  evaluate(at: Float64Array): void;
}

function lawOn(model: Model, y: Float64Array, x: readonly Float64Array[], root: Float64Array, theta: Float64Array): LawOn {
  const n = y.length;
  const p = model.constants.length;
  const tape = compile([model.value, ...model.byConstant], groupsOf(model), model.constants, columnsOf(x, n));
  tape.load();
  tape.run(theta);
  const [h, ...slopes] = tape.out as [Float64Array, ...Float64Array[]];
  const scaled = slopes.map((column) => column.map((value, i) => value * root[i]!));
  const back = inverseOfUpper(triangularise(scaled, new Float64Array(n)).r, p);
  const shares = slopes.map((_, k) => slopes.slice(0, k + 1).map((_slope, j) => back[j * p + k]!));
  const parts = slopes.map((_, k) => slopes.slice(0, k + 1));
  const columns = Array.from({ length: p + 1 }, () => new Float64Array(n));
  const zero = new Float64Array(n);
  const even = root.every((value) => value === 1);
  const evaluate = (at: Float64Array): void => {
    tape.run(at);
    for (let k = 0; k < p; k++) mix(columns[k]!, zero, shares[k]!, parts[k]!);
    const rest = columns[p]!;
    for (let i = 0; i < n; i++) rest[i] = y[i]! - h[i]!;
    if (!even) for (const column of columns) multiplyBy(column, root);
  };
  evaluate(theta);
  return { columns, back, evaluate };
}

const groupsOf = (model: Model): readonly string[] => (model.groups.length === 0 ? [''] : model.groups);
const columnsOf = (x: readonly Float64Array[], n: number): readonly Float64Array[] => (x.length === 0 ? [new Float64Array(n)] : x);

/** Second derivatives of h at the full fit in the basis coordinates, p x p columns of n. */
function bendsOf(
  model: Model,
  x: readonly Float64Array[],
  root: Float64Array,
  theta: Float64Array,
  back: Small,
): readonly (readonly Float64Array[])[] {
  const n = root.length;
  const p = model.constants.length;
  const second = model.byConstant.flatMap((slope) => model.constants.map((name) => derivative(slope, name)));
  const tape = compile(second, groupsOf(model), model.constants, columnsOf(x, n));
  tape.load();
  tape.run(theta);
  const scaled = tape.out.map((column) => column.map((value, i) => value * root[i]!));
  const half = Array.from({ length: p }, (_, a) => combine(scaled.slice(a * p, (a + 1) * p), back, n));
  const turned = Array.from({ length: p }, (_, b) =>
    combine(
      half.map((row) => row[b]!),
      back,
      n,
    ),
  );
  return Array.from({ length: p }, (_, a) => turned.map((column) => column[a]!));
}

/** Design and residual to second order, moved by a step in the basis coordinates. */
function bend(
  columns: readonly Float64Array[],
  bends: readonly (readonly Float64Array[])[],
  step: Small,
  halves: Small,
  out: readonly Float64Array[],
): void {
  const p = step.length;
  for (let k = 0; k < p; k++) {
    mix(out[k]!, columns[k]!, step, bends[k]!);
    halves[k] = -step[k]! / 2;
  }
  mix(out[p]!, columns[p]!, halves, columns);
  mix(out[p]!, out[p]!, halves, out);
}

/** Upper half of (Q, r)^T diag(copies) (Q, r). */
function gather(columns: readonly Float64Array[], copies: Float64Array, all: Small): void {
  const m = columns.length;
  for (let k = 0; k < m; k++) weightedDots(copies, columns[k]!, columns, k, all, k * m);
}

const costOf = (all: Small): number => all[all.length - 1]!;

/** The step in units of the scatter of theta: sqrt(drop of the sum of squares over the residual variance). */
function sizeOf(all: Small, step: Small, freedom: number): number {
  const m = step.length + 1;
  let drop = 0;
  for (let k = 0; k < step.length; k++) drop += step[k]! * all[k * m + m - 1]!;
  return Math.sqrt((Math.max(0, drop) * freedom) / costOf(all));
}

/** theta += T step, T upper triangular. */
function move(theta: Float64Array, back: Small, step: Small): void {
  const p = step.length;
  for (let k = 0; k < p; k++) for (let j = k; j < p; j++) theta[k]! += back[k * p + j]! * step[j]!;
}
