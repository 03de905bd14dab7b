import { whiten } from './campaign-variance.ts';
import { designErrors } from './curvature.ts';
import { choleskyOf, identity, solveWith, transpose, triangularise } from './dense.ts';
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
}

export interface Solution {
  readonly theta: Float64Array;
  readonly q: number;
  readonly stop: Stop;
  /** Entries of theta that lie on a bound which holds them. */
  readonly onBound: readonly number[];
}

/** The step that ends the search, in units of the scatter of theta; the largest damping; and the drop of Q that is rounding. */
const LIMITS = { step: 1e-10, damping: 1e12, rounding: 1e-11, iterations: 200 };

/**
 * theta = argmin r^T V(theta, phi)^-1 r at held components, V's dependence on theta inside: Gauss-Newton on the design at the adjusted points, corrected by
 * the curvature that the errors in x bring, damped (Levenberg 1944, Marquardt 1963) where it does not descend, projected onto the bounds.
 * Leaves the equations at the solution. The design is triangularised by QR; no normal equations of raw columns.
 */
export function solveTheta(eq: Equations, start: Float64Array, components: Components, search: Search): Solution {
  const theta = start.map((value, k) => Math.min(search.upper[k]!, Math.max(search.lower[k]!, value)));
  let q = objective(eq, theta, components, search.copies);
  let damping = 0;
  let iterations = 0;
  const limit = search.iterations ?? LIMITS.iterations;
  const end = (why: Stop['why'], value: number, onBound: readonly number[]): Solution => ({
    theta,
    q,
    stop: { why, value, limit: LIMITS.step, iterations },
    onBound,
  });
  if (!Number.isFinite(q)) return end('not finite', q, []);
  for (; iterations < limit; iterations++) {
    const onBound = heldByBounds(eq, theta, search);
    const active = search.free.filter((k) => !onBound.includes(k));
    const system = systemOf(eq, active, search.copies);
    const size = Math.max(q, system.floor);
    const freedom = Math.max(1, eq.problem.n - active.length);
    let value = 0;
    for (;;) {
      const step = stepOf(system, damping);
      const candidate = theta.slice();
      active.forEach((k, j) => {
        candidate[k] = Math.min(search.upper[k]!, Math.max(search.lower[k]!, theta[k]! + step[j]!));
      });
      const drop = active.reduce((sum, k, j) => sum + system.gradient[j]! * (candidate[k]! - theta[k]!), 0);
      value = Math.sqrt(Math.max(0, drop) * (freedom / size));
      const last = !(value > LIMITS.step);
      const to = last && !(drop > 0) ? Number.NaN : objective(eq, candidate, components, search.copies);
      if (to <= q) {
        theta.set(candidate);
        q = to;
        damping = damping > 1e-7 ? damping / 10 : 0;
        if (last) return end(onBound.length > 0 ? 'on a bound' : 'converged', value, onBound);
        break;
      }
      if (last || (to <= q * (1 + LIMITS.rounding) && drop <= q * LIMITS.rounding)) {
        objective(eq, theta, components, search.copies);
        return end(onBound.length > 0 ? 'on a bound' : 'converged', value, onBound);
      }
      damping = Math.max(1e-4, damping * 10);
      if (damping > LIMITS.damping) {
        objective(eq, theta, components, search.copies);
        return end('no further descent', value, onBound);
      }
    }
  }
  return end('iterations used up', Number.NaN, heldByBounds(eq, theta, search));
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
  readonly r: Float64Array;
  readonly right: Float64Array;
  readonly scale: readonly number[];
  readonly gradient: readonly number[];
  /** Correction of the curvature by errors in x, in the scaled columns; undefined without any. */
  readonly excess: Float64Array | undefined;
  /** Q below this is rounding of y. */
  readonly floor: number;
}

