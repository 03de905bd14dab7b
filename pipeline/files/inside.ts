import { lstatSync, realpathSync } from 'node:fs';
import { isAbsolute, join, relative, sep } from 'node:path';
import { InputError } from '../base/input-error.ts';
import type { Place } from '../base/place.ts';
import { says } from '../base/says/files.ts';
import { causeOf } from './cause.ts';

/**
 * The real path of a file that a study names, inside the study's folder. Refused: an absolute path, one that climbs out, and one that a link leads out.
 * A file that does not exist is refused by name (a missing input is a fault of the study file).
 */
export function pathInside(folder: string, path: string, place: Place): string {
  if (path.includes('\0') || isAbsolute(path) || /^[A-Za-z]:/u.test(path) || leaves(relative(folder, join(folder, path))))
    throw leadsOut(path, place);
  const real = realPath(join(folder, path), path, place);
  if (leaves(relative(realPath(folder, folder, place), real))) throw leadsOut(path, place);
  return real;
}

/** Where a result may be written: like `pathInside`, for a path that need not exist yet. */
export function newPathInside(folder: string, path: string, place: Place): string {
  if (path.includes('\0') || isAbsolute(path) || /^[A-Za-z]:/u.test(path) || leaves(relative(folder, join(folder, path))))
    throw leadsOut(path, place);
  const parts = relative(folder, join(folder, path)).split(sep);
  let known = realPath(folder, folder, place);
  const root = known;
  for (const [k, part] of parts.entries()) {
    if (!exists(join(known, part))) return join(known, ...parts.slice(k));
    known = realPath(join(known, part), path, place);
    if (leaves(relative(root, known))) throw leadsOut(path, place);
  }
  return known;
}

const leaves = (from: string): boolean => from === '..' || from.startsWith(`..${sep}`) || isAbsolute(from);

const exists = (path: string): boolean => lstatSync(path, { throwIfNoEntry: false }) !== undefined;

const leadsOut = (path: string, place: Place): InputError => new InputError([{ code: 'path-outside', text: says.outside(path), place }]);

function realPath(path: string, name: string, place: Place): string {
  try {
    return realpathSync(path);
  } catch (error) {
    const cause = causeOf(error);
    const text = cause === 'missing' ? says.missing(name) : says.notReadable(name, cause);
    throw new InputError([{ code: cause === 'missing' ? 'file-missing' : 'file-not-readable', text, place }]);
  }
}
