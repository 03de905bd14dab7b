import { applyInverse, type CampaignVariance, campaignVariance, setVariance } from './campaign-variance.ts';
import { type Bound, bind } from './model.ts';
import { type MomentsOf, momentsOf } from './moments.ts';
import type { Components, Problem } from './problem.ts';

/**
 * Both estimating equations at one theta and one pair of variance components, on working arrays that each evaluation overwrites.
 * Adjusted points: xhat = x - (Sigma g)_x w with w = V^-1 r, and the design Xhat = dh/dtheta there; stationarity of r^T V^-1 r is Xhat^T w = 0 exactly.
 */
export interface Equations {
  readonly problem: Problem;
  readonly variance: CampaignVariance;
  /** n: residual y - h, linearised at the adjusted point, less fixed shifts. */
  readonly r: Float64Array;
  /** n: V^-1 r. */
  readonly w: Float64Array;
  /** n: measurement variance D = g^T Sigma g. */
  readonly measured: Float64Array;
  /** g columns of n: Cov(x, r) = (Sigma g)_x. */
  readonly covariance: readonly Float64Array[];
  /** q columns of n: dh/dtheta at the adjusted points (all parameters), then the fixed shifts. */
  readonly design: readonly Float64Array[];
  /** p columns of n: m = G (Sigma g)_x. */
  readonly moved: readonly Float64Array[];
  readonly bound: Bound;
  readonly moments: MomentsOf;
  /** Back to the readings, after y or x of the problem were overwritten. */
  restart(): void;
  /** V anew from D as it stands; r and w stay. */
  setComponents(components: Components): void;
  /** Sets everything for theta (q: parameters, then shifts) and returns Q = r^T V^-1 r; NaN where the law has no value. */
  evaluate(theta: Float64Array, components: Components): number;
}

/** Adjusted points of a law that is curved in its groups: iterations, and the move (in units of the scale) that ends them. */
const ADJUST = { iterations: 50, move: 1e-11 };

/** `rest`: the move of the adjusted points that ends their iteration. */
export function equations(problem: Problem, rest = ADJUST.move): Equations {
  const { n, model, sigma } = problem;
  const p = model.constants.length;
  const g = sigma === undefined ? 0 : model.groups.length;
  const column = (): Float64Array => new Float64Array(n);
  const columns = (count: number): Float64Array[] => Array.from({ length: count }, column);
  const state = {
    problem,
    variance: campaignVariance(problem.block, problem.blocks),
    r: column(),
    w: column(),
    measured: problem.response?.slice() ?? column(),
    covariance: columns(g),
    design: [...columns(p), ...problem.shifts],
    moved: columns(sigma === undefined ? 0 : p),
    moments: momentsOf(n, problem.blocks, p + problem.shifts.length),
    bound: bind(model, problem.x, n, sigma !== undefined),
    total: column(),
    slope: new Float64Array(1 + g),
    theta: new Float64Array(p),
    rest,
  };
  return {
    ...state,
    restart: () => {
      backToReadings(state);
      state.bound.load();
    },
    setComponents: (components) => setComponents(state, components),
    evaluate: (theta, components) => evaluate(state, theta, components),
  };
}

type State = Omit<Equations, 'evaluate' | 'setComponents' | 'restart'> & {
  readonly total: Float64Array;
  readonly slope: Float64Array;
  readonly theta: Float64Array;
  readonly rest: number;
};

function evaluate(state: State, theta: Float64Array, components: Components): number {
  const { problem, bound } = state;
  const { model, sigma } = problem;
  state.theta.set(theta.subarray(0, state.theta.length));
  if (sigma === undefined || model.straight) {
    bound.run(state.theta, false);
    residuals(state, theta);
    weigh(state, components);
  } else {
    adjust(state, theta, components);
    bound.run(state.theta, true);
  }
  if (sigma !== undefined) crossTerms(state);
  designAtAdjusted(state);
  let q = 0;
  for (let i = 0; i < state.r.length; i++) q += state.r[i]! * state.w[i]!;
  return q;
}

/**
 * Moves the model's columns to the adjusted points, linearising the law there, until they rest; from the readings again where the last points lead nowhere.
 * Far from the fit they may not rest at all: then the law is linearised at the readings.
 */
