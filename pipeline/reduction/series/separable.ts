import { root } from '../../numerics/root.ts';

/** y = sum of c_j phi_j(t; k): linear in the c, one rate k. */
export interface SeparableModel {
  /** Basis functions at t and k, and their slopes d phi/dk. */
  readonly basis: (t: number, k: number) => readonly number[];
  readonly slopes: (t: number, k: number) => readonly number[];
}

export interface SeparableFit {
  readonly rate: number;
  /** Standard uncertainty of the rate, residual correlation counted. */
  readonly uRate: number;
  readonly linear: readonly number[];
  readonly fitted: Float64Array;
  readonly residualSd: number;
  /** By how much correlation of the residuals widens the uncertainty: 1 for independent ones. */
  readonly widening: number;
  /** Correlation of each residual with the next. */
  readonly lag1: number;
}

/** Rates tried, in multiples of 1/duration: from a curve that is still straight to one that is over at once. */
const SLOWEST = 1e-3;
const FASTEST = 1e3;
const TRIED = 80;

/**
 * Least squares over one rate by variable projection: rates are tried over six decades, then the slope of the sum of squares is brought to zero beside the best.
 * Undefined where the best rate is at an end of the range: the curve does not determine it.
 */
export function fitSeparable(time: Float64Array, value: Float64Array, model: SeparableModel): SeparableFit | undefined {
  const duration = time.at(-1)! - time[0]!;
  if (!(duration > 0)) return undefined;
  const rates = Array.from({ length: TRIED + 1 }, (_, i) => (SLOWEST * (FASTEST / SLOWEST) ** (i / TRIED)) / duration);
  const sums = rates.map((k) => project(time, value, model, k).sum);
  const best = sums.indexOf(Math.min(...sums));
  if (best <= 0 || best >= TRIED) return undefined;
  const log = root((x) => steepness(time, value, model, Math.exp(x)), Math.log(rates[best - 1]!), Math.log(rates[best + 1]!));
  return Number.isNaN(log) ? undefined : statistics(time, value, model, Math.exp(log));
}

interface Projection {
  readonly linear: readonly number[];
  readonly residuals: Float64Array;
  readonly sum: number;
}

function project(time: Float64Array, value: Float64Array, model: SeparableModel, k: number): Projection {
  const columns = columnsOf(time, (t) => model.basis(t, k));
  const { q, r } = orthonormal(columns);
  const residuals = Float64Array.from(value);
  const coordinates = q.map((column) => {
    const along = dot(column, residuals);
    for (let i = 0; i < residuals.length; i++) residuals[i]! -= along * column[i]!;
    return along;
  });
  return { linear: backSubstitute(r, coordinates), residuals, sum: dot(residuals, residuals) };
}

/** Half the slope of the sum of squares in k, the linear parameters at their best. */
function steepness(time: Float64Array, value: Float64Array, model: SeparableModel, k: number): number {
  const { linear, residuals } = project(time, value, model, k);
  return -time.reduce((sum, t, i) => sum + residuals[i]! * weigh(model.slopes(t, k), linear), 0);
}

const weigh = (columns: readonly number[], weights: readonly number[]): number => columns.reduce((sum, x, j) => sum + x * weights[j]!, 0);

function statistics(time: Float64Array, value: Float64Array, model: SeparableModel, k: number): SeparableFit | undefined {
  const { linear, residuals, sum } = project(time, value, model, k);
  const columns = [...columnsOf(time, (t) => model.basis(t, k)), Float64Array.from(time, (t) => weigh(model.slopes(t, k), linear))];
  const freedom = time.length - columns.length;
  if (!(freedom > 0)) return undefined;
  const { r } = orthonormal(columns);
  const residualSd = Math.sqrt(sum / freedom);
  const widening = Math.sqrt(correlationTime(residuals));
  return {
    rate: k,
    // the rate's column comes last, so its variance is that of the last diagonal element alone
    uRate: (residualSd * widening) / Math.abs(r.at(-1)!.at(-1)!),
    linear,
    fitted: value.map((y, i) => y - residuals[i]!),
    residualSd,
    widening,
    lag1: autocorrelation(residuals, 1),
  };
}

function columnsOf(time: Float64Array, row: (t: number) => readonly number[]): Float64Array[] {
  const rows = Array.from(time, row);
  return rows[0]!.map((_, j) => Float64Array.from(rows, (one) => one[j]!));
}

const dot = (a: Float64Array, b: Float64Array): number => a.reduce((sum, x, i) => sum + x * b[i]!, 0);

/** Gram-Schmidt, twice over, columns of a tall matrix: orthonormal columns and the rows of R, upper triangular. */
function orthonormal(columns: readonly Float64Array[]): {
  readonly q: readonly Float64Array[];
  readonly r: readonly (readonly number[])[];
} {
  const q: Float64Array[] = [];
  const r = columns.map(() => new Array<number>(columns.length).fill(0));
  columns.forEach((column, j) => {
    const left = Float64Array.from(column);
    for (let pass = 0; pass < 2; pass++) {
      q.forEach((unit, k) => {
        const along = dot(unit, left);
        r[k]![j]! += along;
        for (let i = 0; i < left.length; i++) left[i]! -= along * unit[i]!;
      });
    }
    const norm = Math.sqrt(dot(left, left));
    r[j]![j] = norm;
    q.push(norm > 0 ? left.map((x) => x / norm) : left);
  });
  return { q, r };
}

function backSubstitute(r: readonly (readonly number[])[], b: readonly number[]): readonly number[] {
  const x = new Array<number>(b.length).fill(0);
  for (let i = b.length - 1; i >= 0; i--) {
    let left = b[i]!;
    for (let j = i + 1; j < b.length; j++) left -= r[i]![j]! * x[j]!;
    x[i] = r[i]![i]! === 0 ? 0 : left / r[i]![i]!;
  }
  return x;
}

function autocorrelation(x: Float64Array, lag: number): number {
  const whole = dot(x, x);
  let sum = 0;
  for (let i = lag; i < x.length; i++) sum += x[i]! * x[i - lag]!;
  return whole > 0 ? sum / whole : 0;
}

/** 1 + 2 (rho_1 + rho_2 + ...), summed while pairs of neighbours stay positive (Geyer 1992); at least 1. */
export function correlationTime(x: Float64Array): number {
  let sum = 1;
  for (let lag = 1; lag + 1 < x.length / 3; lag += 2) {
    const pair = autocorrelation(x, lag) + autocorrelation(x, lag + 1);
    if (!(pair > 0)) break;
    sum += 2 * pair;
  }
  return Math.max(1, sum);
}
