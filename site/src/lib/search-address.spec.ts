import { SearchQuery } from '@ellwand/shared/records/search-query';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { changed, emptySearch, isNarrowed, readSearch, searchParams, sortLabels } from './search-address';

const word = fc.string({ minLength: 1, maxLength: 30 }).filter((text) => text.trim() === text && text !== '');
const words = fc.array(word, { maxLength: 4 });
const bound = fc.integer({ min: 0, max: 5000 }).map(String);
const measure = fc
  .record({
    point: fc.constantFrom('waist', 'hem', 'inner-waist-band'),
    min: bound,
    max: bound,
    open: fc.nat(2),
  })
  .map(({ point, min, max, open }) => ({
    point,
    minMm: open === 1 ? null : min,
    maxMm: open === 2 ? null : max,
  }));
const year = fc.option(fc.integer({ min: 1000, max: 2100 }), { nil: undefined });
const query = fc
  .record({
    q: fc.oneof(word, fc.constant('')),
    kind: words,
    decade: words,
    maker: words,
    place: words,
    material: words,
    colour: words,
    measure: fc.array(measure, { maxLength: 3 }),
    from: year,
    to: year,
    sort: fc.constantFrom(...(Object.keys(sortLabels) as SearchQuery['sort'][])),
    page: fc.integer({ min: 1, max: 500 }),
    size: fc.integer({ min: 1, max: 100 }),
  })
  .map(({ from, to, ...rest }): SearchQuery => ({
    ...rest,
    ...(from === undefined ? {} : { from }),
    ...(to === undefined ? {} : { to }),
  }));

function plain(params: URLSearchParams): Record<string, string | string[]> {
  return Object.fromEntries(
    [...new Set(params.keys())].map((key) => {
      const values = params.getAll(key);
      return [key, values.length === 1 ? (values[0] ?? '') : values];
    }),
  );
}

describe('the address of a search', () => {
  it('is its own canonical form: reading and writing it changes nothing more', () => {
    fc.assert(
      fc.property(query, (search) => {
        const once = searchParams(search).toString();
        expect(searchParams(readSearch(new URLSearchParams(once))).toString()).toBe(once);
      }),
    );
  });

  it('does not depend on the order in which filters were chosen', () => {
    fc.assert(
      fc.property(query, (search) => {
        const turned = {
          ...search,
          kind: [...search.kind].reverse(),
          measure: [...search.measure].reverse(),
        };
        expect(searchParams(turned).toString()).toBe(searchParams(search).toString());
      }),
    );
  });

  it('says to the catalogue’s own schema exactly what is read here', () => {
    fc.assert(
      fc.property(query, (search) => {
        const params = searchParams(search);
        expect(SearchQuery.parse(plain(params))).toEqual(readSearch(params));
      }),
    );
  });

  it('sorts its keys', () => {
    fc.assert(
      fc.property(query, (search) => {
        const keys = [...searchParams(search).keys()];
        expect(keys).toEqual([...keys].sort());
      }),
    );
  });

  it('is empty for the search for everything', () => {
    expect(searchParams(emptySearch).toString()).toBe('');
    expect(readSearch(new URLSearchParams('q=&kind=&page=1&size=24&sort=relevance'))).toEqual(emptySearch);
  });

  it.each(['page=0', 'page=two', 'size=900', 'sort=price', 'measure=waist', 'measure=waist:..', 'from=-4'])(
    'leaves out what is not understood: %s',
    (text) => {
      expect(searchParams(readSearch(new URLSearchParams(text))).toString()).toBe('');
    },
  );

  it('goes back to the first page when a filter changes', () => {
    expect(changed({ ...emptySearch, page: 4 }, { kind: ['dress'] })).toMatchObject({
      page: 1,
      kind: ['dress'],
    });
    expect(changed(emptySearch, { page: 4 }).page).toBe(4);
  });

  it('tells a narrowed search from one that is only ordered or paged', () => {
    expect(isNarrowed({ ...emptySearch, sort: 'date', page: 3 })).toBe(false);
    expect(isNarrowed({ ...emptySearch, from: 1850 })).toBe(true);
  });
});
