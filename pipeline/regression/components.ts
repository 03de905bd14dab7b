import { lnDeterminant } from './campaign-variance.ts';
import type { Equations } from './equations.ts';
import { type Look, plain, restricted } from './likelihood.ts';
import type { Components } from './problem.ts';

/** Restricted or plain likelihood; `criterion` is -2 ln likelihood without the constant n ln 2 pi (n - q for REML). */
export interface ComponentsFit extends Components {
  readonly criterion: number;
  readonly iterations: number;
  readonly settled: boolean;
}

/** Steps, the gain of ln likelihood that ends them (the square of a step in units of the components' own uncertainty), rounding of the criterion, halvings. */
const SCORING = { iterations: 60, gain: 1e-20, rounding: 1e-13, halvings: 20 };

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
    if (step === undefined || !(step[0] * now.score[0] + step[1] * now.score[1] > SCORING.gain)) break;
    const next = descend(eq, design, phi, step, now, floor, kind);
    if (next === undefined) break;
    phi = next.phi;
    now = next.look;
  }
  return { scatter: phi[0], campaign: phi[1], criterion: now.criterion, iterations, settled: iterations < SCORING.iterations };
}

/** sigma^2 stays above this where some trial has no measurement variance of its own to stand on; exact data keep the scatter of their own rounding. */
function scatterFloor({ measured, r, problem: { y } }: Equations): number {
  let least = Number.POSITIVE_INFINITY;
  let square = 0;
  for (let i = 0; i < r.length; i++) {
    least = Math.min(least, measured[i]!);
    square += r[i]! * r[i]! + 1e-18 * y[i]! * y[i]!;
  }
  return least > 0 ? 0 : (1e-12 * square) / r.length + Number.MIN_VALUE * 1e20;
}

function look(eq: Equations, design: readonly Float64Array[], phi: readonly [number, number], kind: 'REML' | 'ML'): Look {
  const { variance, problem, r } = eq;
  eq.setComponents({ scatter: phi[0], campaign: phi[1] });
  const lnV = lnDeterminant(variance, phi[1]);
  const m = eq.moments(variance, problem.scatter, design, r);
  return kind === 'REML' ? restricted(m, lnV) : plain(m, lnV);
}

/** Where to: Newton on the observed information where that is positive, else Fisher scoring; a component at its lower end stays while the score holds it there. */
function scoringStep(
  { score, expected, observed }: Look,
  phi: readonly [number, number],
  estimate: readonly [boolean, boolean],
  floor: number,
): Step | undefined {
  const free = [estimate[0] && !(phi[0] <= floor && score[0] <= 0), estimate[1] && !(phi[1] <= 0 && score[1] <= 0)];
  if (!free[0] && !free[1]) return undefined;
  if (!free[1]) return [score[0] / (observed[0] > expected[0] / 4 ? observed[0] : expected[0]), 0];
  if (!free[0]) return [0, score[1] / (observed[2] > expected[2] / 4 ? observed[2] : expected[2])];
  return solveTwo(observed, expected, score) ?? solveTwo(expected, expected, score) ?? [score[0] / expected[0], 0];
}

type Step = readonly [number, number];

/** Undefined where the matrix is not clearly positive beside the expected one. */
function solveTwo([a, b, d]: readonly [number, number, number], beside: readonly [number, number, number], score: Step): Step | undefined {
  const determinant = a * d - b * b;
  if (!(a > beside[0] / 4 && d > beside[2] / 4 && determinant > 1e-9 * a * d)) return undefined;
  return [(d * score[0] - b * score[1]) / determinant, (a * score[1] - b * score[0]) / determinant];
}

/** The step, halved until the criterion does not rise. */
function descend(
  eq: Equations,
  design: readonly Float64Array[],
  phi: Step,
  step: Step,
  now: Look,
  floor: number,
  kind: 'REML' | 'ML',
): { readonly phi: [number, number]; readonly look: Look } | undefined {
  let share = 1;
  for (let halving = 0; halving < SCORING.halvings; halving++, share /= 2) {
    const to: [number, number] = [
      step[0] === 0 ? phi[0] : Math.max(floor, phi[0] + share * step[0]),
      Math.max(0, phi[1] + share * step[1]),
    ];
    const next = look(eq, design, to, kind);
    if (next.criterion <= now.criterion + SCORING.rounding * (1 + Math.abs(now.criterion))) return { phi: to, look: next };
  }
  return undefined;
}
