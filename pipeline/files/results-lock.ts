import { mkdirSync, readdirSync, readFileSync, renameSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { hostname } from 'node:os';
import { join } from 'node:path';
import { InputError } from '../base/input-error.ts';
import { says } from '../base/says/files.ts';
import { causeOf } from './cause.ts';

const LOCK = '.pilotlaw-writing';
const LEFT = '.pilotlaw-left-';
const OWNER = 'owner.json';

const PATIENCE = 10_000; // ms that a run waits for another to end its writing
const NAP = 50; // ms
const UNSIGNED = 5_000; // ms after which a lock without an owner is no longer being made
const ABANDONED = 600_000; // ms; writing takes seconds

/** A file that pilotlaw wrote, or was about to write. */
export interface Known {
  readonly file: string;
  readonly sha256: string;
}

interface Owner {
  readonly pid: number;
  readonly host: string;
  readonly files: readonly Known[];
}

/** The right to write into a folder of results: a folder in it, which also holds what is not in place yet. */
export interface ResultsLock {
  /** Where new files wait; on the same disk, so that they are put in place by a rename. */
  readonly staging: string;
  /** Files that earlier runs were writing when they were stopped. */
  readonly left: readonly Known[];
  /** Says which files this run writes, before it touches one; only then is what earlier runs left forgotten. */
  sign(files: readonly Known[]): void;
  /** All is in place, or nothing was touched. */
  release(): void;
  /** Stopped halfway: what was signed stays on record for the next run. */
  abandon(): void;
}

/**
 * Takes the lock of a folder; waits while another run is writing, and takes over from one that was killed.
 * Refused (exit 2) where the other does not end, or the folder cannot be written.
 */
export function lockResults(folder: string, patience = PATIENCE): ResultsLock {
  const lock = join(folder, LOCK);
  const since = Date.now();
  while (!made(lock)) {
    const owner = ownerOf(lock);
    if (isLeft(lock, owner)) putAside(folder, lock, owner);
    else if (Date.now() - since > patience)
      throw new InputError([{ code: 'folder-in-use', text: says.inUse(folder, owner?.pid, lock), place: { file: folder } }]);
    else Atomics.wait(new Int32Array(new SharedArrayBuffer(4)), 0, 0, NAP);
  }
  const earlier = readdirSync(folder).filter((name) => name.startsWith(LEFT));
  return {
    staging: lock,
    left: earlier.flatMap((name) => ownerOf(join(folder, name))?.files ?? []),
    sign: (files) => {
      const owner: Owner = { pid: process.pid, host: hostname(), files };
      writeFileSync(join(lock, 'unsigned'), JSON.stringify(owner), { flush: true });
      renameSync(join(lock, 'unsigned'), join(lock, OWNER));
      for (const name of earlier) rmSync(join(folder, name), { recursive: true, force: true });
    },
    release: () => rmSync(lock, { recursive: true, force: true }),
    abandon: () => renameSync(lock, asideName(folder)),
  };
}

function made(lock: string): boolean {
  try {
    mkdirSync(lock);
    return true;
  } catch (error) {
    if (error instanceof Error && 'code' in error && error.code === 'EEXIST') return false;
    throw new InputError([{ code: 'file-not-written', text: says.notWritten(lock, causeOf(error)), place: { file: lock } }]);
  }
}

let count = 0;
const asideName = (folder: string): string => {
  count += 1;
  return join(folder, `${LEFT}${process.pid}-${Date.now().toString(36)}-${count}`);
};

/** The run that held it is gone: its list is kept aside until the next owner has signed. A lock that changed hands meanwhile is given back. */
function putAside(folder: string, lock: string, seen: Owner | undefined): void {
  const aside = asideName(folder);
  try {
    renameSync(lock, aside);
    if (JSON.stringify(ownerOf(aside)) !== JSON.stringify(seen)) renameSync(aside, lock);
  } catch (error) {
    if (causeOf(error) !== 'missing')
      throw new InputError([{ code: 'file-not-written', text: says.notWritten(lock, causeOf(error)), place: { file: lock } }]);
  }
}

function isLeft(lock: string, owner: Owner | undefined): boolean {
  const made = statSync(lock, { throwIfNoEntry: false })?.mtimeMs ?? Date.now();
  const age = Date.now() - made;
  if (owner === undefined) return age > UNSIGNED;
  return age > ABANDONED || (owner.host === hostname() && !isAlive(owner.pid));
}

function isAlive(pid: number): boolean {
  try {
    process.kill(pid, 0);
    return true;
  } catch (error) {
    return error instanceof Error && 'code' in error && error.code === 'EPERM';
  }
}

function ownerOf(lock: string): Owner | undefined {
  try {
    const { pid, host, files } = JSON.parse(readFileSync(join(lock, OWNER), 'utf8')) as Partial<Owner>;
    return typeof pid === 'number' && pid > 0 && typeof host === 'string' ? { pid, host, files: knownFiles(files) } : undefined;
  } catch {
    return undefined;
  }
}

/** What of a list read from disk can be a list of results: relative names that stay below the folder. */
export function knownFiles(list: unknown): readonly Known[] {
  if (!Array.isArray(list)) return [];
  return list.flatMap((entry: unknown) => {
    const { file, sha256 } = (entry ?? {}) as Partial<Known>;
    const sound =
      typeof file === 'string' &&
      typeof sha256 === 'string' &&
      /^[\w-][\w .-]*(?:\/[\w-][\w .-]*)*$/u.test(file) &&
      /^[0-9a-f]{64}$/u.test(sha256);
    return sound ? [{ file, sha256 }] : [];
  });
}
