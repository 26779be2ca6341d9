import { wordsOf } from './words';

/** Which garments (by their place in the index) hold which words; found by the beginning of a word. */
export class WordIndex {
  private readonly holders = new Map<string, Set<number>>();
  private sorted: string[] = [];
  private grown = false;

  add(place: number, text: string): void {
    for (const word of wordsOf(text)) {
      const known = this.holders.get(word);
      if (known) known.add(place);
      else {
        this.holders.set(word, new Set([place]));
        this.sorted.push(word);
        this.grown = true;
      }
    }
  }

  /** A word that nobody holds any more stays in the list: it finds nothing. */
  remove(place: number, text: string): void {
    for (const word of wordsOf(text)) this.holders.get(word)?.delete(place);
  }

  /** Calls back with each garment that holds the word or one that begins so; `whole` tells which it was. */
  find(beginning: string, found: (place: number, whole: boolean) => void): void {
    const words = this.inOrder();
    for (let at = firstFrom(words, beginning); at < words.length; at++) {
      const word = words[at] ?? '';
      if (!word.startsWith(beginning)) return;
      for (const place of this.holders.get(word) ?? []) found(place, word === beginning);
    }
  }

  private inOrder(): readonly string[] {
    if (this.grown) this.sorted.sort((a, b) => (a < b ? -1 : 1));
    this.grown = false;
    return this.sorted;
  }
}

/** Where the first word stands that does not come before `beginning`. */
function firstFrom(words: readonly string[], beginning: string): number {
  let low = 0;
  let high = words.length;
  while (low < high) {
    const middle = (low + high) >>> 1;
    if ((words[middle] ?? '') < beginning) low = middle + 1;
    else high = middle;
  }
  return low;
}
