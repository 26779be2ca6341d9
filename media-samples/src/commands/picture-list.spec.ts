import { readFileSync, statSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import sharp from 'sharp';
import { describe, expect, it } from 'vitest';
import { garments } from '../garments/registry';
import { pictureFiles, type PictureEntry } from './picture-list';

const folder = fileURLToPath(new URL('../../pictures/', import.meta.url));
const entries = JSON.parse(readFileSync(`${folder}pictures.json`, 'utf8')) as PictureEntry[];

describe('the pictures that are kept', () => {
  it('are listed, every one, with the words their garment gives them', () => {
    const told = pictureFiles(garments).map(({ garment, picture, name }) => ({
      file: name,
      number: garment.number,
      alt: picture.alt,
      caption: picture.caption,
    }));
    expect(entries.map(({ file, number, alt, caption }) => ({ file, number, alt, caption }))).toEqual(told);
  });

  it('are 2800 px on the long side, and say in their own metadata what they are', async () => {
    for (const { file, widthPx, heightPx } of entries) {
      const { width, height, exif } = await sharp(`${folder}${file}`).metadata();
      expect([width, height], file).toEqual([widthPx, heightPx]);
      expect(Math.max(width, height), file).toBe(2800);
      expect(exif?.toString('latin1'), file).toContain('rendered; invented garment');
    }
  });

  it('give the scale their camera had', () => {
    for (const { garment, picture, name } of pictureFiles(garments)) {
      const entry = entries.find(({ file }) => file === name);
      expect(entry?.mmPerPx, garment.number).toBeCloseTo(
        (picture.shot.camera.span * 10) / (entry?.heightPx ?? 0),
        4,
      );
    }
  });

  it('weigh less than 40 MB together', () => {
    const bytes = entries.reduce((sum, { file }) => sum + statSync(`${folder}${file}`).size, 0);
    expect(bytes).toBeLessThan(40 * 1024 * 1024);
  });
});
