import { readFile, stat } from 'node:fs/promises';
import { describe, expect, it } from 'vitest';
import { featureTags } from './testing/font-features.js';

/** Inter draws lining figures from the start, so that it has no `lnum` to keep. */
const wanted: Readonly<Record<string, readonly string[]>> = {
  'inter.woff2': ['tnum', 'frac'],
  'cormorant-garamond.woff2': ['tnum', 'lnum', 'frac'],
};
const fonts = Object.keys(wanted);
const path = (file: string) => new URL(`./fonts/${file}`, import.meta.url);

describe('the subset typefaces', () => {
  it.each(fonts)('%s keeps tabular and lining figures and fractions', async (file) => {
    const tags = featureTags(await readFile(path(file)), 'GSUB');
    expect(tags).toEqual(expect.arrayContaining([...(wanted[file] ?? [])]));
  });

  it.each(fonts)('%s keeps its kerning', async (file) => {
    expect(featureTags(await readFile(path(file)), 'GPOS')).toContain('kern');
  });

  it('weigh at most 50 KB in all, since both files are preloaded', async () => {
    const sizes = await Promise.all(fonts.map(async (file) => (await stat(path(file))).size));
    expect(sizes.reduce((sum, size) => sum + size, 0)).toBeLessThanOrEqual(50 * 1024);
  });
});
