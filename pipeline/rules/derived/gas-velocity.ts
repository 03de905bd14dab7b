import { says } from '../../base/says/derived.ts';
import type { Rule } from '../rule.ts';
import { definition } from './definition.ts';

/** Superficial gas velocity of a gas-liquid vessel from the gas flow: the second stream's, or the only one's where the liquid is a batch. */
export const gasVelocity: readonly Rule[] = [
  definition(
    'gas_velocity',
    ['volume_flow_other', 'vessel_diameter'],
    (flow, d) => flow! / ((Math.PI / 4) * d! * d!),
    'u_g = q_V,other/(pi/4 D^2)',
    says.gasIsOther,
  ),
  definition(
    'gas_velocity',
    ['volume_flow', 'vessel_diameter'],
    (flow, d) => flow! / ((Math.PI / 4) * d! * d!),
    'u_g = q_V/(pi/4 D^2)',
    says.gasIsOnlyFlow,
  ),
];
