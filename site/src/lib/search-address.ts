import { formatMeasure, type MeasureFilter, parseMeasure } from '@ellwand/shared/records/measure-filter';
import type { SearchQuery } from '@ellwand/shared/records/search-query';

export type SearchSort = SearchQuery['sort'];

/** What an order is called; the keys are all the orders there are. */
export const sortLabels: Readonly<Record<SearchSort, string>> = {
  relevance: 'Best match',
  date: 'Earliest first',
  'date-desc': 'Latest first',
  title: 'Title',
  newest: 'Newest measured',
};

/** The filters that hold a list of values, each with its own parameter. */
export const listFilters = ['kind', 'decade', 'maker', 'place', 'material', 'colour'] as const;
export type ListFilter = (typeof listFilters)[number];

export const PAGE_SIZE = 24;

export const emptySearch: SearchQuery = {
  q: '',
  kind: [],
  decade: [],
  maker: [],
  place: [],
  material: [],
  colour: [],
  measure: [],
  sort: 'relevance',
  page: 1,
  size: PAGE_SIZE,
};

/**
 * Reads a search from an address. What is not understood is left out rather than refused: an old or clipped
 * link still finds something, and the page then stands at the address that says what was searched.
 */
export function readSearch(params: URLSearchParams): SearchQuery {
  const list = (name: ListFilter) =>
    sortedUnique(params.getAll(name).map((value) => value.trim().slice(0, 200)));
  const sort = params.get('sort') ?? '';
  const from = wholeNumber(params.get('from'), 1000, 2100);
  const to = wholeNumber(params.get('to'), 1000, 2100);
  return {
    q: (params.get('q') ?? '').trim().slice(0, 200),
    kind: list('kind'),
    decade: list('decade'),
    maker: list('maker'),
    place: list('place'),
    material: list('material'),
    colour: list('colour'),
    ...(from === null ? {} : { from }),
    ...(to === null ? {} : { to }),
    measure: orderedMeasures(params.getAll('measure').map(parseMeasure)),
    sort: isSort(sort) ? sort : emptySearch.sort,
    page: wholeNumber(params.get('page'), 1, 100_000) ?? 1,
    size: wholeNumber(params.get('size'), 1, 100) ?? PAGE_SIZE,
  };
}

/** The one address of a search: keys and repeated values in order, defaults left out. */
export function searchParams(query: SearchQuery): URLSearchParams {
  const pairs: [string, string][] = [
    ...listFilters.flatMap((name) =>
      sortedUnique(query[name]).map((value): [string, string] => [name, value]),
    ),
    ...orderedMeasures(query.measure).map((filter): [string, string] => ['measure', formatMeasure(filter)]),
  ];
  if (query.q) pairs.push(['q', query.q]);
  if (query.from !== undefined) pairs.push(['from', String(query.from)]);
  if (query.to !== undefined) pairs.push(['to', String(query.to)]);
  if (query.sort !== emptySearch.sort) pairs.push(['sort', query.sort]);
  if (query.page !== 1) pairs.push(['page', String(query.page)]);
  if (query.size !== PAGE_SIZE) pairs.push(['size', String(query.size)]);
  const params = new URLSearchParams(pairs);
  params.sort();
  return params;
}

/** A search with something changed, back on its first page unless the page itself is what changed. */
export function changed(query: SearchQuery, change: Partial<SearchQuery>): SearchQuery {
  return { ...query, page: 1, ...change };
}

export function isSort(text: string): text is SearchSort {
  return Object.hasOwn(sortLabels, text);
}

/** Whether anything narrows the search; its order and page do not. */
export function isNarrowed(query: SearchQuery): boolean {
  const lists = listFilters.some((name) => query[name].length > 0);
  return (
    lists || query.q !== '' || query.measure.length > 0 || query.from !== undefined || query.to !== undefined
  );
}

function orderedMeasures(filters: readonly (MeasureFilter | null)[]): MeasureFilter[] {
  const known = filters.filter((filter) => filter !== null);
  return sortedUnique(known.map(formatMeasure))
    .map(parseMeasure)
    .filter((filter) => filter !== null);
}

function sortedUnique(values: readonly string[]): string[] {
  // By code unit, so that the order is the same in every language and on both ends.
  return [...new Set(values.filter((value) => value !== ''))].sort((a, b) => (a < b ? -1 : 1));
}

function wholeNumber(text: string | null, least: number, most: number): number | null {
  if (text === null || !/^\d{1,6}$/.test(text.trim())) return null;
  const value = Number(text);
  return value >= least && value <= most ? value : null;
}
