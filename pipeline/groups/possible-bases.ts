import type { Key } from '../rules/rule.ts';
import { basisRecords } from './basis.ts';
import { groups } from './groups.ts';

/** Bases that are usual for a family of equipment; for any other equipment all are possible. */
const usual: Readonly<Record<string, readonly string[]>> = {
  tube: ['pipe', 'hydraulic'],
  annulus: ['hydraulic', 'gap'],
  coil: ['pipe', 'hydraulic'],
  plate: ['plate'],
  cylinder: ['cylinder'],
  'tube-bank': ['tube-bank'],
  sphere: ['particle'],
  'natural-convection': ['plate', 'cylinder', 'particle', 'gap', 'pipe'],
  'packed-bed': ['particle', 'particle-interstitial'],
  'fluidised-bed': ['particle', 'particle-interstitial'],
  'bed-wall': ['particle', 'vessel'],
  vessel: ['vessel', 'impeller', 'pipe', 'cylinder'],
  'suspended-solids': ['particle', 'impeller', 'energy-dissipation', 'vessel'],
  'gas-liquid': ['bubble', 'impeller', 'vessel'],
  'wetted-wall': ['film', 'pipe', 'length'],
  'packed-column': ['packing', 'particle', 'pipe'],
  rotating: ['disk', 'rotating-cylinder'],
  membrane: ['hydraulic', 'pipe', 'length'],
  'plate-exchanger': ['hydraulic', 'gap'],
  'impinging-jet': ['jet'],
  layer: ['layer'],
};

/**
 * Bases a group may be meant on in this equipment, one for each different length that can be had. Exactly one: it may be taken without asking; none or several: ask.
 * `canHave` says whether a quantity is given or can be derived.
 */
export function possibleBases(name: string, equipment: string, canHave: (key: Key) => boolean): readonly string[] {
  const group = groups.get(name);
  if (group === undefined) return [];
  const lengths = new Map<string, string>();
  for (const basis of usual[equipment] ?? group.bases) {
    if (!group.bases.includes(basis)) continue;
    const length = lengthHad(basis, canHave);
    if (length !== undefined && !lengths.has(length)) lengths.set(length, basis);
  }
  return [...lengths.values()];
}

/** What the length of a basis would be had from: the same text means the same length. */
function lengthHad(basis: string, canHave: (key: Key) => boolean): string | undefined {
  const { from, length } = basisRecords.get(basis)!;
  if (basis === 'film') return canHave('kinematic_viscosity') ? 'film' : undefined;
  const quantity = from.find(canHave);
  return quantity === undefined ? undefined : `${quantity}${length?.formula ?? ''}`;
}
