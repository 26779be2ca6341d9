import { fold, wordsOf, wordsSought } from './words';

describe('words that garments are found by', () => {
  it.each([
    ['Crêpe de Chine', ['crepe', 'de', 'chine']],
    ['Dresses', ['dress']],
    ['ladies’ bodices', ['lady', 'bodice']],
    ['sashes, boxes', ['sash', 'box']],
    ['a canvas corset', ['a', 'canva', 'corset']],
    ['glass and moss', ['glass', 'and', 'moss']],
    ['LH.1966.30', ['lh', '1966', '30']],
    ['… — !', []],
  ])('%j is sought as %j', (text, words) => expect(wordsSought(text)).toEqual(words));

  it('keeps a word as written beside its singular, so that the beginning of either finds it', () => {
    expect([...wordsOf('Ladies')]).toEqual(['ladies', 'lady']);
  });

  it('finds the same for every word with and without its plural, accents and capitals', () => {
    for (const [one, other] of [
      ['canvas', 'Canvas'],
      ['dress', 'DRESSES'],
      ['crêpe', 'crepes'],
      ['lady', 'ladies'],
    ] as const) {
      expect(wordsSought(one)).toEqual(wordsSought(other));
      for (const word of wordsSought(one))
        expect([...wordsOf(other)].some((held) => held.startsWith(word))).toBe(true);
    }
  });

  it('reads no more than twelve words, however long the text', () => {
    expect(wordsSought(Array.from({ length: 500 }, (_, n) => `word${n}`).join(' '))).toHaveLength(12);
  });

  it('writes ligatures out', () => expect(fold('Œillet')).toBe('oeillet'));
});
