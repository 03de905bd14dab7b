/**
 * V = diag(d) + tau^2 Z Z^T and its inverse, kept in campaign blocks: V_c^-1 = diag(1/d) - kappa (1/d)(1/d)^T. n trials, never an n x n matrix.
 * The working arrays belong to the object and are overwritten by `setVariance`.
 */
export interface CampaignVariance {
  /** Block of each trial, 0-based; all 0 where there is no campaign effect. */
  readonly block: Int32Array;
  readonly blocks: number;
  /** 1/d_i and its root. */
  readonly inverse: Float64Array;
  readonly root: Float64Array;
  /** Per block: sum of 1/d, kappa = tau^2/(1 + tau^2 sum), beta = (1 - (1 + tau^2 sum)^-1/2)/sum. */
  readonly sum: Float64Array;
  readonly kappa: Float64Array;
  readonly beta: Float64Array;
  readonly scratch: Float64Array;
}

export function campaignVariance(block: Int32Array, blocks: number): CampaignVariance {
  const n = block.length;
  const perTrial = (): Float64Array => new Float64Array(n);
  const perBlock = (): Float64Array => new Float64Array(blocks);
  return {
    block,
    blocks,
    inverse: perTrial(),
    root: perTrial(),
    sum: perBlock(),
    kappa: perBlock(),
    beta: perBlock(),
    scratch: perBlock(),
  };
}

/** Variances d of the trials (all above zero) and tau^2 >= 0; Infinity takes every block's mean out of the data. */
export function setVariance(v: CampaignVariance, d: Float64Array, tau2: number): void {
  v.sum.fill(0);
  for (let i = 0; i < d.length; i++) {
    const e = 1 / d[i]!;
    v.inverse[i] = e;
    v.root[i] = Math.sqrt(e);
    v.sum[v.block[i]!]! += e;
  }
  for (let c = 0; c < v.blocks; c++) {
    const s = v.sum[c]!;
    v.kappa[c] = s > 0 ? 1 / (1 / tau2 + s) : 0;
    v.beta[c] = s > 0 ? -Math.expm1(-0.5 * Math.log1p(tau2 * s)) / s : 0;
  }
}

/** ln |V|. */
export function lnDeterminant(v: CampaignVariance, tau2: number): number {
  let sum = 0;
  for (let i = 0; i < v.inverse.length; i++) sum -= Math.log(v.inverse[i]!);
  for (let c = 0; c < v.blocks; c++) sum += Math.log1p(tau2 * v.sum[c]!);
  return sum;
}

/** out = V^-1 column; n each, may be the same array. */
export function applyInverse(v: CampaignVariance, column: Float64Array, out: Float64Array): void {
  const total = blockTotals(v, column);
  for (let i = 0; i < column.length; i++) {
    const c = v.block[i]!;
    out[i] = v.inverse[i]! * (column[i]! - v.kappa[c]! * total[c]!);
  }
}

/** out = V^-1/2 column; n each, may be the same array. */
export function whiten(v: CampaignVariance, column: Float64Array, out: Float64Array): void {
  const total = blockTotals(v, column);
  for (let i = 0; i < column.length; i++) {
    const c = v.block[i]!;
    out[i] = v.root[i]! * (column[i]! - v.beta[c]! * total[c]!);
  }
}

/** Per block: sum of column_i/d_i, in the object's scratch. */
function blockTotals(v: CampaignVariance, column: Float64Array): Float64Array {
  v.scratch.fill(0);
  for (let i = 0; i < column.length; i++) v.scratch[v.block[i]!]! += v.inverse[i]! * column[i]!;
  return v.scratch;
}
