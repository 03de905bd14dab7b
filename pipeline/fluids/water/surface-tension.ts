import { CRITICAL } from './saturation.ts';

/** Surface tension of water against its vapour in N/m, T in K: IAPWS R1-76(2014), eq. (1). */
export function waterSurfaceTension(T: number): number {
  const tau = 1 - T / CRITICAL.T;
  return 0.2358 * tau ** 1.256 * (1 - 0.625 * tau);
}
