import type { Form } from '../algebra/form.ts';
import { InputError } from '../base/input-error.ts';
import * as says from '../base/says/regression.ts';
import { type CampaignEffect, campaignEffectOf } from './campaign-effect.ts';
import type { FitData, FitOptions } from './fit.ts';
import { type Model, modelOf } from './model.ts';
import type { Problem } from './problem.ts';

/** A law's fit settled: what is estimated, with what weights. */
export interface Prepared {
  readonly problem: Problem;
  readonly effect: CampaignEffect;
  /** Every trial has a measurement variance stated: chi^2 means something. */
  readonly stated: boolean;
}

/**
 * Settles weights and campaign effect. Throws InputError where weights are not positive, or where `scatter: none` leaves a trial without any variance
 * (known once the law's slopes are: see `refuseExact`).
 */
export function prepare(form: Form, data: FitData, options: FitOptions): Prepared {
  const n = data.trials.length;
  const model = modelOf(form, data.scale);
  const effect = campaignEffectOf(data, options);
  const stated = options.weights === 'uncertainty' ? errorsOf(data, model) : {};
  const random = effect === 'random';
  const numbers = [...new Set(data.campaign)].sort((a, b) => a - b);
  return {
    effect,
    stated: stated.sigma !== undefined || stated.response !== undefined,
    problem: {
      n,
      model,
      y: data.y,
      x: data.x,
      ...stated,
      scatter: sharesOf(data, options),
      block: Int32Array.from(data.campaign, (campaign) => (random ? numbers.indexOf(campaign) : 0)),
      blocks: random ? numbers.length : 1,
      shifts: effect === 'fixed' ? [Float64Array.from(data.campaign, (campaign) => (campaign === numbers[0] ? -0.5 : 0.5))] : [],
      estimate: { scatter: options.scatter === 'estimate', campaign: random },
    },
  };
}

/** All covariances in one array; only the variances of the response where every group is exact; nothing where all readings are. */
function errorsOf(data: FitData, model: Model): Pick<Problem, 'sigma' | 'response'> {
  const size = (1 + model.groups.length) ** 2;
  const sigma = new Float64Array(data.sigma.length * size);
  data.sigma.forEach((matrix, i) => {
    sigma.set(matrix, i * size);
  });
  if (sigma.some((value, at) => value !== 0 && at % size !== 0)) return { sigma };
  const response = Float64Array.from(data.sigma, (matrix) => matrix[0]!);
  return response.some((value) => value !== 0) ? { response } : {};
}

/** Scatter variance of a trial is sigma^2 over its prior weight. */
function sharesOf(data: FitData, options: FitOptions): Float64Array {
  if (options.weights !== 'column') return new Float64Array(data.trials.length).fill(1);
  const weight = data.weight ?? new Float64Array(data.trials.length).fill(Number.NaN);
  const bad = weight.findIndex((value) => !(value > 0 && Number.isFinite(value)));
  if (bad >= 0) throw new InputError([{ code: 'weight-not-positive', text: says.weightNotPositive(data.trials[bad]!, weight[bad]!) }], 3);
  return weight.map((value) => 1 / value);
}

/** `scatter: none` leans on stated uncertainties alone: a trial without one would have no variance at all. */
export function refuseExact(measured: Float64Array, trials: readonly string[], options: FitOptions): void {
  if (options.scatter !== 'none') return;
  const exact = trials.filter((_, i) => !(measured[i]! > 0));
  if (exact.length > 0) throw new InputError([{ code: 'scatter-none-without-uncertainty', text: says.exactTrials(exact) }], 2);
}
