import { basisOf } from './basis.ts';
import { applyInverse } from './campaign-variance.ts';
import type { Diagnostics } from './fit.ts';
import type { Solved } from './solve-law.ts';

/**
 * Leave-one-out measures of every trial without refitting, for correlated errors: with P the REML projector, the residual against the other trials is
 * (V^-1 r)_i/P_ii with variance 1/P_ii (for V = sigma^2 I the hat values, studentised residuals and Cook's distances of least squares).
 */
export function trialDiagnostics(solved: Solved): Diagnostics {
  const { eq, settled, columns, prepared } = solved;
  const { n, model, y } = eq.problem;
  const law = lawAtReadings(solved);
  const residual = Array.from(y, (value, i) => value - law[i]!);
  const fitted = Array.from(law, (value) => (model.scale === 'relative' ? Math.exp(value) : value));
  const blank = new Array<number>(n).fill(Number.NaN);
  if (solved.sandwich === undefined) return { fitted, residual, studentised: blank, leverage: blank, cook: blank, residualSd: blank };
  const { own, left } = informationLeft(solved);
  const q = columns.length;
  const freedom = n - q;
  const plain = prepared.problem.estimate.scatter;
  const standardised = left.map((p, i) => (p > 0 ? eq.w[i]! / Math.sqrt(p) : Number.NaN));
  return {
    fitted,
    residual,
    studentised: standardised.map((s) => (plain ? withoutTrial(s, freedom) : s)),
    leverage: left.map((p, i) => 1 - p / own[i]!),
    cook: left.map((p, i) => ((eq.w[i]! / p) ** 2 * (own[i]! - p)) / q),
    residualSd: Array.from(eq.measured, (d, i) =>
      Math.sqrt(d + settled.components.scatter * eq.problem.scatter[i]! + settled.components.campaign),
    ),
  };
}

/** Scatter estimated without the trial: s sqrt((nu - 1)/(nu - s^2)). */
const withoutTrial = (s: number, freedom: number): number =>
  s * s < freedom ? s * Math.sqrt((freedom - 1) / (freedom - s * s)) : Number.POSITIVE_INFINITY * Math.sign(s);

/** h at the readings themselves, not at the adjusted points. */
function lawAtReadings({ eq, settled }: Solved): Float64Array {
  const { model, x, n } = eq.problem;
  if (eq.problem.sigma === undefined || model.straight) return eq.bound.h.slice();
  const at = eq.bound.x.map((column) => column.slice());
  const theta = settled.theta.slice(0, model.constants.length);
  x.forEach((column, k) => {
    eq.bound.x[k]!.set(column);
  });
  eq.bound.run(theta, true);
  const h = eq.bound.h.slice(0, n);
  at.forEach((column, k) => {
    eq.bound.x[k]!.set(column);
  });
  eq.bound.run(theta, true);
  return h;
}

/** (V^-1)_ii and P_ii. */
function informationLeft({ eq, columns }: Solved): { readonly own: readonly number[]; readonly left: readonly number[] } {
  const { variance: v, problem } = eq;
  const own = Array.from(v.inverse, (e, i) => e * (1 - v.kappa[v.block[i]!]! * e));
  const { design } = basisOf(eq, columns);
  const taken = new Array<number>(problem.n).fill(0);
  const solvedColumn = new Float64Array(problem.n);
  for (const column of design) {
    applyInverse(v, column, solvedColumn);
    for (let i = 0; i < problem.n; i++) taken[i]! += solvedColumn[i]! ** 2;
  }
  return { own, left: own.map((value, i) => value - taken[i]!) };
}

/** Best guess of each campaign's shift: tau^2 times the sum of V^-1 r (random), or the fixed levels. */
export function campaignShifts({ eq, settled, prepared }: Solved): readonly number[] {
  const { variance: v, problem, w } = eq;
  if (prepared.effect === 'fixed') {
    const level = settled.theta[problem.model.constants.length]!;
    return [-level / 2, level / 2];
  }
  const shifts = new Array<number>(v.blocks).fill(0);
  if (prepared.effect === 'random') for (let i = 0; i < problem.n; i++) shifts[v.block[i]!]! += settled.components.campaign * w[i]!;
  return shifts;
}
