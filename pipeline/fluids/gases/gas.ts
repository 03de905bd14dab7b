/** Molar gas constant, J/(mol K): SI 2019, exact to these digits. */
export const R = 8.31446261815324;

/** What the equations of a low-pressure gas need; SI. */
export interface Gas {
  readonly name: string;
  readonly title: string;
  readonly molarMass: number;
  /** K, Pa; for the quantum gases effective values at high temperature, with an acentric factor of 0. */
  readonly critical: { readonly T: number; readonly p: number; readonly acentric: number };
  /** a1 ... a7 of cp/R = a1/T^2 + a2/T + a3 + a4 T + a5 T^2 + a6 T^3 + a7 T^4. */
  readonly heatCapacity: readonly number[];
  /** A, B, C, D of ln mu = A ln T + B/T + C/T^2 + D, mu in micropoise. */
  readonly viscosity: readonly [number, number, number, number];
  /** The same for the thermal conductivity in uW/(cm K). */
  readonly conductivity: readonly [number, number, number, number];
  /** K */
  readonly from: number;
  readonly to: number;
  /** Standard uncertainties as shares. */
  readonly shares: { readonly viscosity: number; readonly conductivity: number; readonly heatCapacity: number };
}
