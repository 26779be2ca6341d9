import type { SearchQuery } from '@ellwand/shared/records/search-query';
import { SiteLink } from '../../components/ui/site-link';
import { paths } from '../../config/paths';
import { searchAddress, type SearchView } from './search-loader';

interface PagesNavProps {
  readonly query: SearchQuery;
  readonly total: number;
  readonly view: SearchView;
}

/** The pages of a search: the first, the last, and those next to this one. */
export function PagesNav({ query, total, view }: PagesNavProps) {
  const last = Math.max(1, Math.ceil(total / query.size));
  if (last === 1) return null;
  const to = (page: number) => paths.search(searchAddress({ ...query, page }, { view, unit: null }));
  const near = [1, query.page - 1, query.page, query.page + 1, last];
  const shown = [...new Set(near.filter((page) => page >= 1 && page <= last))].sort((a, b) => a - b);
  return (
    <nav aria-label="Pages of results" className="pages">
      {query.page > 1 && (
        <SiteLink to={to(query.page - 1)} rel="prev" className="pages-step">
          Previous
        </SiteLink>
      )}
      <ol>
        {shown.map((page, index) => (
          <li key={page}>
            {page - (shown[index - 1] ?? page) > 1 && <span aria-hidden="true">…</span>}
            <SiteLink
              to={to(page)}
              aria-label={`Page ${page}`}
              aria-current={page === query.page ? 'page' : undefined}
            >
              {page}
            </SiteLink>
          </li>
        ))}
      </ol>
      {query.page < last && (
        <SiteLink to={to(query.page + 1)} rel="next" className="pages-step">
          Next
        </SiteLink>
      )}
    </nav>
  );
}
