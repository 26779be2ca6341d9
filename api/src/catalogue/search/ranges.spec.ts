import { mm } from '@ellwand/shared/units/length';
import { indexedGarment, query } from '../../../test/catalogue/indexed-garments';
import { CatalogueIndex } from './catalogue-index';
import { binned, mostBins } from './ranges';
import { searchIndex } from './search-index';

const entries = (...values: number[]) => values.map((value, place) => ({ place, value: mm(value) }));

describe('the bins of a range', () => {
  it('are of one round width and hold their lower end, not their upper', () => {
    const bins = binned(entries(560, 579, 580, 1000));
    expect(bins[0]).toEqual({ fromMm: '560', toMm: '580', count: 2 });
    expect(bins[1]).toEqual({ fromMm: '580', toMm: '600', count: 1 });
    expect(bins.at(-1)).toEqual({ fromMm: '1000', toMm: '1020', count: 1 });
    expect(bins).toHaveLength(23);
  });

  it('are never more than twenty-four, whatever the spread', () => {
    for (const most of [1, 23, 24, 25, 47, 48, 119, 120, 240, 999, 5_000, 123_456]) {
      const bins = binned(entries(0, most));
      expect(bins.length).toBeLessThanOrEqual(mostBins);
      expect(bins.length).toBeGreaterThan(most < 24 ? most : 9);
    }
  });

  it('count a garment once, though two of its values lie in one bin', () => {
    const bins = binned([
      { place: 7, value: mm(600) },
      { place: 7, value: mm(600) },
      { place: 7, value: mm(601) },
    ]);
    expect(bins.map(({ count }) => count)).toEqual([1, 1]);
  });

  it('are none where there is no value', () => expect(binned([])).toEqual([]));
});

describe('ranges of an answer', () => {
  const index = new CatalogueIndex();
  index.put(
    indexedGarment({
      measurements: [
        ['waist', 600],
        ['hem', 2700],
      ],
      facets: { kind: ['dress'] },
    }),
  );
  index.put(indexedGarment({ measurements: [['waist', 700]], facets: { kind: ['dress'] } }));
  index.put(indexedGarment({ measurements: [], facets: { kind: ['hat'] } }));

  it('leave their own filter out of account, and say how many garments lack the measurement', () => {
    const [waist] = searchIndex(index, query({ measure: 'waist:..650' })).ranges;
    expect(waist).toMatchObject({ point: 'waist', label: 'Waist', minMm: null, maxMm: '650', missing: 1 });
    expect(waist?.bins.reduce((sum, { count }) => sum + count, 0)).toBe(2);
  });

  it('follow all other filters', () => {
    const [waist] = searchIndex(index, query({ measure: 'waist:..650', kind: 'hat' })).ranges;
    expect(waist).toMatchObject({ missing: 1, bins: [] });
  });

  it('offer what was not asked for, only where it was measured', () => {
    expect(searchIndex(index, query()).ranges.map(({ point }) => point)).toEqual(['waist', 'hem']);
  });
});
