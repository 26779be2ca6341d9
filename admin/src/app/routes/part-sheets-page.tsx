import type { Garment } from '@ellwand/shared/records/garment';
import type { PartSheets } from '@ellwand/shared/records/part-sheets';
import { useQuery } from '@tanstack/react-query';
import { Link, useParams } from 'react-router-dom';
import { ButtonLink } from '../../components/ui/button.js';
import { Page } from '../../components/ui/page.js';
import { Empty, Failed, Waiting } from '../../components/ui/states.js';
import { paths } from '../../config/paths.js';
import { garmentQuery } from '../../features/garments/api/garment.js';
import { lockedWhy } from '../../features/garments/locked-why.js';
import { partSheetsQuery } from '../../features/part-sheets/api/part-sheets.js';
import { PartSheetsDesk } from '../../features/part-sheets/components/part-sheets-desk.js';
import { isProblem } from '../../lib/problem-error.js';
import { useMay } from '../../lib/session.js';

const plainTitle = 'Sheets over the years';

/** Every sheet of one part, side by side. */
export function PartSheetsPage() {
  const { garmentId = '', partId = '' } = useParams();
  const garment = useQuery(garmentQuery(garmentId));
  const sheets = useQuery(partSheetsQuery(partId));
  const failed = [garment, sheets].find(({ isError }) => isError);
  if (failed) {
    const isUnknown = isProblem(failed.error) && failed.error.status === 404;
    return (
      <Page title={isUnknown ? 'There is no such part' : plainTitle}>
        <Failed error={failed.error} onRetry={() => void failed.refetch()} />
      </Page>
    );
  }
  if (!garment.data || !sheets.data) {
    return (
      <Page title={plainTitle}>
        <Waiting label="Fetching the sheets" rows={10} />
      </Page>
    );
  }
  return <Shown garment={garment.data} shown={sheets.data} />;
}

function Shown({ garment, shown }: { readonly garment: Garment; readonly shown: PartSheets }) {
  const locked = lockedWhy(garment, useMay('garment:write'));
  const mayMeasure = useMay('sheet:write');
  const { ownNumber, partSuffix, partName, title, wornTogether, sheets } = shown;
  return (
    <Page
      title={`${plainTitle}: ${partName}`}
      lead={
        <span className="flex flex-wrap gap-x-3">
          <span className="figures">
            {ownNumber}
            {!wornTogether && partSuffix}
          </span>
          <Link to={paths.garment(garment.id)} className="text-indigo underline underline-offset-4">
            {title}
          </Link>
        </span>
      }
    >
      {sheets.length > 0 ? (
        <PartSheetsDesk shown={shown} locked={locked} />
      ) : (
        <Empty
          title="Not measured yet"
          step={
            mayMeasure && !locked ? (
              <ButtonLink tone="action" to={paths.newSheet(garment.id, shown.partId)}>
                New measuring sheet
              </ButtonLink>
            ) : undefined
          }
        >
          Once it is, every sheet stands here beside the others.
        </Empty>
      )}
    </Page>
  );
}
