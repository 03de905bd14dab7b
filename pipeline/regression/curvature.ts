import type { Equations } from './equations.ts';

/** sum_i c_i S_i with S = G Sigma_xx G^T: how the design's own errors weigh on p parameters; p x p row-major. Zero without errors in x. */
export function designErrors(eq: Equations, coefficient: Float64Array): Float64Array {
  const { problem, bound } = eq;
  const p = problem.model.constants.length;
  const out = new Float64Array(p * p);
  const sigma = problem.sigma;
  const g = problem.model.groups.length;
  if (sigma === undefined) return out;
  const row = new Float64Array(p * g);
  for (let i = 0, at = 0; i < problem.n; i++, at += (1 + g) * (1 + g)) {
    const c = coefficient[i]!;
    for (let j = 0; j < p; j++) for (let k = 0; k < g; k++) row[j * g + k] = bound.cross[j]![k]![i]!;
    for (let k = 0; k < g; k++) {
      for (let l = 0; l < g; l++) {
        const s = c * sigma[at + (k + 1) * (1 + g) + l + 1]!;
        if (s === 0) continue;
        for (let a = 0; a < p; a++) for (let b = 0; b < p; b++) out[a * p + b]! += s * row[a * g + k]! * row[b * g + l]!;
      }
    }
  }
  return out;
}
