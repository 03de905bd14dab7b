import type { Rule } from '../rules/rule.ts';
import type { Fluid } from './property-model.ts';
import { type Conditions, propertyRules, type Stream } from './property-rules.ts';
import { steamFluid, water } from './water/water-fluids.ts';

const fluids: readonly Fluid[] = [water, steamFluid];

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
 * Without a pressure the standard atmosphere is taken and said. Throws on a name that is not in `fluidNames`: the caller has checked it.
 */
export function fluidRules({ name, stream, at }: FluidSpec): readonly Rule[] {
  const fluid = fluids.find((one) => one.name === name);
  if (fluid === undefined) throw new Error(`no fluid ${name}`);
  return propertyRules(fluid, stream, at);
}
