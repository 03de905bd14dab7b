import * as says from '../base/says/choice.ts';
import { studentQuantile } from '../numerics/distributions.ts';
import { type CrossValidation, foldLosses } from './cross-validate.ts';
import type { Fit } from './fit.ts';

interface ComparedLaw {
  readonly law: string;
  readonly parameters: number;
  readonly aicc: number;
  readonly bic: number;
  readonly cvRmsLn: number;
  readonly accepted: boolean;
  readonly says: string;
}

export interface Choice {
  readonly law: string;
  readonly why: string;
  readonly compared: readonly ComparedLaw[];
}

interface Held extends Contender {
  readonly losses: readonly number[];
}

/** From this number of left-out campaigns on a difference gets a verdict; below it is only counted. */
const LEAST_FOLDS = 5;

/** One fitted law with its errors on trials that it has not seen. */
export interface Contender {
  readonly fit: Fit;
  readonly cross: CrossValidation;
}

/**
 * Which law: the one with fewest parameters stands unless a richer one predicts left-out trials better beyond one standard error of the difference.
 * Interval of the mean difference per fold: dbar +- t s sqrt(1/C + 1/(C-1)), which counts that the folds share their training trials (Nadeau and Bengio 2003).
 */
export function chooseLaw(all: readonly Contender[]): Choice {
  const reference = all
    .filter(({ fit }) => isUsable(fit))
    .reduce((a, b) => (b.fit.statistics.rmsLn < a.fit.statistics.rmsLn ? b : a), all[0]!).fit;
  const contenders = all.map((one): Held => ({ ...one, losses: foldLosses(one.cross, reference) }));
  const usable = contenders.filter(({ fit }) => isUsable(fit));
  const simplestFirst = [...(usable.length > 0 ? usable : contenders)].sort((a, b) => free(a) - free(b) || meanLoss(a) - meanLoss(b));
  let best = simplestFirst[0]!;
  const story: string[] = [];
  for (const rival of simplestFirst.slice(1)) {
    const against = difference(best, rival);
    const same = free(rival) === free(best);
    const better = same ? against.mean > 0 : against.mean > against.standardError;
    story.push(
      says.against(best.fit.name, rival.fit.name, {
        ...against,
        better,
        campaigns: rival.cross.kind === 'leave one campaign out',
        decided: against.folds >= LEAST_FOLDS,
      }),
    );
    if (better) best = rival;
  }
  const compared = contenders.map((one): ComparedLaw => rowOf(one, best));
  return {
    law: best.fit.name,
    why: contenders.length === 1 ? says.onlyOne(best.fit.name) : [says.chosen(best.fit.name), ...story].join(' '),
    compared: ranked(compared, best.fit.name),
  };
}

export const isUsable = (fit: Fit): boolean =>
  ['converged', 'direct solution', 'on a bound'].includes(fit.stop.why) && Number.isFinite(fit.statistics.residualSd);

const free = ({ fit }: Contender): number => fit.free.length;
const meanLoss = ({ losses }: Held): number => mean(losses);
const mean = (values: readonly number[]): number => values.reduce((sum, v) => sum + v, 0) / values.length;

interface Difference {
  /** Mean loss of the standing law minus the rival's, per fold: above zero the rival is better. */
  readonly mean: number;
  readonly standardError: number;
  readonly lower: number;
  readonly upper: number;
  readonly folds: number;
  readonly wins: number;
}

function difference(standing: Held, rival: Held): Difference {
  const d = standing.losses.map((loss, k) => loss - rival.losses[k]!).filter(Number.isFinite);
  const c = d.length;
  if (c < 2)
    return {
      mean: Number.NaN,
      standardError: Number.NaN,
      lower: Number.NEGATIVE_INFINITY,
      upper: Number.POSITIVE_INFINITY,
      folds: c,
      wins: d.filter((one) => one > 0).length,
    };
  const centre = mean(d);
  const s = Math.sqrt(d.reduce((sum, one) => sum + (one - centre) ** 2, 0) / (c - 1));
  const standardError = s * Math.sqrt(1 / c + 1 / (c - 1));
  const reach = studentQuantile(0.975, c - 1) * standardError;
  return { mean: centre, standardError, lower: centre - reach, upper: centre + reach, folds: c, wins: d.filter((one) => one > 0).length };
}

/** A law is accepted for the plant's comparison where it is usable and not clearly worse than the chosen one. */
function rowOf(one: Held, best: Held): ComparedLaw {
  const { fit, cross } = one;
  const behind = difference(one, best);
  const accepted = isUsable(fit) && (one === best || !(behind.folds >= LEAST_FOLDS && behind.lower > 0));
  const text =
    one === best
      ? says.isChosen()
      : !isUsable(fit)
        ? says.notUsable(fit.stop.why)
        : accepted
          ? says.notWorse()
          : says.worse(behind.wins, behind.folds, cross.kind === 'leave one campaign out');
  return {
    law: fit.name,
    parameters: fit.free.length,
    aicc: fit.statistics.aicc,
    bic: fit.statistics.bic,
    cvRmsLn: cross.rms,
    accepted,
    says: text,
  };
}

const ranked = (rows: readonly ComparedLaw[], chosen: string): readonly ComparedLaw[] =>
  [...rows].sort((a, b) => Number(b.law === chosen) - Number(a.law === chosen) || a.cvRmsLn - b.cvRmsLn);
