import { says } from '../base/says/reduction.ts';
import type { Key, Rule } from '../rules/rule.ts';
import { notZero, wellKnown } from './checks.ts';
import { concentrationDifference, rateAsConcentration } from './concentrations.ts';
import { where } from './defaults.ts';
import type { Need, Route, RouteContext } from './route.ts';
import { plainContext } from './route.ts';
import { permeation } from './series/permeation.ts';

const own: Key = 'mass_transfer_coefficient';
const other: Key = 'mass_transfer_coefficient_other';
const source = 'definition';

/** What stands before and behind the layer, s/m; a side that is not given has no resistance. */
const sides: readonly Rule[] = [
  { gives: 'side_resistance', from: [own, other], of: (a, b) => 1 / a! + 1 / b!, formula: '1/k_own + 1/k_other', source },
  { gives: 'side_resistance', from: [own], of: (a) => 1 / a!, formula: '1/k_own', source, assumes: says.oneSideFree('other') },
  { gives: 'side_resistance', from: [other], of: (b) => 1 / b!, formula: '1/k_other', source, assumes: says.oneSideFree('own') },
  where('side_resistance', 0, says.sidesFree),
];

const layer: readonly Rule[] = [
  {
    gives: 'layer_coefficient',
    from: ['transfer_rate', 'area', 'concentration_difference', 'side_resistance'],
    of: (rate, area, dc, resistance) => 1 / (Math.abs(dc! / rate!) * area! - resistance!),
    formula: '1/k_layer = A dc/N - 1/k_own - 1/k_other',
    source,
    checks: [
      notZero('concentration_difference', 'the concentration difference'),
      {
        code: 'nothing-left',
        from: ['layer_coefficient', 'side_resistance'],
        holds: (k) => k! > 0,
        otherwise: 'refuse',
        says: (k, sides) => says.layerHasNone(1 / k! + sides!, sides!),
      },
      {
        code: 'small-resistance',
        from: ['layer_coefficient', 'side_resistance'],
        holds: (k, sides) => 1 / k! >= 0.3 * (1 / k! + sides!),
        otherwise: 'note',
        says: (k, sides) => says.smallShare(1 / (1 + k! * sides!)),
      },
      wellKnown('concentration_difference', 'the concentration difference', ''),
      wellKnown('transfer_rate', 'the rate of transfer', ''),
    ],
  },
  {
    gives: 'layer_coefficient',
    from: ['diffusivity', 'partition_coefficient', 'wall_thickness'],
    of: (D, K, s) => (D! * K!) / s!,
    formula: 'k_layer = D K/s',
    source,
  },
  {
    gives: 'overall_mass_coefficient',
    from: ['layer_coefficient', 'side_resistance'],
    of: (k, sides) => 1 / (1 / k! + sides!),
    formula: '1/k = 1/k_own + s/(D K) + 1/k_other',
    source,
  },
  { gives: 'permeability', from: ['layer_coefficient', 'wall_thickness'], of: (k, s) => k! * s!, formula: 'P = k_layer s = D K', source },
  {
    gives: 'diffusivity',
    from: ['lag_time', 'wall_thickness'],
    of: (lag, s) => (s! * s!) / (6 * lag!),
    formula: 'D = s^2/(6 lag)',
    source: 'Daynes 1920, Barrer 1939',
  },
  {
    gives: 'partition_coefficient',
    from: ['permeability', 'lag_time', 'wall_thickness'],
    of: (P, lag, s) => (6 * P! * lag!) / (s! * s!),
    formula: 'K = P/D, D = s^2/(6 lag)',
    source: 'Daynes 1920, Barrer 1939',
  },
  where('partition_coefficient', 1, says.onePhase),
  ...['', ',film', ',wall'].map(
    (at): Rule => ({
      gives: `Sh@layer${at}`,
      from: ['layer_coefficient', 'wall_thickness', at === '' ? 'diffusivity' : `diffusivity@${at.slice(1)}`, 'partition_coefficient'],
      of: (k, s, D, K) => (k! * s!) / (D! * K!),
      formula: 'Sh = k_layer s/(D K), on concentrations inside the layer',
      source,
      assumes: says.insideLayer,
    }),
  ),
  {
    gives: own,
    from: ['overall_mass_coefficient'],
    of: (k) => k!,
    formula: 'k = 1/(s/(D K) + 1/k_other)',
    source,
    assumes: says.coefficientIsLayer,
  },
];

const rules = (context: RouteContext): readonly Rule[] => [
  where('bulk_concentration', 0, says.noSolute('bulk_concentration')),
  concentrationDifference,
  ...rateAsConcentration(context),
  ...sides,
  ...layer,
];

const needs: readonly Need[] = [
  {
    key: 'mass_rate',
    says: 'through the layer; or mass_loss and time; or a logged curve',
    without: 'diffusivity and partition_coefficient, from which k is computed',
  },
  { key: 'area', says: 'of the layer' },
  { key: 'saturation_concentration', says: 'on the rich side, in the fluid' },
  { key: 'bulk_concentration', says: 'on the lean side, in the fluid', without: 'zero' },
  { key: 'wall_thickness', says: 'of the layer' },
  { key: 'diffusivity', says: 'in the layer; or lag_time', without: 'k and permeability only' },
  { key: 'partition_coefficient', says: 'c_layer/c_fluid at equilibrium', without: 'one: concentrations inside the layer' },
  { key: own, says: 'on the own side of the layer', without: 'no resistance there' },
  { key: other, says: 'on the other side of the layer', without: 'no resistance there' },
];

/** Permeation through a film, bag or wall, alone or between two fluids. */
export const layerPermeation: Route = {
  name: 'layer-permeation',
  transfer: 'mass',
  title: 'Permeation through a film, bag or wall',
  formula: '1/k = 1/k_own + s/(D K) + 1/k_other, k = N/(A dc)',
  source: 'definition',
  settings: {},
  result: () => 'k',
  gives: () => 'layer_coefficient',
  needs: () => needs,
  rules: (_, context = plainContext) => rules(context),
  series: () => permeation,
  ledger: ['layer_coefficient', 'overall_mass_coefficient', 'permeability', 'lag_time'],
  numbers: {
    layer_coefficient: { unit: 'm/s', symbol: 'k_l', says: 'coefficient of the layer, on concentrations in the fluid' },
    overall_mass_coefficient: { unit: 'm/s', symbol: 'K', says: 'overall coefficient of layer and both sides' },
    side_resistance: { unit: 's/m', symbol: '1/k', says: 'resistances on both sides of the layer' },
    transfer_rate: { unit: 'kg/s or mol/s', symbol: 'N', says: 'rate of transfer' },
    lag_time: { unit: 's', symbol: 't_lag', says: 'time lag of permeation' },
  },
  caution:
    'Steady state, constant diffusivity and partition; a layer that swells, cracks or is laminated has other laws. All coefficients on one phase basis.',
};
