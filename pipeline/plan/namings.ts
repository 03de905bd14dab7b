import { definitionText } from '../groups/definition.ts';
import { quantityOf } from '../quantities/vocabulary.ts';
import type { Key } from '../rules/rule.ts';
import type { GroupPlan } from './group-plan.ts';
import type { Naming, PlannedLaw } from './plan.ts';

/** How every name in the laws is printed: symbol, unit, definition in words and its source. By key. */
export function namingsOf(laws: readonly PlannedLaw[], groups: GroupPlan, units: ReadonlyMap<Key, string>): ReadonlyMap<Key, Naming> {
  const namings = new Map<Key, Naming>();
  for (const law of laws)
    for (const [name, key] of Object.entries(law.groups)) namings.set(key, namingOf(name, key, law.units[name], groups, units));
  return namings;
}

function namingOf(name: string, key: Key, unit: string | undefined, groups: GroupPlan, units: ReadonlyMap<Key, string>): Naming {
  const group = definitionText(key);
  if (group !== undefined && !groups.onTrust.has(name))
    return { name, key, symbol: group.symbol, unit: '1', text: group.text, source: group.source };
  const formula = groups.formulas.get(name);
  if (formula !== undefined) return { name, key, symbol: name, unit: '1', text: `${name} = ${formula}`, source: "the study's own formula" };
  if (groups.onTrust.has(name))
    return {
      name,
      key,
      symbol: name,
      unit: '1',
      text: `${name} as in the table, in the table's own unit`,
      source: "the study's own column",
    };
  const quantity = quantityOf(name);
  const inUnit = unit ?? quantity?.unit ?? units.get(name) ?? '1';
  return {
    name,
    key,
    symbol: quantity?.symbol ?? name,
    unit: inUnit,
    text: quantity === undefined ? `${name}, a quantity of the study's own` : `${name}: ${quantity.says}`,
    source: 'definition',
  };
}
