import type { Garment } from '@ellwand/shared/records/garment';
import { useQuery } from '@tanstack/react-query';
import { Link, useParams } from 'react-router-dom';
import { Page } from '../../components/ui/page.js';
import { Failed, Waiting } from '../../components/ui/states.js';
import { paths } from '../../config/paths.js';
import { cutSheetQuery } from '../../features/cut-sheet/api/cut-sheet.js';
import { CutSheetEditor } from '../../features/cut-sheet/components/cut-sheet-editor.js';
import { garmentQuery } from '../../features/garments/api/garment.js';
import { lockedWhy } from '../../features/garments/locked-why.js';
import { isProblem } from '../../lib/problem-error.js';
import { useMay } from '../../lib/session.js';

const plainTitle = 'Cut sheet';

/** How one part of a garment is cut. */
export function CutSheetPage() {
  const { garmentId = '', partId = '' } = useParams();
  const garment = useQuery(garmentQuery(garmentId));
  const sheet = useQuery(cutSheetQuery(partId));
  const failed = [garment, sheet].find(({ isError }) => isError);
  const part = garment.data?.parts.find(({ id }) => id === partId);
  if (failed || (garment.data && !part)) {
    const isUnknown = !failed || (isProblem(failed.error) && failed.error.status === 404);
    return (
      <Page title={isUnknown ? 'There is no such part' : plainTitle}>
        {failed ? (
          <Failed error={failed.error} onRetry={() => void failed.refetch()} />
        ) : (
          <BackTo garment={garment.data} />
        )}
      </Page>
    );
  }
  if (!garment.data || !part || !sheet.data) {
    return (
      <Page title={plainTitle}>
        <Waiting label="Fetching the cut sheet" />
      </Page>
    );
  }
  return <CutSheetDesk key={partId} garment={garment.data} part={part} sheet={sheet.data} />;
}

function CutSheetDesk({
  garment,
  part,
  sheet,
}: {
  readonly garment: Garment;
  readonly part: Garment['parts'][number];
  readonly sheet: Parameters<typeof CutSheetEditor>[0]['sheet'];
}) {
  const locked = lockedWhy(garment, useMay('garment:write'));
  return (
    <Page
      title={`Cut sheet: ${part.name}`}
      lead={
        <span className="flex flex-wrap gap-x-3">
          <span className="figures">
            {garment.record.ownNumber}
            {part.suffix}
          </span>
          <BackTo garment={garment} />
          {sheet.version === 0 && <span>Nothing is written yet.</span>}
        </span>
      }
    >
      <CutSheetEditor sheet={sheet} garmentId={garment.id} locked={locked} />
    </Page>
  );
}

function BackTo({ garment }: { readonly garment: Garment | undefined }) {
  if (!garment) return null;
  return (
    <Link to={paths.garment(garment.id)} className="text-indigo underline underline-offset-4">
      {garment.record.title}
    </Link>
  );
}
