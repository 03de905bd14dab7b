import type { Key } from '../rules/rule.ts';
import { type PropertyTemperature, propertyTemperatures } from './group.ts';
import { groups } from './groups.ts';

/** A group's key taken apart. */
export interface ParsedKey {
  readonly name: string;
  readonly basis?: string;
  readonly temperature: PropertyTemperature;
}

/**
 * `Re@cylinder,film` -> name, basis, temperature. `Re@film` is Re on the basis film; `Pr@film`, a group without basis, is Pr at film temperature.
 * Undefined for anything that is not a complete group key: an unknown group, basis or temperature, or a missing basis.
 */
export function parseKey(key: Key): ParsedKey | undefined {
  const [name, ...rest] = key.split('@');
  const group = groups.get(name!);
  if (group === undefined || rest.length > 1) return undefined;
  const parts = rest.length === 0 ? [] : rest[0]!.split(',');
  const basis = group.bases.length === 0 ? undefined : parts.shift();
  if (group.bases.length > 0 && !(basis !== undefined && group.bases.includes(basis))) return undefined;
  const temperature = temperatureOf(parts, group.properties);
  return temperature === undefined ? undefined : { name: name!, ...(basis === undefined ? {} : { basis }), temperature };
}

function temperatureOf(parts: readonly string[], properties: boolean): PropertyTemperature | undefined {
  if (parts.length === 0) return 'bulk';
  if (parts.length > 1 || !properties || parts[0] === 'bulk') return undefined;
  return propertyTemperatures.find((one) => one === parts[0]);
}
