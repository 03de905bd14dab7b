import { backgroundConductivity, criticalConductivity } from './conductivity.ts';
import type { GibbsState } from './gibbs-state.ts';
import { waterViscosity } from './viscosity.ts';

/** Viscosity in Pa s of a state at T in K; NaN without a state. */
export const viscosityOf = (T: number, state: GibbsState | undefined): number =>
  state === undefined ? Number.NaN : waterViscosity(T, state.density);

/** Thermal conductivity in W/(m K) of a state at T in K, critical term included; NaN without a state. */
export function conductivityOf(T: number, state: GibbsState | undefined): number {
  if (state === undefined) return Number.NaN;
  return backgroundConductivity(T, state.density) + criticalConductivity(T, { ...state, viscosity: waterViscosity(T, state.density) });
}