function systemOf(eq: Equations, active: readonly number[], copies: Float64Array | undefined): System {
  const { variance, problem } = eq;
  const out = (column: Float64Array): Float64Array => {
    const white = new Float64Array(problem.n);
    whiten(variance, column, white);
    if (copies !== undefined) for (let i = 0; i < white.length; i++) white[i]! *= Math.sqrt(copies[i]!);
    return white;
  };
  const columns = active.map((k) => out(eq.design[k]!));
  const scale = columns.map((column) => Math.sqrt(column.reduce((sum, value) => sum + value * value, 0)) || 1);
  columns.forEach((column, j) => {
    for (let i = 0; i < column.length; i++) column[i]! /= scale[j]!;
  });
  let floor = 0;
  for (let i = 0; i < problem.n; i++) floor += variance.inverse[i]! * (1e-15 * (1 + Math.abs(problem.y[i]!))) ** 2;
  return {
    ...triangularise(columns, out(eq.r)),
    scale,
    gradient: active.map((k) => gradientOf(eq, k, copies)),
    excess: excessOf(eq, active, scale, copies),
    floor,
  };
}

/** Xhat^T V^-1 M + its transpose - M^T V^-1 M + sum w^2 S, M = w m: what the Hessian of Q/2 has less than Xhat^T V^-1 Xhat. */
function excessOf(
  eq: Equations,
  active: readonly number[],
  scale: readonly number[],
  copies: Float64Array | undefined,
): Float64Array | undefined {
  const { moved, w, variance, problem } = eq;
  if (problem.sigma === undefined || moved.every((column) => column.every((value) => value === 0))) return undefined;
  const p = moved.length;
  const times = copies ?? new Float64Array(problem.n).fill(1);
  const shifted = moved.map((column) => column.map((value, i) => value * w[i]!));
  const white = (column: Float64Array): Float64Array => {
    const result = new Float64Array(problem.n);
    whiten(variance, column, result);
    return result;
  };
  const zero = new Float64Array(problem.n);
  const m = active.map((k) => white(k < p ? shifted[k]! : zero));
  const x = active.map((k) => white(eq.design[k]!));
  const errors = designErrors(
    eq,
    w.map((value, i) => times[i]! * value * value),
  );
  const q = active.length;
  const result = new Float64Array(q * q);
  active.forEach((ka, a) => {
    active.forEach((kb, b) => {
      let sum = ka < p && kb < p ? errors[ka * p + kb]! : 0;
      for (let i = 0; i < problem.n; i++) sum += times[i]! * (x[a]![i]! * m[b]![i]! + m[a]![i]! * x[b]![i]! - m[a]![i]! * m[b]![i]!);
      result[a * q + b] = sum / (scale[a]! * scale[b]!);
    });
  });
  return result;
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
function newtonStep(r: Float64Array, right: Float64Array, excess: Float64Array, q: number): readonly number[] | undefined {
  const half = inverseTransposeTimes(r, excess, q);
  const inner = inverseTransposeTimes(r, transpose(half, q, q), q);
  const hessian = identity(q).map((value, k) => value - inner[k]!);
  const factor = choleskyOf(hessian, q);
  if (factor === undefined || hessianTooFlat(factor, q)) return undefined;
  return backSubstitute(r, solveWith(factor, right, q, 1), q);
}

const hessianTooFlat = (factor: Float64Array, q: number): boolean =>
  Array.from({ length: q }, (_, i) => factor[i * q + i]!).some((value) => !(value > 0.2));

/** R^-T matrix, q x q. */
function inverseTransposeTimes(r: Float64Array, matrix: Float64Array, q: number): Float64Array {
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

function backSubstitute(r: Float64Array, right: ArrayLike<number>, q: number): readonly number[] {
  const out = new Array<number>(q).fill(0);
  for (let i = q - 1; i >= 0; i--) {
    let sum = right[i]!;
    for (let k = i + 1; k < q; k++) sum -= r[i * q + k]! * out[k]!;
    out[i] = sum / r[i * q + i]!;
  }
  return out;
}

/** Columns of unit length: a diagonal entry of R this small means that nothing is left of that column beside the ones before it. */
const wellConditioned = (r: Float64Array, q: number): boolean =>
  Array.from({ length: q }, (_, i) => Math.abs(r[i * q + i]!)).every((value) => value > 1e-9);
