import { groups } from '@ellwand/shared/points/groups';
import { findMeasuringPoint } from '@ellwand/shared/points/measuring-points';
import type { SearchQuery } from '@ellwand/shared/records/search-query';
import { toMm } from '@ellwand/shared/units/length';
import fc from 'fast-check';
import { indexedGarment, query } from '../../../test/catalogue/indexed-garments';
import { CatalogueIndex } from './catalogue-index';
import { facetNames, type IndexedGarment } from './indexed-garment';
import { searchIndex } from './search-index';

/* Laws that hold for every set of garments and every search, against a search that looks at each garment in turn. */

const values = {
  kind: ['dress', 'coat'],
  colour: ['teal', 'violet', 'blue'],
  maker: ['Aldous'],
  decade: ['1880', '1890'],
};
const points = ['waist', 'inner-waist-band', 'hem', 'bust', 'coat-waist'];
const words = ['silk', 'velvet', 'trim', 'pleats'];

const garments = fc.array(
  fc
    .record({
      years: fc.tuple(fc.integer({ min: 1800, max: 1820 }), fc.integer({ min: 0, max: 5 })),
      facets: fc.record({
        kind: fc.subarray(values.kind, { minLength: 1 }),
        colour: fc.subarray(values.colour),
        maker: fc.subarray(values.maker),
        decade: fc.subarray(values.decade),
      }),
      measurements: fc.array(fc.tuple(fc.constantFrom(...points), fc.integer({ min: 500, max: 520 })), {
        maxLength: 5,
      }),
      text: fc.subarray(words).map((chosen) => chosen.join(' ')),
    })
    .map(({ years: [from, span], ...rest }) => indexedGarment({ years: [from, from + span], ...rest })),
  { maxLength: 40 },
);

const searches = fc
  .record(
    {
      kind: fc.subarray(values.kind),
      colour: fc.subarray([...values.colour, 'striped']),
      maker: fc.subarray(values.maker),
      decade: fc.subarray(values.decade),
      from: fc.integer({ min: 1800, max: 1825 }),
      to: fc.integer({ min: 1800, max: 1825 }),
      q: fc.constantFrom('', 'silk', 'velv', 'pleat trim'),
      measure: fc.array(
        fc
          .tuple(
            fc.constantFrom(...points),
            fc.integer({ min: 495, max: 525 }),
            fc.integer({ min: 495, max: 525 }),
          )
          .map(([point, least, most]) => `${point}:${least}..${most}`),
        { maxLength: 3 },
      ),
    },
    { requiredKeys: [] },
  )
  .map((parts) => query({ ...parts, size: 100 }));

function indexOf(all: readonly IndexedGarment[]): CatalogueIndex {
  const index = new CatalogueIndex();
  for (const garment of all) index.put(garment);
  return index;
}

function valuesAt(garment: IndexedGarment, id: string): number[] {
  const isGroup = groups.some((group) => group.id === id);
  return garment.measurements
    .filter(({ pointId }) => (isGroup ? findMeasuringPoint(pointId)?.group === id : pointId === id))
    .map(({ value }) => toMm(value));
}

const has = (garment: IndexedGarment, facet: string, value: string) =>
  garment.facets.some((each) => each.facet === facet && each.value === value);

function passes(garment: IndexedGarment, search: SearchQuery): boolean {
  const inText = (word: string) => garment.text.split(' ').some((held) => held.startsWith(word));
  return (
    facetNames.every(
      (name) => search[name].length === 0 || search[name].some((value) => has(garment, name, value)),
    ) &&
    garment.toYear >= (search.from ?? 0) &&
    garment.fromYear <= (search.to ?? 9999) &&
    search.q.split(' ').every(inText) &&
    search.measure.every(({ point, minMm, maxMm }) =>
      valuesAt(garment, point).some((value) => value >= Number(minMm) && value <= Number(maxMm)),
    )
  );
}

describe('laws of searching', () => {
  it('finds exactly the garments that pass every filter', () => {
    fc.assert(
      fc.property(garments, searches, (all, search) => {
        const wanted = all.filter((garment) => passes(garment, search)).map(({ number }) => number);
        const answer = searchIndex(indexOf(all), search);
        expect(answer.items.map(({ number }) => number).sort()).toEqual(wanted.sort());
        expect(answer.total).toBe(wanted.length);
      }),
    );
  });

  it('does not depend on the order of filters, nor of garments', () => {
    fc.assert(
      fc.property(garments, searches, (all, search) => {
        const turned = {
          ...search,
          kind: [...search.kind].reverse(),
          colour: [...search.colour].reverse(),
          measure: [...search.measure].reverse(),
        };
        const [one, other] = [
          searchIndex(indexOf(all), search),
          searchIndex(indexOf([...all].reverse()), turned),
        ];
        expect(other.items.map(({ number }) => number)).toEqual(one.items.map(({ number }) => number));
        expect(other.facets).toEqual(one.facets);
        const byPoint = (ranges: typeof one.ranges) =>
          Object.fromEntries(ranges.map(({ point, bins, missing }) => [point, { bins, missing }]));
        expect(byPoint(other.ranges)).toEqual(byPoint(one.ranges));
      }),
    );
  });

  it('counts each value of a facet as a search for that value alone would', () => {
    fc.assert(
      fc.property(garments, searches, (all, search) => {
        for (const facet of searchIndex(indexOf(all), search).facets) {
          for (const { value, count } of facet.values) {
            const alone = { ...search, [facet.name]: [value] };
            expect(count).toBe(all.filter((garment) => passes(garment, alone)).length);
          }
        }
      }),
    );
  });

  it('puts every garment that passes all else into a bin or among those that lack the measurement', () => {
    fc.assert(
      fc.property(garments, searches, (all, search) => {
        for (const { point, bins, missing } of searchIndex(indexOf(all), search).ranges) {
          const without = { ...search, measure: search.measure.filter((measure) => measure.point !== point) };
          const candidates = all.filter((garment) => passes(garment, without));
          expect(missing).toBe(candidates.filter((garment) => valuesAt(garment, point).length === 0).length);
          for (const { fromMm, toMm: endMm, count } of bins) {
            const held = candidates.filter((garment) =>
              valuesAt(garment, point).some((value) => value >= Number(fromMm) && value < Number(endMm)),
            );
            expect(count).toBe(held.length);
          }
        }
      }),
    );
  });

  it('answers the same after garments were taken out and put back in', () => {
    fc.assert(
      fc.property(garments, searches, fc.array(fc.nat({ max: 39 })), (all, search, taken) => {
        const index = indexOf(all);
        for (const at of taken) if (all[at]) index.remove(all[at].number);
        for (const at of taken) if (all[at]) index.put(all[at]);
        expect(searchIndex(index, search)).toEqual(searchIndex(indexOf(all), search));
      }),
    );
  });

  it('advises a search that finds what the advice says', () => {
    fc.assert(
      fc.property(garments, searches, (all, search) => {
        const { advice, total } = searchIndex(indexOf(all), search);
        expect(advice === null || total === 0).toBe(true);
        const gain = /there (?:is|are) (\d+) garment/.exec(advice?.sentence ?? '')?.[1];
        if (!advice || gain === undefined) return;
        const params = new URLSearchParams(advice.query);
        const next = query(
          Object.fromEntries(
            [...params.keys()]
              .map((key) => [key, params.getAll(key)])
              .map(([key, found]) => [
                key,
                key === 'q' || key === 'from' || key === 'to' ? String(found) : found,
              ]),
          ),
        );
        expect(searchIndex(indexOf(all), next).total).toBe(Number(gain));
      }),
    );
  });
});
