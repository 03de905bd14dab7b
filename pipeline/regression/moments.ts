import { applyInverse, type CampaignVariance } from './campaign-variance.ts';
import { type Small, zeros } from './dense.ts';

/**
 * Sums over one weighted design that the REML equations and the covariance of theta need. The residual takes part as a last column:
 * m = q + 1 columns (X, r), m x m matrices row-major. V_1 = diag(scatter shares), V_2 = Z Z^T.
 */
export interface Moments {
  /** q, without the residual. */
  readonly width: number;
  /** (X, r)^T V^-1 (X, r). */
  readonly gram: Small;
  /** tr V^-1 V_k. */
  readonly trace: readonly [number, number];
  /** tr V^-1 V_k V^-1 V_l: 11, 12, 22. */
  readonly traces: readonly [number, number, number];
  /** (X, r)^T V^-1 V_k V^-1 (X, r). */
  readonly first: readonly [Small, Small];
  /** (X, r)^T V^-1 V_k V^-1 V_l V^-1 (X, r): 11, 12 (not symmetric), 22. */
  readonly second: readonly [Small, Small, Small];
}

/** Makes the sums for designs of up to `width` columns on arrays of its own. */
export type MomentsOf = (v: CampaignVariance, shares: Float64Array, design: readonly Float64Array[], r: Float64Array) => Moments;

/** n trials. `shares`: what sigma^2 is multiplied with in each trial; `design`: q columns of n. */
export function momentsOf(n: number, blocks: number, width: number): MomentsOf {
  const set = (length: number): Float64Array[] => Array.from({ length: width + 1 }, () => new Float64Array(length));
  const per = {
    inverse: set(n),
    shared: set(n),
    via: set(n),
    totals: set(blocks),
    weighted: set(blocks),
    tilted: set(blocks),
    twice: set(blocks),
  };
  return (v, shares, design, r) => {
    const columns = [...design, r];
    columns.forEach((column, j) => {
      applyInverse(v, column, per.inverse[j]!);
      product(per.inverse[j]!, shares, per.shared[j]!);
      applyInverse(v, per.shared[j]!, per.via[j]!);
      blockSums(v, per.inverse[j]!, per.totals[j]!);
      weightedBlockSums(v, per.shared[j]!, per.weighted[j]!);
      for (let c = 0; c < v.blocks; c++) {
        per.tilted[j]![c] = per.totals[j]![c]! * (1 - v.kappa[c]! * v.sum[c]!);
        per.twice[j]![c] = per.tilted[j]![c]! * v.sum[c]!;
      }
    });
    const m = columns.length;
    return {
      width: design.length,
      gram: symmetricPairs(columns, per.inverse, m),
      ...traces(v, shares),
      first: [symmetricPairs(per.inverse, per.shared, m), symmetricPairs(per.totals, per.totals, m)],
      second: [symmetricPairs(per.shared, per.via, m), pairs(per.weighted, per.tilted, m), symmetricPairs(per.totals, per.twice, m)],
    };
  };
}

/** X^T V^-1 X, q x q. */
export function designGram({ gram, width: q }: Moments): Small {
  const out = zeros(q * q);
  for (let a = 0; a < q; a++) for (let b = 0; b < q; b++) out[a * q + b] = gram[a * (q + 1) + b]!;
  return out;
}

function product(a: Float64Array, b: Float64Array, out: Float64Array): void {
  for (let i = 0; i < a.length; i++) out[i] = a[i]! * b[i]!;
}

function blockSums(v: CampaignVariance, column: Float64Array, total: Float64Array): void {
  total.fill(0);
  for (let i = 0; i < column.length; i++) total[v.block[i]!]! += column[i]!;
}

function weightedBlockSums(v: CampaignVariance, column: Float64Array, total: Float64Array): void {
  total.fill(0);
  for (let i = 0; i < column.length; i++) total[v.block[i]!]! += v.inverse[i]! * column[i]!;
}

function dot(a: Float64Array, b: Float64Array): number {
  let sum = 0;
  for (let k = 0; k < a.length; k++) sum += a[k]! * b[k]!;
  return sum;
}

/** a_i . b_j for all i, j. */
function pairs(a: readonly Float64Array[], b: readonly Float64Array[], m: number): Small {
  const out = zeros(m * m);
  for (let i = 0; i < m; i++) for (let j = 0; j < m; j++) out[i * m + j] = dot(a[i]!, b[j]!);
  return out;
}

/** The same, where it is known to be symmetric. */
function symmetricPairs(a: readonly Float64Array[], b: readonly Float64Array[], m: number): Small {
  const out = zeros(m * m);
  for (let i = 0; i < m; i++) for (let j = 0; j <= i; j++) out[i * m + j] = out[j * m + i] = dot(a[i]!, b[j]!);
  return out;
}

function traces(v: CampaignVariance, shares: Float64Array): Pick<Moments, 'trace' | 'traces'> {
  const { block, blocks, inverse, sum, kappa } = v;
  let one = 0;
  let oneOne = 0;
  const squares = zeros(blocks);
  for (let i = 0; i < inverse.length; i++) {
    const c = block[i]!;
    const e = inverse[i]!;
    const u = shares[i]!;
    one += u * e * (1 - kappa[c]! * e);
    oneOne += u * u * e * e * (1 - 2 * kappa[c]! * e);
    squares[c]! += u * e * e;
  }
  let two = 0;
  let oneTwo = 0;
  let twoTwo = 0;
  for (let c = 0; c < blocks; c++) {
    const left = 1 - kappa[c]! * sum[c]!;
    two += left * sum[c]!;
    oneOne += (kappa[c]! * squares[c]!) ** 2;
    oneTwo += left * left * squares[c]!;
    twoTwo += (left * sum[c]!) ** 2;
  }
  return { trace: [one, two], traces: [oneOne, oneTwo, twoTwo] };
}
