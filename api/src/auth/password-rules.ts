import { Refusal } from '../common/refusal';
import { commonWords, placeWords, runs } from './common-passwords';

/** Whose password it is to be: their own name and address are guessed first. */
export interface PasswordOwner {
  readonly name: string;
  readonly email: string;
}

/** Of a password as little as this must be left once everything common is taken out of it. */
const ownLettersNeeded = 6;
const differentLettersNeeded = 5;
/** A run along the keyboard counts as one from here; shorter ones occur in words. */
const shortestRun = 4;

const lookalikes: Readonly<Record<string, string>> = {
  '@': 'a',
  '4': 'a',
  '3': 'e',
  '1': 'i',
  '!': 'i',
  '0': 'o',
  $: 's',
  '5': 's',
  '7': 't',
};

/**
 * Whether a password of the right length is one that others would think of.
 * @returns a sentence for its owner; undefined where there is nothing against it
 */
export function againstPassword(password: string, owner: PasswordOwner): string | undefined {
  if (new Set(password.toLowerCase()).size < differentLettersNeeded) {
    return 'Too few different characters. Three or four words that do not belong together are easy to keep.';
  }
  if (ownLetters(password, owner) < ownLettersNeeded) {
    return 'Easily guessed: it is made of common words, of a run of keys, or of your own or the museum’s name.';
  }
  return undefined;
}

/** @throws Refusal 422 `password.common` that points at the field */
export function refuseCommonPassword(password: string, owner: PasswordOwner): void {
  const detail = againstPassword(password, owner);
  if (detail) {
    throw new Refusal(422, 'password.common', 'Choose another password.', {}, [
      { pointer: '/password', detail },
    ]);
  }
}

/** How many letters are left without runs, common words, the place's and the person's own. */
function ownLetters(password: string, { name, email }: PasswordOwner): number {
  const plain = withoutRuns(password.toLowerCase());
  const theirs = `${name} ${email}`.toLowerCase().split(/[^\p{L}\p{N}]+/u);
  const words = [...commonWords, ...placeWords, ...theirs.map(fold)].filter((word) => word.length > 1);
  const longestFirst = [...new Set(words)].sort((a, b) => b.length - a.length);
  const left = longestFirst.reduce((text, word) => text.replaceAll(word, ' '), fold(plain));
  return left.replaceAll(/[^\p{L}]/gu, '').length;
}

const fold = (text: string) => [...text].map((letter) => lookalikes[letter] ?? letter).join('');

function withoutRuns(text: string): string {
  const both = runs.flatMap((run) => [run, [...run].reverse().join('')]);
  const pieces = both.flatMap((run) =>
    Array.from({ length: run.length - shortestRun + 1 }, (_, start) => run.slice(start, start + shortestRun)),
  );
  return pieces.reduce((rest, piece) => rest.replaceAll(piece, ' '), text);
}
