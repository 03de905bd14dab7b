import type { Observations } from '../observations/observation.ts';
import { inverse } from '../regression/dense.ts';
import type { Fit, FitData } from '../regression/fit.ts';
import { groupSlopes, whitenedDesign } from '../regression/whitened-design.ts';
import type { Budget } from './budget.ts';

/**
 * Which source carries the uncertainty of each free parameter of a law. Random part: the parameter is a weighted sum of the trials' responses,
 * theta = K y; the variance of every random input, of the scatter and of the campaign effect is carried through that sum. Systematic part: the square of
 * the fit's own shift. Shares are of the sum of all.
 */
export function lawBudgets(fit: Fit, data: FitData, observations: Observations, rows: readonly number[]): readonly Budget[] {
  const weights = linearWeights(fit, data);
  const slopes = groupSlopes(fit, data);
  return fit.free.map((name, j) => {
    const k = weights[j]!;
    const parts = [...randomParts(k, slopes, observations, rows), ...componentParts(k, fit, data), ...systematicParts(name, fit)].filter(
      (part) => part.variance > 0,
    );
    const total = parts.reduce((sum, part) => sum + part.variance, 0);
    const shares = parts
      .map(({ source, kind, variance }) => ({ source, kind, share: variance / total }))
      .sort((a, b) => b.share - a.share || (a.source < b.source ? -1 : 1));
    return { of: name, total: Math.sqrt(total), shares };
  });
}

interface Part {
  readonly source: string;
  readonly kind: 'random' | 'systematic' | 'scatter' | 'campaign';
  readonly variance: number;
}

/** K, one row of n for each free parameter: generalised least squares at the fit's own variances, campaigns by the matrix inversion lemma. */
function linearWeights(fit: Fit, data: FitData): readonly Float64Array[] {
  const tau2 = Number.isFinite(fit.statistics.campaignSd) ? fit.statistics.campaignSd ** 2 : 0;
  const sd = fit.diagnostics.residualSd;
  const own = sd.map((s) => Math.max(s * s - tau2, Number.MIN_VALUE));
  const design = whitenedDesign(fit, data).map((column) => column.map((v, i) => v * sd[i]!));
  const solved = design.map((column) => inverseTimes(column, own, data, tau2));
  const normal = design.map((a) => solved.map((b) => a.reduce((sum, v, i) => sum + v * b[i]!, 0)));
  const p = normal.length;
  const covariance = inverse(normal.flat(), p);
  return solved.map((_, j) =>
    Float64Array.from(sd, (_sd, i) => solved.reduce((sum, column, m) => sum + covariance[j * p + m]! * column[i]!, 0)),
  );
}

function inverseTimes(x: Float64Array, own: readonly number[], { campaign, campaigns }: FitData, tau2: number): Float64Array {
  const out = x.map((v, i) => v / own[i]!);
  if (!(tau2 > 0)) return out;
  for (let c = 0; c < campaigns.length; c++) {
    let [sum, ones] = [0, 0];
    campaign.forEach((one, i) => {
      if (one !== c) return;
      sum += x[i]! / own[i]!;
      ones += 1 / own[i]!;
    });
    const shift = (tau2 * sum) / (1 + tau2 * ones);
    campaign.forEach((one, i) => {
      if (one === c) out[i]! -= shift / own[i]!;
    });
  }
  return out;
}

/** Each random input through the whole row (response and groups): d residual/d input times K, squared and summed over trials. */
function randomParts(
  k: Float64Array,
  slopes: readonly Float64Array[],
  { random, randomInputs }: Observations,
  rows: readonly number[],
): readonly Part[] {
  const width = randomInputs.length;
  return randomInputs.map((source, j) => {
    let variance = 0;
    for (let i = 0; i < k.length; i++) {
      let d = random[i]![rows[0]! * width + j]!;
      for (let g = 1; g < rows.length; g++) d -= slopes[g - 1]![i]! * random[i]![rows[g]! * width + j]!;
      variance += (k[i]! * d) ** 2;
    }
    return { source, kind: 'random' as const, variance };
  });
}

function componentParts(k: Float64Array, fit: Fit, { campaign, campaigns }: FitData): readonly Part[] {
  const scatter = fit.statistics.residualSd ** 2 * k.reduce((sum, v) => sum + v * v, 0);
  const tau2 = Number.isFinite(fit.statistics.campaignSd) ? fit.statistics.campaignSd ** 2 : 0;
  const between =
    campaigns.reduce((total, _, c) => total + campaign.reduce((sum, one, i) => (one === c ? sum + k[i]! : sum), 0) ** 2, 0) * tau2;
  return [
    { source: 'scatter of the trials', kind: 'scatter', variance: scatter },
    { source: 'differences between campaigns', kind: 'campaign', variance: between },
  ];
}

function systematicParts(name: string, fit: Fit): readonly Part[] {
  const at = fit.form.constants.indexOf(name);
  return Object.entries(fit.shifts).map(([source, shift]) => ({ source, kind: 'systematic' as const, variance: shift[at]! ** 2 }));
}
