import type { Fit, FitData, FitOptions } from './fit.ts';
import { subset } from './fit-data.ts';
import { fitLaw, type LawToFit } from './fit-law.ts';
import { predictAt } from './predict-at.ts';

/** Trials left out together: campaigns where there are three or more, else single trials, tenths of a study of more than 60 trials. */
export function foldsOf(
  campaign: readonly number[],
  campaigns: number,
): { readonly kind: 'leave one trial out' | 'leave one campaign out'; readonly folds: readonly (readonly number[])[] } {
  const n = campaign.length;
  if (campaigns >= 3)
    return {
      kind: 'leave one campaign out',
      folds: Array.from({ length: campaigns }, (_, c) => campaign.flatMap((own, i) => (own === c ? [i] : []))),
    };
  const count = Math.min(n, n <= 60 ? n : 10);
  return {
    kind: 'leave one trial out',
    folds: Array.from({ length: count }, (_, f) => campaign.flatMap((_own, i) => (i % count === f ? [i] : []))),
  };
}

/** What a law makes of trials it has not seen. */
export interface CrossValidation {
  readonly kind: 'leave one trial out' | 'leave one campaign out';
  /** Per trial: y - prediction from the other folds (ln for relative errors); NaN where the law could not be fitted without it. */
  readonly errors: readonly number[];
  readonly folds: readonly (readonly number[])[];
  readonly rms: number;
}

/** Refits the law without each fold in turn, at the start of the full fit. */
export function crossValidate(law: LawToFit, full: Fit, data: FitData, options: FitOptions): CrossValidation {
  const { kind, folds } = foldsOf(data.campaign, data.campaigns.length);
  const errors = new Array<number>(data.trials.length).fill(Number.NaN);
  const settings = {
    ...options,
    resamples: 0,
    ...(data.campaigns.length - 1 < 3 && kind === 'leave one campaign out' ? { campaignEffect: 'intercept' as const } : {}),
  };
  for (const fold of folds) {
    const left = new Set(fold);
    const rest = data.trials.flatMap((_, i) => (left.has(i) ? [] : [i]));
    const fit = refit({ ...law, start: full.values, trusted: true }, subset(data, rest), settings);
    if (fit === undefined) continue;
    for (const i of fold) errors[i] = data.y[i]! - predictAt(fit, data, i);
  }
  const known = errors.filter(Number.isFinite);
  return {
    kind,
    errors,
    folds,
    rms: known.length === 0 ? Number.NaN : Math.sqrt(known.reduce((sum, e) => sum + e * e, 0) / known.length),
  };
}

/** Too few trials or levels without the fold: then there is no error to tell. */
function refit(law: LawToFit, data: FitData, options: FitOptions): Fit | undefined {
  const fit = fitLaw(law, data, options, 'values');
  return fit.stop.why === 'rank deficient' || fit.stop.why === 'not finite' || fit.stop.why === 'not started' ? undefined : fit;
}

/**
 * Whitened loss e^T V^-1 e of each fold, V from one reference fit for all laws that are compared: a law that fits badly must not be forgiven by its own
 * larger scatter. Correlated trials of a campaign count once.
 */
export const foldLosses = ({ folds, errors }: CrossValidation, reference: Fit): readonly number[] =>
  folds.map((fold) => loss(fold, errors, reference));

/** e^T (diag(v) + tau^2 1 1^T)^-1 e by the matrix inversion lemma. */
function loss(fold: readonly number[], errors: readonly number[], fit: Fit): number {
  const tau = Number.isFinite(fit.statistics.campaignSd) ? fit.statistics.campaignSd ** 2 : 0;
  let [plain, cross, ones] = [0, 0, 0];
  for (const i of fold) {
    const v = Math.max(fit.diagnostics.residualSd[i]! ** 2 - tau, Number.MIN_VALUE);
    plain += errors[i]! ** 2 / v;
    cross += errors[i]! / v;
    ones += 1 / v;
  }
  return plain - (tau * cross ** 2) / (1 + tau * ones);
}
