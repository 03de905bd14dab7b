import { parseFormula } from '../algebra/parse.ts';
import type { Place } from '../base/place.ts';
import * as says from '../base/says/plan.ts';
import { basesOf, groupNames } from '../groups/groups.ts';
import { groupKey } from '../groups/key.ts';
import { possibleBases } from '../groups/possible-bases.ts';
import { type Dimension, dimensionless, dimensionText, isDimensionless } from '../quantities/dimension.ts';
import { isFault } from '../quantities/fault.ts';
import { unitFor } from '../quantities/unit-for.ts';
import { quantityNames, quantityOf } from '../quantities/vocabulary.ts';
import type { Input, Key, Rule } from '../rules/rule.ts';
import type { Study } from '../study/study.ts';
import { dimensionOf } from './dimension-of.ts';
import type { Faults } from './faults.ts';
import { formulaRule } from './formula-rules.ts';
import type { Header } from './header.ts';
import type { DeclaredColumn } from './plan.ts';
import { spreadsOf } from './spreads.ts';

/** What the names under `groups` mean. */
export interface GroupPlan {
  /** Name in laws -> key. */
  readonly keys: Map<string, Key>;
  readonly inputs: Input[];
  readonly columns: DeclaredColumn[];
  readonly rules: Rule[];
  /** Names that are columns of the user's: published correlations are compared with them on trust. */
  readonly onTrust: Set<string>;
  /** Names given by a formula, with it. */
  readonly formulas: Map<string, string>;
}

export function planGroups(groups: Study['groups'], header: Header, dimensions: ReadonlyMap<Key, Dimension>, faults: Faults): GroupPlan {
  const plan: GroupPlan = { keys: new Map(), inputs: [], columns: [], rules: [], onTrust: new Set(), formulas: new Map() };
  for (const [name, { is, place }] of Object.entries(groups)) {
    if (is.column !== undefined) columnGroup(name, is, header, plan, faults);
    else if (is.formula !== undefined) formulaGroup(name, is.formula.is, is.formula.place, dimensions, plan, faults);
    else basisGroup(name, is.basis?.is, is.at?.is, place, plan, faults);
  }
  return plan;
}

type Entry = Study['groups'][string]['is'];

/** Any name may be such a group; the column holds a plain number. */
function columnGroup(name: string, entry: Entry, header: Header, plan: GroupPlan, faults: Faults): void {
  const { is, place } = entry.column!;
  const found = header.find(is, place, faults);
  if (found === undefined) return;
  const unit = unitFor(undefined, '1');
  if (isFault(unit)) throw new Error(unit.text);
  if (found.unit !== undefined && found.unit !== '' && found.unit !== '1' && found.unit !== '-')
    faults.add('unit-of-number', says.unitOfNumber(name, found.unit), place);
  plan.keys.set(name, name);
  plan.onTrust.add(name);
  plan.columns.push({ key: name, column: found.name, index: found.index, unit, place });
  plan.inputs.push({ key: name, label: name, ...spreadsOf(name, entry, undefined, unit, 'random', faults) });
}

function formulaGroup(
  name: string,
  text: string,
  place: Place,
  dimensions: ReadonlyMap<Key, Dimension>,
  plan: GroupPlan,
  faults: Faults,
): void {
  const read = parseFormula(text, [...quantityNames, ...dimensions.keys()]);
  if ('code' in read) {
    faults.add(read.code, says.formulaWrong(name, text, read.text), place);
    return;
  }
  const found = dimensionOf(read.tree, (key) => dimensions.get(key) ?? quantityOf(key)?.dimension ?? dimensionless);
  if ('wrong' in found) faults.add('formula-dimension', says.formulaWrong(name, text, found.wrong), place);
  else if (!isDimensionless(found.dimension))
    faults.add('group-dimension', says.groupDimension(name, text, dimensionText(found.dimension)), place);
  const key = `${name} (own formula)`;
  plan.keys.set(name, key);
  plan.formulas.set(name, text);
  plan.rules.push(formulaRule(key, read.tree, read.names, text));
}

function basisGroup(name: string, basis: string | undefined, at: string | undefined, place: Place, plan: GroupPlan, faults: Faults): void {
  const known = basesOf(name);
  if (known === undefined) {
    faults.add('unknown-group', says.unknownGroup(name, groupNames), place);
    return;
  }
  if (basis !== undefined && !known.includes(basis)) {
    faults.add('unknown-basis', says.unknownBasis(name, basis, known), place);
    return;
  }
  if (basis === undefined && known.length > 0) faults.add('needs-basis', says.needsBasis(name, known), place);
  else plan.keys.set(name, groupKey(name, basis, (at ?? 'bulk') as 'bulk' | 'film' | 'wall'));
}

/**
 * The key of a name in a law that `groups` does not settle: a group without a length means itself; one with a length only where one length is possible.
 * Undefined (and a fault) where it cannot be settled.
 */
export function impliedKey(name: string, equipment: string, canHave: (key: Key) => boolean, place: Place, faults: Faults): Key | undefined {
  const known = basesOf(name);
  if (known === undefined) return undefined;
  if (known.length === 0) return groupKey(name, undefined, 'bulk');
  const possible = possibleBases(name, equipment, canHave);
  if (possible.length === 1) return groupKey(name, possible[0], 'bulk');
  faults.add('needs-basis', says.needsBasis(name, possible.length > 0 ? possible : known), place);
  return undefined;
}
