import { says } from '../../base/says/derived.ts';
import type { Rule } from '../rule.ts';
import { definition } from './definition.ts';

/** Rates and coefficients of mass transfer. */
export const massRules: readonly Rule[] = [
  definition('mass_rate', ['mass_loss', 'time'], (m, t) => m! / t!, 'q_N = mass_loss/time', says.meanRate),
  definition('mass_transfer_coefficient', ['volumetric_coefficient', 'interfacial_area'], (kLa, a) => kLa! / a!, 'k = kLa/a_i'),
  definition('volumetric_coefficient', ['mass_transfer_coefficient', 'interfacial_area'], (k, a) => k! * a!, 'kLa = k a_i'),
];
