import { studentCdf, studentQuantile } from '../numerics/distributions.ts';
import type { Observations } from '../observations/observation.ts';
import { degreesOfFreedom } from '../regression/degrees-of-freedom.ts';
import type { Fit, FitOptions } from '../regression/fit.ts';
import type { Comparison } from './ratio.ts';
import { fitRatio, lnSpan, ratioData, spanningGroups } from './ratio-fit.ts';
import type { Trend, VerdictWord } from './verdict.ts';

export interface Judgement {
  readonly verdict: VerdictWord;
  readonly trends: readonly Trend[];
  readonly rigFactor: number;
  readonly rigFactorLower: number;
  readonly rigFactorUpper: number;
  /** Largest |m| + t s over the in-range trials, as a factor: what the tolerance is held against. */
  readonly reach: number;
  readonly reachWithFactor: number;
  readonly sigma: number;
}

/** Holm-adjusted level below which a trend counts, and the one-sided level of the equivalence interval. */
const HOLM = 0.01;
const EQUIVALENCE = 0.95;

/** In-range trials an entry needs before anything is decided: the larger of 8 and its groups + 5. */
export const leastTrials = (groups: number): number => Math.max(8, groups + 5);

/** Verdict of one comparison over its in-range trials; the order of the tests is part of the rule. `tolerance` as a share (0.2). */
export function judge(
  comparison: Comparison,
  observations: Observations,
  trials: readonly number[],
  tolerance: number,
  options: FitOptions,
): Judgement {
  const groups = spanningGroups(comparison, observations, trials);
  const data = ratioData(comparison, observations, trials, groups);
  const joint = fitRatio(comparison, data, groups, options);
  const factor = groups.length === 0 ? joint : factorFit(comparison, observations, trials, options);
  const limit = Math.log(1 + tolerance);
  const trends = trendsOf(joint, comparison, observations, trials, groups);
  const reach = reachOf(joint, data.x, true);
  const reachWithFactor = reachOf(joint, data.x, false);
  const sigma = joint.statistics.residualSd;
  const offset = joint.parameters[0]!;
  const shifted = !(offset.lower <= 1 && offset.upper >= 1);
  const calm = sigma <= limit;
  const verdict: VerdictWord = trends.some((trend) => trend.pHolm < HOLM && trend.span > limit / 2)
    ? 'wrong trend'
    : reach < limit && calm
      ? 'fits as published'
      : reachWithFactor < limit && calm && shifted
        ? 'fits with a rig factor'
        : 'not decided by these trials';
  const { estimate, lower, upper } = factor.parameters[0]!;
  return {
    verdict,
    trends,
    rigFactor: estimate,
    rigFactorLower: lower,
    rigFactorUpper: upper,
    reach: Math.expm1(reach) + 1,
    reachWithFactor: Math.exp(reachWithFactor),
    sigma,
  };
}

/** The rig factor alone under the study's own error model: ln q without any trend. */
export const factorFit = (comparison: Comparison, observations: Observations, trials: readonly number[], options: FitOptions): Fit =>
  fitRatio(comparison, ratioData(comparison, observations, trials, []), [], options);

function trendsOf(
  fit: Fit,
  comparison: Comparison,
  observations: Observations,
  trials: readonly number[],
  groups: readonly number[],
): readonly Trend[] {
  const p = groups.map((_, k) => {
    const { estimate, standardError, degreesOfFreedom: nu } = fit.parameters[k + 1]!;
    return 2 * studentCdf(-Math.abs(estimate / standardError), nu);
  });
  const adjusted = holm(p);
  return groups.map((g, k) => {
    const { estimate, lower, upper } = fit.parameters[k + 1]!;
    return {
      group: comparison.correlation.form.groups[g]!,
      slope: estimate,
      lower,
      upper,
      pHolm: adjusted[k]!,
      span: Math.abs(estimate) * lnSpan(observations, comparison.rows[g + 1]!, trials),
    };
  });
}

/** Holm's step-down adjustment (Holm 1979, Scand. J. Statist. 6, 65-70). */
function holm(p: readonly number[]): readonly number[] {
  const order = p.map((_, i) => i).sort((a, b) => p[a]! - p[b]!);
  const adjusted = new Array<number>(p.length);
  let running = 0;
  order.forEach((i, rank) => {
    running = Math.max(running, Math.min(1, (p.length - rank) * p[i]!));
    adjusted[i] = running;
  });
  return adjusted;
}

/** Largest |m_i| + t s_i over the trials; without the factor, m is the trend part alone. */
function reachOf(fit: Fit, x: readonly Float64Array[], withFactor: boolean): number {
  const n = x[0]?.length ?? 1;
  let worst = 0;
  for (let i = 0; i < n; i++) {
    const w = [withFactor ? 1 : 0, ...x.map((column) => column[i]!)];
    const theta = fit.parameters.map((parameter, k) => (k === 0 ? Math.log(parameter.estimate) : parameter.estimate));
    const m = w.reduce((sum, wk, k) => sum + wk * theta[k]!, 0);
    const s = Math.sqrt(quadratic(w, lnScale(fit, fit.covariance)));
    const nu = degreesOfFreedom(fit, scaleContrast(fit, w));
    worst = Math.max(worst, Math.abs(m) + (s > 0 ? studentQuantile(EQUIVALENCE, nu) * s : 0));
  }
  return worst;
}

/** The factor enters as its logarithm: covariance and contrasts are turned from C to ln C. */
const lnScale = (fit: Fit, covariance: readonly (readonly number[])[]): readonly (readonly number[])[] => {
  const c = fit.parameters[0]!.estimate;
  return covariance.map((row, a) => row.map((v, b) => v / ((a === 0 ? c : 1) * (b === 0 ? c : 1))));
};
const scaleContrast = (fit: Fit, w: readonly number[]): readonly number[] =>
  w.map((v, k) => (k === 0 ? v / fit.parameters[0]!.estimate : v));

const quadratic = (w: readonly number[], m: readonly (readonly number[])[]): number =>
  w.reduce((sum, a, i) => sum + w.reduce((inner, b, j) => inner + a * b * m[i]![j]!, 0), 0);
