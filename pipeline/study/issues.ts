import type { z } from 'zod';
import type { Message } from '../base/message.ts';
import type { Place } from '../base/place.ts';
import { KEY_BREAK } from './schema-parts.ts';
import type { Tree } from './tree.ts';

type Issue = z.core.$ZodIssue;
type Path = readonly PropertyKey[];

/** Faults that the schema found, each at its place in the file. */
export const messagesOf = (issues: readonly Issue[], tree: Tree): readonly Message[] =>
  issues.flatMap((issue) => messagesOfOne(issue, [], tree));

function messagesOfOne(issue: Issue, above: Path, tree: Tree): readonly Message[] {
  const path = [...above, ...issue.path];
  if (issue.code === 'unrecognized_keys') {
    const texts = issue.message.split(KEY_BREAK);
    return issue.keys.map((key, k) => ({ code: 'unknown-key', text: texts[k]!, place: keyPlace(tree, path, key) }));
  }
  if (issue.code === 'invalid_union') {
    const meant = meantOption(issue.errors);
    if (meant !== undefined) return meant.flatMap((inner) => messagesOfOne(inner, path, tree));
  }
  if (issue.code === 'invalid_key')
    return [
      { code: 'bad-name', text: issue.issues[0]?.message ?? issue.message, place: keyPlace(tree, path.slice(0, -1), String(path.at(-1))) },
    ];
  return [{ code: missing(tree, path) ? 'missing-key' : 'wrong-value', text: issue.message, place: placeOf(tree, path) }];
}

/** Of several allowed shapes the one the user had in mind: the right kind of value with the fewest unknown keys. */
function meantOption(options: readonly (readonly Issue[])[]): readonly Issue[] | undefined {
  const unknown = (errors: readonly Issue[]): number =>
    errors.reduce((sum, one) => sum + (one.code === 'unrecognized_keys' && one.path.length === 0 ? one.keys.length : 0), 0);
  const shaped = options.filter((errors) =>
    errors.every((one) => one.path.length > 0 || one.code === 'unrecognized_keys' || one.code === 'invalid_union'),
  );
  return shaped.sort((a, b) => unknown(a) - unknown(b))[0];
}

const missing = (tree: Tree, path: Path): boolean => reach(tree, path).rest.length > 0;

/** As far down the path as the tree goes. */
function reach(tree: Tree, path: Path): { readonly tree: Tree; readonly rest: Path } {
  const [first, ...rest] = path;
  if (first === undefined) return { tree, rest: [] };
  const next =
    tree.kind === 'map'
      ? tree.entries.findLast(({ key }) => key === String(first))?.value
      : tree.kind === 'list'
        ? tree.items[Number(first)]
        : undefined;
  return next === undefined ? { tree, rest: path } : reach(next, rest);
}

/** The value's place; for what is missing the place of the map that lacks it, with the full key. */
function placeOf(tree: Tree, path: Path): Place {
  const { tree: found, rest } = reach(tree, path);
  const key = [found.place.key, ...rest.map(String)].filter((part) => part !== undefined && part !== '').join('.');
  return { ...found.place, ...(key === '' ? {} : { key }) };
}

function keyPlace(tree: Tree, path: Path, key: string): Place {
  const { tree: found } = reach(tree, path);
  const entry = found.kind === 'map' ? found.entries.findLast((one) => one.key === key) : undefined;
  return entry?.place ?? placeOf(tree, path);
}
