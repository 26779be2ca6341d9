import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatMeasure, parseMeasure } from './measure-filter.js';
import { SearchQuery } from './search-query.js';

describe('a measure in an address', () => {
  it.each([
    ['waist:560..620', { point: 'waist', minMm: '560', maxMm: '620' }],
    ['hem:..1800', { point: 'hem', minMm: null, maxMm: '1800' }],
    ['neck-to-hem-back:920.75..', { point: 'neck-to-hem-back', minMm: '920.75', maxMm: null }],
  ])('%s is read', (text, filter) => {
    expect(parseMeasure(text)).toEqual(filter);
  });

  it.each(['waist', 'waist:..', 'waist:560', 'waist:a..b', 'Waist:1..2', 'waist:1..2;', 'waist:-1..2'])(
    '%s is not',
    (text) => {
      expect(parseMeasure(text)).toBeNull();
    },
  );

  it('is read as it was written', () => {
    const bound = fc.option(fc.integer({ min: 0, max: 999_999 }).map(String));
    fc.assert(
      fc.property(bound, bound, (minMm, maxMm) => {
        const filter = { point: 'waist', minMm, maxMm };
        expect(parseMeasure(formatMeasure(filter))).toEqual(minMm === null && maxMm === null ? null : filter);
      }),
    );
  });
});

describe('a search', () => {
  it('takes one value or several, and says what was wanted of a measure', () => {
    expect(SearchQuery.parse({ kind: 'dress', colour: ['teal', 'cream'] })).toMatchObject({
      kind: ['dress'],
      colour: ['teal', 'cream'],
      page: 1,
      sort: 'relevance',
    });
    const wrong = SearchQuery.safeParse({ measure: 'waist=560' });
    expect(wrong.error?.issues[0]?.message).toBe(
      'Expected a measure such as waist:560..620, got "waist=560"',
    );
  });

  it('asks for no more than a hundred at once', () => {
    expect(SearchQuery.safeParse({ size: '101' }).success).toBe(false);
    expect(SearchQuery.safeParse({ page: '0' }).success).toBe(false);
  });
});
