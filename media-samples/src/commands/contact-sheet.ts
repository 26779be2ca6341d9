import { existsSync } from 'node:fs';
import { mkdir } from 'node:fs/promises';
import sharp from 'sharp';
import type { PictureFile } from './picture-list';

const CELL = { width: 420, height: 480 };
const COLUMNS = 6;

/** Puts the pictures that are there on one sheet, to be looked at together; hands back where it is. */
export async function contactSheet(
  files: readonly PictureFile[],
  folder: string,
  cache: string,
): Promise<string> {
  const there = files
    .map(({ name }) => `${folder.replace(/\/?$/, '/')}${name}`)
    .filter((file) => existsSync(file));
  const cells = await Promise.all(
    there.map(async (file, i) => ({
      input: await sharp(file)
        .resize({ ...CELL, fit: 'contain', background: '#fff' })
        .toBuffer(),
      left: (i % COLUMNS) * CELL.width,
      top: Math.floor(i / COLUMNS) * CELL.height,
    })),
  );
  const rows = Math.max(1, Math.ceil(there.length / COLUMNS));
  await mkdir(cache, { recursive: true });
  const sheet = `${cache}contact-sheet.jpg`;
  await sharp({
    create: { width: COLUMNS * CELL.width, height: rows * CELL.height, channels: 3, background: '#fff' },
  })
    .composite(cells)
    .jpeg({ quality: 88 })
    .toFile(sheet);
  return sheet;
}
