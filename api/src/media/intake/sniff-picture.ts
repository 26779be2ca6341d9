import { open } from 'node:fs/promises';
import { Refusal } from '../../common/refusal';

/** The kinds of file that are taken, by what is in them: names and declared types are hearsay. */
export const pictureTypes = {
  jpeg: { mediaType: 'image/jpeg', extension: 'jpg' },
  png: { mediaType: 'image/png', extension: 'png' },
  webp: { mediaType: 'image/webp', extension: 'webp' },
  tiff: { mediaType: 'image/tiff', extension: 'tif' },
} as const;
export type PictureType = keyof typeof pictureTypes;

/** Enough for every signature below, and for a byte-order mark and white space before markup. */
const headBytes = 512;

const wanted = 'Send a JPEG, PNG, WebP or TIFF picture.';

/**
 * Tells a picture's type by its first bytes.
 * @throws Refusal 415 `image.type` with a sentence that names what came, where that is known
 */
export function sniffPicture(head: Buffer): PictureType {
  if (head.length === 0) throw new Refusal(415, 'image.type', `The file is empty. ${wanted}`);
  if (startsWith(head, [0xff, 0xd8, 0xff])) return 'jpeg';
  if (startsWith(head, [0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a])) return 'png';
  const text = head.toString('latin1');
  if (text.startsWith('RIFF') && text.slice(8, 12) === 'WEBP') return 'webp';
  if (text.startsWith('II*\0') || text.startsWith('MM\0*')) return tiffOrRaw(text);
  throw new Refusal(415, 'image.type', `${whatCame(head, text)} ${wanted}`);
}

export async function sniffPictureFile(path: string): Promise<PictureType> {
  const file = await open(path, 'r');
  try {
    const { buffer, bytesRead } = await file.read(Buffer.alloc(headBytes), 0, headBytes, 0);
    return sniffPicture(buffer.subarray(0, bytesRead));
  } finally {
    await file.close();
  }
}

function startsWith(head: Buffer, signature: readonly number[]): boolean {
  return head.length >= signature.length && signature.every((byte, at) => head[at] === byte);
}

/** Some cameras' raw files are TIFF in their first bytes; what they would decode to is a thumbnail. */
function tiffOrRaw(text: string): 'tiff' {
  if (text.slice(8, 10) !== 'CR') return 'tiff';
  throw new Refusal(415, 'image.type', `This is a camera’s raw file. ${wanted}`);
}

function whatCame(head: Buffer, text: string): string {
  if (text.startsWith('GIF8')) return 'GIF pictures are not taken: they may move, and have few colours.';
  if (text.startsWith('%PDF')) return 'This is a PDF, not a picture.';
  if (text.slice(4, 8) === 'ftyp') return 'HEIC and AVIF originals are not taken.';
  const markup = head
    .toString('utf8')
    .replace(/^\uFEFF/, '')
    .trimStart();
  if (markup.startsWith('<')) return 'This is a drawing or page in markup (SVG, HTML), not a picture.';
  return 'This is not a picture of a kind that is taken.';
}
