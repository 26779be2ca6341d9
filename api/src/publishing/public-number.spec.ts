import fc from 'fast-check';
import { slugOf } from './public-number';

describe('a public number', () => {
  it.each([
    ['LH.1966.30', 'lh-1966-30'],
    ['T 12/1931 (a)', 't-12-1931-a'],
    ['Élégance №3', 'elegance-3'],
    ['…', 'garment'],
  ])('%s becomes %s', (own, number) => {
    expect(slugOf(own)).toBe(number);
  });

  it('is made of a-z, 0-9 and single hyphens, whatever the own number', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme', maxLength: 60 }), (own) => {
        expect(slugOf(own)).toMatch(/^[a-z0-9]+(-[a-z0-9]+)*$/);
      }),
    );
  });
});
