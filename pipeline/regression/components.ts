import { lnDeterminant, setVariance } from './campaign-variance.ts';
import { choleskyOf, lnDeterminantOf, multiply, solveWith, traceOfProduct } from './dense.ts';
import type { Equations } from './equations.ts';
import { type Moments, moments } from './moments.ts';
import type { Components } from './problem.ts';

/** Restricted or plain likelihood; `criterion` is -2 ln likelihood without the constant n ln 2 pi (n - q for REML). */
export interface ComponentsFit extends Components {
  readonly criterion: number;
  readonly iterations: number;
  readonly settled: boolean;
}

/** Steps of Fisher scoring, the change of the criterion that ends them, and the halvings of one step. */
const SCORING = { iterations: 60, change: 1e-13, halvings: 30 };

/**
 * phi = (sigma^2, tau^2) >= 0 at the present theta of the equations: minimum of r^T P r + ln|V| (+ ln|X^T V^-1 X| for REML),
 * residuals, design and measurement variances held. `design`: the columns that count as estimated.
 */
export function estimateComponents(
  eq: Equations,
  design: readonly Float64Array[],
  start: Components,
  kind: 'REML' | 'ML' = 'REML',
): ComponentsFit {
  const { scatter, campaign } = eq.problem.estimate;
  const floor = scatterFloor(eq);
  let phi: [number, number] = [scatter ? Math.max(start.scatter, floor) : 0, campaign ? start.campaign : 0];
  let now = look(eq, design, phi, kind);
  let iterations = 0;
  for (; iterations < SCORING.iterations; iterations++) {
    const step = scoringStep(now, phi, [scatter, campaign], floor);
    if (step === undefined) break;
    const next = descend(eq, design, phi, step, now, floor, kind);
    if (next === undefined) break;
    const gain = now.criterion - next.look.criterion;
    phi = next.phi;
    now = next.look;
    if (!(gain > SCORING.change * (1 + Math.abs(now.criterion))) && next.small) break;
  }
  return { scatter: phi[0], campaign: phi[1], criterion: now.criterion, iterations, settled: iterations < SCORING.iterations };
}

/** sigma^2 stays above this where some trial has no measurement variance of its own to stand on. */
function scatterFloor({ measured, r }: Equations): number {
  let least = Number.POSITIVE_INFINITY;
  let square = 0;
  for (let i = 0; i < r.length; i++) {
    least = Math.min(least, measured[i]!);
    square += r[i]! * r[i]!;
  }
  return least > 0 ? 0 : (1e-12 * square) / r.length + Number.MIN_VALUE * 1e20;
}

export interface Look {
  readonly criterion: number;
  readonly score: readonly [number, number];
  readonly information: readonly [number, number, number];
}

function look(eq: Equations, design: readonly Float64Array[], phi: readonly [number, number], kind: 'REML' | 'ML'): Look {
  const total = eq.measured.map((d, i) => d + phi[0] * eq.problem.scatter[i]!);
  setVariance(eq.variance, total, phi[1]);
  const m = moments(eq.variance, eq.problem.scatter, design, eq.r);
  return kind === 'REML' ? restricted(m, lnDeterminant(eq.variance, phi[1])) : plain(m, lnDeterminant(eq.variance, phi[1]));
}

/** score_k = (r^T P V_k P r - tr P V_k)/2, information_kl = tr(P V_k P V_l)/2, P the REML projector. */
export function restricted(m: Moments, lnV: number): Look {
  const q = m.right.length;
  const factor = choleskyOf(m.gram, q);
  if (factor === undefined) return { criterion: Number.POSITIVE_INFINITY, score: [0, 0], information: [1, 0, 1] };
  const b = solveWith(factor, m.right, q, 1);
  const solved = m.first.map((first) => solveWith(factor, first, q, q));
  const square = [0, 1].map((k) => m.square[k]! - 2 * dot(m.cross[k]!, b) + quadratic(m.first[k]!, b, q));
  const trace = [0, 1].map((k) => m.trace[k]! - traceOfProduct(solved[k]!, undefined, q));
  const pair = ([k, l, kl]: readonly [number, number, number]): number =>
    (m.traces[kl]! - 2 * traceOfProduct(solveWith(factor, m.second[kl]!, q, q), undefined, q) + traceOfProduct(solved[k]!, solved[l]!, q)) /
    2;
  return {
    criterion: m.q - dot(m.right, b) + lnV + lnDeterminantOf(factor, q),
    score: [(square[0]! - trace[0]!) / 2, (square[1]! - trace[1]!) / 2],
    information: [pair([0, 0, 0]), pair([0, 1, 1]), pair([1, 1, 2])],
  };
}

function plain(m: Moments, lnV: number): Look {
  return {
    criterion: m.q + lnV,
    score: [(m.square[0] - m.trace[0]) / 2, (m.square[1] - m.trace[1]) / 2],
    information: [m.traces[0] / 2, m.traces[1] / 2, m.traces[2] / 2],
  };
}

/** The components that may move, and where to: Fisher scoring, those at their lower end left there while the score holds them. */
function scoringStep(
  { score, information: [a, b, d] }: Look,
  phi: readonly [number, number],
  estimate: readonly [boolean, boolean],
  floor: number,
): readonly [number, number] | undefined {
  const free = [estimate[0] && !(phi[0] <= floor && score[0] <= 0), estimate[1] && !(phi[1] <= 0 && score[1] <= 0)];
  if (!free[0] && !free[1]) return undefined;
  if (!free[1]) return [score[0] / a, 0];
  if (!free[0]) return [0, score[1] / d];
  const determinant = a * d - b * b;
  if (!(determinant > 1e-12 * a * d)) return [score[0] / a, 0];
  return [(d * score[0] - b * score[1]) / determinant, (a * score[1] - b * score[0]) / determinant];
}

interface Descent {
  readonly phi: [number, number];
  readonly look: Look;
  /** The step is far below the components' own uncertainty. */
  readonly small: boolean;
}

/** The step, halved until the criterion does not rise. */
function descend(
  eq: Equations,
  design: readonly Float64Array[],
  phi: readonly [number, number],
  step: readonly [number, number],
  now: Look,
  floor: number,
  kind: 'REML' | 'ML',
): Descent | undefined {
  let share = 1;
  for (let halving = 0; halving < SCORING.halvings; halving++, share /= 2) {
    const to: [number, number] = [
      step[0] === 0 ? phi[0] : Math.max(floor, phi[0] + share * step[0]),
      Math.max(0, phi[1] + share * step[1]),
    ];
    const next = look(eq, design, to, kind);
    if (next.criterion <= now.criterion + SCORING.change * Math.abs(now.criterion)) {
      const moved = [0, 1].map((k) => Math.abs(to[k]! - phi[k]!) * Math.sqrt(Math.max(0, next.information[k === 0 ? 0 : 2]!)));
      return { phi: to, look: next, small: moved.every((size) => size < 1e-9) };
    }
  }
  return undefined;
}

const dot = (a: ArrayLike<number>, b: ArrayLike<number>): number => {
  let sum = 0;
  for (let k = 0; k < a.length; k++) sum += a[k]! * b[k]!;
  return sum;
};

const quadratic = (m: Float64Array, b: Float64Array, q: number): number => dot(multiply(m, b, q, 1), b);
