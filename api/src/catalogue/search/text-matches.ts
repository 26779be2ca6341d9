import { TypedFastBitSet } from 'typedfastbitset';
import type { CatalogueIndex } from './catalogue-index';
import { wordsSought } from './words';

/** What a word is worth where it is found; a beginning counts half of a whole word. */
const weights = { title: 8, text: 2 } as const;

export interface TextMatches {
  readonly garments: TypedFastBitSet;
  /** How well the garment at each place answers. */
  readonly scores: Float32Array;
}

/** Garments that hold every word of the text, or a word that begins so. A text without words finds nothing. */
export function matchText(index: CatalogueIndex, text: string): TextMatches {
  const scores = new Float32Array(index.places);
  let garments: TypedFastBitSet | null = null;
  for (const word of wordsSought(text)) {
    const holders = new TypedFastBitSet();
    const score = (weight: number) => (place: number, whole: boolean) => {
      holders.add(place);
      scores[place] = (scores[place] ?? 0) + (whole ? weight : weight / 2);
    };
    index.titles.find(word, score(weights.title));
    index.texts.find(word, score(weights.text));
    garments = garments ? garments.intersection(holders) : holders;
  }
  return { garments: garments ?? new TypedFastBitSet(), scores };
}
