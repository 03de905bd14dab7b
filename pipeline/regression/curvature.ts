import { type Small, zeros } from './dense.ts';
import type { Equations } from './equations.ts';

/** sum_i c_i S_i with S = G Sigma_xx G^T: how the design's own errors weigh on p parameters; p x p row-major. Zero without errors in x. */
export function designErrors(eq: Equations, coefficient: Float64Array): Small {
  const { problem, bound } = eq;
  const p = problem.model.constants.length;
  const out = zeros(p * p);
  const sigma = problem.sigma;
  const g = problem.model.groups.length;
  if (sigma === undefined) return out;
  const row = zeros(p * g);
  const flat = bound.cross.flat();
  for (let i = 0, at = 0; i < problem.n; i++, at += (1 + g) * (1 + g)) {
    const c = coefficient[i]!;
    for (let k = 0; k < p * g; k++) row[k] = flat[k]![i]!;
    for (let a = 0; a < p; a++) {
      for (let k = 0; k < g; k++) {
        const left = row[a * g + k]!;
        if (left === 0) continue;
        for (let b = 0; b < p; b++) {
          for (let l = 0; l < g; l++) out[a * p + b]! += c * left * sigma[at + (k + 1) * (1 + g) + l + 1]! * row[b * g + l]!;
        }
      }
    }
  }
  return out;
}
