import { constant, group, mul, pow } from '../algebra/build.ts';
import type { Form } from '../algebra/form.ts';
import type { Observations } from '../observations/observation.ts';
import type { Fit, FitData, FitOptions } from '../regression/fit.ts';
import { outerProduct } from '../regression/fit-data.ts';
import { fitLaw } from '../regression/fit-law.ts';
import type { Comparison } from './ratio.ts';

/** A group takes part in the trend only where it spans at least this factor over the trials in range. */
const LEAST_SPAN = 1.5;

/** Positions (in the form's groups) of the groups that span enough to show a trend. */
export function spanningGroups(
  { correlation, rows }: Comparison,
  observations: Observations,
  trials: readonly number[],
): readonly number[] {
  return correlation.form.groups.flatMap((_, g) => (lnSpan(observations, rows[g + 1]!, trials) >= Math.log(LEAST_SPAN) ? [g] : []));
}

/** ln(max/min) of one observed key over some trials. */
export function lnSpan(observations: Observations, row: number, trials: readonly number[]): number {
  const ln = trials.map((i) => observations.z[row]![i]!);
  return Math.max(...ln) - Math.min(...ln);
}

/**
 * Data of ln q = ln(measured/predicted) against centred ln groups, with the covariance the readings give them: the predicted value moves with the groups,
 * so the uncertainty of ln q is that of ln y - sum (d ln f/d ln x) ln x.
 */
export function ratioData(
  comparison: Comparison,
  observations: Observations,
  trials: readonly number[],
  groups: readonly number[],
): FitData {
  const { rows, lnRatio, slopes } = comparison;
  const centre = groups.map((g) => trials.reduce((sum, i) => sum + observations.z[rows[g + 1]!]![i]!, 0) / trials.length);
  const project = (block: Float64Array, width: number, i: number): Float64Array => {
    const out = new Float64Array((1 + groups.length) * width);
    for (let j = 0; j < width; j++) {
      let q = block[rows[0]! * width + j]!;
      for (let g = 0; g < slopes.length; g++) q -= slopes[g]![i]! * block[rows[g + 1]! * width + j]!;
      out[j] = q;
      groups.forEach((g, k) => {
        out[(k + 1) * width + j] = block[rows[g + 1]! * width + j]!;
      });
    }
    return out;
  };
  const names = [...new Set(trials.map((i) => observations.campaign[i]!))];
  return {
    trials: trials.map((i) => observations.trials[i]!),
    campaign: trials.map((i) => names.indexOf(observations.campaign[i]!)),
    campaigns: names.map((campaign) => observations.campaigns[campaign]!),
    y: Float64Array.from(trials, (i) => lnRatio[i]!),
    x: groups.map((g, k) => Float64Array.from(trials, (i) => observations.z[rows[g + 1]!]![i]! - centre[k]!)),
    sigma: trials.map((i) => outerProduct(project(observations.random[i]!, observations.randomInputs.length, i), 1 + groups.length)),
    sources: observations.sources,
    systematic: trials.map((i) => project(observations.systematic[i]!, observations.sources.length, i)),
    scale: 'relative',
  };
}

/** q = C * x1^b1 * x2^b2 ... */
function ratioForm(groups: readonly string[]): Form {
  const tree = groups.reduce((product, name) => mul(product, pow(group(name), constant(`trend in ${name}`))), constant('factor'));
  return { response: 'measured/predicted', tree, groups, constants: ['factor', ...groups.map((name) => `trend in ${name}`)] };
}

/** ln q against the groups under the study's own error model; with no groups, the rig factor alone. */
export function fitRatio(comparison: Comparison, data: FitData, groups: readonly number[], options: FitOptions): Fit {
  const names = groups.map((g) => comparison.correlation.form.groups[g]!);
  const form = ratioForm(names);
  return fitLaw(
    { name: comparison.correlation.id, form, groups: Object.fromEntries([form.response, ...names].map((name) => [name, name])) },
    data,
    { ...options, scale: 'relative', weights: 'uncertainty', resamples: 0 },
  );
}
