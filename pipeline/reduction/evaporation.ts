import { says } from '../base/says/reduction.ts';
import { saturationPressure } from '../fluids/water/saturation.ts';
import { GAS_CONSTANT } from '../rules/derived/physical-constants.ts';
import type { Check, Rule } from '../rules/rule.ts';
import { wellKnown } from './checks.ts';
import { where } from './defaults.ts';
import type { Need, Route, RouteContext, Settings } from './route.ts';
import { plainContext, settingOf } from './route.ts';

const water = (settings: Settings): boolean => settingOf(evaporation, settings, 'vapour') === 'water';
const source = 'definition';

/** ln((p - p_b)/(p - p_s)) over (p_s - p_b)/p: how much more is carried than by diffusion alone, Stefan 1874. */
function highFluxFactor(surface: number, bulk: number, total: number): number {
  const x = (surface - bulk) / (total - surface);
  return x === 0 ? total / (total - bulk) : (Math.log1p(x) * total) / (surface - bulk);
}

/** Partial pressures at the surface and in the bulk, Pa. */
function pressures(settings: Settings, { concentrations }: RouteContext): readonly Rule[] {
  const molar = concentrations === 'mass' ? ['molar_mass'] : [];
  const ofConcentration = (gives: string, c: string, T: string): Rule => ({
    gives,
    from: [c, T, ...molar],
    of: (c, T, M = 1) => (c! * GAS_CONSTANT * T!) / M,
    formula: molar.length > 0 ? `p = ${c} R T/M` : `p = ${c} R T`,
    source: 'ideal gas law',
  });
  const ofWater = (gives: string, T: string, humidity: boolean): Rule => ({
    gives,
    from: [T, ...(humidity ? ['relative_humidity'] : [])],
    of: (T, phi = 1) => phi * saturationPressure(T!),
    formula: humidity ? 'p_b = relative_humidity p_sat(T)' : `p_s = p_sat(${T})`,
    source: 'IAPWS-IF97 region 4',
  });
  return [
    ...(water(settings) ? [ofWater('surface_pressure', 'wall_temperature', false), ofWater('bulk_pressure', 'temperature', true)] : []),
    {
      gives: 'surface_pressure',
      from: ['vapour_pressure'],
      of: (p) => p!,
      formula: 'p_s = vapour_pressure',
      source,
      assumes: says.vapourAtSurface,
    },
    ofConcentration('surface_pressure', 'saturation_concentration', 'wall_temperature'),
    ofConcentration('bulk_pressure', 'bulk_concentration', 'temperature'),
    ofWater('bulk_pressure', 'temperature', true),
    where('bulk_pressure', 0, says.dryGas),
    { ...where('pressure', 101_325, says.atmospheric), source: 'standard atmosphere, ISO 2533' },
  ];
}

const belowBoiling: Check = {
  code: 'boiling',
  from: ['surface_pressure', 'pressure'],
  holds: (s, p) => s! < p!,
  otherwise: 'refuse',
  says: (s, p) => says.boils(s!, p!),
};

const directionHolds: Check = {
  code: 'no-driving-force',
  from: ['amount_rate', 'surface_pressure', 'bulk_pressure'],
  holds: (n, s, b) => n! * (s! - b!) > 0,
  otherwise: 'refuse',
  says: (n, s, b) => says.evaporationBackwards(n!, s!, b!),
};

const highFlux: Check = {
  code: 'high-flux',
  from: ['high_flux_factor'],
  holds: (f) => Math.abs(f! - 1) <= 0.1,
  otherwise: 'note',
  says: (f) => says.highFlux(f!),
};

function rules(settings: Settings, context: RouteContext): readonly Rule[] {
  const byMass = context.rates === 'mass';
  return [
    ...pressures(settings, context),
    {
      gives: 'amount_rate',
      from: ['mass_rate', ...(byMass ? ['molar_mass'] : [])],
      of: (n, M = 1) => n! / M,
      formula: byMass ? 'N = mass_rate/M' : 'N = mass_rate',
      source,
    },
    {
      gives: 'pressure_difference',
      from: ['surface_pressure', 'bulk_pressure'],
      of: (s, b) => s! - b!,
      formula: 'dp = p_s - p_b',
      source,
    },
    {
      gives: 'high_flux_factor',
      from: ['surface_pressure', 'bulk_pressure', 'pressure'],
      of: (s, b, p) => highFluxFactor(s!, b!, p!),
      formula: 'ln((p - p_b)/(p - p_s)) p/(p_s - p_b)',
      source: 'Stefan 1874',
    },
    {
      gives: 'mass_transfer_coefficient',
      from: ['amount_rate', 'area', 'pressure_difference', 'high_flux_factor', 'film_temperature'],
      of: (n, area, dp, factor, T) => (n! * GAS_CONSTANT * T!) / (area! * dp! * factor!),
      formula: 'k = N R T_f/(A p ln((p - p_b)/(p - p_s)))',
      source: 'Stefan 1874',
      assumes: says.filmConcentration,
      checks: [belowBoiling, directionHolds, highFlux, wellKnown('pressure_difference', 'the vapour pressure difference', ' Pa')],
    },
  ];
}

const needs = (settings: Settings): readonly Need[] => [
  { key: 'mass_rate', says: 'or mass_loss and time' },
  { key: 'area', says: 'of the wet surface' },
  { key: 'wall_temperature', says: 'of the surface itself, which evaporation cools' },
  { key: 'temperature', says: 'of the gas' },
  ...(water(settings)
    ? [{ key: 'relative_humidity', says: 'of the gas', without: 'bulk_concentration, else dry gas' }]
    : [
        { key: 'vapour_pressure', says: 'at the surface; or saturation_concentration' },
        { key: 'bulk_concentration', says: 'of the vapour in the gas', without: 'dry gas' },
      ]),
  { key: 'molar_mass', says: 'of the vapour, where rate or concentrations are by mass' },
  { key: 'pressure', says: 'total', without: '101.325 kPa' },
];

/** A liquid that evaporates from a surface whose own temperature is known. */
export const evaporation: Route = {
  name: 'evaporation',
  transfer: 'mass',
  title: 'Evaporation from a surface at its own temperature',
  formula: 'k = N R T_f/(A p ln((p - p_b)/(p - p_s)))',
  source: 'Stefan 1874',
  settings: {
    vapour: {
      says: 'water: vapour pressures by IAPWS-IF97 at wall_temperature, and from relative_humidity; given: by vapour_pressure or concentrations',
      allowed: ['given', 'water'],
      default: 'given',
    },
  },
  result: () => 'k',
  gives: () => 'mass_transfer_coefficient',
  needs,
  rules: (settings, context = plainContext) => rules(settings, context),
  ledger: ['pressure_difference', 'high_flux_factor'],
  numbers: {
    amount_rate: { unit: 'mol/s', symbol: 'N', says: 'rate of evaporation' },
    surface_pressure: { unit: 'Pa', symbol: 'p_s', says: 'vapour pressure at the surface' },
    bulk_pressure: { unit: 'Pa', symbol: 'p_b', says: 'partial pressure of the vapour in the gas' },
    pressure_difference: { unit: 'Pa', symbol: 'dp', says: 'vapour pressure difference' },
    high_flux_factor: { unit: '1', symbol: 'F', says: 'transfer by the flow of vapour itself, over diffusion alone' },
  },
  caution: 'The surface is colder than the gas: with the gas temperature in its place the coefficient reads low. One vapour, ideal gas.',
};
