import type { Solution } from './theta.ts';

/** Estimates of many resamples, model's coordinates, one row each; `failed` of them found no minimum and are left out. */
export interface Resamples {
  readonly theta: readonly Float64Array[];
  readonly failed: number;
}

/** A refit may take this many iterations and ends at this step, in units of the scatter of theta: far below what a percentile of thousands can tell. */
export const REFIT = { iterations: 60, step: 1e-4 };

export const hasEnded = ({ stop, theta }: Solution): boolean =>
  (stop.why === 'converged' || stop.why === 'on a bound') && theta.every(Number.isFinite);

export function collectResamples(count: number, next: () => Solution): Resamples {
  const theta: Float64Array[] = [];
  let failed = 0;
  for (let resample = 0; resample < count; resample++) {
    const found = next();
    if (hasEnded(found)) theta.push(found.theta.slice());
    else failed += 1;
  }
  return { theta, failed };
}
