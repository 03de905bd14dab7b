import type { Fit } from './fit.ts';

type Rows = readonly (readonly number[])[];

/** a^T M b. */
export function bilinear(a: readonly number[], m: Rows, b: readonly number[]): number {
  let sum = 0;
  for (let i = 0; i < a.length; i++) for (let j = 0; j < b.length; j++) sum += a[i]! * m[i]![j]! * b[j]!;
  return sum;
}

/**
 * Satterthwaite's degrees of freedom (1946) of a variance s^2 that depends on the estimated components: 2 s^4/(gamma^T W gamma), gamma_k = d s^2/d phi_k;
 * within 1 and n - p. Used for any part of a prediction: law, law + campaign + scatter.
 */
export function satterthwaite(variance: number, gamma: readonly number[], w: Rows, most: number): number {
  const spread = bilinear(gamma, w, gamma);
  const nu = spread > 0 ? (2 * variance * variance) / spread : Number.POSITIVE_INFINITY;
  return Math.max(1, Math.min(most, nu));
}

/** Degrees of freedom of c^T theta, random part; c in the order of form.constants, natural parameters. */
export function degreesOfFreedom(fit: Fit, c: readonly number[]): number {
  const gamma = fit.components.derivatives.map((d) => bilinear(c, d, c));
  return satterthwaite(bilinear(c, fit.covarianceRandom, c), gamma, fit.components.covariance, fit.residualDegreesOfFreedom);
}

/** A known part (systematic sources) beside a random one of nu degrees of freedom: Welch-Satterthwaite, nu (s^2/s_random^2)^2. */
export const withKnownPart = (nu: number, random: number, total: number): number =>
  random > 0 ? nu * (total / random) ** 2 : Number.POSITIVE_INFINITY;
