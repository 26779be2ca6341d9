import { formatMeasure } from '@ellwand/shared/records/measure-filter';
import type { SearchQuery } from '@ellwand/shared/records/search-query';
import { facetNames } from './indexed-garment';

/** The query part of a search's one address: keys and values in order, what is usual left out. */
export function searchAddress(query: SearchQuery): string {
  const pairs: [string, string][] = [
    ...facetNames.flatMap((name) => [...query[name]].sort().map((value): [string, string] => [name, value])),
    ...query.measure
      .map(formatMeasure)
      .sort()
      .map((measure): [string, string] => ['measure', measure]),
  ];
  if (query.q !== '') pairs.push(['q', query.q]);
  if (query.from !== undefined) pairs.push(['from', String(query.from)]);
  if (query.to !== undefined) pairs.push(['to', String(query.to)]);
  if (query.sort !== 'relevance') pairs.push(['sort', query.sort]);
  const params = new URLSearchParams(pairs);
  params.sort();
  return params.toString();
}
