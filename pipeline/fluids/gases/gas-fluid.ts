import { says } from '../../base/says/fluids.ts';
import type { Fluid, PropertyModel, Range } from '../property-model.ts';
import type { Gas } from './gas.ts';
import { DENSE_REFUSED, DENSE_SAID, denseness, gasConductivity, gasViscosity, idealHeatCapacity, virialState } from './gas-equations.ts';

const VIRIAL = "Abbott's form of the Pitzer second virial coefficient, in Smith and Van Ness 1975";
const CP = 'McBride, Zehe, Gordon 2002, NASA/TP-2002-211556';
const TRANSPORT = 'Svehla 1995, NASA TM-4647';

/** A named gas: virial density, ideal-gas heat capacity with its pressure term, transport at low pressure. */
export function gasFluid(gas: Gas): Fluid {
  const inRange = (T: number, p: number): boolean =>
    T >= gas.from && T <= gas.to && p > 0 && denseness(gas.critical, T, p) <= DENSE_REFUSED;
  const where =
    (f: (T: number, p: number) => number) =>
    (T = Number.NaN, p = Number.NaN): number =>
      inRange(T, p) ? f(T, p) : Number.NaN;
  const state = (T: number, p: number) => virialState(gas.molarMass, gas.critical, idealHeatCapacity(gas, T), T, p);
  const ranges: readonly Range[] = gasRanges(gas.critical, gas.from, gas.to);
  const dense: Range = {
    holds: (T, p) => !inRange(T!, p!) || denseness(gas.critical, T!, p!) <= DENSE_SAID,
    otherwise: 'warning',
    says: (T, p) => says.denseGas(T!, p!),
  };
  const shared = { from: ['temperature', 'pressure'], ranges: [...ranges, dense] } as const;
  const properties: readonly PropertyModel[] = [
    { ...shared, property: 'density', of: where((T, p) => state(T, p).density), formula: 'M/(R T/p + B(T))', source: VIRIAL, share: 0.002 },
    {
      ...shared,
      property: 'heat_capacity',
      of: where((T, p) => state(T, p).heatCapacity),
      formula: '(cp0(T) - T p d2B/dT2)/M',
      source: CP,
      share: gas.shares.heatCapacity,
    },
    {
      ...shared,
      property: 'thermal_expansion',
      of: where((T, p) => state(T, p).thermalExpansion),
      formula: '(R/p + dB/dT)/(R T/p + B)',
      source: VIRIAL,
      share: 0.002,
    },
    {
      ...shared,
      property: 'viscosity',
      of: where((T) => gasViscosity(gas, T)),
      formula: 'ln mu = A ln T + B/T + C/T^2 + D',
      source: TRANSPORT,
      share: gas.shares.viscosity,
    },
    {
      ...shared,
      property: 'thermal_conductivity',
      of: where((T) => gasConductivity(gas, T)),
      formula: 'ln lambda = A ln T + B/T + C/T^2 + D',
      source: TRANSPORT,
      share: gas.shares.conductivity,
    },
  ];
  return { name: gas.name, title: gas.title, properties };
}

/** Where the equations of a slightly imperfect gas hold. */
export const gasRanges = (critical: Gas['critical'], from: number, to: number): readonly Range[] => [
  { holds: (T) => T! >= from && T! <= to, otherwise: 'refuse', says: (T) => says.outsideTemperature(T!, from, to) },
  {
    holds: (T, p) => !(T! >= from && T! <= to) || (p! > 0 && denseness(critical, T!, p!) <= DENSE_REFUSED),
    otherwise: 'refuse',
    says: (T, p) => says.tooDense(T!, p!, (DENSE_REFUSED * critical.p * T!) / critical.T),
  },
];
