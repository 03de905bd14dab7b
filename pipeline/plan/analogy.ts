import type { Correlation } from '../../correlations/correlation.ts';
import type { Key } from '../rules/rule.ts';

/** Heat group -> mass group of the heat-mass analogy (same law, Pr -> Sc, Nu -> Sh): common practice, no source. */
const toMass: Readonly<Record<string, string>> = {
  Nu: 'Sh',
  Pr: 'Sc',
  Pe_heat: 'Pe_mass',
  St_heat: 'St_mass',
  j_heat: 'j_mass',
  Gz_heat: 'Gz_mass',
};
const toHeat = Object.fromEntries(Object.entries(toMass).map(([heat, mass]) => [mass, heat]));

/** Groups that exist on one side only: with one of these a law has no counterpart. */
const oneSided = new Set(['viscosity_ratio', 'Gr', 'Ra', 'Bi', 'Fo', 'Le']);

const split = (key: Key): readonly [string, string] => {
  const at = key.indexOf('@');
  return at < 0 ? [key, ''] : [key.slice(0, at), key.slice(at)];
};

/** The key of the same group on the other side of the analogy, or undefined where it has none. */
function counterpart(key: Key, to: 'heat' | 'mass'): Key | undefined {
  const [name, rest] = split(key);
  if (oneSided.has(name)) return undefined;
  const other = (to === 'mass' ? toMass : toHeat)[name];
  return (other ?? name) + rest;
}

/** The definitions a correlation has on the trials' side, and whether they are its own or by analogy. */
export function keysOn(
  correlation: Correlation,
  transfer: 'heat' | 'mass',
): { readonly basis: 'direct' | 'analogy'; readonly keys: Readonly<Record<string, Key>> } | undefined {
  if (correlation.transfer === transfer) return { basis: 'direct', keys: correlation.groups };
  if (!correlation.analogy) return undefined;
  const keys = Object.entries(correlation.groups).map(([name, key]) => [name, counterpart(key, transfer)] as const);
  return keys.some(([, key]) => key === undefined)
    ? undefined
    : { basis: 'analogy', keys: Object.fromEntries(keys) as Record<string, Key> };
}
