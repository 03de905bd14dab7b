import { lstatSync, readFileSync, renameSync, rmSync, type Stats, statSync } from 'node:fs';
import { basename, dirname, join } from 'node:path';
import { InputError } from '../base/input-error.ts';
import { says } from '../base/says/files.ts';
import { causeOf } from './cause.ts';
import { sha256, sha256OfFile } from './hash.ts';
import { type Known, knownFiles, lockResults, type ResultsLock } from './results-lock.ts';
import { makeFolder, syncFolder, writeSynced } from './write.ts';

const MOST = 1 << 30;

/**
 * Replaces all results of a folder. `last` is the file that lists the others with their hashes: removed before the first file is replaced, put in place after
 * the last one. All are written and synced beside before any is touched, so that a full disk or a refused folder leaves the old results whole.
 * A file that stands where a result goes and is none of ours is never touched: refused (exit 2). Results of an earlier run that are none now are removed.
 */
export function replaceResults(folder: string, files: ReadonlyMap<string, string | Uint8Array>, last: string): void {
  makeFolder(folder);
  const lock = lockResults(folder);
  const own = [...ownFiles(join(folder, last)), ...lock.left];
  stage(folder, files, own, lock);
  try {
    exchange(folder, files, last, own, lock.staging);
  } catch (error) {
    lock.abandon();
    throw notWritten(folder, error);
  }
  lock.release();
}

/** Results that a list of results on disk names. */
export const ownResults = (list: string): readonly Known[] => ownFiles(list).slice(0, -1);

/** Those and the list itself; nothing where the file is no such list. */
function ownFiles(list: string): readonly Known[] {
  try {
    const text = readFileSync(list, 'utf8');
    const results = knownFiles((JSON.parse(text) as { results?: unknown }).results);
    return results.length === 0 ? [] : [...results, { file: basename(list), sha256: sha256(text) }];
  } catch {
    return [];
  }
}

function stage(folder: string, files: ReadonlyMap<string, string | Uint8Array>, own: readonly Known[], lock: ResultsLock): void {
  try {
    refuseOthers(folder, files, own);
    lock.sign([...own, ...[...files].map(([file, content]) => ({ file, sha256: sha256(content) }))]);
    for (const [name, content] of files) {
      makeFolder(dirname(join(folder, name)));
      makeFolder(dirname(join(lock.staging, name)));
      writeSynced(join(lock.staging, name), typeof content === 'string' ? Buffer.from(content, 'utf8') : content);
    }
  } catch (error) {
    lock.release();
    throw error instanceof InputError ? error : notWritten(folder, error);
  }
}

function exchange(folder: string, files: ReadonlyMap<string, unknown>, last: string, own: readonly Known[], staging: string): void {
  rmSync(join(folder, last), { force: true });
  syncFolder(folder);
  for (const name of files.keys()) if (name !== last) renameSync(join(staging, name), join(folder, name));
  for (const { file, sha256: hash } of own)
    if (!files.has(file) && isStill(join(folder, file), hash)) rmSync(join(folder, file), { force: true });
  for (const part of new Set([...files.keys()].map((name) => dirname(join(folder, name))))) syncFolder(part);
  renameSync(join(staging, last), join(folder, last));
  syncFolder(folder);
}

const isStill = (path: string, hash: string): boolean =>
  statSync(path, { throwIfNoEntry: false })?.isFile() === true && sha256OfFile(path, { most: MOST }) === hash;

/** Files of the user's own that stand where results would go. One with the very bytes of the result loses nothing. */
function refuseOthers(folder: string, files: ReadonlyMap<string, string | Uint8Array>, own: readonly Known[]): void {
  const known = new Set(own.map(({ file }) => file));
  const others = [...files].filter(([name, content]) => {
    const there = statOf(join(folder, name));
    if (there === undefined) return false;
    return there.isDirectory() || (!known.has(name) && !isStill(join(folder, name), sha256(content)));
  });
  if (others.length > 0)
    throw new InputError(others.map(([name]) => ({ code: 'not-a-result', text: says.notOurs(name), place: { file: join(folder, name) } })));
}

function statOf(path: string): Stats | undefined {
  try {
    return lstatSync(path, { throwIfNoEntry: false });
  } catch (error) {
    causeOf(error);
    return undefined;
  }
}

const notWritten = (folder: string, error: unknown): InputError =>
  new InputError([{ code: 'file-not-written', text: says.notWritten(folder, causeOf(error)), place: { file: folder } }]);
