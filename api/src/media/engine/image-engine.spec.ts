import { mkdtemp, rm, stat, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import sharp from 'sharp';
import * as pictures from '../../../test/pictures/test-pictures';
import { pictureXmp } from '../forms/picture-xmp';
import { sniffPicture } from '../intake/sniff-picture';
import { ImageEngine } from './image-engine';

describe('the decoding process', () => {
  let folder: string;
  const engine = new ImageEngine();
  beforeEach(async () => {
    folder = await mkdtemp(join(tmpdir(), 'ellwand-engine-'));
  });
  afterEach(() => rm(folder, { recursive: true, force: true }));

  const master = () => join(folder, 'master.tif');

  async function inspect(picture: Buffer) {
    const source = join(folder, 'source');
    await writeFile(source, picture);
    return engine.use((session) =>
      session.inspect({
        source,
        type: sniffPicture(picture),
        master: master(),
        scratch: join(folder, 'scratch'),
      }),
    );
  }

  const refusal = (says: string): unknown =>
    expect.objectContaining({ status: 422, code: 'image.refused', message: expect.stringContaining(says) });

  it('turns a picture upright by its EXIF, and says its upright size', async () => {
    // Stored lying, 800 × 400 with its left half white: turned clockwise, the top half is white.
    expect(await inspect(await pictures.jpegWithGps(800, 400))).toEqual({ widthPx: 400, heightPx: 800 });
    const { data, info } = await sharp(master()).raw().toBuffer({ resolveWithObject: true });
    expect([info.width, info.height, info.channels]).toEqual([400, 800, 3]);
    expect(data[(100 * 400 + 200) * 3 + 2]).toBeGreaterThan(250);
    expect(data[(700 * 400 + 200) * 3 + 2]).toBeLessThan(120);
  });

  it('applies an embedded profile: the same look in sRGB, not the same numbers', async () => {
    const wide = await sharp({
      create: { width: 400, height: 400, channels: 3, background: { r: 40, g: 180, b: 60 } },
    })
      .withIccProfile('p3')
      .png()
      .toBuffer();
    const [storedRed] = await sharp(wide, { ignoreIcc: true }).raw().toBuffer();
    expect(storedRed).toBeGreaterThan(60);
    await inspect(wide);
    const [r, g, b] = await sharp(master()).raw().toBuffer();
    for (const [came, meant] of [
      [r, 40],
      [g, 180],
      [b, 60],
    ] as const)
      expect(Math.abs((came ?? 0) - meant)).toBeLessThanOrEqual(3);
    expect((await sharp(master()).metadata()).icc).toBeUndefined();
  });

  it('brings grey, sixteen-bit and transparent pictures to eight-bit colour on white', async () => {
    const clear = await sharp({
      create: { width: 400, height: 400, channels: 4, background: { r: 0, g: 0, b: 0, alpha: 0 } },
    })
      .png()
      .toBuffer();
    await inspect(clear);
    expect([...(await sharp(master()).raw().toBuffer()).subarray(0, 3)]).toEqual([255, 255, 255]);
    await inspect(await pictures.plain(400, 400).toColourspace('grey16').png().toBuffer());
    const metadata = await sharp(master()).metadata();
    expect([metadata.depth, metadata.space, metadata.channels]).toEqual(['uchar', 'srgb', 3]);
  });

  it('keeps no more than 1920 pixels of width for the forms', async () => {
    expect(await inspect(await pictures.plain(3000, 1500).jpeg().toBuffer())).toEqual({
      widthPx: 3000,
      heightPx: 1500,
    });
    expect((await sharp(master()).metadata()).width).toBe(1920);
  });

  it.each([
    ['too many pixels', () => Promise.resolve(pictures.pngBomb(20_000, 20_000)), '400 megapixels'],
    ['a moving PNG', () => Promise.resolve(pictures.animatedPng()), 'moves'],
    ['a moving WebP', pictures.animatedWebp, 'moves'],
    [
      'a JPEG that breaks off',
      async () => (await pictures.honestJpeg(1200, 1200)).subarray(0, 4000),
      'not complete',
    ],
    [
      'a PNG that breaks off',
      () => Promise.resolve(pictures.pngBomb(400, 400).subarray(0, 60)),
      'not complete',
    ],
    ['less than the smallest form', () => pictures.honestJpeg(200, 400), '200 pixels wide'],
    ['an endless strip', () => pictures.honestJpeg(320, 4000), 'times as high'],
  ])('refuses %s in a plain sentence', async (_, picture, says) => {
    await expect(inspect(await picture())).rejects.toEqual(refusal(says));
  });

  it('opens a small picture whose texts and profile swell, without opening those', async () => {
    expect(await inspect(pictures.pngTextBomb())).toEqual({ widthPx: 400, heightPx: 400 });
  });

  it('opens a picture of just under 100 megapixels within its time and memory', async () => {
    expect(await inspect(pictures.pngBomb(9_984, 9_984))).toEqual({ widthPx: 9_984, heightPx: 9_984 });
  });

  it('ends a process that wants more memory than it may have, and lives on', async () => {
    // All coefficients of a progressive picture are held at once: 99 megapixels × 3 channels × 2 bytes.
    const greedy = await pictures
      .plain(9_950, 9_950)
      .jpeg({ progressive: true, chromaSubsampling: '4:4:4' })
      .toBuffer();
    await expect(inspect(greedy)).rejects.toEqual(refusal('Send'));
    expect(await inspect(await pictures.honestJpeg())).toEqual({ widthPx: 700, heightPx: 900 });
  }, 60_000);

  it('makes forms without the camera’s metadata, with caption and credit', async () => {
    await inspect(await pictures.jpegWithGps(800, 700));
    for (const format of ['jpg', 'avif'] as const) {
      const target = join(folder, `form.${format}`);
      const xmp = pictureXmp({ caption: 'Cuff. Rendered; invented garment.' });
      const size = await engine.use((session) =>
        session.make({ master: master(), format, widthPx: 320, target, xmp }),
      );
      expect(size).toEqual({ widthPx: 320, heightPx: Math.round((320 * 800) / 700) });
      const metadata = await sharp(target).metadata();
      expect([metadata.exif, metadata.icc, metadata.orientation]).toEqual([undefined, undefined, undefined]);
      expect(metadata.xmp?.toString()).toContain('Rendered; invented garment.');
      expect(metadata.format).toBe(format === 'jpg' ? 'jpeg' : 'heif');
      expect((await stat(target)).size).toBeGreaterThan(0);
    }
  });
});
