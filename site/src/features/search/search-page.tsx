import { useEffect, useRef } from 'react';
import { useLoaderData } from 'react-router-dom';
import { SiteLink } from '../../components/ui/site-link';
import { paths } from '../../config/paths';
import type { BoxProblem } from '../../lib/range-boxes';
import { isNarrowed } from '../../lib/search-address';
import { counted } from '../../lib/words';
import { GarmentCard } from '../../components/ui/garment-card';
import { PagesNav } from './pages-nav';
import { ResultsTable } from './results-table';
import { SearchChips } from './search-chips';
import { SearchForm } from './search-form';
import { searchAddress, type SearchFound } from './search-loader';

const CARD_SIZES = '(width >= 80rem) 300px, (width >= 40rem) 40vw, 38vw';

/** Search results: what narrows them at the left, the garments at the right. */
export function SearchPage() {
  const found = useLoaderData<SearchFound>();
  const { query, view, answer, problems } = found;
  const words = `${counted(answer.total, 'garment')}${isNarrowed(query) ? ' found' : ' in the catalogue'}`;
  return (
    <div className="wide search">
      <div className="search-side">
        <SearchForm {...found} />
      </div>
      <div className="search-main">
        {problems.length > 0 && <ProblemSummary problems={problems} />}
        <div className="search-heading">
          <h1 className="title text-title-42">{words}</h1>
          <p role="status" className="sr-only">
            {words}
          </p>
          <ViewSwitch found={found} />
        </div>
        <SearchChips query={query} answer={answer} view={view} />
        <Results found={found} />
        <PagesNav query={query} total={answer.total} view={view} />
      </div>
    </div>
  );
}

function Results({ found: { answer, view } }: { readonly found: SearchFound }) {
  if (answer.items.length === 0) return <NothingFound advice={answer.advice} />;
  if (view === 'table') return <ResultsTable cards={answer.items} />;
  return (
    <ul className="cards">
      {answer.items.map((card, index) => (
        <li key={card.number}>
          <GarmentCard card={card} heading="h2" sizes={CARD_SIZES} first={index < 2} />
        </li>
      ))}
    </ul>
  );
}

function NothingFound({ advice }: { readonly advice: SearchFound['answer']['advice'] }) {
  return (
    <div className="nothing">
      <p>No garment in the catalogue answers all of this at once.</p>
      {advice && <p>{advice.sentence}</p>}
      <p className="notice-actions">
        {advice && (
          <SiteLink to={paths.search(advice.query.replace(/^.*\?/, ''))} className="button">
            Search without it
          </SiteLink>
        )}
        <SiteLink to={paths.search()} className="button-quiet">
          Show every garment
        </SiteLink>
      </p>
    </div>
  );
}

function ViewSwitch({ found: { query, view } }: { readonly found: SearchFound }) {
  const to = (other: 'cards' | 'table') => paths.search(searchAddress(query, { view: other, unit: null }));
  return (
    <nav aria-label="Results as" className="view-switch">
      <SiteLink to={to('cards')} aria-current={view === 'cards' ? 'true' : undefined}>
        Pictures
      </SiteLink>
      <SiteLink to={to('table')} aria-current={view === 'table' ? 'true' : undefined}>
        Table
      </SiteLink>
    </nav>
  );
}

/** First in the page after a search that could not be read: what is wrong, each with a link to its box. */
function ProblemSummary({ problems }: { readonly problems: readonly BoxProblem[] }) {
  const summary = useRef<HTMLDivElement>(null);
  useEffect(() => summary.current?.focus(), [problems]);
  return (
    <div
      ref={summary}
      tabIndex={-1}
      className="problem-summary"
      role="group"
      aria-labelledby="problems-title"
    >
      <h2 id="problems-title" className="font-semibold">
        {problems.length === 1
          ? 'One figure could not be read'
          : `${problems.length} figures could not be read`}
      </h2>
      <ul>
        {problems.map(({ field, sentence }) => (
          <li key={field}>
            <a href={`#box-${field.replace('.', '-')}`} className="link">
              {sentence}
            </a>
          </li>
        ))}
      </ul>
    </div>
  );
}
