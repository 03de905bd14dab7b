import type { Place } from '../base/place.ts';
import type { Placed } from './study.ts';
import type { MapTree, Tree } from './tree.ts';

/** How the parts of a tree that the schema has passed are taken out of it. A key that was given without a value counts as given: the schema has refused it. */
export const child = (tree: Tree, key: string): Tree | undefined =>
  tree.kind === 'map' ? tree.entries.find((entry) => entry.key === key)?.value : undefined;

export const entriesOf = (tree: Tree | undefined): MapTree['entries'] => (tree?.kind === 'map' ? tree.entries : []);

export const itemsOf = (tree: Tree | undefined): readonly Tree[] => (tree === undefined ? [] : tree.kind === 'list' ? tree.items : [tree]);

export const written = (tree: Tree): string => (tree.kind === 'scalar' ? tree.text : '');

export const placed = (tree: Tree): Placed<string> => ({ is: written(tree), place: tree.place });

export const textAt = (tree: Tree, key: string): Placed<string> | undefined => {
  const found = child(tree, key);
  return found === undefined ? undefined : placed(found);
};

/** One of a few words, which the schema has checked. */
export const wordAt = <T extends string>(tree: Tree, key: string): Placed<T> | undefined => textAt(tree, key) as Placed<T> | undefined;

export const numberOf = (tree: Tree): number =>
  tree.kind === 'scalar'
    ? ({ '.inf': Number.POSITIVE_INFINITY, '-.inf': Number.NEGATIVE_INFINITY }[tree.text] ?? Number(tree.value))
    : Number.NaN;

export const placedNumber = (tree: Tree): Placed<number> => ({ is: numberOf(tree), place: tree.place });

/** 0.2 or `20 %` as 0.2. */
export const shareOf = (tree: Tree): number => (written(tree).includes('%') ? Number.parseFloat(written(tree)) / 100 : numberOf(tree));

/** By the user's own names; without a prototype, so that no name can be mistaken for a given one. */
export function recordOf<T>(tree: Tree | undefined, read: (value: Tree, key: string, place: Place) => T): Readonly<Record<string, T>> {
  const record: Record<string, T> = Object.create(null);
  for (const { key, value, place } of entriesOf(tree)) record[key] = read(value, key, place);
  return record;
}

export const truthAt = (tree: Tree, key: string, otherwise: boolean): boolean => {
  const found = child(tree, key);
  return found?.kind === 'scalar' && typeof found.value === 'boolean' ? found.value : otherwise;
};
