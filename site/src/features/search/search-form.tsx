import { useRef, useSyncExternalStore } from 'react';
import { Form, useSearchParams, useSubmit } from 'react-router-dom';
import { useFollowing } from '../../components/ui/use-following';
import { paths } from '../../config/paths';
import { isUnit } from '../../lib/range-boxes';
import { PAGE_SIZE, sortLabels } from '../../lib/search-address';
import { Facets } from './facets';
import { RangeFields } from './range-fields';
import type { SearchFound } from './search-loader';

/**
 * Everything that narrows and orders a search, in one form that also works without a script: the server reads
 * what it sends and answers at the one address of that search.
 */
export function SearchForm({ query, view, answer, problems }: SearchFound) {
  const form = useRef<HTMLFormElement>(null);
  const words = useFollowing<HTMLInputElement>(query.q);
  const sort = useFollowing<HTMLSelectElement>(query.sort);
  const submit = useSubmit();
  const scripted = useScripted();
  const [params] = useSearchParams();
  const unit = params.get('unit');
  const send = () => void submit(form.current, { preventScrollReset: true });
  return (
    <Form
      ref={form}
      method="get"
      action={paths.search()}
      preventScrollReset
      noValidate
      className="search-form"
    >
      {view === 'table' && <input type="hidden" name="view" value="table" />}
      {isUnit(unit) && <input type="hidden" name="unit" value={unit} />}
      {query.size !== PAGE_SIZE && <input type="hidden" name="size" value={query.size} />}
      <div>
        <label htmlFor="search-words" className="label">
          Words in title, description, maker or label
        </label>
        <div className="search-row">
          <input
            id="search-words"
            ref={words}
            name="q"
            type="search"
            defaultValue={query.q}
            className="input"
          />
          <button type="submit" className="button">
            Search
          </button>
        </div>
      </div>
      <div>
        <label htmlFor="search-sort" className="label">
          Order
        </label>
        <select
          id="search-sort"
          name="sort"
          ref={sort}
          defaultValue={query.sort}
          className="input"
          onChange={send}
        >
          {Object.entries(sortLabels).map(([value, label]) => (
            <option key={value} value={value}>
              {label}
            </option>
          ))}
        </select>
      </div>
      <details className="filters" open={problems.length > 0}>
        <summary>Narrow the search</summary>
        <RangeFields query={query} ranges={answer.ranges} problems={problems} />
        <button type="submit" className="button-quiet button-small">
          Show these measurements
        </button>
        <Facets query={query} facets={answer.facets} onTick={send} />
        <Years from={query.from} to={query.to} />
        <button type="submit" className={scripted ? 'button-quiet button-small' : 'button'}>
          Show the garments
        </button>
      </details>
    </Form>
  );
}

function Years({ from, to }: { readonly from: number | undefined; readonly to: number | undefined }) {
  return (
    <fieldset className="facet">
      <legend>Years</legend>
      <div className="range-boxes">
        <YearBox name="from" label="From the year" year={from} />
        <YearBox name="to" label="To the year" year={to} />
      </div>
    </fieldset>
  );
}

interface YearBoxProps {
  readonly name: 'from' | 'to';
  readonly label: string;
  readonly year: number | undefined;
}

function YearBox({ name, label, year }: YearBoxProps) {
  const text = year === undefined ? '' : String(year);
  const field = useFollowing<HTMLInputElement>(text);
  return (
    <div>
      <label htmlFor={`search-${name}`} className="label">
        {label}
      </label>
      <input
        ref={field}
        id={`search-${name}`}
        name={name}
        type="text"
        inputMode="numeric"
        autoComplete="off"
        maxLength={4}
        defaultValue={text}
        className="input input-small input-figure"
      />
    </div>
  );
}

const never = () => () => undefined;

/** False on the server and in the first render here, so that both draw the same. */
function useScripted(): boolean {
  return useSyncExternalStore(
    never,
    () => true,
    () => false,
  );
}
