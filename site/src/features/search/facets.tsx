import type { SearchAnswer } from '@ellwand/shared/records/published-garment';
import type { SearchQuery } from '@ellwand/shared/records/search-query';
import { useFollowingTick } from '../../components/ui/use-following';
import { listFilters } from '../../lib/search-address';
import { capitalised } from '../../lib/words';

interface FacetsProps {
  readonly query: SearchQuery;
  readonly facets: SearchAnswer['facets'];
  /** A box was ticked: the form may be sent at once. */
  readonly onTick: () => void;
}

/** How many values stand open; a value that is ticked always does. */
const SHOWN = 8;

/** What a search can be narrowed by. Each count leaves its own list out of account. */
export function Facets({ query, facets, onTick }: FacetsProps) {
  return (
    <>
      {listFilters.map((name) => {
        const facet = facets.find((each) => each.name === name);
        const ticked = query[name];
        const known = facet?.values ?? [];
        // A value from the address that the catalogue no longer names can still be taken off.
        const strays = ticked.filter((value) => known.every((each) => each.value !== value));
        const values = [...known, ...strays.map((value) => ({ value, label: value, count: 0 }))];
        if (values.length === 0) return null;
        const open = values.filter(({ value }, index) => index < SHOWN || ticked.includes(value));
        const rest = values.filter((each) => !open.includes(each));
        const box = (each: (typeof values)[number]) => (
          <FacetBox
            key={each.value}
            name={name}
            ticked={ticked.includes(each.value)}
            onTick={onTick}
            {...each}
          />
        );
        return (
          <fieldset key={name} className="facet">
            <legend>{facet?.label ?? name}</legend>
            {open.map(box)}
            {rest.length > 0 && (
              <details>
                <summary>{rest.length} more</summary>
                {rest.map(box)}
              </details>
            )}
          </fieldset>
        );
      })}
    </>
  );
}

interface FacetBoxProps {
  readonly name: string;
  readonly value: string;
  readonly label: string;
  readonly count: number;
  readonly ticked: boolean;
  readonly onTick: () => void;
}

function FacetBox({ name, value, label, count, ticked, onTick }: FacetBoxProps) {
  const box = useFollowingTick(ticked);
  return (
    <label className="facet-value">
      <input ref={box} type="checkbox" name={name} value={value} defaultChecked={ticked} onChange={onTick} />
      <span>{capitalised(label)}</span>
      <span className="facet-count figures">{count}</span>
    </label>
  );
}
