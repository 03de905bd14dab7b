import { says } from '../base/says/reduction.ts';
import type { Rule } from '../rules/rule.ts';
import { notZero, wellKnown } from './checks.ts';
import { concentrationDifference, rateAsConcentration } from './concentrations.ts';
import { where } from './defaults.ts';
import type { Need, Route, RouteContext } from './route.ts';
import { plainContext } from './route.ts';

const needs: readonly Need[] = [
  { key: 'mass_rate', says: 'or mass_loss and time' },
  { key: 'area', says: 'of transfer' },
  { key: 'saturation_concentration', says: 'at the surface' },
  { key: 'bulk_concentration', says: 'in the fluid', without: 'zero' },
  { key: 'molar_mass', says: 'where one of rate and concentrations is by amount of substance and the other by mass' },
];

const rules = (context: RouteContext): readonly Rule[] => [
  where('bulk_concentration', 0, says.noSolute('bulk_concentration')),
  concentrationDifference,
  ...rateAsConcentration(context),
  {
    gives: 'mass_transfer_coefficient',
    from: ['transfer_rate', 'area', 'concentration_difference'],
    of: (rate, area, dc) => Math.abs(rate! / dc!) / area!,
    formula: 'k = N/(A dc)',
    source: 'definition',
    checks: [
      notZero('concentration_difference', 'the concentration difference'),
      wellKnown('concentration_difference', 'the concentration difference', ''),
      wellKnown('transfer_rate', 'the rate of transfer', ''),
    ],
  },
];

/** A surface at known concentration that gives or takes substance at a measured rate. */
export const massRate: Route = {
  name: 'mass-rate',
  transfer: 'mass',
  title: 'Rate of transfer over area and concentration difference',
  formula: 'k = N/(A (c_s - c))',
  source: 'definition',
  settings: {},
  result: () => 'k',
  gives: () => 'mass_transfer_coefficient',
  needs: () => needs,
  rules: (_, context = plainContext) => rules(context),
  ledger: ['transfer_rate', 'concentration_difference'],
  numbers: {
    transfer_rate: { unit: 'kg/s or mol/s', symbol: 'N', says: 'rate of transfer, in the kind of the concentrations' },
    concentration_difference: { unit: 'kg/m^3 or mol/m^3', symbol: 'dc', says: 'surface less bulk concentration' },
  },
  caution: 'Dilute transfer: no correction for the flow that the transfer itself makes (see evaporation for that).',
};
