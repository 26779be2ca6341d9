import { mm } from '@ellwand/shared/units/length';
import { indexedGarment, query } from '../../../test/catalogue/indexed-garments';
import { CatalogueIndex } from './catalogue-index';
import { type IndexedGarment, namedPoint } from './indexed-garment';
import { searchIndex } from './search-index';

function indexOf(...garments: IndexedGarment[]): CatalogueIndex {
  const index = new CatalogueIndex();
  for (const garment of garments) index.put(garment);
  return index;
}

const numbers = (index: CatalogueIndex, parts: Parameters<typeof query>[0]) =>
  searchIndex(index, query(parts)).items.map(({ number }) => number);

const teal = indexedGarment({
  number: 'lh-1',
  title: 'Teal day dress',
  years: [1885, 1886],
  facets: { kind: ['dress', 'bodice', 'skirt'], colour: ['teal'], maker: ['Aldous & Finch'] },
  measurements: [
    ['waist', 612, 'Bodice'],
    ['waistband', 640, 'Skirt'],
    ['hem', 2710, 'Skirt'],
    ['bust', 850, 'Bodice'],
  ],
  text: 'silk velvet, pleated flounces',
});
const violet = indexedGarment({
  number: 'lh-2',
  title: 'Violet dress of faille',
  years: [1872, 1874],
  facets: { kind: ['dress'], colour: ['violet'] },
  measurements: [
    ['waist', 580],
    ['inner-waist-band', 590],
  ],
  text: 'crêpe, velvet trim',
});
const coat = indexedGarment({
  number: 'lh-3',
  title: 'Tailcoat',
  years: [1825, 1830],
  facets: { kind: ['coat'], colour: ['blue'], maker: ['Aldous & Finch'] },
  measurements: [
    ['coat-waist', 830],
    ['coat-chest', 960],
  ],
  text: 'broadcloth with a velvet collar',
});

describe('searching', () => {
  const index = indexOf(teal, violet, coat);

  it('without filters finds everything, the oldest first', () => {
    expect(numbers(index, {})).toEqual(['lh-3', 'lh-2', 'lh-1']);
  });

  it('counts a museum’s own point in its group, and stands by the id of what nobody knows', () => {
    const own = namedPoint('own-band-to-loop', { group: 'skirt-length', label: 'Band to train loop' });
    const unknown = namedPoint('own-of-nobody', { group: 'no-such-group', label: null });
    const skirt = indexedGarment({ number: 'lh-4', title: 'Trained skirt' });
    const value = mm(812);
    const more = indexOf(teal, {
      ...skirt,
      measurements: [own, unknown].map((named) => ({ ...named, partName: 'Skirt', value })),
    });
    expect(numbers(more, { measure: 'skirt-length:800..820' })).toEqual(['lh-4']);
    const answer = searchIndex(more, query({ measure: 'own-band-to-loop:800..' }));
    expect(answer.ranges[0]?.label).toBe('Band to train loop');
    expect(answer.items[0]?.measurements).toEqual([
      { pointId: 'own-band-to-loop', label: 'Band to train loop', partName: 'Skirt', valueMm: '812' },
    ]);
    expect(searchIndex(more, query({ measure: 'own-of-nobody:..900' })).ranges[0]?.label).toBe(
      'own-of-nobody',
    );
  });

  it('takes several values of one facet as alternatives, several facets as conditions', () => {
    expect(numbers(index, { colour: ['teal', 'blue'] })).toEqual(['lh-3', 'lh-1']);
    expect(numbers(index, { colour: ['teal', 'blue'], kind: 'dress' })).toEqual(['lh-1']);
  });

  it('finds a garment when its years touch those asked for', () => {
    expect(numbers(index, { from: 1874, to: 1885 })).toEqual(['lh-2', 'lh-1']);
    expect(numbers(index, { to: 1871 })).toEqual(['lh-3']);
  });

  it('finds by the beginning of a word, without accents, in any order; every word must be there', () => {
    expect(numbers(index, { q: 'velv' }).sort()).toEqual(['lh-1', 'lh-2', 'lh-3']);
    expect(numbers(index, { q: 'CREPES' })).toEqual(['lh-2']);
    expect(numbers(index, { q: 'flounce teal' })).toEqual(['lh-1']);
    expect(numbers(index, { q: 'teal collar' })).toEqual([]);
    expect(numbers(index, { q: 'lh 3' })).toEqual(['lh-3']);
    expect(numbers(index, { q: '?!' })).toEqual([]);
  });

  it('puts what is in the title before what is only in the text', () => {
    const plain = indexedGarment({ number: 'lh-4', title: 'Velvet bodice', years: [1900, 1900] });
    expect(numbers(indexOf(teal, coat, plain), { q: 'velvet' })[0]).toBe('lh-4');
  });

  it('means the group where a group and a point bear one name', () => {
    // 830 is a coat’s waist, 590 an inner waist band: both answer the question for a waist.
    expect(numbers(index, { measure: 'waist:585..' })).toEqual(['lh-3', 'lh-2', 'lh-1']);
    expect(numbers(index, { measure: 'inner-waist-band:585..' })).toEqual(['lh-2']);
  });

  it('includes both ends of a range, to the ten-thousandth', () => {
    expect(numbers(index, { measure: 'hem:2710..2710' })).toEqual(['lh-1']);
    expect(numbers(index, { measure: 'hem:2710.0001..' })).toEqual([]);
  });

  it('wants all of several ranges, also two of the same point', () => {
    expect(numbers(index, { measure: ['waist:600..', 'bust:..900'] })).toEqual(['lh-1']);
    expect(numbers(index, { measure: ['waist:600..', 'waist:..700'] })).toEqual(['lh-1']);
  });

  it('finds nothing by a point that is none', () => {
    expect(searchIndex(index, query({ measure: 'waste:1..' }))).toMatchObject({ total: 0 });
  });

  it('orders by date, title and publication, and pages without overlap', () => {
    expect(numbers(index, { sort: 'date-desc' })).toEqual(['lh-1', 'lh-2', 'lh-3']);
    expect(numbers(index, { sort: 'title' })).toEqual(['lh-3', 'lh-1', 'lh-2']);
    const pages = [1, 2, 3, 4].map((page) => numbers(index, { size: 1, page, sort: 'title' }));
    expect(pages).toEqual([['lh-3'], ['lh-1'], ['lh-2'], []]);
  });

  it('forgets what is removed, and knows what is put in its place', () => {
    const changing = indexOf(teal, violet);
    changing.put({ ...teal, title: 'Grey dress', facets: [], measurements: [], text: '' });
    expect(numbers(changing, { q: 'teal' })).toEqual([]);
    expect(numbers(changing, { colour: 'teal' })).toEqual([]);
    expect(numbers(changing, { measure: 'hem:1..' })).toEqual([]);
    changing.remove('lh-1');
    expect(numbers(changing, {})).toEqual(['lh-2']);
    changing.put(coat);
    expect(numbers(changing, { sort: 'date' })).toEqual(['lh-3', 'lh-2']);
  });
});

