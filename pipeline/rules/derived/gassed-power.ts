import { says } from '../../base/says/derived.ts';
import type { Rule } from '../rule.ts';
import { STANDARD_GRAVITY as g } from './physical-constants.ts';

/** Blade height over diameter of a six-blade disk turbine of standard proportions. */
const BLADE = 1 / 5;

/** Power under gas over power without: gas flow m3/s, speed 1/s, impeller diameter m, liquid volume m3. Hughmark 1980, constants from memory. */
export function gassedShare(gas: number, speed: number, d: number, volume: number): number {
  const flow = gas / (speed * volume);
  const froude = (speed * speed * d ** 4) / (g * BLADE * d * Math.cbrt(volume * volume));
  return 0.1 * flow ** -0.25 * froude ** -0.2;
}

/** Power of a disk turbine under gas. The gas flow is the superficial gas velocity times the vessel's cross section. */
export const gassedPower: Rule = {
  gives: 'power',
  from: ['power_ungassed', 'gas_velocity', 'vessel_diameter', 'rotation_speed', 'impeller_diameter', 'liquid_volume'],
  of: (p, u, vessel, n, d, v) => p! * Math.min(1, gassedShare((Math.PI / 4) * vessel! * vessel! * u!, n!, d!, v!)),
  formula: 'P = P_0 min(1, 0.10 (Q/(N V))^(-1/4) (N^2 d^4/(g W V^(2/3)))^(-1/5)), W = d/5',
  source: 'Hughmark 1980, Ind. Eng. Chem. Process Des. Dev. 19, 638 (constants from memory)',
  accuracy: { source: 'model: gassed power of a disk turbine (Hughmark 1980)', share: 0.12 },
  assumes: says.gassedTurbine,
};
