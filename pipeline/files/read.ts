import { closeSync, existsSync, fstatSync, openSync, readSync } from 'node:fs';
import { InputError } from '../base/input-error.ts';
import type { Place } from '../base/place.ts';
import { says } from '../base/says/files.ts';
import { causeOf } from './cause.ts';

export interface ReadOptions {
  /** Most bytes that are read; a larger file is refused before a byte of it is. */
  readonly most: number;
  /** Name of the file in messages; the path where left out. */
  readonly name?: string;
  /** Where the file is named, if not on the command line. */
  readonly place?: Place;
}

/** A whole file. Refused (exit 2) where it is missing, no file, not readable or larger than `most`. */
export function readBytes(path: string, options: ReadOptions): Buffer {
  const name = options.name ?? path;
  return opened(path, options, (file, size) => {
    if (size > options.most) throw refusal(says.tooLarge(name, size, options.most), 'file-too-large', name, options);
    const bytes = Buffer.alloc(size);
    let filled = 0;
    while (filled < size) {
      const read = readSync(file, bytes, filled, size - filled, null);
      if (read === 0) throw refusal(says.changedWhileRead(name), 'file-changed', name, options);
      filled += read;
    }
    return bytes;
  });
}

/** A file in pieces of at most `size` bytes, for logs that memory must not hold at once. */
export function* readPieces(path: string, options: ReadOptions, size = 1 << 20): Generator<Buffer> {
  const name = options.name ?? path;
  const file = openFile(path, options);
  try {
    if (fstatSync(file).size > options.most)
      throw refusal(says.tooLarge(name, fstatSync(file).size, options.most), 'file-too-large', name, options);
    for (let piece = nextPiece(file, size); piece.length > 0; piece = nextPiece(file, size)) yield piece;
  } finally {
    closeSync(file);
  }
}

function nextPiece(file: number, size: number): Buffer {
  const piece = Buffer.allocUnsafe(size);
  return piece.subarray(0, readSync(file, piece, 0, size, null));
}

function opened<T>(path: string, options: ReadOptions, use: (file: number, size: number) => T): T {
  const file = openFile(path, options);
  try {
    return use(file, fstatSync(file).size);
  } catch (error) {
    throw error instanceof InputError
      ? error
      : refusal(says.notReadable(options.name ?? path, causeOf(error)), 'file-not-readable', options.name ?? path, options);
  } finally {
    closeSync(file);
  }
}

/** An open plain file; a pipe or a device would never end. */
function openFile(path: string, options: ReadOptions): number {
  const name = options.name ?? path;
  let file: number;
  try {
    file = openSync(path, 'r');
  } catch (error) {
    const cause = causeOf(error);
    throw cause === 'missing'
      ? refusal(says.missing(name), 'file-missing', name, options)
      : refusal(says.notReadable(name, cause), 'file-not-readable', name, options);
  }
  if (fstatSync(file).isFile()) return file;
  closeSync(file);
  throw refusal(says.noFile(name), 'file-no-file', name, options);
}

const refusal = (text: string, code: string, name: string, { place }: ReadOptions): InputError =>
  new InputError([{ code, text, place: place ?? { file: name } }]);

/** Whether something stands at a path. */
export const fileExists = (path: string): boolean => existsSync(path);
