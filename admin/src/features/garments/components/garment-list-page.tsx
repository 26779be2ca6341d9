import { recordStages, stageLabels } from '@ellwand/shared/records/record-moves';
import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { Button, ButtonLink } from '../../../components/ui/button.js';
import { Page } from '../../../components/ui/page.js';
import { Paging } from '../../../components/ui/paging.js';
import { Empty, Failed, Waiting } from '../../../components/ui/states.js';
import { paths } from '../../../config/paths.js';
import { useRemembered } from '../../../lib/remembered.js';
import { useMay } from '../../../lib/session.js';
import { garmentListQuery } from '../api/garment-list.js';
import { GarmentTable, rowHeights } from './garment-table.js';

const SIZE = 24;

/** Every garment of the house. The address holds the search, so that a list can be sent to a colleague. */
export function GarmentListPage() {
  const [search, setSearch] = useSearchParams();
  const mayWrite = useMay('garment:write');
  const [height, setHeight] = useRemembered('garment-rows', rowHeights, '56');
  const asked = {
    q: search.get('q') ?? '',
    stage: recordStages.find((stage) => stage === search.get('stage')),
    page: Math.max(1, Number(search.get('page')) || 1),
  };
  const list = useQuery(garmentListQuery({ ...asked, size: SIZE }));
  const change = (next: Partial<Record<'q' | 'stage' | 'page', string>>) => {
    const entries = Object.entries({ q: asked.q, stage: asked.stage ?? '', page: '', ...next });
    setSearch(new URLSearchParams(entries.filter(([, value]) => value !== '' && value !== '1')));
  };
  const searched = asked.q !== '' || asked.stage !== undefined;

  return (
    <Page
      title="Garments"
      lead={<span role="status">{list.data ? count(list.data.total, searched) : ''}</span>}
      aside={
        mayWrite && (
          <ButtonLink tone="action" to={paths.newGarment()}>
            New garment
          </ButtonLink>
        )
      }
    >
      <SearchBar asked={asked} onSearch={change} height={height} onHeight={setHeight} />
      {list.isPending && <Waiting label="Fetching the garments" rows={8} />}
      {list.isError && <Failed error={list.error} onRetry={() => void list.refetch()} />}
      {list.data?.total === 0 && (
        <Empty
          title={searched ? 'No garment answers this search' : 'No garments yet'}
          step={
            searched ? (
              <Button onClick={() => change({ q: '', stage: '' })}>Show all garments</Button>
            ) : (
              mayWrite && (
                <ButtonLink tone="action" to={paths.newGarment()}>
                  Record the first garment
                </ButtonLink>
              )
            )
          }
        >
          {searched
            ? 'Numbers, titles and makers are searched. Try fewer letters.'
            : 'A garment is recorded once; its measurements and pictures follow.'}
        </Empty>
      )}
      {list.data && list.data.total > 0 && (
        <div className={list.isPlaceholderData ? 'opacity-60' : ''}>
          <GarmentTable garments={list.data.items} height={height} />
          <Paging {...list.data} onPage={(page) => change({ page: String(page) })} />
        </div>
      )}
    </Page>
  );
}

function count(total: number, searched: boolean): string {
  const garments = total === 1 ? '1 garment' : `${total} garments`;
  return searched ? `${garments} found` : garments;
}

interface SearchBarProps {
  readonly asked: { readonly q: string; readonly stage?: string };
  readonly onSearch: (next: { q?: string; stage?: string }) => void;
  readonly height: (typeof rowHeights)[number];
  readonly onHeight: (height: (typeof rowHeights)[number]) => void;
}

function SearchBar({ asked, onSearch, height, onHeight }: SearchBarProps) {
  return (
    <form
      key={asked.q}
      role="search"
      className="mb-4 flex flex-wrap items-end gap-3"
      onSubmit={(event) => {
        event.preventDefault();
        const q = new FormData(event.currentTarget).get('q');
        onSearch({ q: typeof q === 'string' ? q.trim() : '' });
      }}
    >
      <div className="min-w-0 grow basis-60">
        <label htmlFor="q" className="text-label font-medium text-ink-2">
          Number, title or maker
        </label>
        <div className="mt-1 flex gap-2">
          <input id="q" name="q" type="search" defaultValue={asked.q} className="box" />
          <Button type="submit">Search</Button>
        </div>
      </div>
      <div className="basis-44">
        <label htmlFor="stage" className="text-label font-medium text-ink-2">
          Stage
        </label>
        <select
          id="stage"
          value={asked.stage ?? ''}
          onChange={(event) => onSearch({ stage: event.target.value })}
          className="box mt-1"
        >
          <option value="">All stages</option>
          {recordStages.map((stage) => (
            <option key={stage} value={stage}>
              {stageLabels[stage]}
            </option>
          ))}
        </select>
      </div>
      <div className="hidden basis-36 md:block">
        <label htmlFor="rows" className="text-label font-medium text-ink-2">
          Rows
        </label>
        <select
          id="rows"
          value={height}
          onChange={(event) => onHeight(rowHeights.find((one) => one === event.target.value) ?? '56')}
          className="box mt-1"
        >
          <option value="36">Dense</option>
          <option value="44">Usual</option>
          <option value="56">Roomy</option>
        </select>
      </div>
    </form>
  );
}
