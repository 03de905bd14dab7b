import { says } from '../base/says/study.ts';
import type { Faults } from './faults.ts';
import { given } from './given.ts';
import type { Placed, QuantityEntry } from './study.ts';
import type { Tree } from './tree.ts';
import { child, placed, placedNumber, recordOf, textAt, wordAt } from './view.ts';

/** Where a quantity comes from; exactly one is given. */
const ORIGINS = ['column', 'value', 'formula'] as const;

/** How a systematic uncertainty may be stated; at most one is given. */
const SYSTEMATIC = ['systematic', 'accuracy', 'expanded'] as const;

export const readQuantities = (tree: Tree | undefined, faults: Faults): Readonly<Record<string, Placed<QuantityEntry>>> =>
  recordOf(tree, (value) => ({ is: readQuantity(value, faults), place: value.place }));

function readQuantity(tree: Tree, faults: Faults): QuantityEntry {
  if (tree.kind === 'scalar') return { value: placed(tree) };
  const k = child(tree, 'k');
  const entry = given({
    column: textAt(tree, 'column'),
    value: textAt(tree, 'value'),
    formula: textAt(tree, 'formula'),
    unit: textAt(tree, 'unit'),
    random: textAt(tree, 'random'),
    systematic: textAt(tree, 'systematic'),
    accuracy: textAt(tree, 'accuracy'),
    expanded: textAt(tree, 'expanded'),
    k: k === undefined ? undefined : placedNumber(k),
    per: wordAt<'study' | 'campaign'>(tree, 'per'),
    instrument: textAt(tree, 'instrument'),
    kind: wordAt<'reading' | 'set'>(tree, 'kind'),
  });
  checkQuantity(entry, tree, faults);
  return entry;
}

function checkQuantity(entry: QuantityEntry, { place }: Tree, faults: Faults): void {
  const origins = ORIGINS.filter((key) => entry[key] !== undefined);
  if (origins.length !== 1) faults.add('one-of', says.oneOf(ORIGINS, origins), place);
  const stated = SYSTEMATIC.filter((key) => entry[key] !== undefined);
  if (stated.length > 1) faults.add('one-of', says.oneOf(SYSTEMATIC, stated), entry[stated[1]!]!.place);
  if (entry.k !== undefined && entry.expanded === undefined) faults.add('needs', says.needs('k', 'expanded'), entry.k.place);
  if (entry.expanded !== undefined && entry.k === undefined)
    faults.add('needs', says.needs('expanded', 'its coverage factor k, such as k: 2'), entry.expanded.place);
}
