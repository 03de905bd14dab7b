import { applyInverse, type CampaignVariance } from './campaign-variance.ts';

/** Sums over one weighted design that both the REML equations and the covariance of theta need; q x q matrices row-major. */
export interface Moments {
  /** X^T V^-1 X. */
  readonly gram: Float64Array;
  /** X^T V^-1 r. */
  readonly right: Float64Array;
  /** r^T V^-1 r. */
  readonly q: number;
  /** tr V^-1 V_k for scatter and campaign. */
  readonly trace: readonly [number, number];
  /** tr V^-1 V_k V^-1 V_l: scatter-scatter, scatter-campaign, campaign-campaign. */
  readonly traces: readonly [number, number, number];
  /** (V^-1 X)^T V_k (V^-1 X). */
  readonly first: readonly [Float64Array, Float64Array];
  /** (V^-1 X)^T V_k V^-1 V_l (V^-1 X), in the order of `traces`. */
  readonly second: readonly [Float64Array, Float64Array, Float64Array];
  /** (V^-1 r)^T V_k (V^-1 X) and (V^-1 r)^T V_k (V^-1 r). */
  readonly cross: readonly [Float64Array, Float64Array];
  readonly square: readonly [number, number];
}

/** `scatter`: what sigma^2 is multiplied with in each trial. */
export function moments(v: CampaignVariance, scatter: Float64Array, design: readonly Float64Array[], r: Float64Array): Moments {
  const rows = [...design, r].map((column) => inverseOf(v, column));
  const q = design.length;
  const scattered = rows.map((column) => column.map((value, i) => value * scatter[i]!));
  const totals = rows.map((column) => blockSums(v, column));
  const spread = totals.map((total) => Float64Array.from(v.block, (c) => total[c]!));
  const first = [pairs(rows, scattered), pairs(totals, totals)] as const;
  const viaScatter = scattered.map((column) => inverseOf(v, column));
  const viaCampaign = spread.map((column) => inverseOf(v, column));
  const second = [pairs(scattered, viaScatter), pairs(scattered, viaCampaign), pairs(spread, viaCampaign)] as const;
  const plain = pairs([...design, r], rows);
  const corner = (all: Float64Array): Float64Array =>
    Float64Array.from({ length: q * q }, (_, k) => all[Math.floor(k / q) * (q + 1) + (k % q)]!);
  const edge = (all: Float64Array): Float64Array => all.slice(q * (q + 1), q * (q + 1) + q);
  const last = (all: Float64Array): number => all[(q + 1) * (q + 1) - 1]!;
  return {
    gram: corner(plain),
    right: edge(plain),
    q: last(plain),
    ...traces(v, scatter),
    first: [corner(first[0]), corner(first[1])],
    second: [corner(second[0]), corner(second[1]), corner(second[2])],
    cross: [edge(first[0]), edge(first[1])],
    square: [last(first[0]), last(first[1])],
  };
}

function inverseOf(v: CampaignVariance, column: Float64Array): Float64Array {
  const out = new Float64Array(column.length);
  applyInverse(v, column, out);
  return out;
}

function blockSums(v: CampaignVariance, column: Float64Array): Float64Array {
  const total = new Float64Array(v.blocks);
  for (let i = 0; i < column.length; i++) total[v.block[i]!]! += column[i]!;
  return total;
}

/** a_i . b_j for all i, j. */
function pairs(a: readonly Float64Array[], b: readonly Float64Array[]): Float64Array {
  const out = new Float64Array(a.length * b.length);
  a.forEach((left, i) => {
    b.forEach((right, j) => {
      let sum = 0;
      for (let k = 0; k < left.length; k++) sum += left[k]! * right[k]!;
      out[i * b.length + j] = sum;
    });
  });
  return out;
}

function traces(v: CampaignVariance, scatter: Float64Array): Pick<Moments, 'trace' | 'traces'> {
  const { block, blocks, inverse, sum, kappa } = v;
  let one = 0;
  let oneOne = 0;
  const squares = new Float64Array(blocks);
  for (let i = 0; i < inverse.length; i++) {
    const c = block[i]!;
    const e = inverse[i]!;
    const u = scatter[i]!;
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
