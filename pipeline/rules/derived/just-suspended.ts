import type { Rule } from '../rule.ts';
import { STANDARD_GRAVITY as g } from './physical-constants.ts';

/** Speed at which no particle rests on the bottom longer than 1 s to 2 s; 1/s. NaN where the solid is not the heavier one. */
export const justSuspendedSpeed: Rule = {
  gives: 'just_suspended_speed',
  from: [
    'suspension_constant',
    'kinematic_viscosity',
    'particle_diameter',
    'solid_density',
    'density',
    'solids_loading',
    'impeller_diameter',
  ],
  of: (s, nu, dp, solid, liquid, loading, d) =>
    (s! * nu! ** 0.1 * dp! ** 0.2 * ((g * (solid! - liquid!)) / liquid!) ** 0.45 * (100 * loading!) ** 0.13) / d! ** 0.85,
  formula: 'N_js = S nu^0.1 d_p^0.2 (g (rho_s - rho)/rho)^0.45 X^0.13/d^0.85, X in % of the liquid by mass',
  source: 'Zwietering 1958, Chem. Eng. Sci. 8, 244-253, doi:10.1016/0009-2509(58)85031-9',
};
