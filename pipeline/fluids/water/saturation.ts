/** n1 ... n10 of IAPWS R7-97(2012), Table 34. */
const N1 = 1167.0521452767;
const N2 = -724213.16703206;
const N3 = -17.073846940092;
const N4 = 12020.82470247;
const N5 = -3232555.0322333;
const N6 = 14.91510861353;
const N7 = -4823.2657361591;
const N8 = 405113.40542057;
const N9 = -0.23855557567849;
const N10 = 650.17534844798;

const P_STAR = 1e6; // Pa

/** Critical point of water: IAPWS R2-83(1992). K, Pa, kg/m^3. */
export const CRITICAL = { T: 647.096, p: 22.064e6, density: 322 };

/** Saturation pressure in Pa at T in K (273.15 to 647.096 K; NaN elsewhere): IAPWS-IF97 region 4, eq. (30). */
export function saturationPressure(T: number): number {
  if (!(T >= 273.15 && T <= CRITICAL.T)) return Number.NaN;
  const t = T + N9 / (T - N10);
  const a = t * t + N1 * t + N2;
  const b = N3 * t * t + N4 * t + N5;
  const c = N6 * t * t + N7 * t + N8;
  return P_STAR * ((2 * c) / (-b + Math.sqrt(b * b - 4 * a * c))) ** 4;
}

/** Saturation temperature in K at p in Pa (611.213 Pa to 22.064 MPa; NaN elsewhere): IAPWS-IF97 region 4, eq. (31). */
export function saturationTemperature(p: number): number {
  if (!(p >= 611.213 && p <= CRITICAL.p)) return Number.NaN;
  const beta = (p / P_STAR) ** 0.25;
  const e = beta * beta + N3 * beta + N6;
  const f = N1 * beta * beta + N4 * beta + N7;
  const g = N2 * beta * beta + N5 * beta + N8;
  const d = (2 * g) / (-f - Math.sqrt(f * f - 4 * e * g));
  return (N10 + d - Math.sqrt((N10 + d) ** 2 - 4 * (N9 + N10 * d))) / 2;
}

/** Pressure in Pa on the boundary of regions 2 and 3 at T in K: IAPWS-IF97, eq. (5), Table 1. */
export const boundary23 = (T: number): number => P_STAR * (348.05185628969 - 1.1671859879975 * T + 1.0192970039326e-3 * T * T);
