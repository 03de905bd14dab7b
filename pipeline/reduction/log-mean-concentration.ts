import { says } from '../base/says/reduction.ts';
import type { Rule } from '../rules/rule.ts';
import { farFromEquilibrium, wellKnown } from './checks.ts';
import { approachesSaturation } from './concentrations.ts';
import { where } from './defaults.ts';
import type { Need, Route } from './route.ts';
import { plainContext } from './route.ts';
import { tubeArea } from './tube-area.ts';

const ends = ['inlet_concentration', 'outlet_concentration', 'saturation_concentration'] as const;

/** Transfer units of a stream along a wall that keeps saturation; with their checks. */
export const unitsToWall: readonly Rule[] = [
  where('inlet_concentration', 0, says.noSolute('inlet_concentration')),
  {
    gives: 'concentration_change',
    from: ['inlet_concentration', 'outlet_concentration'],
    of: (a, b) => Math.abs(b! - a!),
    formula: 'change = |c_out - c_in|',
    source: 'definition',
  },
  {
    gives: 'transfer_units',
    from: ends,
    of: (a, b, s) => Math.log((s! - a!) / (s! - b!)),
    formula: 'N = ln((c_s - c_in)/(c_s - c_out))',
    source: 'definition',
    checks: [
      approachesSaturation,
      farFromEquilibrium('inlet_concentration', 'outlet_concentration', 'saturation_concentration'),
      wellKnown('transfer_units', 'the number of transfer units', ''),
    ],
  },
];

const needs: readonly Need[] = [
  { key: 'volume_flow', says: 'or mass_flow and density, or velocity and cross_section' },
  { key: 'area', says: 'or diameter and length of one tube' },
  { key: 'saturation_concentration', says: 'at the wall, the same all along' },
  { key: 'inlet_concentration', says: 'of the stream', without: 'zero' },
  { key: 'outlet_concentration', says: 'of the stream' },
];

/** One stream along a wall of known concentration: wetted wall, soluble tube, membrane channel. */
export const logMeanConcentration: Route = {
  name: 'log-mean-concentration',
  transfer: 'mass',
  title: 'Flow over area and log-mean concentration difference',
  formula: 'k = q_V (c_out - c_in)/(A dc_lm) = (q_V/A) ln((c_s - c_in)/(c_s - c_out))',
  source: 'definition',
  settings: {},
  result: () => 'k',
  gives: () => 'mass_transfer_coefficient',
  needs: () => needs,
  rules: (_, context = plainContext) => [
    ...unitsToWall,
    {
      gives: 'mass_transfer_coefficient',
      from: ['volume_flow', 'area', 'transfer_units'],
      of: (flow, area, units) => (flow! * units!) / area!,
      formula: 'k = (q_V/A) ln((c_s - c_in)/(c_s - c_out))',
      source: 'definition',
      assumes: says.constantFlow,
    },
    ...tubeArea(context.equipment, false),
  ],
  ledger: ['transfer_units'],
  numbers: {
    transfer_units: { unit: '1', symbol: 'N', says: 'number of transfer units' },
    concentration_change: { unit: 'kg/m^3 or mol/m^3', symbol: 'dc', says: 'outlet less inlet concentration' },
  },
  caution:
    'Plug flow, constant coefficient and volume flow, dilute. A membrane channel must keep its wall concentration along the whole length.',
};