function adjust(state: State, theta: Float64Array, components: Components): void {
  if (rest(state, theta, components)) return;
  backToReadings(state);
  if (rest(state, theta, components)) return;
  backToReadings(state);
  look(state, theta, components);
}

function look(state: State, theta: Float64Array, components: Components): void {
  state.bound.near(state.theta);
  residuals(state, theta);
  weigh(state, components);
}

function backToReadings({ problem, bound }: State): void {
  problem.x.forEach((x, k) => {
    bound.x[k]!.set(x);
  });
}

/** False where the points do not come to rest, or the law has no value there. */
function rest(state: State, theta: Float64Array, components: Components): boolean {
  const { problem, bound, covariance, w } = state;
  for (let iteration = 0; iteration < ADJUST.iterations; iteration++) {
    look(state, theta, components);
    let largest = 0;
    problem.x.forEach((x, k) => {
      const at = bound.x[k]!;
      const s = covariance[k]!;
      for (let i = 0; i < x.length; i++) {
        const to = x[i]! - s[i]! * w[i]!;
        const move = Math.abs(to - at[i]!) / (1 + Math.abs(to));
        if (!(move >= 0)) largest = Number.POSITIVE_INFINITY;
        else if (move > largest) largest = move;
        at[i] = to;
      }
    });
    if (largest <= state.rest) return true;
    if (largest === Number.POSITIVE_INFINITY) return false;
  }
  return false;
}

/** r = y - h - slopes (x - xhat) - shifts. */
function residuals({ problem, bound, r }: State, theta: Float64Array): void {
  const { y, x, shifts, model } = problem;
  for (let i = 0; i < r.length; i++) r[i] = y[i]! - bound.h[i]!;
  if (problem.sigma !== undefined && !model.straight) {
    x.forEach((column, k) => {
      const at = bound.x[k]!;
      const slope = bound.byGroup[k]!;
      for (let i = 0; i < r.length; i++) r[i]! -= slope[i]! * (column[i]! - at[i]!);
    });
  }
  shifts.forEach((column, k) => {
    const size = theta[model.constants.length + k]!;
    for (let i = 0; i < r.length; i++) r[i]! -= size * column[i]!;
  });
}

/** D, Cov(x, r), V and w at the present slopes. */
function weigh(state: State, components: Components): void {
  if (state.problem.sigma !== undefined) measurementVariance(state, state.problem.sigma);
  setComponents(state, components);
  applyInverse(state.variance, state.r, state.w);
}

function setComponents({ problem, measured, total, variance }: State, { scatter, campaign }: Components): void {
  for (let i = 0; i < total.length; i++) total[i] = measured[i]! + scatter * problem.scatter[i]!;
  setVariance(variance, total, campaign);
}

/** D_i = g^T Sigma g with g = (1, -dh/dx), and its x rows. */
function measurementVariance({ bound, measured, covariance, slope }: State, sigma: Float64Array): void {
  const width = slope.length;
  slope[0] = 1;
  for (let i = 0, at = 0; i < measured.length; i++, at += width * width) {
    for (let k = 1; k < width; k++) slope[k] = -bound.byGroup[k - 1]![i]!;
    let d = 0;
    for (let a = 0; a < width; a++) {
      let s = 0;
      for (let b = 0; b < width; b++) s += sigma[at + a * width + b]! * slope[b]!;
      d += slope[a]! * s;
      if (a > 0) covariance[a - 1]![i] = s;
    }
    measured[i] = Math.max(0, d);
  }
}

/** m_j = sum_k G_jk (Sigma g)_k. */
function crossTerms({ bound, covariance, moved }: State): void {
  moved.forEach((column, j) => {
    column.fill(0);
    covariance.forEach((s, k) => {
      const cross = bound.cross[j]![k]!;
      for (let i = 0; i < column.length; i++) column[i]! += cross[i]! * s[i]!;
    });
  });
}

/** Straight laws were evaluated at the readings: their derivative moves by -m w on the way to the adjusted point, exactly. */
function designAtAdjusted({ problem, bound, design, moved, w }: State): void {
  const move = problem.sigma !== undefined && problem.model.straight;
  bound.byConstant.forEach((column, j) => {
    const out = design[j]!;
    for (let i = 0; i < out.length; i++) out[i] = column[i]! - (move ? moved[j]![i]! * w[i]! : 0);
  });
}
