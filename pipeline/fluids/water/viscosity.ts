import { CRITICAL } from './saturation.ts';

/** H_i of IAPWS R12-08, Table 1. */
const DILUTE = [1.67752, 2.20462, 0.6366564, -0.241605];

/** [i, j, H_ij] of IAPWS R12-08, Table 2. */
const DENSE: readonly (readonly [number, number, number])[] = [
  [0, 0, 0.520094],
  [1, 0, 0.0850895],
  [2, 0, -1.08374],
  [3, 0, -0.289555],
  [0, 1, 0.222531],
  [1, 1, 0.999115],
  [2, 1, 1.88797],
  [3, 1, 1.26613],
  [5, 1, 0.120573],
  [0, 2, -0.281378],
  [1, 2, -0.906851],
  [2, 2, -0.772479],
  [3, 2, -0.489837],
  [4, 2, -0.25704],
  [0, 3, 0.161913],
  [1, 3, 0.257399],
  [0, 4, -0.0325372],
  [3, 4, 0.0698452],
  [4, 5, 0.00872102],
  [3, 6, -0.00435673],
  [5, 6, -0.000593264],
];

/** Viscosity of water or steam in Pa s; T in K, density in kg/m^3. Without the critical term, as the release recommends for industrial use. */
export function waterViscosity(T: number, density: number): number {
  const t = T / CRITICAL.T;
  const d = density / CRITICAL.density;
  const dilute = (100 * Math.sqrt(t)) / DILUTE.reduce((sum, h, i) => sum + h / t ** i, 0);
  const x = 1 / t - 1;
  const y = d - 1;
  let dense = 0;
  for (const [i, j, h] of DENSE) dense += h * x ** i * y ** j;
  return 1e-6 * dilute * Math.exp(d * dense);
}
