import { createHash } from 'node:crypto';
import { type ReadOptions, readPieces } from './read.ts';

/** SHA-256 in lower-case hexadecimal. */
export const sha256 = (content: string | Uint8Array): string => createHash('sha256').update(content).digest('hex');

/** SHA-256 of a file, read in pieces. */
export function sha256OfFile(path: string, options: ReadOptions): string {
  const hash = createHash('sha256');
  for (const piece of readPieces(path, options)) hash.update(piece);
  return hash.digest('hex');
}
