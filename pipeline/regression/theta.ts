import { applyInverse, whiten } from './campaign-variance.ts';
import { designErrors } from './curvature.ts';
import { choleskyOf, identity, type Small, solveWith, transpose, triangularise, zeros } from './dense.ts';
import type { Equations } from './equations.ts';
import type { Stop } from './fit.ts';
import type { Components } from './problem.ts';

/** What bounds the search and which entries of theta (parameters, then shifts) may move. */
export interface Search {
  readonly free: readonly number[];
  readonly lower: Float64Array;
  readonly upper: Float64Array;
  /** n copies of each trial, for resamples; all trials of a campaign alike where there is a campaign effect. */
  readonly copies?: Float64Array;
  readonly iterations?: number;
  /** The step that ends the search, in units of the scatter of theta; Q is then known to its square. */
  readonly step?: number;
}

export interface Solution {
  readonly theta: Float64Array;
  readonly q: number;
  readonly stop: Stop;
  /** Entries of theta that lie on a bound which holds them. */
  readonly onBound: readonly number[];
}

/**
 * The step that ends the search, in units of the scatter of theta. Steps below `resting` are taken though Q cannot resolve them (a rise within rounding is none),
 * as long as Q falls or each is less than half the one before. The largest damping.
 */
const LIMITS = { step: 1e-11, resting: 1e-4, rounding: 1e-10, falling: 1e-13, damping: 1e12, iterations: 200 };

/**
 * theta = argmin r^T V(theta, phi)^-1 r at held components, V's dependence on theta inside: Gauss-Newton on the design at the adjusted points, corrected by
 * the curvature that the errors in x bring, damped (Levenberg 1944, Marquardt 1963) where it does not descend, projected onto the bounds.
 * Leaves the equations at the solution. The design is triangularised by QR; no normal equations of raw columns.
 */
export function solveTheta(eq: Equations, start: Float64Array, components: Components, search: Search): Solution {
  const at: Point = { theta: within(start, search), q: Number.NaN, damping: 0, value: Number.POSITIVE_INFINITY };
  at.q = objective(eq, at.theta, components, search.copies);
  const limit = search.iterations ?? LIMITS.iterations;
  const end = (why: Stop['why'], iterations: number, onBound: readonly number[]): Solution => ({
    theta: at.theta,
    q: at.q,
    stop: { why, value: why === 'not finite' ? at.q : at.value, limit: search.step ?? LIMITS.step, iterations },
    onBound,
  });
  if (!Number.isFinite(at.q)) return end('not finite', 0, []);
  for (let iteration = 0; iteration < limit; iteration++) {
    const onBound = heldByBounds(eq, at.theta, search);
    const active = search.free.filter((k) => !onBound.includes(k));
    const outcome = descend(eq, at, active, components, search);
    if (outcome === 'stuck') return end('no further descent', iteration, onBound);
    if (outcome === 'arrived') return end(onBound.length > 0 ? 'on a bound' : 'converged', iteration, onBound);
  }
  return end('iterations used up', limit, heldByBounds(eq, at.theta, search));
}

/** Where the search stands; `value` is the last step in units of the scatter of theta. */
interface Point {
  readonly theta: Float64Array;
  q: number;
  damping: number;
  value: number;
}

const within = (theta: Float64Array, { lower, upper }: Search): Float64Array =>
  theta.map((value, k) => Math.min(upper[k]!, Math.max(lower[k]!, value)));

/** One linearisation and its step, damped until it descends. Leaves the equations where the point is. */
function descend(
  eq: Equations,
  at: Point,
  active: readonly number[],
  components: Components,
  search: Search,
): 'moved' | 'arrived' | 'stuck' {
  const system = systemOf(eq, active, search.copies);
  const freedom = Math.max(1, eq.problem.n - active.length);
  const before = at.value;
  for (; at.damping <= LIMITS.damping; at.damping = Math.max(1e-4, at.damping * 10)) {
    const candidate = stepped(at, active, stepOf(system, at.damping), search);
    const drop = active.reduce((sum, k, j) => sum + system.gradient[j]! * (candidate[k]! - at.theta[k]!), 0);
    at.value = Math.sqrt(Math.max(0, drop) * (freedom / Math.max(at.q, system.floor)));
    const resting = at.value < LIMITS.resting && at.damping === 0;
    const small = !(at.value > (search.step ?? LIMITS.step));
    if (small && (at.value === 0 || !resting)) return back(eq, at, components, 'arrived');
    const q = objective(eq, candidate, components, search.copies);
    if (q <= at.q || (resting && q <= at.q * (1 + LIMITS.rounding) + system.floor)) {
      const falls = q < at.q * (1 - LIMITS.falling);
      at.theta.set(candidate);
      at.q = q;
      at.damping = at.damping > 1e-7 ? at.damping / 10 : 0;
      return small || (resting && !falls && at.value > before / 2) ? 'arrived' : 'moved';
    }
    if (resting) return back(eq, at, components, 'arrived');
  }
  return back(eq, at, components, 'stuck');
}

