/** Size and number of a ZIP archive's parts once unpacked, as its directory states them; undefined where it is no ZIP archive. APPNOTE 6.3.10, sections 4.3.12 and 4.3.16. */
export function zipSizes(bytes: Buffer): { readonly parts: number; readonly unpacked: number } | undefined {
  if (bytes.length < 22 || bytes.readUInt32LE(0) !== 0x04034b50) return undefined;
  const end = endOfDirectory(bytes);
  if (end < 0) return undefined;
  const parts = bytes.readUInt16LE(end + 10);
  let at = bytes.readUInt32LE(end + 16);
  let unpacked = 0;
  for (let k = 0; k < parts; k++) {
    if (at + 46 > bytes.length || bytes.readUInt32LE(at) !== 0x02014b50) return undefined;
    const size = bytes.readUInt32LE(at + 24);
    unpacked += size === 0xffffffff ? Infinity : size;
    at += 46 + bytes.readUInt16LE(at + 28) + bytes.readUInt16LE(at + 30) + bytes.readUInt16LE(at + 32);
  }
  return { parts, unpacked };
}

/** The record stands within the last 64 kB, after which only a comment may follow. */
function endOfDirectory(bytes: Buffer): number {
  const first = Math.max(0, bytes.length - 22 - 0xffff);
  for (let at = bytes.length - 22; at >= first; at--) if (bytes.readUInt32LE(at) === 0x06054b50) return at;
  return -1;
}
