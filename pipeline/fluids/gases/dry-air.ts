import type { Fluid, PropertyModel } from '../property-model.ts';
import { DENSE_REFUSED, denseness, idealHeatCapacity, virialState } from './gas-equations.ts';
import { gasRanges } from './gas-fluid.ts';
import { argon, nitrogen, oxygen } from './gas-records.ts';

/** Dry air: molar mass kg/mol with carbon dioxide (Picard and others 2008, CIPM-2007); mole fractions and pseudo-critical constants of Lemmon, Jacobsen, Penoncello, Friend 2000. */
export const AIR = {
  molarMass: 0.02896546,
  nitrogen: 0.7812,
  oxygen: 0.2096,
  argon: 0.0092,
  critical: { T: 132.6306, p: 3.786e6, acentric: 0.0335 },
};

const FROM = 200;
const TO = 1000;

/** Ideal-gas heat capacity in J/(mol K) of the mixture. */
export const airHeatCapacity = (T: number): number =>
  AIR.nitrogen * idealHeatCapacity(nitrogen, T) + AIR.oxygen * idealHeatCapacity(oxygen, T) + AIR.argon * idealHeatCapacity(argon, T);

/** Constants of Lemmon and Jacobsen 2004 for air: mixture critical point of their equation, molecular size in nm, energy in K. */
const REDUCING = { T: 132.6312, density: 10447.7 }; // K, mol/m^3
const MASS = 28.9586; // g/mol, of their mixture without carbon dioxide
const SIZE = 0.36;
const ENERGY = 103.3;
const COLLISION = [0.431, -0.4623, 0.08406, 0.005341, -0.00331];

/** [N, t, d, l] of the density-dependent viscosity in uPa s. */
const VISCOSITY: readonly (readonly [number, number, number, number])[] = [
  [10.72, 0.2, 1, 0],
  [1.122, 0.05, 4, 0],
  [0.002019, 2.4, 9, 0],
  [-8.876, 0.6, 1, 1],
  [-0.02916, 3.6, 8, 1],
];

/** [N, t, d, l] of the density-dependent conductivity in mW/(m K). */
const CONDUCTIVITY: readonly (readonly [number, number, number, number])[] = [
  [8.743, 0.1, 1, 0],
  [14.76, 0, 2, 0],
  [-16.62, 0.5, 3, 2],
  [3.793, 2.7, 7, 2],
  [-6.142, 0.3, 7, 2],
  [-0.3778, 1.3, 11, 2],
];

/** Viscosity of dilute air in uPa s. */
function diluteViscosity(T: number): number {
  const t = Math.log(T / ENERGY);
  const collision = Math.exp(COLLISION.reduceRight((sum, b) => sum * t + b, 0));
  return (0.0266958 * Math.sqrt(MASS * T)) / (SIZE * SIZE * collision);
}

function residual(terms: typeof VISCOSITY, T: number, density: number): number {
  const tau = REDUCING.T / T;
  const delta = density / AIR.molarMass / REDUCING.density;
  return terms.reduce((sum, [n, t, d, l]) => sum + n * tau ** t * delta ** d * (l === 0 ? 1 : Math.exp(-(delta ** l))), 0);
}

/** Viscosity of air in Pa s, T in K, density in kg/m^3: Lemmon and Jacobsen 2004. */
export const airViscosity = (T: number, density: number): number => 1e-6 * (diluteViscosity(T) + residual(VISCOSITY, T, density));

/** Thermal conductivity of air in W/(m K), without the critical term, which is nothing at these states: Lemmon and Jacobsen 2004. */
export function airConductivity(T: number, density: number): number {
  const tau = REDUCING.T / T;
  const dilute = 1.308 * diluteViscosity(T) + 1.405 * tau ** -1.1 - 1.036 * tau ** -0.3;
  return 1e-3 * (dilute + residual(CONDUCTIVITY, T, density));
}

const state = (T: number, p: number) => virialState(AIR.molarMass, AIR.critical, airHeatCapacity(T), T, p);

const inRange = (T: number, p: number): boolean => T >= FROM && T <= TO && p > 0 && denseness(AIR.critical, T, p) <= DENSE_REFUSED;

const where =
  (f: (T: number, p: number) => number) =>
  (T = Number.NaN, p = Number.NaN): number =>
    inRange(T, p) ? f(T, p) : Number.NaN;

const COMPOSITION =
  'Lemmon, Jacobsen, Penoncello, Friend 2000 (doi 10.1063/1.1285884): composition; McBride, Zehe, Gordon 2002: heat capacities';
const TRANSPORT = 'Lemmon and Jacobsen 2004, doi 10.1023/B:IJOT.0000022327.04529.f3';
const VIRIAL = "Abbott's form of the Pitzer second virial coefficient, in Smith and Van Ness 1975";
const shared = { from: ['temperature', 'pressure'], ranges: gasRanges(AIR.critical, FROM, TO) } as const;

const properties: readonly PropertyModel[] = [
  { ...shared, property: 'density', of: where((T, p) => state(T, p).density), formula: 'M/(R T/p + B(T))', source: VIRIAL, share: 0.001 },
  {
    ...shared,
    property: 'heat_capacity',
    of: where((T, p) => state(T, p).heatCapacity),
    formula: '(cp0(T) - T p d2B/dT2)/M',
    source: COMPOSITION,
    share: 0.002,
  },
  {
    ...shared,
    property: 'thermal_expansion',
    of: where((T, p) => state(T, p).thermalExpansion),
    formula: '(R/p + dB/dT)/(R T/p + B)',
    source: VIRIAL,
    share: 0.002,
  },
  // Stated by its authors: 1 % for the dilute gas, 2 % for the conductivity; read as k = 2.
  {
    ...shared,
    property: 'viscosity',
    of: where((T, p) => airViscosity(T, state(T, p).density)),
    formula: 'mu0(T) + mu_r(T, rho)',
    source: TRANSPORT,
    share: 0.005,
  },
  {
    ...shared,
    property: 'thermal_conductivity',
    of: where((T, p) => airConductivity(T, state(T, p).density)),
    formula: 'lambda0(T) + lambda_r(T, rho)',
    source: TRANSPORT,
    share: 0.01,
  },
];

export const air: Fluid = { name: 'air', title: 'dry air', properties };
