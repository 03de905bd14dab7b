/** The mean of a stretch of equally spaced samples, with what it is worth. */
export interface SeriesMean {
  readonly mean: number;
  /** Standard uncertainty of the mean (k = 1), autocorrelation counted. */
  readonly u: number;
  /** How many independent samples would give that uncertainty. */
  readonly effective: number;
}

/**
 * Mean and its standard uncertainty from autocorrelated samples: sum of autocovariances by the initial monotone sequence (Geyer 1992, Statistical Science 7,
 * 473-483, section 3.3), corrected for the mean being taken from the same samples (Wolff 2004, Comput. Phys. Commun. 156, 143-153, eq. 49).
 * Constant samples give u = 0. With fewer than about 20 independent samples in the stretch u is too small (measured: see its test).
 */
export function meanOfSeries(x: Float64Array): SeriesMean {
  const mean = meanOf(x);
  const scatter = autocovariance(x, mean, 0);
  if (!(scatter > 0)) return { mean, u: 0, effective: x.length };
  const blocks = blockMeans(x);
  const n = blocks.length;
  const variance = autocovariance(blocks, mean, 0);
  const { sum, lag } = monotoneSum(blocks, mean);
  const longRun = Math.max(2 * sum - variance, variance / n) * (1 + (2 * lag + 1) / n);
  return { mean, u: Math.sqrt(longRun / n), effective: Math.min(x.length, (n * scatter) / longRun) };
}

const mostBlocks = 5000;

/** Means of blocks of equal length, so that a long stretch costs no more than one of 5,000 samples; the sum of autocovariances stays what it is. */
function blockMeans(x: Float64Array): Float64Array {
  const size = Math.ceil(x.length / mostBlocks);
  if (size === 1) return x;
  return Float64Array.from({ length: Math.floor(x.length / size) }, (_, k) => meanOf(x.subarray(k * size, (k + 1) * size)));
}

/** Sum of pairs gamma(2k) + gamma(2k + 1), each no larger than the one before, up to the first that is not positive; and the last lag in it. */
function monotoneSum(x: Float64Array, mean: number): { readonly sum: number; readonly lag: number } {
  let sum = 0;
  let lag = 0;
  let before = Number.POSITIVE_INFINITY;
  for (let k = 0; 2 * k + 1 < x.length; k++) {
    const pair = autocovariance(x, mean, 2 * k) + autocovariance(x, mean, 2 * k + 1);
    if (!(pair > 0)) break;
    before = Math.min(before, pair);
    sum += before;
    lag = 2 * k + 1;
  }
  return { sum, lag };
}

function autocovariance(x: Float64Array, mean: number, lag: number): number {
  let sum = 0;
  for (let i = 0; i + lag < x.length; i++) sum += (x[i]! - mean) * (x[i + lag]! - mean);
  return sum / x.length;
}

/** From the first sample, so that a large level costs no digits. */
function meanOf(x: Float64Array): number {
  const first = x[0]!;
  let sum = 0;
  for (const value of x) sum += value - first;
  return first + sum / x.length;
}
