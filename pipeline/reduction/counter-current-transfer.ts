import { says } from '../base/says/reduction.ts';
import type { Check, Rule } from '../rules/rule.ts';
import { wellKnown } from './checks.ts';
import { where } from './defaults.ts';
import type { Need, Route, Settings } from './route.ts';
import { settingOf } from './route.ts';

const gasSide = (settings: Settings): boolean => settingOf(counterCurrentTransfer, settings, 'side') === 'gas';

/**
 * Overall transfer units of one stream in counter flow with another, both dilute, straight equilibrium line: Colburn 1939. `ratio` = slope times own over other flow,
 * `share` = (c_out - c*)/(c_in - c*) with c* in equilibrium with the other stream as it enters.
 */
function counterCurrentUnits(share: number, ratio: number): number {
  const r = 1 - ratio;
  // ln((1 - S)/share + S)/(1 - S) = ln(1 + (1 - S)(1/share - 1))/(1 - S)
  const x = r * (1 / share - 1);
  return Math.abs(x) < 1e-300 ? 1 / share - 1 : Math.log1p(x) / r;
}

const pinch: Check = {
  code: 'no-approach',
  from: ['approach_share', 'capacity_ratio'],
  holds: (share, ratio) => share! > 0 && share! < 1 && 1 + (1 - ratio!) * (1 / share! - 1) > 0,
  otherwise: 'refuse',
  says: (share, ratio) => says.pinched(share!, ratio!),
};

const nearEquilibrium: Check = {
  code: 'near-equilibrium',
  from: ['approach_share'],
  holds: (share) => share! >= 0.05,
  otherwise: 'warning',
  says: (share) => says.nearEquilibrium(share!),
};

const source = 'definition';

function rules(settings: Settings): readonly Rule[] {
  const gas = gasSide(settings);
  const [own, other] = gas ? ['gas_velocity', 'velocity'] : ['velocity', 'gas_velocity'];
  return [
    where('inlet_concentration_other', 0, says.noSolute('inlet_concentration_other')),
    {
      gives: 'equilibrium_concentration',
      from: ['inlet_concentration_other', 'partition_coefficient'],
      of: (c, m) => (gas ? c! * m! : c! / m!),
      formula: gas ? 'c* = m c_in,other' : 'c* = c_in,other/m',
      source,
    },
    {
      gives: 'capacity_ratio',
      from: [own!, other!, 'partition_coefficient'],
      of: (u, v, m) => (gas ? m! * u! : u! / m!) / v!,
      formula: gas ? 'S = m u_g/u_l' : 'S = u_l/(m u_g)',
      source,
    },
    {
      gives: 'approach_share',
      from: ['inlet_concentration', 'outlet_concentration', 'equilibrium_concentration'],
      of: (a, b, e) => (b! - e!) / (a! - e!),
      formula: '(c_out - c*)/(c_in - c*)',
      source,
    },
    {
      gives: 'transfer_units',
      from: ['approach_share', 'capacity_ratio'],
      of: (share, ratio) => counterCurrentUnits(share!, ratio!),
      formula: 'N = ln((1 - S) (c_in - c*)/(c_out - c*) + S)/(1 - S)',
      source: 'Colburn 1939',
      checks: [pinch, nearEquilibrium, wellKnown('transfer_units', 'the number of transfer units', '')],
    },
    ...['length', 'depth'].map(
      (height): Rule => ({
        gives: 'volumetric_coefficient',
        from: [own!, height, 'transfer_units'],
        of: (u, z, units) => (u! * units!) / z!,
        formula: `Ka = (u/${height}) N, overall on the ${gas ? 'gas' : 'liquid'} side, per volume of packing`,
        source,
        assumes: says.overallOnSide(gas ? 'gas' : 'liquid'),
      }),
    ),
    {
      gives: 'mass_transfer_coefficient',
      from: ['volumetric_coefficient', 'interfacial_area'],
      of: (Ka, a) => Ka! / a!,
      formula: 'K = Ka/a_i',
      source,
    },
    {
      gives: 'mass_transfer_coefficient',
      from: ['volumetric_coefficient', 'specific_area'],
      of: (Ka, a) => Ka! / a!,
      formula: 'K = Ka/a',
      source,
      assumes: says.wholeArea,
    },
  ];
}

const needs: readonly Need[] = [
  { key: 'inlet_concentration', says: 'of the stream whose side is stated' },
  { key: 'outlet_concentration', says: 'of that stream' },
  { key: 'inlet_concentration_other', says: 'of the other stream as it enters', without: 'zero: solute-free' },
  { key: 'partition_coefficient', says: 'c_gas/c_liquid at equilibrium' },
  { key: 'gas_velocity', says: 'superficial' },
  { key: 'velocity', says: 'superficial, of the liquid' },
  { key: 'length', says: 'packed height; or depth' },
  { key: 'specific_area', says: 'or interfacial_area, for K from Ka', without: 'Ka only' },
];

/** Absorption or stripping in counter flow. */
export const counterCurrentTransfer: Route = {
  name: 'counter-current-transfer',
  transfer: 'mass',
  title: 'Transfer units of a dilute counter-current column',
  formula: 'Ka = (u/Z) N, N = ln((1 - S)(c_in - c*)/(c_out - c*) + S)/(1 - S)',
  source: 'Colburn 1939',
  settings: {
    side: {
      says: 'the stream whose concentrations are measured and on whose side the coefficient is',
      allowed: ['gas', 'liquid'],
      default: 'gas',
    },
  },
  result: () => 'kLa',
  gives: () => 'volumetric_coefficient',
  needs: () => needs,
  rules,
  ledger: ['transfer_units', 'capacity_ratio', 'approach_share'],
  numbers: {
    transfer_units: { unit: '1', symbol: 'N', says: 'number of overall transfer units' },
    capacity_ratio: { unit: '1', symbol: 'S', says: 'slope of equilibrium times own over other flow' },
    approach_share: { unit: '1', symbol: 'y', says: 'share of the inlet difference left at the outlet' },
  },
  caution:
    'Dilute, isothermal, straight equilibrium line through the origin, plug flow of both. The coefficient is overall: it is that of one side only where the other resistance is small.',
};
