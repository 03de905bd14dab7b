import { CRITICAL } from './saturation.ts';

/** L_k of IAPWS R15-11, Table 1. */
const DILUTE = [2.443221e-3, 1.323095e-2, 6.770357e-3, -3.454586e-3, 4.096266e-4];

/** L_ij of IAPWS R15-11, Table 2: one row for each i, one column for each j. */
const DENSE = [
  [1.60397357, -0.646013523, 0.111443906, 0.102997357, -0.0504123634, 0.00609859258],
  [2.33771842, -2.78843778, 1.53616167, -0.463045512, 0.0832827019, -0.00719201245],
  [2.19650529, -4.54580785, 3.55777244, -1.40944978, 0.275418278, -0.0205938816],
  [-1.21051378, 1.60812989, -0.621178141, 0.0716373224, 0, 0],
  [-2.720337, 4.57586331, -3.18369245, 1.1168348, -0.19268305, 0.012913842],
];

/** Polynomials in reduced density of the reference compressibility at 1.5 T_c, each up to its density: IAPWS R15-11, Table 6 and eq. (25). */
const REFERENCE: readonly { readonly upTo: number; readonly a: readonly number[] }[] = [
  { upTo: 0.310559006, a: [6.53786807199516, -5.61149954923348, 3.39624167361325, -2.27492629730878, 10.2631854662709, 1.97815050331519] },
  { upTo: 0.776397516, a: [6.52717759281799, -6.30816983387575, 8.08379285492595, -9.82240510197603, 12.1358413791395, -5.54349664571295] },
  { upTo: 1.242236025, a: [5.35500529896124, -3.96415689925446, 8.91990208918795, -12.033872950579, 9.19494865194302, -2.16866274479712] },
  { upTo: 1.863354037, a: [1.55225959906681, 0.464621290821181, 8.93237374861479, -11.0321960061126, 6.1678099993336, -0.965458722086812] },
  {
    upTo: Number.POSITIVE_INFINITY,
    a: [1.11999926419994, 0.595748562571649, 9.8895256507892, -10.325505114704, 4.66861294457414, -0.503243546373828],
  },
];

/** The background of the thermal conductivity in W/(m K), critical term left out; T in K, density in kg/m^3: IAPWS R15-11, eqs. (16) and (17). */
export function backgroundConductivity(T: number, density: number): number {
  const t = T / CRITICAL.T;
  const d = density / CRITICAL.density;
  const dilute = Math.sqrt(t) / DILUTE.reduce((sum, l, k) => sum + l / t ** k, 0);
  let dense = 0;
  for (let i = DENSE.length - 1; i >= 0; i--) dense = dense * (1 / t - 1) + DENSE[i]!.reduceRight((sum, l) => sum * (d - 1) + l, 0);
  return 1e-3 * dilute * Math.exp(d * dense);
}

/** What the critical term needs of the state: kg/m^3, J/(kg K), kg/(m^3 Pa), Pa s. */
export interface CriticalState {
  readonly density: number;
  readonly heatCapacity: number;
  readonly heatCapacityVolume: number;
  readonly compression: number;
  readonly viscosity: number;
}

/** The critical enhancement in W/(m K), industrial form: IAPWS R15-11, eqs. (18) to (25), constants of its Table 3. */
export function criticalConductivity(
  T: number,
  { density, heatCapacity, heatCapacityVolume, compression, viscosity }: CriticalState,
): number {
  const t = T / CRITICAL.T;
  const d = density / CRITICAL.density;
  const zeta = (compression * CRITICAL.p) / CRITICAL.density;
  const excess = Math.max(0, d * (zeta - (referenceCompression(d) * 1.5) / t));
  const length = 0.13 * (excess / 0.06) ** (0.63 / 1.239); // nm
  const y = length / 0.4;
  if (!(y >= 1.2e-7)) return 0;
  const kappa = heatCapacity / heatCapacityVolume;
  const z = (2 / (Math.PI * y)) * ((1 - 1 / kappa) * Math.atan(y) + y / kappa - (1 - Math.exp(-1 / (1 / y + (y * y) / (3 * d * d)))));
  return (1e-3 * 177.8514 * d * (heatCapacity / 461.51805) * t * z) / (viscosity * 1e6);
}

function referenceCompression(d: number): number {
  const { a } = REFERENCE.find(({ upTo }) => d <= upTo)!;
  return 1 / a.reduceRight((sum, c) => sum * d + c, 0);
}
