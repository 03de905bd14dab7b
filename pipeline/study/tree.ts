import type { Place } from '../base/place.ts';

/** A YAML value with the place of every part; aliases written out, keys unique, depth and number of values capped. */
export type Tree = ScalarTree | ListTree | MapTree;

export interface ScalarTree {
  readonly kind: 'scalar';
  readonly value: string | number | boolean | null;
  /** Characters as written: `0.40` and `007` keep their zeros. */
  readonly text: string;
  readonly place: Place;
}

interface ListTree {
  readonly kind: 'list';
  readonly items: readonly Tree[];
  readonly place: Place;
}

export interface MapTree {
  readonly kind: 'map';
  readonly entries: readonly { readonly key: string; readonly place: Place; readonly value: Tree }[];
  readonly place: Place;
}

/** The value without places, for the schema. */
export function plain(tree: Tree): unknown {
  if (tree.kind === 'scalar') return tree.value;
  if (tree.kind === 'list') return tree.items.map(plain);
  return Object.fromEntries(tree.entries.map(({ key, value }) => [key, plain(value)]));
}
