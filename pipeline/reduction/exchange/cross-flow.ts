import { root } from '../../numerics/root.ts';

/**
 * Effectiveness of one pass of cross flow, both streams unmixed, at N transfer units of the stream and its capacity ratio R: Mason 1955's series in Poisson sums.
 * Exact to rounding for N and N R up to some hundreds.
 */
export function crossFlowEffectiveness(N: number, R: number): number {
  if (!(N > 0)) return N === 0 ? 0 : Number.NaN;
  if (!(R >= 0)) return Number.NaN;
  if (R < 1e-12) return -Math.expm1(-N);
  return poissonTails(N, R * N) / (R * N);
}

/** Sum over n of P(Poisson(a) > n) P(Poisson(b) > n). */
function poissonTails(a: number, b: number): number {
  let termA = Math.exp(-a);
  let termB = Math.exp(-b);
  let tailA = -Math.expm1(-a);
  let tailB = -Math.expm1(-b);
  let sum = 0;
  for (let n = 0; n < 2000; n++) {
    const product = tailA * tailB;
    sum += product;
    if (!(product > sum * 1e-17)) break;
    termA *= a / (n + 1);
    termB *= b / (n + 1);
    tailA -= termA;
    tailB -= termB;
    if (tailA < 1e-14 || tailB < 1e-14) break;
  }
  return sum;
}

/** Most transfer units that are looked for; beyond them effectiveness hardly changes. */
const MOST = 100;

/** Transfer units N at effectiveness P and capacity ratio R in cross flow; NaN where it cannot be reached. */
export function crossFlowUnits(P: number, R: number): number {
  if (!(P > 0 && P < 1 && R >= 0)) return Number.NaN;
  const top = MOST / Math.max(1, R);
  return root((N) => crossFlowEffectiveness(N, R) - P, 0, top);
}

/** Transfer units of counter flow at the same effectiveness and capacity ratio. */
function counterFlowUnits(P: number, R: number): number {
  if (!(P > 0 && P < 1 && R * P < 1)) return Number.NaN;
  const r = 1 - R;
  // ln((1 - R P)/(1 - P))/(1 - R), whose limit at R = 1 is P/(1 - P)
  const x = (P * r) / (1 - P);
  return Math.abs(x) < 1e-300 ? P / (1 - P) : Math.log1p(x) / r;
}

/** Correction of the counter-flow log-mean difference for cross flow: F = N_counter/N_cross. */
export const crossFlowCorrection = (P: number, R: number): number => counterFlowUnits(P, R) / crossFlowUnits(P, R);
