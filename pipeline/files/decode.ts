import { isUtf8 } from 'node:buffer';
import { InputError } from '../base/input-error.ts';
import { says } from '../base/says/files.ts';

export type Encoding = 'utf-8' | 'utf-16le' | 'utf-16be';

/** The encoding that a byte-order mark tells; UTF-8 without one. `skip` is the mark's length. */
export function encodingOf(head: Uint8Array): { readonly encoding: Encoding; readonly skip: number } {
  const [a, b, c] = head;
  if (a === 0xef && b === 0xbb && c === 0xbf) return { encoding: 'utf-8', skip: 3 };
  if (a === 0xff && b === 0xfe) return { encoding: 'utf-16le', skip: 2 };
  if (a === 0xfe && b === 0xff) return { encoding: 'utf-16be', skip: 2 };
  return { encoding: 'utf-8', skip: 0 };
}

/** A text file's characters. Bytes that are none are refused (exit 3) with line and column. */
export function decodeText(bytes: Uint8Array, file: string): string {
  const { encoding, skip } = encodingOf(bytes);
  const body = bytes.subarray(skip);
  if (encoding === 'utf-8' && looksLikeUtf16(body)) throw refusal(file, 1, 1, 'encoding-unmarked', says.utf16WithoutMark());
  if (encoding === 'utf-8' && !isUtf8(body)) throw badUtf8(body, file);
  if (encoding !== 'utf-8' && body.length % 2 === 1) throw refusal(file, 1, 1, 'encoding-broken', says.oddUtf16());
  try {
    return new TextDecoder(encoding, { fatal: true, ignoreBOM: true }).decode(body);
  } catch {
    throw refusal(file, 1, 1, 'encoding-broken', says.brokenUtf16());
  }
}

/** Of the first hundred bytes many at even or at odd places are NUL, none at the others. */
function looksLikeUtf16(body: Uint8Array): boolean {
  const head = body.subarray(0, 100);
  const zeros = [0, 1].map((parity) => head.filter((byte, k) => k % 2 === parity && byte === 0).length);
  return head.length >= 8 && Math.max(...zeros) >= 0.4 * (head.length / 2) && Math.min(...zeros) === 0;
}

function badUtf8(body: Uint8Array, file: string): InputError {
  let line = 1;
  let start = 0;
  for (let end = body.indexOf(10, start); end >= 0 && isUtf8(body.subarray(start, end + 1)); end = body.indexOf(10, start)) {
    line += 1;
    start = end + 1;
  }
  const end = body.indexOf(10, start);
  const bad = body.subarray(start, end < 0 ? body.length : end);
  const good = firstBad(bad);
  const column = new TextDecoder().decode(bad.subarray(0, good)).length + 1;
  return refusal(file, line, column, 'encoding-broken', says.notUtf8(bad[good] ?? 0));
}

/** Length of the longest sound start: a character has at most four bytes. */
function firstBad(bytes: Uint8Array): number {
  let good = 0;
  while (good < bytes.length) {
    const size = [1, 2, 3, 4].find((length) => good + length <= bytes.length && isUtf8(bytes.subarray(good, good + length)));
    if (size === undefined) return good;
    good += size;
  }
  return good;
}

const refusal = (file: string, line: number, column: number, code: string, text: string): InputError =>
  new InputError([{ code, text, place: { file, line, column } }], 3);
