import { brotliDecompressSync } from 'node:zlib';

/**
 * The four-letter feature tags of one layout table of a WOFF2 font ("GSUB" or "GPOS"); none when the table is
 * absent. Layout tables are stored unchanged inside the one Brotli stream, in the directory's order.
 * Offsets after W3C WOFF 2.0 sections 4 and 5 and the OpenType specification's common table formats.
 */
export function featureTags(woff2: Buffer, layoutTable: 'GSUB' | 'GPOS'): string[] {
  const { tables, end } = directory(woff2);
  const streamLength = woff2.readUInt32BE(20);
  const stream = brotliDecompressSync(woff2.subarray(end, end + streamLength));
  const wanted = tables.findIndex(({ tag }) => tag === layoutTable);
  if (wanted < 0) return [];
  const start = tables.slice(0, wanted).reduce((sum, { length }) => sum + length, 0);
  return tagsIn(stream.subarray(start));
}

function tagsIn(table: Buffer): string[] {
  const list = table.readUInt16BE(6);
  return Array.from({ length: table.readUInt16BE(list) }, (_, index) => {
    const at = list + 2 + index * 6;
    return table.toString('latin1', at, at + 4);
  });
}

/** Known tags by their index, so far as the tables here use them (WOFF 2.0, section 5.1). */
const knownTags: Readonly<Record<number, string>> = { 10: 'glyf', 11: 'loca', 27: 'GPOS', 28: 'GSUB' };
const HEADER_BYTES = 48;

function directory(woff2: Buffer) {
  let at = HEADER_BYTES;
  const readLength = () => {
    let value = 0;
    for (let byte = 0x80; byte & 0x80;) {
      byte = woff2.readUInt8(at++);
      value = value * 128 + (byte & 0x7f);
    }
    return value;
  };
  const tables = Array.from({ length: woff2.readUInt16BE(12) }, () => {
    const flags = woff2.readUInt8(at++);
    const index = flags & 0x3f;
    const tag = index === 0x3f ? woff2.toString('latin1', at, (at += 4)) : (knownTags[index] ?? `#${index}`);
    const plainLength = readLength();
    // glyf and loca are transformed unless their version is 3; any other table only when it is not 0.
    const version = flags >> 6;
    const transformed = tag === 'glyf' || tag === 'loca' ? version !== 3 : version !== 0;
    return { tag, length: transformed ? readLength() : plainLength };
  });
  return { tables, end: at };
}
