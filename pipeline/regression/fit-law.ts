import { formText } from '../algebra/print.ts';
import { crossValidate } from './cross-validate.ts';
import { rowsOf } from './dense.ts';
import type { Fit, FitData, FitOptions, Stop } from './fit.ts';
import { fitNotes } from './fit-notes.ts';
import { inNature, scaleOf } from './model.ts';
import { parametersOf } from './parameters.ts';
import { type LawToFit, type Solved, solveLaw } from './solve-law.ts';
import { statedUncertaintyTest, uncorrectedTheta } from './stated-uncertainty.ts';
import { noStatistics, statisticsOf } from './statistics.ts';
import { type Shifts, systematicShifts } from './systematic.ts';
import { campaignShifts, trialDiagnostics } from './trial-diagnostics.ts';

export type { LawToFit } from './solve-law.ts';

/**
 * Fits one law: theta by r^T V^-1 r with V's own dependence on it, variance components by REML, covariance by the sandwich of both, in that order until neither
 * moves. Never throws on data that a law does not suit: `stop` and `notes` say so. Throws InputError for weights or `scatter: none` that cannot be used.
 * `extent`: `law only` leaves out the refits of left-out trials (cvRmsLn is NaN then), the default where no resamples are asked for; `values`, for refits by the
 * dozen, also takes t for every interval and leaves out the test of the stated uncertainties and the uncorrected parameters.
 */
export function fitLaw(
  law: LawToFit,
  data: FitData,
  options: FitOptions,
  extent: 'whole' | 'law only' | 'values' = options.resamples > 0 ? 'whole' : 'law only',
): Fit {
  // 1. Both estimating equations, parameters that the data cannot tell held.
  const solved = solveLaw(law, data, options);
  if (solved.settled.stop.why === 'rank deficient' || solved.settled.stop.why === 'not finite')
    return withoutFit(law, solved, data, options);

  // 2. What systematic sources, stated uncertainties and errors in the groups do to it.
  const shifts = systematicShifts(solved, data);
  const short = extent === 'values';
  const uncorrected = inNature(solved.eq.problem.model, short ? solved.settled.theta : uncorrectedTheta(solved));
  const statedUncertainty = short ? undefined : statedUncertaintyTest(solved, data.campaign);

  // 3. Intervals, trials, notes.
  const parameters = parametersOf(solved, shifts, options, short);
  const diagnostics = trialDiagnostics(solved);
  const statistics = { ...statisticsOf(solved, diagnostics), cvRmsLn: Number.NaN, cvKind: 'leave one trial out' as const };
  const fit: Fit = {
    ...headOf(law, solved, data, options),
    ...covariancesOf(solved, shifts, data),
    parameters,
    diagnostics,
    statistics,
    uncorrected,
    ...(statedUncertainty === undefined ? {} : { statedUncertainty }),
    notes: fitNotes({ law: law.name, solved, parameters, uncorrected, statedUncertainty, data, options }),
  };

  // 4. Left-out trials.
  if (extent !== 'whole') return fit;
  const cross = crossValidate(law, fit, data, options);
  return { ...fit, statistics: { ...statistics, cvRmsLn: cross.rms, cvKind: cross.kind } };
}

type Head = Pick<
  Fit,
  | 'name'
  | 'form'
  | 'groups'
  | 'values'
  | 'text'
  | 'free'
  | 'stop'
  | 'scale'
  | 'confidence'
  | 'residualDegreesOfFreedom'
  | 'campaigns'
  | 'held'
  | 'reliability'
  | 'ranges'
>;

function headOf(law: LawToFit, solved: Solved, data: FitData, options: FitOptions): Head {
  const { eq, settled, columns, prepared, held, sandwich } = solved;
  const { model, n } = eq.problem;
  const natural = inNature(model, settled.theta);
  const values = Object.fromEntries(model.constants.map((name, j) => [name, natural[j]!]));
  const present = [...new Set(data.campaign)].sort((a, b) => a - b);
  const shifts = campaignShifts(solved);
  return {
    name: law.name,
    form: law.form,
    groups: law.groups,
    values,
    text: formText(law.form, values, (value) => String(Number(value.toPrecision(5)))),
    free: columns.filter((k) => k < model.constants.length).map((k) => model.constants[k]!),
    stop: direct(solved) ? { ...settled.stop, why: 'direct solution' } : settled.stop,
    scale: data.scale,
    confidence: options.confidence,
    residualDegreesOfFreedom: n - columns.length,
    campaigns: { kind: prepared.effect, names: present.map((c) => data.campaigns[c]!), shifts: present.map((_, c) => shifts[c] ?? 0) },
    held,
    reliability: sandwich?.reliability ?? 1,
    ranges: Object.fromEntries(law.form.groups.map((name, g) => [name, rangeOf(data.x[g]!, data.scale)])),
  };
}

