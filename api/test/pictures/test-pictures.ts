import { constants, crc32, deflateRawSync, deflateSync } from 'node:zlib';
import sharp from 'sharp';

/** Pictures for specs, honest and hostile, made here so that no binary lies in the repository. */

const rose = { r: 182, g: 74, b: 96 };

export const plain = (width: number, height: number) =>
  sharp({ create: { width, height, channels: 3, background: rose } });

/** A picture with a white left half, so that turning it shows. */
export function halfWhite(width: number, height: number): sharp.Sharp {
  const white = {
    create: { width: Math.floor(width / 2), height, channels: 3 as const, background: '#ffffff' },
  };
  return plain(width, height).composite([{ input: white, left: 0, top: 0 }]);
}

export const honestJpeg = (width = 700, height = 900) => halfWhite(width, height).jpeg().toBuffer();

/** EXIF as a telephone writes it: orientation 6 (turn clockwise to view), maker, and where it was taken. */
export function jpegWithGps(width: number, height: number): Promise<Buffer> {
  return halfWhite(width, height)
    .jpeg()
    .withExif({
      IFD0: { Make: 'Lark Telephone', Orientation: '6' },
      IFD3: {
        GPSLatitudeRef: 'N',
        GPSLatitude: '54/1 12/1 30/1',
        GPSLongitudeRef: 'W',
        GPSLongitude: '1/1 2/1 3/1',
      },
    })
    .withMetadata({ orientation: 6 })
    .toBuffer();
}

/** A PNG put together chunk by chunk. */
export function pngOf(chunks: readonly (readonly [type: string, data: Buffer])[]): Buffer {
  const signature = Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]);
  return Buffer.concat([signature, ...chunks.map(([type, data]) => pngChunk(type, data))]);
}

function pngChunk(type: string, data: Buffer): Buffer {
  const typed = Buffer.concat([Buffer.from(type, 'latin1'), data]);
  const length = Buffer.alloc(4);
  length.writeUInt32BE(data.length);
  const sum = Buffer.alloc(4);
  sum.writeUInt32BE(crc32(typed));
  return Buffer.concat([length, typed, sum]);
}

/** Header of an RGB picture of eight bits a channel. */
export function pngHeader(width: number, height: number): readonly [string, Buffer] {
  const data = Buffer.alloc(13);
  data.writeUInt32BE(width, 0);
  data.writeUInt32BE(height, 4);
  data.set([8, 2, 0, 0, 0], 8);
  return ['IHDR', data];
}

/** Black throughout: a few kilobytes that open into `width × height × 3` bytes. */
export function pngBomb(width: number, height: number): Buffer {
  return pngOf([pngHeader(width, height), ['IDAT', blackRows(width, height)], ['IEND', Buffer.alloc(0)]]);
}

/**
 * Deflated rows of black. A block of rows is compressed once and repeated (each ends in a full flush, so that
 * they may be joined), because all the rows of a bomb would fill the memory here first.
 */
export function blackRows(width: number, height: number): Buffer {
  const rowsInBlock = height % 64 === 0 ? 64 : height % 50 === 0 ? 50 : 1;
  const rowBytes = 1 + width * 3;
  const block = deflateRawSync(Buffer.alloc(rowBytes * rowsInBlock), {
    level: 9,
    finishFlush: constants.Z_FULL_FLUSH,
  });
  const header = Buffer.from([0x78, 0xda]);
  const lastBlock = Buffer.from([0x03, 0x00]);
  const blocks = Array.from({ length: height / rowsInBlock }, () => block);
  return Buffer.concat([header, ...blocks, lastBlock, adlerOfZeros(rowBytes * height)]);
}

/** RFC 1950: of nothing but zero bytes the first sum stays 1, so that the second counts them. */
function adlerOfZeros(count: number): Buffer {
  const sum = Buffer.alloc(4);
  sum.writeUInt16BE(count % 65_521, 0);
  sum.writeUInt16BE(1, 2);
  return sum;
}

/** A small picture with a text that opens into a gigabyte, and a colour profile that does. */
export function pngTextBomb(): Buffer {
  const swelling = deflateSync(Buffer.alloc(256 * 1024 * 1024), { level: 9 });
  const named = Buffer.concat([Buffer.from('bomb\0\0', 'latin1'), swelling]);
  return pngOf([
    pngHeader(400, 400),
    ['iCCP', named],
    ...Array.from({ length: 8 }, () => ['zTXt', named] as const),
    ['IDAT', blackRows(400, 400)],
    ['IEND', Buffer.alloc(0)],
  ]);
}

/** A still first picture and the chunks of an animation around it (APNG). */
export function animatedPng(): Buffer {
  return pngOf([
    pngHeader(400, 400),
    ['acTL', Buffer.from([0, 0, 0, 2, 0, 0, 0, 0])],
    ['IDAT', blackRows(400, 400)],
    ['IEND', Buffer.alloc(0)],
  ]);
}

export async function animatedWebp(): Promise<Buffer> {
  const frames = await Promise.all(['#112233', '#445566'].map((background) => frame(background)));
  return sharp(frames, { join: { animated: true } })
    .webp({ delay: [100, 100] })
    .toBuffer();
}

export async function animatedGif(): Promise<Buffer> {
  const frames = await Promise.all(['#112233', '#445566'].map((background) => frame(background)));
  return sharp(frames, { join: { animated: true } })
    .gif({ delay: [100, 100] })
    .toBuffer();
}

const frame = (background: string) =>
  sharp({ create: { width: 400, height: 400, channels: 3, background } })
    .png()
    .toBuffer();

export const svg = Buffer.from(
  '<?xml version="1.0"?><svg xmlns="http://www.w3.org/2000/svg" width="900" height="900"><script>alert(1)</script></svg>',
);

/** A real JPEG that is also a page: markup in a comment and after its end. */
export async function jpegAndHtml(): Promise<Buffer> {
  const jpeg = await honestJpeg(400, 400);
  const markup = Buffer.from('<!doctype html><script>alert(1)</script>');
  const comment = Buffer.concat([Buffer.from([0xff, 0xfe, 0, markup.length + 2]), markup]);
  return Buffer.concat([jpeg.subarray(0, 2), comment, jpeg.subarray(2), markup]);
}
