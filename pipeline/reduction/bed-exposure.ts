import { says } from '../base/says/reduction.ts';
import type { Rule } from '../rules/rule.ts';
import { unitsToWall } from './log-mean-concentration.ts';
import type { Need, Route } from './route.ts';

const bed = (length: string): Rule => ({
  gives: 'mass_transfer_coefficient',
  from: ['velocity', 'specific_area', length, 'transfer_units'],
  of: (u, a, l, units) => (u! * units!) / (a! * l!),
  formula: `k = u/(a ${length}) ln((c_s - c_in)/(c_s - c_out)), u superficial`,
  source: 'definition',
  checks: [
    {
      code: 'short-bed',
      from: [length, 'particle_diameter'],
      holds: (l, d) => l! >= 20 * d!,
      otherwise: 'note',
      says: (l, d) => says.shortBed(l! / d!),
    },
  ],
});

const needs: readonly Need[] = [
  { key: 'velocity', says: 'superficial; or volume_flow and the cross section (vessel_diameter)' },
  { key: 'specific_area', says: 'or voidage and particle_diameter: 6 (1 - voidage)/d_p' },
  { key: 'length', says: 'of the bed in flow direction; or depth' },
  { key: 'saturation_concentration', says: 'at the surface of the packing' },
  { key: 'inlet_concentration', says: 'of the stream', without: 'zero' },
  { key: 'outlet_concentration', says: 'of the stream' },
];

/** A stream through a bed whose surface keeps a known concentration. */
export const bedExposure: Route = {
  name: 'bed-exposure',
  transfer: 'mass',
  title: 'Outlet concentration of a packed bed in plug flow',
  formula: 'k = u/(a L) ln((c_s - c_in)/(c_s - c_out))',
  source: 'definition',
  settings: {},
  result: () => 'k',
  gives: () => 'mass_transfer_coefficient',
  needs: () => needs,
  rules: () => [...unitsToWall, bed('length'), bed('depth')],
  ledger: ['transfer_units'],
  numbers: { transfer_units: { unit: '1', symbol: 'N', says: 'number of transfer units' } },
  caution: 'Plug flow: axial mixing and channelling make the coefficient read low, most at low Re and in short beds.',
};
