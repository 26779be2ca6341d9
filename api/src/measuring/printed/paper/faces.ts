import { readFile } from 'node:fs/promises';

/** The weights that a printed sheet is set in; the title has a typeface of its own. */
export type Weight = 'sans' | 'sans-semibold' | 'title';

const alphabets = ['latin', 'latin-ext', 'greek', 'cyrillic'] as const;
type Alphabet = (typeof alphabets)[number];

/** The name by which a page knows a typeface. */
export type Face = `${Exclude<Weight, 'title'>}-${Alphabet}` | 'title';

export const faces: readonly Face[] = [
  ...alphabets.flatMap((alphabet): Face[] => [`sans-${alphabet}`, `sans-semibold-${alphabet}`]),
  'title',
];

let read: Promise<ReadonlyMap<Face, Buffer>> | undefined;

/** The typefaces' files, read once in a process. They are embedded, so that a sheet prints alike everywhere. */
export function readFaces(): Promise<ReadonlyMap<Face, Buffer>> {
  read ??= Promise.all(faces.map(async (face) => [face, await readFile(fileOf(face))] as const)).then(
    (pairs) => new Map(pairs),
  );
  return read;
}

const fileOf = (face: Face): string => require.resolve(`@ellwand/shared/look/fonts/print/${face}.ttf`);

/** A stretch of text that one typeface can set. */
export interface Run {
  readonly face: Face;
  readonly text: string;
}

/** Which file holds a sign; undefined where none does. */
function alphabetOf(sign: string): Alphabet | undefined {
  if (/[\u0020-\u007e\u00a0-\u00ffŒœŸıˆ˚˜–—‘’‚“”„•…′″⁄€−\u2009\u202f\u2011\u2150-\u215f√≈≤≥→]/u.test(sign))
    return 'latin';
  if (/[\u0100-\u024f\u1e00-\u1eff]/u.test(sign)) return 'latin-ext';
  if (/[\u0370-\u03ff]/u.test(sign)) return 'greek';
  if (/[\u0400-\u045f\u0490\u0491]/u.test(sign)) return 'cyrillic';
  return undefined;
}

/** A line's end is set as a space, and an accent with its letter. */
export const inOneLine = (text: string): string => text.normalize('NFC').replace(/\s/gu, ' ');

/**
 * Text in stretches of one typeface each. A sign that no typeface has is written as its number, "[U+65E5]", so that
 * nothing is lost on paper.
 */
export function runsOf(text: string, weight: Weight): readonly Run[] {
  const runs: Run[] = [];
  for (const sign of inOneLine(text)) {
    const alphabet = alphabetOf(sign);
    const set = alphabet === undefined ? `[U+${codeOf(sign)}]` : sign;
    const face = faceOf(weight, alphabet ?? 'latin');
    const last = runs.at(-1);
    // A space goes with what stands before it: one run less.
    if (last && (last.face === face || sign === ' '))
      runs[runs.length - 1] = { ...last, text: last.text + set };
    else runs.push({ face, text: set });
  }
  return runs;
}

const codeOf = (sign: string) => (sign.codePointAt(0) ?? 0).toString(16).toUpperCase().padStart(4, '0');

function faceOf(weight: Weight, alphabet: Alphabet): Face {
  if (weight !== 'title') return `${weight}-${alphabet}`;
  return alphabet === 'latin' ? 'title' : `sans-semibold-${alphabet}`;
}
