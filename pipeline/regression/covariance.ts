import { basisOf, combine } from './basis.ts';
import type { CampaignVariance } from './campaign-variance.ts';
import { designErrors } from './curvature.ts';
import { choleskyOf, forward, identity, inverse, multiply, type Small, smallestEigenvalue, solveWith, transpose, zeros } from './dense.ts';
import type { Equations } from './equations.ts';
import { restricted } from './likelihood.ts';
import { designGram, type Moments } from './moments.ts';
import type { Components } from './problem.ts';

/** Sandwich of the estimating equations at the fit, q x q row-major in the order of `columns`. */
export interface Sandwich {
  readonly inverseOfA: Small | undefined;
  readonly inverseOfB: Small;
  /** Phi = A^-1 (B + A_tp W A_tp^T) A^-1; undefined where A is not positive definite. */
  readonly phi: Small | undefined;
  /** d Phi/d phi_k of the estimated components. */
  readonly derivatives: readonly Small[];
  /** Covariance W of the estimated components. */
  readonly components: Small;
  /** Smallest eigenvalue of B^-1 A: the share of the design that is not its own error. */
  readonly reliability: number;
}

/** Step of the central differences over the components, relative to the component or to the variance it stands beside. */
const STEP = 1e-4;

/** `columns`: which of the design's columns are estimated (parameters, then shifts). The equations must stand at the fit. */
export function sandwich(eq: Equations, columns: readonly number[], at: Components): Sandwich {
  const held = hold(eq, columns);
  const now = bread(held, at);
  const q = columns.length;
  const { scatter, campaign } = eq.problem.estimate;
  const estimated = [...(scatter ? (['scatter'] as const) : []), ...(campaign ? (['campaign'] as const) : [])];
  const derivatives = estimated.map((which) => {
    const h = STEP * Math.max(at[which], typicalVariance(eq, which));
    const up = bread(held, { ...at, [which]: at[which] + h }).phi;
    const down = bread(held, { ...at, [which]: at[which] - h }).phi;
    return up === undefined || down === undefined ? zeros(q * q).fill(Number.NaN) : up.map((value, k) => (value - down[k]!) / (2 * h));
  });
  eq.setComponents(at);
  const natural = (matrix: Small): Small => outward(held.back, matrix, q);
  return {
    inverseOfA: now.inverseOfA === undefined ? undefined : natural(now.inverseOfA),
    inverseOfB: natural(inverse(now.b, q)),
    phi: now.phi === undefined ? undefined : natural(now.phi),
    derivatives: derivatives.map(natural),
    components: now.components,
    reliability: smallestRatio(now.a, now.b, q),
  };
}

/** Everything of the fit that stays while the components are moved, in a basis that makes the design orthonormal. */
interface Held {
  readonly eq: Equations;
  readonly back: Small;
  readonly design: readonly Float64Array[];
  /** m of the columns, zero for shifts. */
  readonly moved: readonly Float64Array[];
  /** sum_i c_i S_i. */
  errors(coefficient: Float64Array): Small;
}

function hold(eq: Equations, columns: readonly number[]): Held {
  const { n, model } = eq.problem;
  const zero = new Float64Array(n);
  const { back, design } = basisOf(eq, columns);
  const p = model.constants.length;
  const q = columns.length;
  const pick = (all: Small): Small => {
    const out = zeros(q * q);
    for (let a = 0; a < q; a++) {
      for (let b = 0; b < q; b++) if (columns[a]! < p && columns[b]! < p) out[a * q + b] = all[columns[a]! * p + columns[b]!]!;
    }
    return out;
  };
  return {
    eq,
    back,
    design,
    moved: combine(
      columns.map((k) => eq.moved[k] ?? zero),
      back,
      n,
    ),
    errors: (coefficient) => inward(back, pick(designErrors(eq, coefficient)), q),
  };
}

/** T^T M T and T M T^T. */
const inward = (t: Small, m: Small, q: number): Small => multiply(transpose(t, q), multiply(m, t, q, q), q, q);
const outward = (t: Small, m: Small, q: number): Small => multiply(t, multiply(m, transpose(t, q), q, q), q, q);

interface Bread {
  readonly a: Small;
  readonly b: Small;
  readonly inverseOfA: Small | undefined;
  readonly phi: Small | undefined;
  readonly components: Small;
}

function bread(held: Held, at: Components): Bread {
  const { eq, design, moved } = held;
  const q = design.length;
  eq.setComponents(at);
  const m = eq.moments(eq.variance, eq.problem.scatter, design, eq.r);
  const errors = errorsOf(held, q);
  const b = designGram(m);
  const a = b.map((value, k) => value - errors[k]!);
  const components = componentsCovariance(eq, m);
  const factor = choleskyOf(a, q);
  if (factor === undefined) return { a, b, inverseOfA: undefined, phi: undefined, components };
  const spread = spreadOfComponents(eq, moved, components, q);
  const meat = b.map((value, k) => value + spread[k]!);
  const half = solveWith(factor, meat, q, q);
  return {
    a,
    b,
    inverseOfA: solveWith(factor, identity(q), q, q),
    phi: solveWith(factor, transpose(half, q), q, q),
    components,
  };
}