describe('the card of a garment', () => {
  const shown = (parts: Parameters<typeof query>[0]) =>
    searchIndex(indexOf(teal), query(parts)).items[0]?.measurements.map(({ pointId, valueMm }) => [
      pointId,
      valueMm,
    ]);

  it('shows the three measures that tell most', () => {
    expect(shown({})).toEqual([
      ['bust', '850'],
      ['waist', '612'],
      ['hem', '2710'],
    ]);
  });

  it('shows the searched one first, and of a group the one that answers', () => {
    expect(shown({ measure: 'hem:1..' })?.[0]).toEqual(['hem', '2710']);
    expect(shown({ measure: 'waist:620..' })?.[0]).toEqual(['waistband', '640']);
  });
});

describe('facets', () => {
  const answer = searchIndex(indexOf(teal, violet, coat), query({ kind: 'dress', colour: 'teal' }));
  const counts = (name: string) =>
    Object.fromEntries(
      answer.facets.find((facet) => facet.name === name)?.values.map(({ value, count }) => [value, count]) ??
        [],
    );

  it('count what each value would find, leaving their own choice out of account', () => {
    expect(counts('colour')).toEqual({ teal: 1, violet: 1 });
    expect(counts('kind')).toEqual({ dress: 1, bodice: 1, skirt: 1 });
    expect(counts('maker')).toEqual({ 'Aldous & Finch': 1 });
  });

  it('keep a chosen value in the list when it finds nothing', () => {
    const none = searchIndex(indexOf(teal, coat), query({ kind: 'coat', colour: ['teal', 'blue'] }));
    const colours = none.facets.find(({ name }) => name === 'colour')?.values;
    expect(colours).toEqual([
      { value: 'blue', label: 'BLUE', count: 1 },
      { value: 'teal', label: 'TEAL', count: 0 },
    ]);
  });
});

describe('advice', () => {
  const index = indexOf(teal, violet, coat);
  const advice = (parts: Parameters<typeof query>[0]) => searchIndex(index, query(parts)).advice;

  it('is given only where nothing was found', () => {
    expect(advice({ kind: 'dress' })).toBeNull();
  });

  it('names the one filter whose removal gives most, and the search without it', () => {
    expect(advice({ colour: 'violet', maker: 'Aldous & Finch' })).toEqual({
      sentence: 'Without colour: VIOLET there are 2 garments.',
      query: 'maker=Aldous+%26+Finch',
    });
    expect(advice({ kind: 'dress', measure: 'waist:800..900', sort: 'title' })).toEqual({
      sentence: 'Without waist from 800 mm (31 1/2 in) to 900 mm (35 3/8 in) there are 2 garments.',
      query: 'kind=dress&sort=title',
    });
  });

  it('says so where no single one helps', () => {
    expect(advice({ q: 'zebra', colour: 'striped' })).toEqual({
      sentence: 'Leaving out one filter finds nothing either. All 3 garments are here.',
      query: '',
    });
  });
});
