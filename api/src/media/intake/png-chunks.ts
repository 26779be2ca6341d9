import type { FileHandle } from 'node:fs/promises';
import { inflateSync } from 'node:zlib';

/** W3C PNG (third edition), 5.2: signature, then chunks of length, type, data, CRC. */
const signatureBytes = 8;
const besideData = 12;
/** Longest chunk the standard allows, 5.3. */
const longestChunk = 2 ** 31 - 1;
/** A profile of a real device is far smaller; a compressed one may swell without end. */
const longestProfile = 4 * 1024 * 1024;
const copyBytes = 1024 * 1024;
/** A file of nothing but tiny chunks would keep the reader busy. */
const mostChunks = 100_000;

/** What decoding needs. Everything else (texts, times, thumbnails, private chunks) is left out. */
const kept: ReadonlySet<string> = new Set([
  'IHDR',
  'PLTE',
  'IDAT',
  'IEND',
  'tRNS',
  'gAMA',
  'cHRM',
  'sRGB',
  'sBIT',
  'iCCP',
  'eXIf',
]);

export type PngCopy = 'still' | 'animated' | 'broken';

/**
 * Copies a PNG without its ancillary chunks, but for those that say how its colours and its orientation are
 * meant. Compressed texts and profiles can swell a thousandfold; the decoder never sees them.
 */
export async function copyWithoutAncillaries(source: FileHandle, target: FileHandle): Promise<PngCopy> {
  await copyRange(source, target, 0, signatureBytes);
  let at = signatureBytes;
  for (let count = 0; count < mostChunks; count++) {
    const header = await readExactly(source, at, 8);
    if (!header) return 'broken';
    const length = header.readUInt32BE(0);
    const type = header.toString('latin1', 4, 8);
    if (length > longestChunk) return 'broken';
    if (type === 'acTL' || type === 'fdAT') return 'animated';
    if (kept.has(type) && (await isHarmless(source, type, at + 8, length))) {
      if (!(await copyRange(source, target, at, length + besideData))) return 'broken';
    }
    if (type === 'IEND') return 'still';
    at += length + besideData;
  }
  return 'broken';
}

async function isHarmless(source: FileHandle, type: string, at: number, length: number): Promise<boolean> {
  if (type === 'eXIf') return length <= 64 * 1024;
  if (type !== 'iCCP') return true;
  const data = length <= longestProfile ? await readExactly(source, at, length) : null;
  if (!data) return false;
  // Name (1–79 bytes), NUL, method, then the deflated profile: 11.3.2.3.
  const nameEnd = data.indexOf(0);
  if (nameEnd < 1 || nameEnd > 79) return false;
  try {
    inflateSync(data.subarray(nameEnd + 2), { maxOutputLength: longestProfile });
    return true;
  } catch {
    return false;
  }
}

async function readExactly(source: FileHandle, at: number, length: number): Promise<Buffer | null> {
  const { buffer, bytesRead } = await source.read(Buffer.alloc(length), 0, length, at);
  return bytesRead === length ? buffer : null;
}

/** @returns false where the source ends before the range does */
async function copyRange(
  source: FileHandle,
  target: FileHandle,
  from: number,
  length: number,
): Promise<boolean> {
  for (let done = 0; done < length;) {
    const piece = await readExactly(source, from + done, Math.min(copyBytes, length - done));
    if (!piece) return false;
    await target.write(piece);
    done += piece.length;
  }
  return true;
}
