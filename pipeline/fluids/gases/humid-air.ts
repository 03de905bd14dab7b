import { says } from '../../base/says/fluids.ts';
import type { Condition, Fluid, PropertyModel, Range } from '../property-model.ts';
import { backgroundConductivity } from '../water/conductivity.ts';
import { region2 } from '../water/region-2.ts';
import { saturationPressure } from '../water/saturation.ts';
import { waterViscosity } from '../water/viscosity.ts';
import { saturationProperties } from '../water/water-fluids.ts';
import { AIR, airConductivity, airHeatCapacity, airViscosity } from './dry-air.ts';
import { R } from './gas.ts';
import { mixtureConductivity, mixtureViscosity, type Part } from './mixing.ts';

const WATER_MASS = 0.01801528; // kg/mol, IAPWS R6-95
const FROM = 273.15;
const TO = 473.15;
const HIGHEST = 1e6; // Pa

/** Mole fraction of vapour from the relative humidity at the bulk temperature. */
export const vapourFraction = (bulk: number, p: number, humidity: number): number => (humidity * saturationPressure(bulk)) / p;

/** Mole fraction of vapour from its mass fraction in the moist air. */
const fractionFromMass = (w: number): number => w / WATER_MASS / (w / WATER_MASS + (1 - w) / AIR.molarMass);

const idealDensity = (molarMass: number, T: number, p: number): number => (p * molarMass) / (R * T);

const moistMass = (x: number): number => x * WATER_MASS + (1 - x) * AIR.molarMass;

function parts(T: number, p: number, x: number): readonly Part[] {
  const air = idealDensity(AIR.molarMass, T, (1 - x) * p);
  const vapour = idealDensity(WATER_MASS, T, x * p);
  return [
    { x: 1 - x, molarMass: AIR.molarMass, viscosity: airViscosity(T, air), conductivity: airConductivity(T, air) },
    { x, molarMass: WATER_MASS, viscosity: waterViscosity(T, vapour), conductivity: backgroundConductivity(T, vapour) },
  ];
}

/** J/(kg K) of moist air: ideal mixture, vapour at its partial pressure. */
function heatCapacity(T: number, p: number, x: number): number {
  const vapour = region2(T, Math.max(x * p, 1)).heatCapacity * WATER_MASS;
  return ((1 - x) * airHeatCapacity(T) + x * vapour) / moistMass(x);
}

/** Marrero and Mason 1972: water vapour in air, 282 to 450 K; m^2/s. */
const vapourDiffusivity = (T: number, p: number): number => (1.87e-10 * T ** 2.072) / (p / 101_325);

type Moist = (T: number, p: number, x: number) => number;

/** One property from the relative humidity at bulk temperature, or else from the mass fraction of water. */
function twoWays(model: Pick<PropertyModel, 'property' | 'formula' | 'source' | 'share' | 'assumes'>, of: Moist): readonly PropertyModel[] {
  const humid: readonly Condition[] = ['temperature', 'pressure', 'bulk_temperature', 'relative_humidity'];
  const byMass: readonly Condition[] = ['temperature', 'pressure', 'mass_fraction'];
  const inside = (T: number, p: number): boolean => T >= FROM && T <= TO && p > 0 && p <= HIGHEST;
  const here: Range = {
    holds: (T, p) => inside(T!, p!),
    otherwise: 'refuse',
    says: (T, p) => says.outsideHumidAir(T!, p!, FROM, TO, HIGHEST),
  };
  const humidity: Range = {
    holds: (T, p, bulk, phi) => !inside(T!, p!) || (phi! >= 0 && phi! <= 1 && vapourFraction(bulk!, p!, phi!) <= 1),
    otherwise: 'refuse',
    says: (_, p, bulk, phi) => says.noHumidity(phi!, bulk!, p!),
  };
  const dew: Range = {
    holds: (T, p, bulk, phi) => !inside(T!, p!) || !(phi! * saturationPressure(bulk!) > 1.001 * saturationPressure(T!)),
    otherwise: 'warning',
    says: (T, _, bulk, phi) => says.belowDewPoint(T!, bulk!, phi!),
  };
  const mass: Range = { holds: (_T, _p, w) => w! >= 0 && w! < 1, otherwise: 'refuse', says: (_T, _p, w) => says.noMassFraction(w!, 0, 1) };
  const guarded = (T: number, p: number, x: number): number => (inside(T, p) && x >= 0 && x <= 1 ? of(T, p, x) : Number.NaN);
  return [
    {
      ...model,
      from: humid,
      ranges: [here, humidity, dew],
      of: (T, p, bulk, phi) => (phi! >= 0 && phi! <= 1 ? guarded(T!, p!, vapourFraction(bulk!, p!, phi!)) : Number.NaN),
    },
    { ...model, from: byMass, ranges: [here, mass], of: (T, p, w) => guarded(T!, p!, fractionFromMass(w!)) },
  ];
}

const MIXTURE = 'ideal mixture of dry air (Lemmon and others) and water vapour (IAPWS R7-97)';
const SAME = says.humiditySame;

export const humidAir: Fluid = {
  name: 'humid-air',
  title: 'humid air',
  properties: [
    ...twoWays({ property: 'density', formula: 'p (x M_w + (1 - x) M_a)/(R T)', source: MIXTURE, share: 0.003, assumes: SAME }, (T, p, x) =>
      idealDensity(moistMass(x), T, p),
    ),
    ...twoWays(
      { property: 'heat_capacity', formula: '((1 - x) c_a + x c_w)/M, per kg of moist air', source: MIXTURE, share: 0.005, assumes: SAME },
      heatCapacity,
    ),
    ...twoWays(
      {
        property: 'thermal_expansion',
        formula: '1/T',
        source: 'ideal gas',
        assumes: says.accuracyNotStated('thermal expansion of humid air'),
      },
      (T) => 1 / T,
    ),
    ...twoWays(
      {
        property: 'viscosity',
        formula: 'sum x_i mu_i/sum x_j phi_ij',
        source: 'Wilke 1950, doi 10.1063/1.1747673, of dry air and water vapour',
        share: 0.02,
        assumes: SAME,
      },
      (T, p, x) => mixtureViscosity(parts(T, p, x)),
    ),
    ...twoWays(
      {
        property: 'thermal_conductivity',
        formula: 'sum x_i lambda_i/sum x_j phi_ij',
        source: 'Mason and Saxena 1958, doi 10.1063/1.1724352, of dry air and water vapour',
        share: 0.03,
        assumes: SAME,
      },
      (T, p, x) => mixtureConductivity(parts(T, p, x)),
    ),
    {
      property: 'diffusivity',
      from: ['temperature', 'pressure'],
      of: (T, p) => (T! >= 282 && T! <= 450 && p! > 0 && p! <= HIGHEST ? vapourDiffusivity(T!, p!) : Number.NaN),
      formula: '1.87e-10 T^2.072/(p/101325 Pa), water vapour in air',
      source: 'Marrero and Mason 1972, doi 10.1063/1.3253094',
      share: 0.03,
      ranges: [
        {
          holds: (T, p) => T! >= 282 && T! <= 450 && p! > 0 && p! <= HIGHEST,
          otherwise: 'refuse',
          says: (T, p) => says.outsideHumidAir(T!, p!, 282, 450, HIGHEST),
        },
      ],
    },
    ...saturationProperties.filter(({ property }) => property !== 'surface_tension'),
  ],
};
