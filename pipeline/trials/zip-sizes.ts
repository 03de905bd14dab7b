import { inflateRawSync } from 'node:zlib';

export interface ZipSizes {
  readonly parts: number;
  /** Bytes once unpacked; more than `most` where there are more than that. */
  readonly unpacked: number;
}

/**
 * Number of a ZIP archive's parts and their size once unpacked; undefined where it is no ZIP archive or a broken one. The directory's word is taken where it
 * says too much; where it does not, every part is unpacked up to `most`, since a directory may lie. APPNOTE 6.3.10, sections 4.3.7, 4.3.12 and 4.3.16.
 */
export function zipSizes(bytes: Buffer, most: { readonly parts: number; readonly unpacked: number }): ZipSizes | undefined {
  if (bytes.length < 22 || bytes.readUInt32LE(0) !== 0x04034b50) return undefined;
  const listed = directory(bytes);
  if (listed === undefined) return undefined;
  const stated = listed.reduce((sum, { size }) => sum + size, 0);
  if (listed.length > most.parts || stated > most.unpacked) return { parts: listed.length, unpacked: stated };
  let unpacked = 0;
  for (const part of listed) {
    const size = unpackedSize(bytes, part, most.unpacked - unpacked);
    if (size === undefined) return undefined;
    unpacked += size;
    if (unpacked > most.unpacked) break;
  }
  return { parts: listed.length, unpacked };
}

interface Part {
  /** As the directory states it. */
  readonly size: number;
  readonly packed: number;
  readonly at: number;
}

function directory(bytes: Buffer): readonly Part[] | undefined {
  const end = endOfDirectory(bytes);
  if (end < 0) return undefined;
  const parts: Part[] = [];
  let at = bytes.readUInt32LE(end + 16);
  for (let k = bytes.readUInt16LE(end + 10); k > 0; k--) {
    if (at + 46 > bytes.length || bytes.readUInt32LE(at) !== 0x02014b50) return undefined;
    const size = bytes.readUInt32LE(at + 24);
    parts.push({ size: size === 0xffffffff ? Infinity : size, packed: bytes.readUInt32LE(at + 20), at: bytes.readUInt32LE(at + 42) });
    at += 46 + bytes.readUInt16LE(at + 28) + bytes.readUInt16LE(at + 30) + bytes.readUInt16LE(at + 32);
  }
  return parts;
}

/** What a part really unpacks to; `most` + 1 where it is more; undefined where it does not unpack. */
function unpackedSize(bytes: Buffer, { at, packed }: Part, most: number): number | undefined {
  if (at + 30 > bytes.length || bytes.readUInt32LE(at) !== 0x04034b50) return undefined;
  const start = at + 30 + bytes.readUInt16LE(at + 26) + bytes.readUInt16LE(at + 28);
  if (bytes.readUInt16LE(at + 8) === 0) return packed;
  try {
    return inflateRawSync(bytes.subarray(start), { maxOutputLength: Math.max(most, 1) }).length;
  } catch (error) {
    return error instanceof Error && 'code' in error && error.code === 'ERR_BUFFER_TOO_LARGE' ? most + 1 : undefined;
  }
}

/** The record stands within the last 64 kB, after which only a comment may follow. */
function endOfDirectory(bytes: Buffer): number {
  const first = Math.max(0, bytes.length - 22 - 0xffff);
  for (let at = bytes.length - 22; at >= first; at--) if (bytes.readUInt32LE(at) === 0x06054b50) return at;
  return -1;
}
