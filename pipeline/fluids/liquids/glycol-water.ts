import { says } from '../../base/says/fluids.ts';
import type { Fluid, PropertyModel } from '../property-model.ts';
import { ethyleneGlycol, secondary, secondarySlope } from './secondary-liquids.ts';
import { insideSolution, type SolutionRange, solutionRanges } from './solution-ranges.ts';

const SOURCE = 'Melinder 2010, Properties of Secondary Working Fluids for Indirect Systems, International Institute of Refrigeration';
const range: SolutionRange = { from: 223.15, to: 373.15, most: 0.6, freezes: ethyleneGlycol };

const where =
  (f: (T: number, w: number) => number) =>
  (T = Number.NaN, w = Number.NaN): number =>
    insideSolution(range, T, w) ? f(T, w) : Number.NaN;
const shared = { from: ['temperature', 'mass_fraction'], source: SOURCE, ranges: solutionRanges(range) } as const;
const density = (T: number, w: number): number => secondary(ethyleneGlycol, 'density', T, w);

/** Shares: the spread between this source and the ASHRAE tables of inhibited glycol (test/fluids/fixtures/solution-states.csv); the source states none. */
const properties: readonly PropertyModel[] = [
  { ...shared, property: 'density', of: where(density), formula: 'polynomial in w and t', share: 0.005 },
  {
    ...shared,
    property: 'heat_capacity',
    of: where((T, w) => secondary(ethyleneGlycol, 'heatCapacity', T, w)),
    formula: 'polynomial in w and t',
    share: 0.015,
  },
  {
    ...shared,
    property: 'thermal_conductivity',
    of: where((T, w) => secondary(ethyleneGlycol, 'conductivity', T, w)),
    formula: 'polynomial in w and t',
    share: 0.03,
  },
  {
    ...shared,
    property: 'viscosity',
    of: where((T, w) => 1e-3 * Math.exp(secondary(ethyleneGlycol, 'lnViscosity', T, w))),
    formula: 'ln mu = polynomial in w and t',
    share: 0.04,
  },
  {
    ...shared,
    property: 'thermal_expansion',
    of: where((T, w) => -secondarySlope(ethyleneGlycol, 'density', T, w) / density(T, w)),
    formula: '-(d rho/dT)/rho',
    assumes: says.accuracyNotStated('thermal expansion of glycol and water'),
  },
];

/** Ethylene glycol without inhibitors; `mass_fraction` is that of the glycol. */
export const glycolWater: Fluid = { name: 'glycol-water', title: 'ethylene glycol in water', properties };
