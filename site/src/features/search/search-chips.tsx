import type { SearchAnswer } from '@ellwand/shared/records/published-garment';
import type { MeasureFilter } from '@ellwand/shared/records/measure-filter';
import type { SearchQuery } from '@ellwand/shared/records/search-query';
import { formatLength, type LengthUnit } from '@ellwand/shared/units/format-length';
import { fromMmString } from '@ellwand/shared/units/length';
import type { ReactNode } from 'react';
import { SiteLink } from '../../components/ui/site-link';
import { InEachUnit } from '../../components/units/length';
import { paths } from '../../config/paths';
import { changed, emptySearch, listFilters } from '../../lib/search-address';
import { searchAddress, type SearchView } from './search-loader';

interface Chip {
  readonly key: string;
  readonly words: ReactNode;
  readonly without: SearchQuery;
}

interface SearchChipsProps {
  readonly query: SearchQuery;
  readonly answer: SearchAnswer;
  readonly view: SearchView;
}

/** What the search is narrowed by, each with the way to take it off again. */
export function SearchChips({ query, answer, view }: SearchChipsProps) {
  const chips = chipsOf(query, answer);
  if (chips.length === 0) return null;
  return (
    <ul className="chips" aria-label="Narrowed by">
      {chips.map(({ key, words, without }) => (
        <li key={key}>
          <SiteLink className="chip" to={paths.search(searchAddress(without, { view, unit: null }))}>
            <span className="sr-only">Remove </span>
            <span>{words}</span>
            <Cross />
          </SiteLink>
        </li>
      ))}
      {chips.length > 1 && (
        <li>
          <SiteLink
            className="link chip-clear"
            to={paths.search(searchAddress({ ...emptySearch, sort: query.sort }, { view, unit: null }))}
          >
            Clear all
          </SiteLink>
        </li>
      )}
    </ul>
  );
}

function Cross() {
  return (
    <svg width="10" height="10" viewBox="0 0 10 10" aria-hidden="true">
      <path d="M1 1l8 8M9 1l-8 8" stroke="currentColor" strokeWidth="1.5" />
    </svg>
  );
}

function chipsOf(query: SearchQuery, answer: SearchAnswer): Chip[] {
  const chips: Chip[] = [];
  if (query.q) chips.push({ key: 'q', words: `“${query.q}”`, without: changed(query, { q: '' }) });
  for (const name of listFilters) {
    const facet = answer.facets.find((each) => each.name === name);
    for (const value of query[name]) {
      const label = facet?.values.find((each) => each.value === value)?.label ?? value;
      const without = changed(query, { [name]: query[name].filter((each) => each !== value) });
      chips.push({ key: `${name} ${value}`, words: label, without });
    }
  }
  const { from, to, ...anyYear } = query;
  if (from !== undefined || to !== undefined) {
    chips.push({ key: 'years', words: yearsText(from, to), without: { ...anyYear, page: 1 } });
  }
  for (const filter of query.measure) {
    const label = answer.ranges.find(({ point }) => point === filter.point)?.label ?? filter.point;
    const without = changed(query, { measure: query.measure.filter((each) => each !== filter) });
    chips.push({
      key: `measure ${filter.point} ${filter.minMm} ${filter.maxMm}`,
      words: <InEachUnit write={(unit) => `${label} ${rangeText(filter, unit)}`} />,
      without,
    });
  }
  return chips;
}

function yearsText(from: number | undefined, to: number | undefined): string {
  if (from !== undefined && to !== undefined) return `${from} to ${to}`;
  return from !== undefined ? `from ${from}` : `up to ${to ?? ''}`;
}

/** "560 mm to 620 mm", "from 560 mm", "up to 620 mm". */
export function rangeText({ minMm, maxMm }: MeasureFilter, unit: LengthUnit): string {
  // As finely as the boxes show it, so that chip and box say the same.
  const write = (mm: string) => formatLength(fromMmString(mm), unit, { denominator: 16 });
  if (minMm !== null && maxMm !== null) return `${write(minMm)} to ${write(maxMm)}`;
  return minMm !== null ? `from ${write(minMm)}` : `up to ${write(maxMm ?? '0')}`;
}
