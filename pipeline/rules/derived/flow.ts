import { says } from '../../base/says/derived.ts';
import type { Rule } from '../rule.ts';
import { definition } from './definition.ts';

/** Flows and velocities of one stream from each other. */
export const flowRules: readonly Rule[] = [
  definition('velocity', ['volume_flow', 'cross_section'], (flow, section) => flow! / section!, 'u = q_V/S'),
  definition('volume_flow', ['mass_flow', 'density'], (flow, rho) => flow! / rho!, 'q_V = q_m/rho', says.flowAtBulk),
  definition('volume_flow', ['velocity', 'cross_section'], (u, section) => u! * section!, 'q_V = u S'),
  definition('mass_flow', ['volume_flow', 'density'], (flow, rho) => flow! * rho!, 'q_m = q_V rho', says.flowAtBulk),
];
