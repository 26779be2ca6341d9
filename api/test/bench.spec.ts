import { SearchQuery } from '@ellwand/shared/records/search-query';
import { percentile } from '../bench/percentile';
import { variedQueries } from '../bench/varied-queries';
import { CatalogueIndex } from '../src/catalogue/search/catalogue-index';
import { searchIndex } from '../src/catalogue/search/search-index';
import { indexedGarment, query } from './catalogue/indexed-garments';

describe('what the bench measures with', () => {
  it('takes percentiles by nearest rank, whatever the order', () => {
    const times = Array.from({ length: 100 }, (_, n) => 100 - n);
    expect([0.5, 0.95, 0.99, 1].map((share) => percentile(times, share))).toEqual([50, 95, 99, 100]);
    expect(percentile([7], 0.5)).toBe(7);
    expect(percentile([], 0.5)).toBeNaN();
  });

  it('asks searches that the catalogue understands, of every kind', () => {
    const index = new CatalogueIndex();
    index.put(
      indexedGarment({ facets: { kind: ['dress'], colour: ['teal'] }, measurements: [['waist', 612]] }),
    );
    const searches = variedQueries(searchIndex(index, query()));
    for (const search of searches) {
      const params = new URLSearchParams(search);
      const read = SearchQuery.parse(
        Object.fromEntries([...params.keys()].map((key) => [key, params.get(key)])),
      );
      expect(searchIndex(index, read).total).toBe(1);
    }
    for (const kind of ['kind=', 'colour=', 'measure=', 'q=', 'sort='])
      expect(searches.join(' ')).toContain(kind);
  });
});
