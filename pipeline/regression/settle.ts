import { basisOf } from './basis.ts';
import { estimateComponents } from './components.ts';
import type { Equations } from './equations.ts';
import type { Stop } from './fit.ts';
import type { Components } from './problem.ts';
import { type Search, solveTheta } from './theta.ts';

/** Where both estimating equations hold. The equations themselves are left standing there. */
export interface Settled {
  readonly theta: Float64Array;
  readonly components: Components;
  /** r^T V^-1 r. */
  readonly q: number;
  /** -2 ln restricted likelihood, constant included, in the columns of the design. */
  readonly criterion: number;
  readonly stop: Stop;
  readonly onBound: readonly number[];
  readonly rounds: number;
}

/** Rounds of alternation, and the relative change of every trial's variance that ends them. */
const ALTERNATION = { rounds: 200, change: 1e-11 };

/** theta at held components, the components at held theta, in turn until neither moves. */
export function settle(eq: Equations, start: Float64Array, from: Components, search: Search): Settled {
  const { scatter, campaign } = eq.problem.estimate;
  let components: Components = { scatter: scatter ? from.scatter : 0, campaign: campaign ? from.campaign : 0 };
  let theta = start;
  let rounds = 0;
  let change = Number.POSITIVE_INFINITY;
  const estimated = scatter || campaign;
  for (; ; rounds++) {
    const solved = solveTheta(eq, theta, components, search);
    theta = solved.theta;
    const active = search.free.filter((k) => !solved.onBound.includes(k));
    const done = !estimated || change < ALTERNATION.change || rounds >= ALTERNATION.rounds || failed(solved.stop);
    const basis = basisOf(eq, active);
    if (done) {
      const at = estimated && !failed(solved.stop) ? estimateComponents(eq, basis.design, components) : undefined;
      eq.evaluate(theta, components);
      const criterion =
        at === undefined ? Number.NaN : at.criterion + basis.lnDeterminant + (eq.problem.n - active.length) * Math.log(2 * Math.PI);
      const stop =
        rounds >= ALTERNATION.rounds && change > 1e-6
          ? ({ ...solved.stop, why: 'iterations used up', value: change, limit: ALTERNATION.change } as const)
          : solved.stop;
      return { theta, components, q: solved.q, criterion, stop, onBound: solved.onBound, rounds };
    }
    const next = estimateComponents(eq, basis.design, components);
    change = changeOf(eq, components, next);
    components = { scatter: next.scatter, campaign: next.campaign };
  }
}

export const failed = (stop: Stop): boolean => stop.why === 'not finite' || stop.why === 'rank deficient';

/** Largest change of a component beside the variances it is added to. */
function changeOf(eq: Equations, from: Components, to: Components): number {
  let mean = 0;
  for (let i = 0; i < eq.problem.n; i++) mean += (eq.measured[i]! + to.scatter * eq.problem.scatter[i]!) / eq.problem.n;
  return Math.max(Math.abs(to.scatter - from.scatter), Math.abs(to.campaign - from.campaign)) / (mean + to.campaign);
}
