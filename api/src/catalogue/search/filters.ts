import type { MeasureFilter } from '@ellwand/shared/records/measure-filter';
import type { SearchQuery } from '@ellwand/shared/records/search-query';
import { formatBoth } from '@ellwand/shared/units/format-length';
import { fromMmString } from '@ellwand/shared/units/length';
import { TypedFastBitSet } from 'typedfastbitset';
import type { CatalogueIndex } from './catalogue-index';
import { facetLabels, type FacetName, facetNames } from './indexed-garment';
import type { TextMatches } from './text-matches';

/** One thing that narrows a search: what it lets through, how it is called, and the search without it. */
export interface Filter {
  readonly key: string;
  readonly passing: TypedFastBitSet;
  readonly words: string;
  readonly without: Partial<SearchQuery>;
}

export const measureKey = (point: string) => `measure:${point}`;

/** Everything that narrows, each on its own. Several values of one facet are alternatives. */
export function filtersOf(index: CatalogueIndex, query: SearchQuery, text: TextMatches | null): Filter[] {
  return [
    ...(text
      ? [{ key: 'q', passing: text.garments, words: `the words “${query.q}”`, without: { q: '' } }]
      : []),
    ...facetNames
      .filter((name) => query[name].length > 0)
      .map((name) => facetFilter(index, name, query[name])),
    ...datesFilter(index, query),
    ...[...new Set(query.measure.map(({ point }) => point))].map((point) =>
      measureFilter(index, query, point),
    ),
  ];
}

function facetFilter(index: CatalogueIndex, name: FacetName, wanted: readonly string[]): Filter {
  const passing = new TypedFastBitSet();
  const known = index.values(name);
  for (const value of wanted) {
    const holders = known.get(value)?.holders;
    if (holders) passing.union(holders);
  }
  const values = wanted.map((value) => known.get(value)?.label ?? value).join(' or ');
  return {
    key: name,
    passing,
    words: `${facetLabels[name].toLowerCase()}: ${values}`,
    without: { [name]: [] },
  };
}

/** A garment passes when its span of years touches the years asked for. */
function datesFilter(index: CatalogueIndex, { from, to }: SearchQuery): Filter[] {
  if (from === undefined && to === undefined) return [];
  const passing = new TypedFastBitSet();
  for (const place of index.all.array()) {
    const { fromYear, toYear } = index.garment(place);
    if (toYear >= (from ?? -Infinity) && fromYear <= (to ?? Infinity)) passing.add(place);
  }
  const words = [from !== undefined && `from ${from}`, to !== undefined && `to ${to}`]
    .filter((said) => said)
    .join(' ');
  return [
    { key: 'dates', passing, words: `the years ${words}`, without: { from: undefined, to: undefined } },
  ];
}

function measureFilter(index: CatalogueIndex, query: SearchQuery, point: string): Filter {
  const ranges = query.measure.filter((measure) => measure.point === point);
  const column = index.column(point);
  const [first, ...others] = ranges.map((range) =>
    column ? column.between(bound(range.minMm), bound(range.maxMm)) : new TypedFastBitSet(),
  );
  return {
    key: measureKey(point),
    passing: others.reduce((passing, other) => passing.intersection(other), first ?? new TypedFastBitSet()),
    words: `${index.label(point).toLowerCase()} ${ranges.map(rangeWords).join(', ')}`,
    without: { measure: query.measure.filter((measure) => measure.point !== point) },
  };
}

export const bound = (mm: string | null) => (mm === null ? null : fromMmString(mm));

function rangeWords({ minMm, maxMm }: MeasureFilter): string {
  const write = (mm: string) => formatBoth(fromMmString(mm));
  if (minMm !== null && maxMm !== null) return `from ${write(minMm)} to ${write(maxMm)}`;
  return minMm !== null ? `from ${write(minMm)}` : `up to ${write(maxMm ?? '0')}`;
}
