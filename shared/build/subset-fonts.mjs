// @ts-check
/**
 * Makes the two typefaces of the look from the packages that carry them: Latin letters, the figures and signs
 * the pages use, the weights the type scale uses, and the features that put figures in columns and fractions
 * on the line; and those of printed sheets, which are set from files with one weight each and in every alphabet
 * that the packages have. Run `node shared/build/subset-fonts.mjs` after changing what is below; the files are
 * committed.
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

/** @type {{ name: string, alphabets: (keyof typeof alphabet)[], weight: number }[]} */
const printed = [
  { name: 'sans', alphabets: ['latin', 'latin-ext', 'greek', 'cyrillic'], weight: 400 },
  { name: 'sans-semibold', alphabets: ['latin', 'latin-ext', 'greek', 'cyrillic'], weight: 600 },
];

/** Greek and Cyrillic as they are written today, and the Latin letters of the other European languages. */
const alphabet = {
  latin: `${characters}${range(0x2150, 0x215f)}√≈≤≥×÷→`,
  'latin-ext': range(0x100, 0x24f) + range(0x1e00, 0x1eff),
  greek: range(0x370, 0x3ff),
  cyrillic: range(0x400, 0x45f) + range(0x490, 0x491),
};

await mkdir(new URL('print/', target), { recursive: true });
for (const { source, file, weights, features } of faces) {
  await make(source, file, characters, {
    targetFormat: 'woff2',
    variationAxes: { wght: weights },
    keepFeatures: features,
    noHinting: true,
  });
}
for (const { name, alphabets, weight } of printed) {
  for (const letters of alphabets) {
    const source = `@fontsource-variable/inter/files/inter-${letters}-wght-normal.woff2`;
    await make(source, `print/${name}-${letters}.ttf`, alphabet[letters], {
      targetFormat: 'truetype',
      variationAxes: { wght: weight },
      keepFeatures: ['kern', 'tnum'],
      noHinting: true,
    });
  }
}
await make(
  '@fontsource-variable/cormorant-garamond/files/cormorant-garamond-latin-wght-normal.woff2',
  'print/title.ttf',
  alphabet.latin,
  {
    targetFormat: 'truetype',
    variationAxes: { wght: 600 },
    keepFeatures: ['kern', 'lnum', 'liga'],
    noHinting: true,
  },
);

/** @param {string} source @param {string} file @param {string} text @param {import('subset-font').SubsetOptions} options */
async function make(source, file, text, options) {
  const made = await subsetFont(await readFile(require.resolve(source)), text, options);
  await writeFile(new URL(file, target), made);
  console.log(`${file} ${(made.length / 1024).toFixed(1)} KB`);
}
