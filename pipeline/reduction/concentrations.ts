import { says } from '../base/says/reduction.ts';
import type { Check, Rule } from '../rules/rule.ts';
import type { RouteContext } from './route.ts';

/** Surface less bulk, in the study's kind of concentration. */
export const concentrationDifference: Rule = {
  gives: 'concentration_difference',
  from: ['saturation_concentration', 'bulk_concentration'],
  of: (s, b) => s! - b!,
  formula: 'dc = c_s - c',
  source: 'definition',
};

/** The rate of transfer in the kind of the concentrations: by mass or by amount. */
export function rateAsConcentration({ concentrations, rates }: RouteContext): readonly Rule[] {
  if (concentrations === rates)
    return [{ gives: 'transfer_rate', from: ['mass_rate'], of: (n) => n!, formula: 'N = mass_rate', source: 'definition' }];
  const toAmount = concentrations === 'amount';
  return [
    {
      gives: 'transfer_rate',
      from: ['mass_rate', 'molar_mass'],
      of: (n, M) => (toAmount ? n! / M! : n! * M!),
      formula: toAmount ? 'N = mass_rate/M' : 'N = mass_rate M',
      source: 'definition',
      assumes: says.rateByMolarMass,
    },
  ];
}

/** Inlet and outlet lie on one side of saturation, the outlet nearer to it. */
export const approachesSaturation: Check = {
  code: 'no-approach',
  from: ['inlet_concentration', 'outlet_concentration', 'saturation_concentration'],
  holds: (a, b, s) => (s! - a!) * (s! - b!) > 0 && Math.abs(s! - b!) < Math.abs(s! - a!),
  otherwise: 'refuse',
  says: (a, b, s) => says.noApproach(a!, b!, s!),
};
