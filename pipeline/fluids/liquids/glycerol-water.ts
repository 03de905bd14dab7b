import { says } from '../../base/says/fluids.ts';
import type { Fluid, PropertyModel, Range } from '../property-model.ts';
import { glycerol, secondary } from './secondary-liquids.ts';
import { insideSolution, type SolutionRange, solutionRanges } from './solution-ranges.ts';

const CHENG = 'Cheng 2008, Ind. Eng. Chem. Res. 47, 3285, doi 10.1021/ie071349z';
const VOLK = 'Volk and Kaehler 2018, Exp. Fluids 59, 75, doi 10.1007/s00348-018-2527-y';
const MELINDER = 'Melinder 2010, Properties of Secondary Working Fluids for Indirect Systems, International Institute of Refrigeration';

/** Viscosity in Pa s, T in K, w the mass fraction of glycerol: Cheng 2008, eqs. (6), (11) to (13), (21), (22). */
export function glycerolViscosity(T: number, w: number): number {
  const t = T - 273.15;
  const water = 1.79 * Math.exp(((-1230 - t) * t) / (36100 + 360 * t));
  const pure = 12100 * Math.exp(((-1233 + t) * t) / (9900 + 70 * t));
  const a = 0.705 - 0.0017 * t;
  const b = (4.9 + 0.036 * t) * a ** 2.5;
  const alpha = 1 - w + (a * b * w * (1 - w)) / (a * w + b * (1 - w));
  return 1e-3 * water ** alpha * pure ** (1 - alpha);
}

/** Density in kg/m^3: volumes of the pure liquids with a contraction, Volk and Kaehler 2018. */
export function glycerolDensity(T: number, w: number): number {
  const t = T - 273.15;
  const water = 1000 * (1 - Math.abs((t - 3.98) / 615) ** 1.71);
  const pure = 1273 - 0.612 * t;
  const contraction = 1 + (1.78e-6 * t * t - 1.82e-4 * t + 1.41e-2) * Math.sin(w ** 1.31 * Math.PI) ** 0.81;
  return contraction / (w / pure + (1 - w) / water);
}

const wide: SolutionRange = { from: 273.15, to: 373.15, most: 1 };
const narrow: SolutionRange = { from: 243.15, to: 313.15, most: 0.6, freezes: glycerol };

const where =
  (range: SolutionRange, f: (T: number, w: number) => number) =>
  (T = Number.NaN, w = Number.NaN): number =>
    insideSolution(range, T, w) ? f(T, w) : Number.NaN;

const statedRange: Range = {
  holds: (T) => T! >= 288.15 && T! <= 303.15,
  otherwise: 'warning',
  says: (T) => says.statedFor(T!, 288.15, 303.15),
};
const inWide = (f: Range): Range => ({ ...f, holds: (T, w) => !insideSolution(wide, T!, w!) || f.holds(T!, w!) });

const from = ['temperature', 'mass_fraction'] as const;
const STEP = 0.05; // K, half the width of the density difference behind the expansion

const properties: readonly PropertyModel[] = [
  // 0.07 % stated by its authors between 15 and 30 degC.
  {
    from,
    property: 'density',
    of: where(wide, glycerolDensity),
    formula: 'contraction/(w/rho_g + (1 - w)/rho_w)',
    source: VOLK,
    share: 0.0007,
    ranges: [...solutionRanges(wide), inWide(statedRange)],
  },
  {
    from,
    property: 'thermal_expansion',
    of: where(wide, (T, w) => -(glycerolDensity(T + STEP, w) - glycerolDensity(T - STEP, w)) / (2 * STEP * glycerolDensity(T, w))),
    formula: '-(d rho/dT)/rho',
    source: VOLK,
    ranges: solutionRanges(wide),
    assumes: says.accuracyNotStated('thermal expansion of glycerol and water'),
  },
  // Mean deviation from three data bases as its author states it: 2 to 3 % (from memory).
  {
    from,
    property: 'viscosity',
    of: where(wide, glycerolViscosity),
    formula: 'mu_w^alpha mu_g^(1 - alpha)',
    source: CHENG,
    share: 0.03,
    ranges: solutionRanges(wide),
  },
  {
    from,
    property: 'heat_capacity',
    of: where(narrow, (T, w) => secondary(glycerol, 'heatCapacity', T, w)),
    formula: 'polynomial in w and t',
    source: MELINDER,
    share: 0.015,
    ranges: solutionRanges(narrow),
  },
  {
    from,
    property: 'thermal_conductivity',
    of: where(narrow, (T, w) => secondary(glycerol, 'conductivity', T, w)),
    formula: 'polynomial in w and t',
    source: MELINDER,
    share: 0.03,
    ranges: solutionRanges(narrow),
  },
];

/** `mass_fraction` is that of the glycerol. */
export const glycerolWater: Fluid = { name: 'glycerol-water', title: 'glycerol in water', properties };
