import type { Key, SourceId } from '../rules/rule.ts';

/**
 * What the trials say, in columns: n trials, q wanted keys.
 * `relative` studies hold natural logarithms, `absolute` ones the values themselves.
 */
export interface Observations {
  readonly scale: 'relative' | 'absolute';
  readonly trials: readonly string[];
  /** Campaign index of each trial, 0-based. */
  readonly campaign: readonly number[];
  readonly campaigns: readonly string[];
  readonly keys: readonly Key[];
  /** q columns of n: ln value (or value); NaN where a trial does not have it. */
  readonly z: readonly Float64Array[];
  /** Names of the random inputs, m of them; per trial a q x m row-major matrix D = dz/dinput * u(random); Sigma of any choice of keys is D D^T. */
  readonly randomInputs: readonly string[];
  readonly random: readonly Float64Array[];
  /** Systematic sources, s of them; per trial a q x s row-major matrix dz/dsource * u (zero where a source belongs to another campaign). */
  readonly sources: readonly SourceId[];
  readonly systematic: readonly Float64Array[];
}