/** Linear in its parameters, no errors in the groups: the minimum is one least-squares solution. */
const direct = ({ eq, settled }: Solved): boolean =>
  settled.stop.why === 'converged' && eq.problem.model.linear && eq.moved.every((column) => column.every((value) => value === 0));

function rangeOf(column: Float64Array, scale: FitData['scale']): readonly [number, number] {
  let [low, high] = [Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];
  for (const value of column) {
    low = Math.min(low, value);
    high = Math.max(high, value);
  }
  return scale === 'relative' ? [Math.exp(low), Math.exp(high)] : [low, high];
}

type Covariances = Pick<Fit, 'covarianceRandom' | 'covariance' | 'inverseOfB' | 'shifts' | 'components'>;

/** All matrices over all parameters in natural units; held parameters have zeros. */
function covariancesOf(solved: Solved, shifts: Shifts, data: FitData): Covariances {
  const { eq, settled, columns, sandwich } = solved;
  const { model, estimate } = eq.problem;
  const p = model.constants.length;
  const q = columns.length;
  const scale = scaleOf(model, settled.theta);
  const positions = Array.from({ length: p }, (_, j) => columns.indexOf(j));
  const spread = (matrix: readonly number[] | undefined): number[][] =>
    positions.map((a, i) => positions.map((b, j) => (a < 0 || b < 0 ? 0 : (matrix?.[a * q + b] ?? Number.NaN) * scale[i]! * scale[j]!)));
  const random = spread(sandwich?.phi);
  const moves = shifts.columns.map((column) => positions.map((a, j) => (a < 0 ? 0 : column[a]! * scale[j]!)));
  const names = [...(estimate.scatter ? ['scatter'] : []), ...(estimate.campaign ? ['campaign'] : [])];
  return {
    covarianceRandom: random,
    covariance: random.map((row, i) => row.map((value, j) => moves.reduce((sum, move) => sum + move[i]! * move[j]!, value))),
    inverseOfB: spread(sandwich?.inverseOfB),
    shifts: Object.fromEntries(data.sources.map((source, s) => [source, moves[s]!])),
    components: {
      names,
      values: [...(estimate.scatter ? [settled.components.scatter] : []), ...(estimate.campaign ? [settled.components.campaign] : [])],
      covariance: sandwich === undefined ? names.map(() => names.map(() => Number.NaN)) : rowsOf(sandwich.components),
      derivatives: sandwich === undefined ? names.map(() => spread(undefined)) : sandwich.derivatives.map(spread),
      criterion: settled.criterion,
    },
  };
}

/** A law that these data give no values: everything unknown, and the notes say why. */
function withoutFit(law: LawToFit, solved: Solved, data: FitData, options: FitOptions): Fit {
  const { constants } = law.form;
  const unknown = constants.map(() => Number.NaN);
  const blank = data.trials.map(() => Number.NaN);
  const stop: Stop = solved.settled.stop;
  return {
    ...headOf(law, solved, data, options),
    ...covariancesOf(solved, { columns: data.sources.map(() => []) }, data),
    values: Object.fromEntries(constants.map((name) => [name, Number.NaN])),
    text: formText(law.form),
    stop,
    parameters: parametersOf(solved, { columns: [] }, options),
    diagnostics: { fitted: blank, residual: blank, studentised: blank, leverage: blank, cook: blank, residualSd: blank },
    statistics: noStatistics(data.trials.length, constants.length),
    uncorrected: unknown,
    notes: fitNotes({ law: law.name, solved, parameters: [], uncorrected: unknown, statedUncertainty: undefined, data, options }),
  };
}
