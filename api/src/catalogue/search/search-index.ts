import type { CatalogueCard, SearchAnswer } from '@ellwand/shared/records/published-garment';
import type { MeasureFilter } from '@ellwand/shared/records/measure-filter';
import type { SearchQuery } from '@ellwand/shared/records/search-query';
import type { TypedFastBitSet } from 'typedfastbitset';
import { advise } from './advice';
import type { CatalogueIndex } from './catalogue-index';
import { countFacets } from './facets';
import { filtersOf } from './filters';
import type { IndexedGarment } from './indexed-garment';
import { Narrowed } from './narrowed';
import { measuredRanges } from './ranges';
import { tellingMeasurements } from './telling-measurements';
import { matchText, type TextMatches } from './text-matches';

/** Answers a search from the index alone: a pure function of the two. */
export function searchIndex(index: CatalogueIndex, query: SearchQuery): SearchAnswer {
  const text = query.q === '' ? null : matchText(index, query.q);
  const filters = filtersOf(index, query, text);
  const narrowed = new Narrowed(index.all, filters);
  return {
    total: narrowed.found.size(),
    page: query.page,
    size: query.size,
    items: pageOf(index, query, narrowed.found, text).map((place) =>
      cardOf(index.garment(place), query.measure),
    ),
    facets: countFacets(index, query, narrowed),
    ranges: measuredRanges(index, query, narrowed),
    advice: advise(query, filters, narrowed, index.all.size()),
  };
}

/** Places on the page asked for, in the order asked for. */
function pageOf(
  index: CatalogueIndex,
  { page, size, sort }: SearchQuery,
  found: TypedFastBitSet,
  text: TextMatches | null,
): number[] {
  // Without words every match is as good as another: then the oldest garment comes first.
  const order = index.inOrder(sort === 'relevance' ? 'date' : sort).filter((place) => found.has(place));
  if (sort === 'relevance' && text) order.sort((a, b) => (text.scores[b] ?? 0) - (text.scores[a] ?? 0));
  return order.slice((page - 1) * size, page * size);
}

export function cardOf(garment: IndexedGarment, searched: readonly MeasureFilter[] = []): CatalogueCard {
  const { number, title, kind, dateDisplay, image } = garment;
  return { number, title, kind, dateDisplay, image, measurements: tellingMeasurements(garment, searched) };
}
