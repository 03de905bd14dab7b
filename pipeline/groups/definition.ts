import type { Key } from '../rules/rule.ts';
import { basisRecords } from './basis.ts';
import { groups, settingOf } from './groups.ts';
import { parseKey } from './parse-key.ts';

/** A definition in words, for the report. */
export interface Definition {
  readonly name: string;
  /** `Re = rho u d/mu, u = mean velocity, d = bore diameter, properties at bulk temperature` */
  readonly text: string;
  readonly symbol: string;
  /** `Reynolds number` */
  readonly title: string;
  readonly source: string;
}

/** The definition behind a group's key; undefined where the key is no group's. */
export function definitionText(key: Key): Definition | undefined {
  const parsed = parseKey(key);
  if (parsed === undefined) return undefined;
  const group = groups.get(parsed.name)!;
  const basis = parsed.basis === undefined ? undefined : basisRecords.get(parsed.basis);
  const way = group.ways(settingOf(parsed.basis, parsed.temperature))[0]!;
  const said = [
    way.formula,
    group.where?.(basis) ?? '',
    basis === undefined || basis.name === 'packing' ? '' : `${basis.symbol} = ${basis.says}`,
    basis?.name === 'packing' ? 'a = specific area of the packing' : '',
    group.properties ? `properties at ${parsed.temperature} temperature` : '',
  ];
  return {
    name: group.name,
    text: said.filter((part) => part !== '').join(', '),
    symbol: group.symbol,
    title: group.title,
    source: group.source,
  };
}
