import type { Model } from './model.ts';

/** What one fit works on: n trials, g groups, all on the scale of the fit, everything settled. */
export interface Problem {
  readonly n: number;
  readonly model: Model;
  readonly y: Float64Array;
  readonly x: readonly Float64Array[];
  /** n blocks of (1+g) x (1+g): covariance of (y, x) of each trial; undefined where the groups count as exact. */
  readonly sigma?: Float64Array;
  /** n: variance of y where the groups are exact and the response is not. */
  readonly response?: Float64Array;
  /** Scatter variance of trial i is sigma^2 times this; ones unless prior weights are given. */
  readonly scatter: Float64Array;
  /** Campaign of each trial for the random effect; one block of zeros where there is none. */
  readonly block: Int32Array;
  readonly blocks: number;
  /** Columns of fixed shifts between campaigns (sum of their levels zero), beside the law. */
  readonly shifts: readonly Float64Array[];
  /** Which variance components are estimated; the others are held at 0. */
  readonly estimate: { readonly scatter: boolean; readonly campaign: boolean };
}

/** Scatter variance sigma^2 and campaign variance tau^2, both >= 0. */
export interface Components {
  readonly scatter: number;
  readonly campaign: number;
}
