import type { Rule } from '../rules/rule.ts';
import { basisRecords, lengthKey, lengthRules } from './basis.ts';
import { Ar, Bo, Ga, Gr, Ra } from './buoyancy-groups.ts';
import { Fr, graetzHeat, graetzMass, pecletHeat, pecletMass, We } from './flow-groups.ts';
import { type Group, type PropertyTemperature, propertyTemperatures, type Setting } from './group.ts';
import { groupKey } from './key.ts';
import { Le, Pr, Sc, viscosityRatio } from './property-groups.ts';
import { Re } from './reynolds.ts';
import { Bi, Fo, factorHeat, factorMass, Nu, Sh, stantonHeat, stantonMass } from './transfer-groups.ts';

const list: readonly Group[] = [
  ...[Re, Pr, Sc, Le, Nu, Sh, pecletHeat, pecletMass, Gr, Ra, graetzHeat, graetzMass],
  ...[Ga, Ar, Bo, Fr, We, stantonHeat, stantonMass, factorHeat, factorMass, Bi, Fo, viscosityRatio],
];

/** Every group by name. */
export const groups: ReadonlyMap<string, Group> = new Map(list.map((group) => [group.name, group]));

/** Names a law or a study's `groups` may use. */
export const groupNames: readonly string[] = list.map(({ name }) => name);

/** Names of the bases a group may stand on; none for a group without one; undefined for an unknown group. */
export const basesOf = (name: string): readonly string[] | undefined => groups.get(name)?.bases;

/** Characteristic lengths and every group on every basis and at every property temperature. */
export const groupRules: readonly Rule[] = [...lengthRules, ...list.flatMap(rulesOf)];

function rulesOf(group: Group): readonly Rule[] {
  const temperatures = group.properties ? propertyTemperatures : (['bulk'] as const);
  const on = group.bases.length === 0 ? [undefined] : group.bases;
  return on.flatMap((basis) => temperatures.flatMap((temperature) => rulesAt(group, basis, temperature)));
}

function rulesAt(group: Group, basis: string | undefined, temperature: PropertyTemperature): readonly Rule[] {
  return group
    .ways(settingOf(basis, temperature))
    .map(({ from, of, formula }) => ({ gives: groupKey(group.name, basis, temperature), from, of, formula, source: group.source }));
}

/** How keys are written on a basis and at a temperature. */
export function settingOf(basis: string | undefined, temperature: PropertyTemperature): Setting {
  return {
    at: (property) => (temperature === 'bulk' ? property : `${property}@${temperature}`),
    temperature,
    length: basis === undefined ? '' : lengthKey(basis, temperature),
    symbol: basis === undefined ? '' : basisRecords.get(basis)!.symbol,
    basis: basis ?? '',
  };
}
