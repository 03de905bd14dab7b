import { closeSync, fsyncSync, mkdirSync, openSync, renameSync, rmSync, statSync, writeSync } from 'node:fs';
import { basename, dirname, join } from 'node:path';
import { InputError } from '../base/input-error.ts';
import { says } from '../base/says/files.ts';
import { causeOf } from './cause.ts';

let count = 0;

/**
 * Replaces a file in one step: a new file beside it is written and synced, then renamed over it. A reader sees the old or the new bytes, never a part.
 * A folder that cannot be written or a full disk is refused (exit 2); nothing half-written is left behind.
 */
export function replaceFile(path: string, content: string | Uint8Array): void {
  const bytes = typeof content === 'string' ? Buffer.from(content, 'utf8') : content;
  count += 1;
  const part = join(dirname(path), `.${basename(path)}.${process.pid}.${count}.part`);
  try {
    writeSynced(part, bytes);
    renameSync(part, path);
    syncFolder(dirname(path));
  } catch (error) {
    remove(part);
    throw new InputError([{ code: 'file-not-written', text: says.notWritten(path, causeOf(error)), place: { file: path } }]);
  }
}

/** A new file whose bytes have reached the disk. Throws what the system throws. */
export function writeSynced(path: string, bytes: Uint8Array): void {
  const file = openSync(path, 'wx', 0o666);
  try {
    let written = 0;
    while (written < bytes.length) written += writeSync(file, bytes, written);
    fsyncSync(file);
  } finally {
    closeSync(file);
  }
}

/** The rename itself reaches the disk; some file systems cannot sync a folder, and lose nothing by it. */
export function syncFolder(folder: string): void {
  let file: number | undefined;
  try {
    file = openSync(folder, 'r');
    fsyncSync(file);
  } catch (error) {
    causeOf(error);
  } finally {
    if (file !== undefined) closeSync(file);
  }
}

function remove(path: string): void {
  try {
    rmSync(path, { force: true });
  } catch (error) {
    causeOf(error);
  }
}

/** Makes a folder and those above it. */
export function makeFolder(path: string): void {
  try {
    made(path);
  } catch (error) {
    throw new InputError([{ code: 'folder-not-made', text: says.folderNotMade(path, causeOf(error)), place: { file: path } }]);
  }
}

/** One folder after another: the recursive way of the system tells a read-only disk as a missing folder. */
function made(path: string): void {
  if (statSync(path, { throwIfNoEntry: false })?.isDirectory()) return;
  if (dirname(path) !== path) made(dirname(path));
  try {
    mkdirSync(path);
  } catch (error) {
    if (!statSync(path, { throwIfNoEntry: false })?.isDirectory()) throw error;
  }
}

/** Removes a file of ours if it is there. */
export function removeFile(path: string): void {
  try {
    rmSync(path, { force: true });
  } catch (error) {
    throw new InputError([{ code: 'file-not-removed', text: says.notRemoved(path, causeOf(error)), place: { file: path } }]);
  }
}
