import type { Law } from '../algebra/form.ts';
import type { Note } from '../base/message.ts';
import type { SourceId } from '../rules/rule.ts';

/** Why a minimiser stopped, with the number and the limit it was held against. */
export interface Stop {
  readonly why:
    | 'not started'
    | 'converged'
    | 'direct solution'
    | 'on a bound'
    | 'rank deficient'
    | 'no further descent'
    | 'iterations used up'
    | 'not finite';
  readonly value: number;
  readonly limit: number;
  readonly iterations: number;
}

/** Settings of a fit, all from the study file. */
export interface FitOptions {
  readonly scale: 'relative' | 'absolute';
  readonly weights: 'uncertainty' | 'equal' | 'column';
  readonly scatter: 'estimate' | 'none';
  readonly campaignEffect: 'auto' | 'none' | 'intercept';
  readonly confidence: number;
  readonly resamples: number;
  readonly seed: number;
}

/**
 * What a law's fit sees: n trials, response first. No heat, no mass.
 * `relative`: y and x are natural logarithms; `absolute`: values.
 */
export interface FitData {
  readonly trials: readonly string[];
  readonly campaign: readonly number[];
  readonly campaigns: readonly string[];
  /** n */
  readonly y: Float64Array;
  /** One column of n for each of form.groups. */
  readonly x: readonly Float64Array[];
  /** Per trial (1+g) x (1+g) row-major random covariance of (y, x1, ..., xg); zeros where exact. */
  readonly sigma: readonly Float64Array[];
  readonly sources: readonly SourceId[];
  /** Per trial (1+g) x s row-major: slope to each systematic source times its standard uncertainty. */
  readonly systematic: readonly Float64Array[];
  /** n prior weights, where `weights: column`. */
  readonly weight?: Float64Array;
  readonly scale: 'relative' | 'absolute';
}

export interface Bounds {
  readonly [parameter: string]: readonly [number, number];
}

export interface Parameter {
  readonly name: string;
  readonly estimate: number;
  /** Random and systematic parts together. */
  readonly standardError: number;
  readonly standardErrorRandom: number;
  /** Satterthwaite, fractional. */
  readonly degreesOfFreedom: number;
  /** At the study's confidence; -Infinity or Infinity on the side where no honest bound exists. */
  readonly lower: number;
  readonly upper: number;
  /** Held, not estimated: its value is an assumption and has no interval. */
  readonly fixed: boolean;
  readonly onBound: boolean;
  /** How the interval was made; `none` where it is not estimated. */
  readonly intervalBy: 't' | 'profile' | 'none';
}

export interface Statistics {
  readonly n: number;
  readonly parameters: number;
  /** Scatter beyond the stated uncertainties; with none stated the residual standard deviation. */
  readonly residualSd: number;
  /** Between-campaign standard deviation; NaN where it is not estimated. */
  readonly campaignSd: number;
  readonly rSquared: number;
  readonly rmsLn: number;
  readonly aicc: number;
  readonly bic: number;
  readonly cvRmsLn: number;
  readonly cvKind: 'leave one trial out' | 'leave one campaign out';
  readonly conditionIndex: number;
  /** r^T V^-1 r with sigma = tau = 0 and its degrees of freedom, where uncertainties are stated. */
  readonly chiSquared: number;
  readonly degreesOfFreedom: number;
}

/** Per trial, in the order of the fit's data. */
export interface Diagnostics {
  /** The law's value at the trial, in the unit of the response. */
  readonly fitted: readonly number[];
  /** y - law on the scale of the fit (ln measured - ln fitted for relative errors), campaign shifts left in. */
  readonly residual: readonly number[];
  /** Residual against what the other trials predict, over its standard deviation with scatter estimated without the trial. */
  readonly studentised: readonly number[];
  /** Share of the trial's own information that it takes from the fit, 0 to 1; the hat value of least squares. */
  readonly leverage: readonly number[];
  /** Cook's distance: move of the law on leaving the trial out, (dtheta)^T B (dtheta)/p. */
  readonly cook: readonly number[];
  /** Standard deviation of each residual: measurement, scatter and campaign together. */
  readonly residualSd: readonly number[];
}

/** How campaigns entered: their names, and the estimated shift of each on the scale of the fit (0 where there is no effect). */
interface CampaignShifts {
  readonly kind: 'random' | 'fixed' | 'none' | 'inseparable';
  readonly names: readonly string[];
  readonly shifts: readonly number[];
}

/** A parameter that the data could not tell and that was therefore held. */
export interface Held {
  readonly parameter: string;
  readonly value: number;
  readonly why: 'not identified' | 'own error of the group';
  readonly from: 'theory' | 'start' | 'common exponent';
  /** Share of the design that was not its own error before the parameter was held; 0 where it was not identified. */
  readonly reliability: number;
}

/** r^T V^-1 r of the stated uncertainties alone, campaigns' levels taken out, with both tails. */
export interface StatedUncertaintyTest {
  readonly chiSquared: number;
  readonly degreesOfFreedom: number;
  /** Probability of a smaller and of a larger value if the stated uncertainties were right and complete. */
  readonly below: number;
  readonly above: number;
}

/** Result of fitting one law. All per-parameter arrays are in the order of form.constants. */
export interface Fit extends Law {
  readonly text: string;
  readonly free: readonly string[];
  readonly stop: Stop;
  readonly parameters: readonly Parameter[];
  readonly statistics: Statistics;
  /** p x p, random part (Phi). */
  readonly covarianceRandom: readonly (readonly number[])[];
  /** p x p, random and systematic. */
  readonly covariance: readonly (readonly number[])[];
  /** p x p, (Xhat^T V^-1 Xhat)^-1: what least distance (York) prints, without the errors of the design. */
  readonly inverseOfB: readonly (readonly number[])[];
  /** d theta/d source times u(source), one row of p for each source. */
  readonly shifts: Readonly<Record<SourceId, readonly number[]>>;
  /** Estimated variance components (sigma^2, tau^2; those that are estimated), their covariance W, and d Phi/d phi_k. */
  readonly components: {
    readonly names: readonly string[];
    readonly values: readonly number[];
    readonly covariance: readonly (readonly number[])[];
    readonly derivatives: readonly (readonly (readonly number[])[])[];
    /** -2 ln restricted likelihood at the fit, on the model's coordinates. */
    readonly criterion: number;
  };
  readonly scale: 'relative' | 'absolute';
  readonly confidence: number;
  /** n - p (parameters, fixed shifts): the most degrees of freedom any random part may claim. */
  readonly residualDegreesOfFreedom: number;
  readonly campaigns: CampaignShifts;
  readonly held: readonly Held[];
  /** Smallest eigenvalue of B^-1 A: 1 without errors in x. */
  readonly reliability: number;
  /** Parameters if errors in x were ignored, in the order of form.constants. */
  readonly uncorrected: readonly number[];
  /** Undefined where some trial has no stated uncertainty. */
  readonly statedUncertainty?: StatedUncertaintyTest;
  readonly diagnostics: Diagnostics;
  /** Smallest and largest value of each group in the data fitted. */
  readonly ranges: Readonly<Record<string, readonly [number, number]>>;
  readonly notes: readonly Note[];
}
