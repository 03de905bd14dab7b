import type { Solved } from './solve-law.ts';
import { solveTheta } from './theta.ts';

/** Strides outward, iterations inward, closeness to the cut (its share), and what solving for the others may cost. */
const LIMITS = { strides: 40, iterations: 60, closeness: 1e-7, step: 1e-5, solving: 40 };

/**
 * Where the profile of Q over one parameter (at held components) has risen by t^2 c^T Phi c/c^T A^-1 c, on one side of the estimate; model's coordinates.
 * `position` counts in the estimated columns. Infinite where it never rises so far; the bound where the parameter's own bound comes first.
 * Leaves the equations at the fit. Equal to the profile-t interval of least squares where V = sigma^2 I (Bates and Watts 1988, section 6.1).
 */
export function profileLimit(solved: Solved, position: number, sign: -1 | 1, t: number): number {
  const { eq, settled, columns, search, sandwich } = solved;
  const phi = sandwich?.phi;
  const inverseOfA = sandwich?.inverseOfA;
  if (phi === undefined || inverseOfA === undefined) return sign * Number.POSITIVE_INFINITY;
  const k = columns[position]!;
  const at = position * columns.length + position;
  const cut = t * Math.sqrt(phi[at]! / inverseOfA[at]!);
  const edge = sign > 0 ? search.upper[k]! : search.lower[k]!;
  const others = { ...search, step: LIMITS.step, iterations: LIMITS.solving, free: search.free.filter((one) => one !== k) };
  let theta = settled.theta;
  /** Root of the rise of Q less the cut: nearly linear in the parameter. */
  const rise = (value: number): number => {
    const start = theta.slice();
    columns.forEach((one, j) => {
      start[one]! += ((value - theta[k]!) * inverseOfA[j * columns.length + position]!) / inverseOfA[at]!;
    });
    start[k] = value;
    const found = solveTheta(eq, start, settled.components, others);
    if (!Number.isFinite(found.q)) return Number.NaN;
    theta = found.theta;
    return Math.sqrt(Math.max(0, found.q - settled.q)) - cut;
  };
  const limit = climb(rise, settled.theta[k]!, sign * t * Math.sqrt(phi[at]!), cut, edge);
  eq.evaluate(settled.theta, settled.components);
  return limit;
}

/** Brackets the root outward from the estimate in steps that the rise so far suggests, then closes in on it (regula falsi, Illinois). */
function climb(rise: (value: number) => number, from: number, step: number, cut: number, edge: number): number {
  let [inner, low] = [from, -cut];
  let stride = step / 2;
  for (let trial = 0; trial < LIMITS.strides; trial++) {
    const ahead = inner + stride;
    const outer = step > 0 ? Math.min(edge, ahead) : Math.max(edge, ahead);
    const high = rise(outer);
    if (Number.isNaN(high)) return valueless(rise, inner, outer, low, cut);
    if (high >= 0) return close(rise, inner, outer, low, high, cut);
    if (outer === edge) return edge;
    const slope = (high - low) / (outer - inner);
    const needed = slope * step > 0 ? (-1.05 * high) / slope : 2 * stride;
    stride = Math.sign(step) * Math.min(Math.abs(needed), 2 * Math.abs(outer - from));
    [inner, low] = [outer, high];
  }
  return step > 0 ? Number.POSITIVE_INFINITY : Number.NEGATIVE_INFINITY;
}

/** The law ends between the two: halve towards the last value that it had. */
function valueless(rise: (value: number) => number, inner: number, outer: number, low: number, cut: number): number {
  let [inside, lowest, end] = [inner, low, outer];
  for (let iteration = 0; iteration < LIMITS.iterations; iteration++) {
    const middle = (inside + end) / 2;
    const value = rise(middle);
    if (Number.isNaN(value)) end = middle;
    else if (value >= 0) return close(rise, inside, middle, lowest, value, cut);
    else [inside, lowest] = [middle, value];
  }
  return inside;
}

function close(rise: (value: number) => number, inner: number, outer: number, low: number, high: number, cut: number): number {
  let [a, fa, b, fb] = [inner, low, outer, high];
  let side = 0;
  for (let iteration = 0; iteration < LIMITS.iterations; iteration++) {
    const c = fb === fa ? (a + b) / 2 : b - (fb * (b - a)) / (fb - fa);
    const fc = rise(c);
    if (Number.isNaN(fc)) return (a + b) / 2;
    if (Math.abs(fc) <= LIMITS.closeness * cut || Math.abs(b - a) <= 1e-13 * (Math.abs(a) + Math.abs(b))) return c;
    if (fc > 0) {
      [b, fb] = [c, fc];
      if (side === 1) fa /= 2;
      side = 1;
    } else {
      [a, fa] = [c, fc];
      if (side === -1) fb /= 2;
      side = -1;
    }
  }
  return (a + b) / 2;
}