function stepped(at: Point, active: readonly number[], step: readonly number[], search: Search): Float64Array {
  const out = at.theta.slice();
  active.forEach((k, j) => {
    out[k] = Math.min(search.upper[k]!, Math.max(search.lower[k]!, out[k]! + step[j]!));
  });
  return out;
}

function back<T>(eq: Equations, at: Point, components: Components, outcome: T): T {
  eq.evaluate(at.theta, components);
  return outcome;
}

/** Q, with every trial counted as often as it was drawn. */
function objective(eq: Equations, theta: Float64Array, components: Components, copies: Float64Array | undefined): number {
  const q = eq.evaluate(theta, components);
  if (copies === undefined) return q;
  let sum = 0;
  for (let i = 0; i < copies.length; i++) sum += copies[i]! * eq.r[i]! * eq.w[i]!;
  return sum;
}

/** Entries on a bound that the gradient presses against it. */
function heldByBounds(eq: Equations, theta: Float64Array, search: Search): readonly number[] {
  return search.free.filter((k) => {
    if (theta[k]! > search.lower[k]! && theta[k]! < search.upper[k]!) return false;
    const slope = gradientOf(eq, k, search.copies);
    return theta[k]! <= search.lower[k]! ? slope <= 0 : slope >= 0;
  });
}

/** -1/2 dQ/dtheta_k = Xhat_k^T w. */
function gradientOf({ design, w }: Equations, k: number, copies: Float64Array | undefined): number {
  const column = design[k]!;
  let sum = 0;
  for (let i = 0; i < w.length; i++) sum += (copies === undefined ? 1 : copies[i]!) * column[i]! * w[i]!;
  return sum;
}

/** One linearisation: columns scaled to unit length, triangular. */
interface System {
  readonly r: Small;
  readonly right: Small;
  readonly scale: readonly number[];
  readonly gradient: readonly number[];
  /** Correction of the curvature by errors in x, in the scaled columns; undefined without any. */
  readonly excess: Small | undefined;
  /** Q below this is rounding of y. */
  readonly floor: number;
}

function systemOf(eq: Equations, active: readonly number[], copies: Float64Array | undefined): System {
  const n = eq.problem.n;
  const root = copies === undefined ? undefined : copies.map(Math.sqrt);
  const scale: number[] = [];
  const columns = active.map((k) => {
    const column = whitened(eq, eq.design[k]!, root);
    let square = 0;
    for (let i = 0; i < n; i++) square += column[i]! * column[i]!;
    const length = Math.sqrt(square) || 1;
    for (let i = 0; i < n; i++) column[i]! /= length;
    scale.push(length);
    return column;
  });
  const { r, right } = triangularise(columns, whitened(eq, eq.r, root));
  return {
    r,
    right,
    scale,
    gradient: active.map((k) => gradientOf(eq, k, copies)),
    excess: excessOf(eq, active, scale, copies),
    floor: roundingOf(eq),
  };
}

function whitened(eq: Equations, column: Float64Array, root: Float64Array | undefined): Float64Array {
  const out = new Float64Array(column.length);
  whiten(eq.variance, column, out);
  if (root !== undefined) for (let i = 0; i < out.length; i++) out[i]! *= root[i]!;
  return out;
}

/** What Q would be if the residuals were nothing but rounding of y. */
function roundingOf({ variance, problem }: Equations): number {
  let floor = 0;
  for (let i = 0; i < problem.n; i++) floor += variance.inverse[i]! * (1e-15 * (1 + Math.abs(problem.y[i]!))) ** 2;
  return floor;
}

