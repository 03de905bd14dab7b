import type { Comparison } from './ratio.ts';

/** Out-of-sample ln errors of one correlation on its in-range trials: as published, and with the factor refitted without the fold. */
export interface FoldErrors {
  readonly asPublished: readonly number[];
  readonly withFactor: readonly number[];
  readonly trials: readonly number[];
}

/** `weight`: inverse variance of ln q for each trial under the study's error model. */
export function foldErrors(comparison: Comparison, folds: readonly (readonly number[])[], weight: readonly number[]): FoldErrors {
  const trials: number[] = [];
  const asPublished: number[] = [];
  const withFactor: number[] = [];
  for (const fold of folds) {
    const factor = lnFactorWithout(comparison, new Set(fold), weight);
    for (const i of fold) {
      if (!comparison.inside[i]) continue;
      trials.push(i);
      asPublished.push(comparison.lnRatio[i]!);
      withFactor.push(comparison.lnRatio[i]! - factor);
    }
  }
  return { trials, asPublished, withFactor };
}

function lnFactorWithout(comparison: Comparison, fold: ReadonlySet<number>, weight: readonly number[]): number {
  let sum = 0;
  let total = 0;
  comparison.lnRatio.forEach((ratio, i) => {
    if (fold.has(i) || !comparison.inside[i]) return;
    sum += weight[i]! * ratio;
    total += weight[i]!;
  });
  return sum / total;
}

export const rms = (errors: readonly number[]): number =>
  errors.length === 0 ? Number.NaN : Math.sqrt(errors.reduce((sum, e) => sum + e * e, 0) / errors.length);

/** The best published correlation with its factor, chosen anew inside each fold from the other trials: what choosing among m costs. */
export function bestOfMany(
  comparisons: readonly Comparison[],
  folds: readonly (readonly number[])[],
  weight: readonly number[],
): { readonly rms: number; readonly trials: number } {
  const errors: number[] = [];
  for (const fold of folds) {
    const left = new Set(fold);
    const able = comparisons.filter((one) => fold.every((i) => one.inside[i]));
    const ranked = able
      .map((one) => ({ one, factor: lnFactorWithout(one, left, weight), loss: trainingLoss(one, left, weight) }))
      .sort((a, b) => a.loss - b.loss);
    const best = ranked[0];
    if (best === undefined) continue;
    for (const i of fold) errors.push(best.one.lnRatio[i]! - best.factor);
  }
  return { rms: rms(errors), trials: errors.length };
}

function trainingLoss(comparison: Comparison, fold: ReadonlySet<number>, weight: readonly number[]): number {
  const factor = lnFactorWithout(comparison, fold, weight);
  const errors = Array.from(comparison.lnRatio, (ratio, i) => (fold.has(i) || !comparison.inside[i] ? Number.NaN : ratio - factor)).filter(
    Number.isFinite,
  );
  return errors.length === 0 ? Number.POSITIVE_INFINITY : rms(errors);
}
