import { says } from '../base/says/reduction.ts';
import { FARADAY } from '../rules/derived/physical-constants.ts';
import type { Rule } from '../rules/rule.ts';
import { wellKnown } from './checks.ts';
import type { Need, Route, RouteContext } from './route.ts';
import { plainContext } from './route.ts';

const needs: readonly Need[] = [
  { key: 'limiting_current', says: 'plateau of the current' },
  { key: 'electrons', says: 'per ion' },
  { key: 'area', says: 'of the electrode' },
  { key: 'bulk_concentration', says: 'of the ion; at the electrode it is zero' },
  { key: 'molar_mass', says: 'where concentrations are by mass' },
];

const rule = ({ concentrations }: RouteContext): Rule => ({
  gives: 'mass_transfer_coefficient',
  from: ['limiting_current', 'electrons', 'area', 'bulk_concentration', ...(concentrations === 'mass' ? ['molar_mass'] : [])],
  of: (current, z, area, c, M = 1) => (current! * M) / (z! * FARADAY * area! * c!),
  formula: concentrations === 'mass' ? 'k = I M/(z F A c)' : 'k = I/(z F A c)',
  source: "Faraday's law; F 96 485.33 C/mol, CODATA 2018",
  assumes: says.noMigration,
  checks: [wellKnown('limiting_current', 'the limiting current', ' A'), wellKnown('bulk_concentration', 'the concentration', '')],
});

/** Electrode at its limiting current, where the concentration at its surface is zero. */
export const limitingCurrent: Route = {
  name: 'limiting-current',
  transfer: 'mass',
  title: 'Limiting current of an electrode',
  formula: 'k = I/(z F A c)',
  source: "Faraday's law",
  settings: {},
  result: () => 'k',
  gives: () => 'mass_transfer_coefficient',
  needs: () => needs,
  rules: (_, context = plainContext) => [rule(context)],
  ledger: [],
  numbers: {},
  caution: 'An excess of supporting electrolyte, a true plateau, no second reaction. The area is that which is active.',
};
