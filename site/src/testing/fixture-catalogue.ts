import { groupLabels } from '@ellwand/shared/points/groups';
import { findMeasuringPoint } from '@ellwand/shared/points/measuring-points';
import { kindLabels } from '@ellwand/shared/points/kinds';
import type { CatalogueCard, SearchAnswer } from '@ellwand/shared/records/published-garment';
import type { SearchQuery } from '@ellwand/shared/records/search-query';
import type { SiteCatalogue } from '@ellwand/shared/records/site-catalogue';
import { changed, searchParams } from '../lib/search-address';
import { isKind } from '../lib/words';
import { fixtureGarments, type FixtureGarment } from './fixture-cards';
import { dressInTwoParts, withdrawnNotice } from './fixture-dress';

/** A small catalogue of invented garments that answers as the real one does. */
export const fixtureCatalogue: SiteCatalogue = {
  search: (query) => Promise.resolve(answer(query)),
  garment(number, version) {
    if (number === withdrawnNotice.number)
      return Promise.resolve({ found: 'withdrawn', notice: withdrawnNotice });
    if (number !== dressInTwoParts.number) return Promise.resolve({ found: 'nothing' });
    if (version === undefined || version === 3)
      return Promise.resolve({ found: 'garment', garment: dressInTwoParts });
    if (version > 3) return Promise.resolve({ found: 'nothing' });
    return Promise.resolve({
      found: 'garment',
      garment: { ...dressInTwoParts, version, state: 'superseded' },
    });
  },
  front() {
    const kinds = counts(fixtureGarments, ({ card }) => card.kind);
    return Promise.resolve({
      total: fixtureGarments.length,
      kinds: [...kinds].map(([kind, count]) => ({ kind, count })),
      newest: fixtureGarments.slice(0, 4).map(({ card }) => card),
    });
  },
};

function answer(query: SearchQuery): SearchAnswer {
  const found = fixtureGarments.filter((garment) => passes(garment, query));
  const start = (query.page - 1) * query.size;
  const decades = [...counts(fixtureGarments, ({ year }) => `${Math.floor(year / 10)}0`)].sort();
  const without = changed(query, { measure: [] });
  return {
    total: found.length,
    page: query.page,
    size: query.size,
    items: found.slice(start, start + query.size).map(({ card }) => card),
    facets: [
      facet(
        'kind',
        'Kind',
        counts(fixtureGarments, ({ card }) => card.kind),
        (kind) => (isKind(kind) ? kindLabels[kind].plural : kind),
      ),
      facet('decade', 'Decade', new Map(decades), (decade) => `${decade}s`),
      facet(
        'colour',
        'Colour',
        counts(fixtureGarments, ({ colour }) => colour),
        (colour) => colour,
      ),
    ],
    ranges: ['bust', 'waist', 'hem'].map((point) => range(point, query)),
    advice:
      found.length > 0
        ? null
        : {
            sentence: 'Without its measuring range the search finds more.',
            query: searchParams(without).toString(),
          },
  };
}

function passes({ card, year, colour }: FixtureGarment, query: SearchQuery): boolean {
  const any = (wanted: readonly string[], value: string) => wanted.length === 0 || wanted.includes(value);
  return (
    card.title.toLowerCase().includes(query.q.toLowerCase()) &&
    any(query.kind, card.kind) &&
    any(query.decade, `${Math.floor(year / 10)}0`) &&
    any(query.colour, colour) &&
    year >= (query.from ?? 0) &&
    year <= (query.to ?? 9999) &&
    query.measure.every(({ point, minMm, maxMm }) =>
      valuesOf(card, point).some(
        (value) => value >= Number(minMm ?? 0) && value <= Number(maxMm ?? Infinity),
      ),
    )
  );
}

/** A group's figures where the id names a group, else the point's own. */
function valuesOf(card: CatalogueCard, point: string): number[] {
  const meant = card.measurements.filter(
    ({ pointId }) => pointId === point || findMeasuringPoint(pointId)?.group === point,
  );
  return meant.map(({ valueMm }) => Number(valueMm));
}

function range(point: string, query: SearchQuery): SearchAnswer['ranges'][number] {
  const values = fixtureGarments.flatMap(({ card }) => valuesOf(card, point));
  const width = point === 'hem' ? 200 : 20;
  const first = Math.floor(Math.min(...values) / width) * width;
  const last = Math.ceil((Math.max(...values) + 1) / width) * width;
  const filter = query.measure.find((each) => each.point === point);
  return {
    point,
    label: (groupLabels as Readonly<Record<string, string>>)[point] ?? point,
    minMm: filter?.minMm ?? null,
    maxMm: filter?.maxMm ?? null,
    missing: fixtureGarments.filter(({ card }) => valuesOf(card, point).length === 0).length,
    bins: Array.from({ length: (last - first) / width }, (_, index) => {
      const from = first + index * width;
      const count = values.filter((value) => value >= from && value < from + width).length;
      return { fromMm: String(from), toMm: String(from + width), count };
    }),
  };
}

function counts<T>(items: readonly T[], of: (item: T) => string): Map<string, number> {
  const found = new Map<string, number>();
  for (const item of items) found.set(of(item), (found.get(of(item)) ?? 0) + 1);
  return found;
}

function facet(
  name: string,
  label: string,
  values: ReadonlyMap<string, number>,
  labelOf: (value: string) => string,
) {
  return {
    name,
    label,
    values: [...values].map(([value, count]) => ({ value, label: labelOf(value), count })),
  };
}
