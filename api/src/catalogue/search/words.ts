/** More words than this in one search are left unread. */
const mostWords = 12;

/** Without accents and capitals: Crêpe and crepe are one word. */
export function fold(text: string): string {
  return text
    .normalize('NFD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replaceAll('œ', 'oe')
    .replaceAll('æ', 'ae');
}

/** English plurals of nouns, roughly: bodices, dresses, ladies. What it cuts off is cut off on both sides alike. */
export function singular(word: string): string {
  if (word.length > 4 && word.endsWith('ies')) return `${word.slice(0, -3)}y`;
  if (word.length > 4 && /(?:ss|sh|ch|x|z)es$/.test(word)) return word.slice(0, -2);
  if (word.length > 3 && word.endsWith('s') && !/(?:ss|us|is)$/.test(word)) return word.slice(0, -1);
  return word;
}

function plainWords(text: string): string[] {
  return fold(text).match(/[\p{L}\p{N}]+/gu) ?? [];
}

/** The words a text is found by: as written and in the singular, each once. */
export function wordsOf(text: string): Set<string> {
  return new Set(plainWords(text).flatMap((word) => [word, singular(word)]));
}

/** The words of a search, in the singular. */
export function wordsSought(text: string): string[] {
  return [...new Set(plainWords(text).map(singular))].slice(0, mostWords);
}
