import { type Gas, R } from './gas.ts';

/** Heat capacity of the ideal gas in J/(mol K), T in K. */
export const idealHeatCapacity = ({ heatCapacity }: Pick<Gas, 'heatCapacity'>, T: number): number =>
  R * heatCapacity.reduce((sum, a, k) => sum + a * T ** (k - 2), 0);

const fitted = ([a, b, c, d]: readonly [number, number, number, number], T: number): number =>
  Math.exp(a * Math.log(T) + b / T + c / (T * T) + d);

/** Viscosity in Pa s at low pressure, T in K. */
export const gasViscosity = (gas: Gas, T: number): number => 1e-7 * fitted(gas.viscosity, T);

/** Thermal conductivity in W/(m K) at low pressure, T in K. */
export const gasConductivity = (gas: Gas, T: number): number => 1e-4 * fitted(gas.conductivity, T);

/** Second virial coefficient in m^3/mol with its first and second derivative by T. */
interface Virial {
  readonly b: number;
  readonly bT: number;
  readonly bTT: number;
}

type Critical = Gas['critical'];

/** Abbott's form of the Pitzer correlation: Smith and Van Ness, Introduction to Chemical Engineering Thermodynamics, 3rd ed. 1975 (from memory). */
function secondVirial({ T: Tc, p: pc, acentric }: Critical, T: number): Virial {
  const t = T / Tc;
  const scale = (R * Tc) / pc;
  const power = (a: number, n: number): Virial => ({
    b: -a * t ** -n,
    bT: (a * n * t ** (-n - 1)) / Tc,
    bTT: (-a * n * (n + 1) * t ** (-n - 2)) / (Tc * Tc),
  });
  const b0 = power(0.422, 1.6);
  const b1 = power(0.172, 4.2);
  return {
    b: scale * (0.083 + b0.b + acentric * (0.139 + b1.b)),
    bT: scale * (b0.bT + acentric * b1.bT),
    bTT: scale * (b0.bTT + acentric * b1.bTT),
  };
}

/** v = R T/p + B: density kg/m^3, heat capacity J/(kg K) and thermal expansion 1/K of a slightly imperfect gas. */
export function virialState(molarMass: number, critical: Critical, idealCp: number, T: number, p: number) {
  const { b, bT, bTT } = secondVirial(critical, T);
  const volume = (R * T) / p + b;
  return { density: molarMass / volume, heatCapacity: (idealCp - T * bTT * p) / molarMass, thermalExpansion: (R / p + bT) / volume };
}

/** p T_c/(p_c T), a measure of how dense a gas is: a reduced density is about 0.3 of it. */
export const denseness = ({ T: Tc, p: pc }: Critical, T: number, p: number): number => (p * Tc) / (pc * T);

/** Up to here transport at low pressure is within 1 to 2 %; further the reader is told. */
export const DENSE_SAID = 0.06;
/** Beyond here two terms of the virial series are no longer enough. */
export const DENSE_REFUSED = 0.15;
