import { choleskyOf, lnDeterminantOf, type Small, solveWith, traceOfProduct, zeros } from './dense.ts';
import { designGram, type Moments } from './moments.ts';

/** -2 ln likelihood (without n ln 2 pi) of the variance components, its slope and its curvature. */
export interface Look {
  readonly criterion: number;
  /** d ln likelihood/d phi_k. */
  readonly score: readonly [number, number];
  /** Expected information, 11, 12, 22: its inverse is W. */
  readonly expected: readonly [number, number, number];
  /** Observed information: the better step near the end. */
  readonly observed: readonly [number, number, number];
}

const none: Look = { criterion: Number.POSITIVE_INFINITY, score: [0, 0], expected: [1, 0, 1], observed: [1, 0, 1] };

/** REML: r^T P r + ln|V| + ln|X^T V^-1 X|, P the projector V^-1 - V^-1 X (X^T V^-1 X)^-1 X^T V^-1. */
export function restricted(m: Moments, lnV: number): Look {
  const q = m.width;
  const factor = choleskyOf(designGram(m), q);
  if (factor === undefined) return none;
  const b = solveWith(factor, edge(m.gram, q), q, 1);
  const through = (matrix: Small): Small => solveWith(factor, corner(matrix, q), q, q);
  const solved = m.first.map(through);
  const rest = m.first.map((first) => restOf(first, b, q));
  const score = [0, 1].map((k) => (rest[k]!.square - m.trace[k]! + traceOfProduct(solved[k]!, undefined, q)) / 2);
  const pair = ([k, l, kl]: Pair): { readonly expected: number; readonly observed: number } => {
    const trace = m.traces[kl]! - 2 * traceOfProduct(through(m.second[kl]!), undefined, q) + traceOfProduct(solved[k]!, solved[l]!, q);
    const square = restOf(m.second[kl]!, b, q).square - dot(rest[k]!.edge, solveWith(factor, rest[l]!.edge, q, 1));
    return { expected: trace / 2, observed: square - trace / 2 };
  };
  const information = pairs.map(pair);
  return {
    criterion: restOf(m.gram, b, q).square + lnV + lnDeterminantOf(factor, q),
    score: [score[0]!, score[1]!],
    expected: triple(information.map((one) => one.expected)),
    observed: triple(information.map((one) => one.observed)),
  };
}

/** Maximum likelihood at held theta: r^T V^-1 r + ln|V|. */
export function plain(m: Moments, lnV: number): Look {
  const last = (m.width + 1) ** 2 - 1;
  const score = [0, 1].map((k) => (m.first[k]![last]! - m.trace[k]!) / 2);
  return {
    criterion: m.gram[last]! + lnV,
    score: [score[0]!, score[1]!],
    expected: triple(pairs.map(([, , kl]) => m.traces[kl] / 2)),
    observed: triple(pairs.map(([, , kl]) => m.second[kl][last]! - m.traces[kl] / 2)),
  };
}

type Pair = readonly [0 | 1, 0 | 1, 0 | 1 | 2];
const pairs: readonly Pair[] = [
  [0, 0, 0],
  [0, 1, 1],
  [1, 1, 2],
];
const triple = (values: readonly number[]): readonly [number, number, number] => [values[0]!, values[1]!, values[2]!];

const corner = (all: Small, q: number): Small => {
  const out = zeros(q * q);
  for (let a = 0; a < q; a++) for (let b = 0; b < q; b++) out[a * q + b] = all[a * (q + 1) + b]!;
  return out;
};
const edge = (all: Small, q: number): Small => all.slice(q * (q + 1), q * (q + 1) + q);

/** The residual's row and square of a form over (X, r), once X b is taken from r. */
function restOf(all: Small, b: Small, q: number): { readonly edge: Small; readonly square: number } {
  const m = q + 1;
  const out = zeros(q);
  let square = all[m * m - 1]!;
  for (let j = 0; j < q; j++) {
    let sum = all[q * m + j]!;
    for (let k = 0; k < q; k++) sum -= b[k]! * all[k * m + j]!;
    out[j] = sum;
    square -= b[j]! * (all[j * m + q]! + sum);
  }
  return { edge: out, square };
}

const dot = (a: Small, b: Small): number => {
  let sum = 0;
  for (let k = 0; k < a.length; k++) sum += a[k]! * b[k]!;
  return sum;
};
