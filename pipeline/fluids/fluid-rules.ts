import type { Rule } from '../rules/rule.ts';
import { diffusivityRules } from './diffusivity/diffusivity-rules.ts';
import { air } from './gases/dry-air.ts';
import { gasFluid } from './gases/gas-fluid.ts';
import { argon, carbonDioxide, helium, hydrogen, nitrogen, oxygen } from './gases/gas-records.ts';
import { humidAir } from './gases/humid-air.ts';
import { glycerolWater } from './liquids/glycerol-water.ts';
import { glycolWater } from './liquids/glycol-water.ts';
import type { Fluid } from './property-model.ts';
import { type Conditions, propertyRules, type Stream } from './property-rules.ts';
import { steamFluid, water } from './water/water-fluids.ts';

const gases = [nitrogen, oxygen, carbonDioxide, hydrogen, helium, argon].map(gasFluid);
const liquids: readonly Fluid[] = [water, glycerolWater, glycolWater];
const fluids: readonly Fluid[] = [water, steamFluid, air, humidAir, ...gases, glycerolWater, glycolWater];

/** Fluids a study may name. */
export const fluidNames: readonly string[] = fluids.map(({ name }) => name);

/** One stream's fluid and the keys of the quantities that hold its conditions, where they are not the usual ones. */
export interface FluidSpec {
  /** One of `fluidNames`. */
  readonly name: string;
  readonly stream: Stream;
  readonly at: Conditions;
}

/**
 * Rules for every property of a named fluid: bare keys at bulk, `@film`, `@wall`; with `_other` for the second stream (`viscosity_other@wall`).
 * Without a pressure the standard atmosphere is taken and said. Estimators of the diffusivity are among them: they need quantities of the solute.
 * Throws on a name that is not in `fluidNames`: the caller has checked it.
 */
export function fluidRules({ name, stream, at }: FluidSpec): readonly Rule[] {
  const fluid = fluids.find((one) => one.name === name);
  if (fluid === undefined) throw new Error(`no fluid ${name}`);
  const solvent = name === 'water' ? 'water' : liquids.includes(fluid) ? 'liquid' : 'gas';
  return [...propertyRules(fluid, stream, at), ...diffusivityRules(stream, solvent, at)];
}
