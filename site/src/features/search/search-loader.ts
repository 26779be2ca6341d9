import type { SearchAnswer } from '@ellwand/shared/records/published-garment';
import type { SearchQuery } from '@ellwand/shared/records/search-query';
import type { SiteCatalogue } from '@ellwand/shared/records/site-catalogue';
import { redirect } from 'react-router-dom';
import { paths } from '../../config/paths';
import { type BoxProblem, boxPoints, isUnit, readBoxes } from '../../lib/range-boxes';
import { readSearch, searchParams } from '../../lib/search-address';

export type SearchView = 'cards' | 'table';

export interface SearchFound {
  readonly query: SearchQuery;
  readonly view: SearchView;
  readonly answer: SearchAnswer;
  /** What was typed and cannot be searched for; it stays in its box, beside the word on how to mend it. */
  readonly problems: readonly BoxProblem[];
}

/**
 * Answers a search, but only at its one address: whatever a form or an old link sends is read first, and
 * sent on to where the same search stands in order.
 */
export async function searchLoader(
  catalogue: SiteCatalogue,
  request: Request,
): Promise<SearchFound | Response> {
  const params = new URL(request.url).searchParams;
  const boxes = readBoxes(params);
  const read = readSearch(params);
  const query =
    boxPoints(params).length > 0 ? { ...read, measure: [...read.measure, ...boxes.filters] } : read;
  const view: SearchView = params.get('view') === 'table' ? 'table' : 'cards';
  const address = searchAddress(query, { view, unit: params.get('unit') });
  if (boxes.problems.length === 0 && `?${params.toString()}` !== `?${address}`) {
    return redirect(paths.search(address));
  }
  return { query, view, answer: await catalogue.search(query), problems: boxes.problems };
}

/** The query with what only concerns the reader: how results are laid out, and the unit of a shared link. */
export function searchAddress(query: SearchQuery, reader: { view: SearchView; unit: string | null }): string {
  const params = searchParams(query);
  if (reader.view === 'table') params.set('view', 'table');
  if (isUnit(reader.unit)) params.set('unit', reader.unit);
  params.sort();
  return params.toString();
}
