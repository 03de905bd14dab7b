import type { Key } from '../rules/rule.ts';
import type { PropertyTemperature } from './group.ts';

/** `Re`, `pipe`, `film` -> `Re@pipe,film`; bulk is left out. */
export function groupKey(name: string, basis: string | undefined, temperature: PropertyTemperature): Key {
  const after = [...(basis === undefined ? [] : [basis]), ...(temperature === 'bulk' ? [] : [temperature])];
  return after.length === 0 ? name : `${name}@${after.join(',')}`;
}