/** Xhat^T V^-1 M + its transpose - M^T V^-1 M + sum w^2 S, M = w m: what the Hessian of Q/2 has less than Xhat^T V^-1 Xhat. */
function excessOf(eq: Equations, active: readonly number[], scale: readonly number[], copies: Float64Array | undefined): Small | undefined {
  const { moved, w, problem, design } = eq;
  const { n, sigma } = problem;
  if (sigma === undefined || !moved.some(isNotZero)) return undefined;
  const p = moved.length;
  const q = active.length;
  const times = new Float64Array(n);
  for (let i = 0; i < n; i++) times[i] = (copies === undefined ? 1 : copies[i]!) * w[i]! * w[i]!;
  const errors = designErrors(eq, times);
  const result = zeros(q * q);
  active.forEach((kb, b) => {
    const m = moved[kb];
    if (m === undefined || !isNotZero(m)) return;
    const shifted = new Float64Array(n);
    for (let i = 0; i < n; i++) shifted[i] = m[i]! * w[i]!;
    const solved = new Float64Array(n);
    applyInverse(eq.variance, shifted, solved);
    if (copies !== undefined) for (let i = 0; i < n; i++) solved[i]! *= copies[i]!;
    active.forEach((ka, a) => {
      const x = design[ka]!;
      const other = moved[ka];
      let sum = 0;
      for (let i = 0; i < n; i++) sum += (x[i]! - (other === undefined ? 0 : (other[i]! * w[i]!) / 2)) * solved[i]!;
      result[a * q + b]! += sum;
      result[b * q + a]! += sum;
    });
  });
  for (let a = 0; a < q; a++) {
    for (let b = 0; b < q; b++) {
      const [ka, kb] = [active[a]!, active[b]!];
      if (ka < p && kb < p) result[a * q + b]! += errors[ka * p + kb]!;
      result[a * q + b]! /= scale[a]! * scale[b]!;
    }
  }
  return result;
}

function isNotZero(column: Float64Array): boolean {
  for (let i = 0; i < column.length; i++) if (column[i] !== 0) return true;
  return false;
}

/** Damped step in the parameters themselves. */
function stepOf({ r, right, scale, excess }: System, damping: number): readonly number[] {
  const q = right.length;
  if (damping === 0 && wellConditioned(r, q)) {
    const newton = excess === undefined ? undefined : newtonStep(r, right, excess, q);
    return (newton ?? backSubstitute(r, right, q)).map((value, j) => value / scale[j]!);
  }
  const root = Math.sqrt(Math.max(damping, 1e-10));
  const rows = 2 * q;
  const columns = Array.from({ length: q }, (_, j) =>
    Float64Array.from({ length: rows }, (_row, i) => (i < q ? r[i * q + j]! : i - q === j ? root : 0)),
  );
  const padded = new Float64Array(rows);
  padded.set(right);
  const damped = triangularise(columns, padded);
  return backSubstitute(damped.r, damped.right, q).map((value, j) => value / scale[j]!);
}

/** (R^T R - excess)^-1 in the coordinates that make R the identity; undefined where that is not safely positive. */
function newtonStep(r: Small, right: Small, excess: Small, q: number): readonly number[] | undefined {
  const half = inverseTransposeTimes(r, excess, q);
  const inner = inverseTransposeTimes(r, transpose(half, q), q);
  const hessian = identity(q).map((value, k) => value - inner[k]!);
  const factor = choleskyOf(hessian, q);
  if (factor === undefined || hessianTooFlat(factor, q)) return undefined;
  return backSubstitute(r, solveWith(factor, right, q, 1), q);
}

const hessianTooFlat = (factor: Small, q: number): boolean =>
  Array.from({ length: q }, (_, i) => factor[i * q + i]!).some((value) => !(value > 0.2));

/** R^-T matrix, q x q. */
function inverseTransposeTimes(r: Small, matrix: Small, q: number): Small {
  const out = matrix.slice();
  for (let c = 0; c < q; c++) {
    for (let i = 0; i < q; i++) {
      let sum = out[i * q + c]!;
      for (let k = 0; k < i; k++) sum -= r[k * q + i]! * out[k * q + c]!;
      out[i * q + c] = sum / r[i * q + i]!;
    }
  }
  return out;
}

function backSubstitute(r: Small, right: ArrayLike<number>, q: number): readonly number[] {
  const out = new Array<number>(q).fill(0);
  for (let i = q - 1; i >= 0; i--) {
    let sum = right[i]!;
    for (let k = i + 1; k < q; k++) sum -= r[i * q + k]! * out[k]!;
    out[i] = sum / r[i * q + i]!;
  }
  return out;
}

/** Columns of unit length: a diagonal entry of R this small means that nothing is left of that column beside the ones before it. */
const wellConditioned = (r: Small, q: number): boolean =>
  Array.from({ length: q }, (_, i) => Math.abs(r[i * q + i]!)).every((value) => value > 1e-9);
