import * as says from '../base/says/regression.ts';
import { studentQuantile } from '../numerics/distributions.ts';
import { campaignResamples, clusterErrors } from './campaign-resamples.ts';
import { withKnownPart } from './degrees-of-freedom.ts';
import type { Fit, FitData, FitOptions } from './fit.ts';
import { coordinate } from './parameters.ts';
import { parametricResamples } from './parametric-resamples.ts';
import { profileLimit } from './profile.ts';
import type { Resamples } from './resamples.ts';
import { type LawToFit, type Solved, solveLaw } from './solve-law.ts';
import { systematicShifts } from './systematic.ts';
import { trialResamples } from './trial-resamples.ts';

/** One parameter's interval by one method; natural units. */
export interface IntervalRow {
  readonly law: string;
  readonly parameter: string;
  readonly method: 't' | 'profile' | 'parametric bootstrap' | 'bootstrap by trial' | 'bootstrap by campaign' | 'bootstrap-t by campaign';
  readonly lower: number;
  readonly upper: number;
  readonly note: string;
}

/** From this many campaigns on their resampling may be studentised; below, no bootstrap of campaigns is honest. */
const CAMPAIGNS_FOR_T = 10;

/**
 * The intervals of a law's estimated parameters by every method that suits its data: t and profile (as the fit prints them), and resampling as a check of both.
 * `options.resamples` 0 leaves the resampling out. Seeded: the same input gives the same rows.
 */
export function intervalRows(law: LawToFit, fit: Fit, data: FitData, options: FitOptions): readonly IntervalRow[] {
  const solved = solveLaw({ ...law, start: fit.values, trusted: true }, data, options);
  if (solved.sandwich?.phi === undefined) return [];
  const sets = [tLimits(solved, data, options), ...profiles(solved, data, options), ...resampled(solved, options)];
  const { model } = solved.eq.problem;
  return solved.columns
    .filter((k) => k < model.constants.length)
    .flatMap((k, position) =>
      sets.map(({ method, note, limits }): IntervalRow => {
        const [lower, upper] = limits(position).map((value) => (model.asLogarithm[k] ? Math.exp(value) : value)) as [number, number];
        return { law: law.name, parameter: model.constants[k]!, method, lower, upper, note };
      }),
    );
}

/** Limits of each estimated column, model's coordinates. */
interface Method {
  readonly method: IntervalRow['method'];
  readonly note: string;
  limits(position: number): readonly [number, number];
}

function tLimits(solved: Solved, data: FitData, { confidence }: FitOptions): Method {
  const shifts = systematicShifts(solved, data);
  const limits = (position: number): readonly [number, number] => {
    const at = coordinate(solved, shifts, position)!;
    const total = Math.hypot(at.random, at.systematic);
    const half = studentQuantile((1 + confidence) / 2, withKnownPart(at.degreesOfFreedom, at.random, total)) * total;
    return [at.estimate - half, at.estimate + half];
  };
  return { method: 't', note: '', limits };
}

function profiles(solved: Solved, data: FitData, { confidence }: FitOptions): readonly Method[] {
  if (solved.eq.problem.model.linear) return [];
  const shifts = systematicShifts(solved, data);
  const limits = (position: number): readonly [number, number] => {
    const at = coordinate(solved, shifts, position)!;
    const t = studentQuantile((1 + confidence) / 2, at.degreesOfFreedom);
    return [profileLimit(solved, position, -1, t), profileLimit(solved, position, 1, t)];
  };
  return [{ method: 'profile', note: data.sources.length > 0 ? says.randomPartOnly() : '', limits }];
}

function resampled(solved: Solved, options: FitOptions): readonly Method[] {
  if (!(options.resamples > 0)) return [];
  const { effect } = solved.prepared;
  const parametric = percentiles(
    solved,
    'parametric bootstrap',
    parametricResamples(solved, options.resamples, options.seed),
    options,
    says.parametricBootstrap(),
  );
  if (effect === 'random') return [parametric, ...byCampaign(solved, options)];
  if (effect === 'fixed') return [parametric];
  return [
    parametric,
    percentiles(solved, 'bootstrap by trial', trialResamples(solved, options.resamples, options.seed), options, says.trialBootstrap()),
  ];
}

function byCampaign(solved: Solved, options: FitOptions): readonly Method[] {
  const { blocks } = solved.eq.problem;
  const found = campaignResamples(solved, options.resamples, options.seed);
  const plain = percentiles(solved, 'bootstrap by campaign', found, options, says.campaignBootstrap(blocks));
  if (blocks < CAMPAIGNS_FOR_T) return [plain];
  const own = clusterErrors(solved.eq, solved.columns, new Array<number>(blocks).fill(1));
  const limits = (position: number): readonly [number, number] => {
    const k = solved.columns[position]!;
    const estimate = solved.settled.theta[k]!;
    const t = found.theta.map((theta, b) => (theta[k]! - estimate) / found.standardErrors[b]![position]!);
    const [low, high] = middle(t, options.confidence);
    return [estimate - high * own[position]!, estimate - low * own[position]!];
  };
  return [plain, { method: 'bootstrap-t by campaign', note: says.campaignBootstrapT(found.failed, options.resamples), limits }];
}

function percentiles(
  solved: Solved,
  method: IntervalRow['method'],
  { theta, failed }: Resamples,
  options: FitOptions,
  note: string,
): Method {
  const limits = (position: number): readonly [number, number] =>
    middle(
      theta.map((one) => one[solved.columns[position]!]!),
      options.confidence,
    );
  return { method, note: failed > 0 ? `${note}; ${says.failedResamples(failed, options.resamples)}` : note, limits };
}

/** The middle share of a sample: quantiles at rank p (B + 1), between neighbours in proportion. */
function middle(values: readonly number[], share: number): readonly [number, number] {
  const sorted = [...values].sort((a, b) => a - b);
  const quantile = (p: number): number => {
    const rank = p * (sorted.length + 1) - 1;
    const below = Math.max(0, Math.min(sorted.length - 1, Math.floor(rank)));
    const above = Math.min(sorted.length - 1, below + 1);
    return sorted[below]! + (sorted[above]! - sorted[below]!) * Math.min(1, Math.max(0, rank - below));
  };
  return sorted.length === 0 ? [Number.NaN, Number.NaN] : [quantile((1 - share) / 2), quantile((1 + share) / 2)];
}
