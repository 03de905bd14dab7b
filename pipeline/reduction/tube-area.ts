import { says } from '../base/says/reduction.ts';
import type { Key, Rule } from '../rules/rule.ts';

/** Equipment in which `diameter` and `length` are those of one tube that the stream runs through. */
const bores = new Set(['tube', 'coil', 'wetted-wall', 'membrane', 'other']);

const mantle = (diameter: Key): Rule => ({
  gives: 'area',
  from: [diameter, 'length'],
  of: (d, l) => Math.PI * d! * l!,
  formula: `A = pi ${diameter} L`,
  source: 'definition',
  assumes: says.tubeArea(diameter),
});

/** Area of one tube: on the bore for a coefficient inside it; an overall coefficient is on the outer diameter where there is one. */
export function tubeArea(equipment: string, overall: boolean): readonly Rule[] {
  if (equipment === 'annulus' || equipment === 'cylinder') return [mantle('outer_diameter')];
  if (!bores.has(equipment)) return [];
  return overall ? [mantle('outer_diameter'), mantle('diameter')] : [mantle('diameter')];
}
