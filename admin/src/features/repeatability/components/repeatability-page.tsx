import { repeatabilitySources, type RepeatabilitySource } from '@ellwand/shared/records/repeatability';
import { useQuery } from '@tanstack/react-query';
import { Link, useSearchParams } from 'react-router-dom';
import { Page } from '../../../components/ui/page.js';
import { Empty, Failed, Waiting } from '../../../components/ui/states.js';
import { paths } from '../../../config/paths.js';
import { repeatabilityQuery } from '../api/repeatability.js';
import { Meaning } from './meaning.js';
import { PointCard } from './point-card.js';

const sourceLabels: Readonly<Record<RepeatabilitySource, string>> = {
  all: 'All',
  study: 'Study sheets',
  record: 'Record sheets',
};

const isSource = (text: string | null): text is RepeatabilitySource =>
  repeatabilitySources.some((source) => source === text);

/** How far two readings of one point lie apart in this house. */
export function RepeatabilityPage() {
  const [search] = useSearchParams();
  const asked = search.get('from');
  const from = isSource(asked) ? asked : 'all';
  const found = useQuery(repeatabilityQuery(from));
  return (
    <Page
      title="Repeatability"
      lead="How far two readings of one point lie apart."
      aside={<Sources from={from} />}
    >
      {found.isPending && <Waiting label="Working out how well readings repeat" rows={6} />}
      {found.isError && <Failed error={found.error} onRetry={() => void found.refetch()} />}
      {found.data?.points.length === 0 && <NothingYet from={from} />}
      {found.data && found.data.points.length > 0 && (
        <>
          <Meaning />
          {found.data.more && <p className="mb-4 text-table text-ink-2">From the newest thousand sheets.</p>}
          <div className="grid gap-4">
            {found.data.points.map((point) => (
              <PointCard key={point.pointId} point={point} />
            ))}
          </div>
        </>
      )}
    </Page>
  );
}

function Sources({ from }: { readonly from: RepeatabilitySource }) {
  return (
    <nav aria-label="Which readings" className="flex border border-rule bg-sheet">
      {repeatabilitySources.map((source) => (
        <Link
          key={source}
          to={paths.repeatability(source)}
          aria-current={source === from ? 'true' : undefined}
          className="inline-flex min-h-11 items-center border-r border-rule px-4 text-table text-ink-2 last:border-r-0 hover:text-ink aria-[current]:bg-indigo-tint aria-[current]:font-medium aria-[current]:text-ink"
        >
          {sourceLabels[source]}
        </Link>
      ))}
    </nav>
  );
}

const steps: Readonly<Record<RepeatabilitySource, string>> = {
  all: 'Choose points to read twice when you open a measuring sheet, or open a study sheet for something sturdy that two people read in turn.',
  study:
    'Open a study sheet for something sturdy, and let two people read it in turn without seeing each other’s figures.',
  record:
    'Choose points to read twice when you open a measuring sheet. The second round does not show the first.',
};

function NothingYet({ from }: { readonly from: RepeatabilitySource }) {
  return (
    <Empty
      title="Nothing was read twice yet"
      step={
        <Link
          to={paths.garments()}
          className="inline-flex min-h-11 items-center text-table text-indigo underline underline-offset-4"
        >
          To the garments
        </Link>
      }
    >
      {steps[from]}
    </Empty>
  );
}
