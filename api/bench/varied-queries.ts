import { formatMeasure } from '@ellwand/shared/records/measure-filter';
import type { SearchAnswer } from '@ellwand/shared/records/published-garment';

const sorts = ['', 'date', 'date-desc', 'title', 'newest'];

/**
 * Searches as visitors make them, from what the catalogue itself offers: each facet's values, each range's bins,
 * words of titles, alone and together. The same catalogue gives the same searches.
 */
export function variedQueries(answer: SearchAnswer): string[] {
  const facets = answer.facets.flatMap(({ name, values }) =>
    values.slice(0, 8).map(({ value }): [string, string] => [name, value]),
  );
  const measures = answer.ranges.flatMap(({ point, bins }) =>
    bins
      .filter(({ count }) => count > 0)
      .map(({ fromMm, toMm }): [string, string] => [
        'measure',
        formatMeasure({ point, minMm: fromMm, maxMm: toMm }),
      ]),
  );
  const words = answer.items.map(({ title }): [string, string] => ['q', title.split(' ')[0] ?? '']);
  const single = [...facets, ...measures, ...words].map((pair) => [pair]);
  const pairs = facets.flatMap((facet, at) => {
    const measure = measures[at % Math.max(1, measures.length)];
    return measure ? [[facet, measure]] : [];
  });
  const all = [[], ...single, ...pairs];
  return all.map((filters, at) => {
    const sort = sorts[at % sorts.length];
    return `?${new URLSearchParams([...filters, ...(sort ? [['sort', sort] as [string, string]] : [])]).toString()}`;
  });
}