/** sum_i (V^-1)_ii S_i - sum_ij ((V^-1)_ij)^2 m_i m_j^T: B - A. */
function errorsOf({ eq, moved, errors }: Held, q: number): Small {
  const { variance: v } = eq;
  const out = errors(v.inverse.map((e, i) => e * (1 - v.kappa[v.block[i]!]! * e)));
  const weights = v.inverse.map((e, i) => e * e * (1 - 2 * v.kappa[v.block[i]!]! * e));
  const sums = moved.map((column) => squareSums(v, column));
  for (let a = 0; a < q; a++) {
    for (let b = 0; b < q; b++) {
      let sum = 0;
      for (let i = 0; i < weights.length; i++) sum += weights[i]! * moved[a]![i]! * moved[b]![i]!;
      for (let c = 0; c < v.blocks; c++) sum += v.kappa[c]! ** 2 * sums[a]![c]! * sums[b]![c]!;
      out[a * q + b]! -= sum;
    }
  }
  return out;
}

/** Per block: sum of column_i/d_i^2. */
function squareSums(v: CampaignVariance, column: Float64Array): Float64Array {
  const out = new Float64Array(v.blocks);
  for (let i = 0; i < column.length; i++) out[v.block[i]!]! += column[i]! * v.inverse[i]! ** 2;
  return out;
}

/** W = [tr(P V_k P V_l)/2]^-1 over the estimated components, k x k. */
function componentsCovariance(eq: Equations, m: Moments): Small {
  const information = restricted(m, 0).expected;
  const { scatter, campaign } = eq.problem.estimate;
  if (!scatter && !campaign) return [];
  if (!campaign) return [1 / information[0]];
  if (!scatter) return [1 / information[2]];
  const [a, b, d] = information;
  const determinant = a * d - b * b;
  return [d / determinant, -b / determinant, -b / determinant, a / determinant];
}

/** A_tp W A_tp^T with A_tp,k = - sum_i m_i (V^-1 V_k V^-1)_ii. */
function spreadOfComponents(eq: Equations, moved: readonly Float64Array[], components: Small, q: number): Small {
  const { variance: v } = eq;
  const { scatter, campaign } = eq.problem.estimate;
  const diagonals = [...(scatter ? [scatterDiagonal(v, eq.problem.scatter)] : []), ...(campaign ? [campaignDiagonal(v)] : [])];
  const k = diagonals.length;
  const slope = moved.map((column) => diagonals.map((diagonal) => -dot(column, diagonal)));
  const out = zeros(q * q);
  for (let a = 0; a < q; a++) {
    for (let b = 0; b < q; b++) {
      for (let i = 0; i < k; i++) for (let j = 0; j < k; j++) out[a * q + b]! += slope[a]![i]! * components[i * k + j]! * slope[b]![j]!;
    }
  }
  return out;
}

function dot(a: Float64Array, b: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < a.length; i++) sum += a[i]! * b[i]!;
  return sum;
}

/** (V^-1 V_1 V^-1)_ii. */
function scatterDiagonal(v: CampaignVariance, scatter: Float64Array): Float64Array {
  const sums = squareSums(v, scatter);
  return v.inverse.map((e, i) => {
    const kappa = v.kappa[v.block[i]!]!;
    return scatter[i]! * e * e * (1 - 2 * kappa * e) + (kappa * e) ** 2 * sums[v.block[i]!]!;
  });
}

/** (V^-1 V_2 V^-1)_ii. */
const campaignDiagonal = (v: CampaignVariance): Float64Array =>
  v.inverse.map((e, i) => (e * (1 - v.kappa[v.block[i]!]! * v.sum[v.block[i]!]!)) ** 2);

/** A variance that the component stands beside: the step of a difference is measured against it. */
function typicalVariance({ variance: v, problem }: Equations, which: 'scatter' | 'campaign'): number {
  const mean = v.inverse.reduce((sum, e) => sum + e, 0) / problem.n;
  return which === 'scatter' ? 1 / mean : 1 / Math.max(...v.sum);
}

/** Smallest eigenvalue of B^-1 A, by the symmetric L^-1 A L^-T. */
function smallestRatio(a: Small, b: Small, q: number): number {
  const factor = choleskyOf(b, q);
  if (factor === undefined) return Number.NaN;
  const half = forward(factor, a, q, q);
  return smallestEigenvalue(forward(factor, transpose(half, q), q, q), q);
}
