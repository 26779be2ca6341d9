// @ts-check
/**
 * Makes the two typefaces of the look from the packages that carry them: Latin letters, the figures and signs
 * the pages use, the weights the type scale uses, and the features that put figures in columns and fractions
 * on the line. Run `node shared/build/subset-fonts.mjs` after changing what is below; the files are committed.
 */
import { mkdir, readFile, writeFile } from 'node:fs/promises';
import { createRequire } from 'node:module';
import subsetFont from 'subset-font';

const require = createRequire(import.meta.url);
const target = new URL('../look/fonts/', import.meta.url);

/** @param {number} from @param {number} to */
const range = (from, to) =>
  Array.from({ length: to - from + 1 }, (_, step) => String.fromCodePoint(from + step)).join('');

/** ASCII, Latin-1, the joined letters of French, and the punctuation that careful text needs. */
const characters = `${range(0x20, 0x7e)}${range(0xa0, 0xff)}ŒœŸıˆ˚˜–—‘’‚“”„•…′″⁄€−\u2009\u202f\u2011`;

/**
 * kern: even setting. lnum, tnum: lining and tabular figures. frac: fractions. Cormorant joins Th and fi as well;
 * in Inter ligatures only make arrows and signs that nobody types here. Every letter comes ready composed, so
 * that the features that place accents can go: together the files must stay under 50 KB.
 */
const setting = ['kern', 'lnum', 'tnum', 'frac'];

const faces = [
  {
    source: '@fontsource-variable/inter/files/inter-latin-wght-normal.woff2',
    file: 'inter.woff2',
    weights: { min: 400, max: 600 },
    features: [...setting, 'ccmp', 'numr', 'dnom'],
  },
  {
    source: '@fontsource-variable/cormorant-garamond/files/cormorant-garamond-latin-wght-normal.woff2',
    file: 'cormorant-garamond.woff2',
    weights: { min: 500, max: 600 },
    features: [...setting, 'liga'],
  },
];

await mkdir(target, { recursive: true });
for (const { source, file, weights, features } of faces) {
  const made = await subsetFont(await readFile(require.resolve(source)), characters, {
    targetFormat: 'woff2',
    variationAxes: { wght: weights },
    keepFeatures: features,
    noHinting: true,
  });
  await writeFile(new URL(file, target), made);
  console.log(`${file} ${(made.length / 1024).toFixed(1)} KB`);
}
