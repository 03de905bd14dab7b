import * as says from '../base/says/scale-up.ts';
import type { Key } from '../rules/rule.ts';
import type { Evaluation } from './condition.ts';
import type { PlantCase } from './plant-result.ts';

/** Fully developed laminar flow in a circular tube, wall at one temperature or concentration: Shah and London 1978, 3.6568. */
const LAMINAR_TUBE = 3.6568;
/** Stagnant medium around a sphere, diameter as the length: exact, 2. */
const STAGNANT_SPHERE = 2;

/** Limits of Nu or Sh that a real coefficient does not fall below, by family of equipment. */
const limits: Readonly<Record<string, { readonly value: number; readonly bases: readonly string[]; readonly says: string }>> = {
  tube: { value: LAMINAR_TUBE, bases: ['pipe', 'hydraulic'], says: says.laminarFloor() },
  coil: { value: LAMINAR_TUBE, bases: ['pipe', 'hydraulic'], says: says.laminarFloor() },
  sphere: { value: STAGNANT_SPHERE, bases: ['particle', 'pipe'], says: says.stagnantFloor() },
  'suspended-solids': { value: STAGNANT_SPHERE, bases: ['particle'], says: says.stagnantFloor() },
  'fluidised-bed': { value: STAGNANT_SPHERE, bases: ['particle'], says: says.stagnantFloor() },
};

/** Coefficient at the stagnant or laminar limit, where the response is Nu or Sh on a length the limit is known for. */
export function floorsOf(at: Evaluation, equipment: string, perCoefficient: Key | undefined): PlantCase['floors'] {
  const limit = limits[equipment];
  const [, name, basis] = /^(Nu|Sh)@([a-z-]+)/.exec(perCoefficient ?? '') ?? [];
  if (limit === undefined || name === undefined || !limit.bases.includes(basis!)) return [];
  const value = limit.value / at.value(perCoefficient!);
  return Number.isFinite(value) ? [{ says: `${name} = ${limit.value}: ${limit.says}`, value }] : [];
}
