import { says } from '../../base/says/derived.ts';
import type { Rule } from '../rule.ts';
import { definition } from './definition.ts';
import { gassedPower } from './gassed-power.ts';
import { justSuspendedSpeed } from './just-suspended.ts';

/** Power, power per mass and volume, and tip speed of an impeller. */
export const agitationRules: readonly Rule[] = [
  definition('tip_speed', ['rotation_speed', 'impeller_diameter'], (n, d) => Math.PI * n! * d!, 'u_tip = pi N d'),
  justSuspendedSpeed,
  definition(
    'power_ungassed',
    ['power_number', 'density', 'rotation_speed', 'impeller_diameter'],
    (np, rho, n, d) => np! * rho! * n! ** 3 * d! ** 5,
    'P_0 = N_P rho N^3 d^5',
  ),
  gassedPower,
  definition('power', ['power_ungassed'], (p) => p!, 'P = P_0', says.notGassed),
  definition('power', ['power_per_volume', 'liquid_volume'], (p, v) => p! * v!, 'P = (P/V) V'),
  definition('power', ['power_per_mass', 'density', 'liquid_volume'], (p, rho, v) => p! * rho! * v!, 'P = (P/m) rho V'),
  definition('power_per_volume', ['power', 'liquid_volume'], (p, v) => p! / v!, 'P/V = power/liquid_volume'),
  definition('power_per_volume', ['power_per_mass', 'density'], (p, rho) => p! * rho!, 'P/V = (P/m) rho'),
  definition('power_per_mass', ['power', 'density', 'liquid_volume'], (p, rho, v) => p! / (rho! * v!), 'P/m = P/(rho V)'),
  definition('power_per_mass', ['power_per_volume', 'density'], (p, rho) => p! / rho!, 'P/m = (P/V)/rho'),
  definition(
    'power_number',
    ['power_ungassed', 'density', 'rotation_speed', 'impeller_diameter'],
    (p, rho, n, d) => p! / (rho! * n! ** 3 * d! ** 5),
    'N_P = P_0/(rho N^3 d^5)',
  ),
];
