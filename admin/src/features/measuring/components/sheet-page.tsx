import type { Sheet } from '@ellwand/shared/records/sheet';
import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { Page } from '../../../components/ui/page.js';
import { Failed, Waiting } from '../../../components/ui/states.js';
import { sheetQuery } from '../api/sheet.js';
import { HazardGate } from './hazard-gate.js';
import { SheetScreen } from './sheet-screen.js';

/** A measuring sheet. Nothing of it opens before the cautions have been read. */
export function SheetPage() {
  const { sheetId = '' } = useParams();
  const sheet = useQuery(sheetQuery(sheetId));
  if (sheet.data) return <OpenedSheet key={sheet.data.id} sheet={sheet.data} />;
  return (
    <main>
      <Page title="Measuring sheet">
        {sheet.isError ? (
          <Failed error={sheet.error} onRetry={() => void sheet.refetch()} />
        ) : (
          <Waiting label="Fetching the sheet" rows={8} />
        )}
      </Page>
    </main>
  );
}

function OpenedSheet({ sheet }: { readonly sheet: Sheet }) {
  return (
    <HazardGate sheet={sheet}>
      <SheetScreen sheet={sheet} />
    </HazardGate>
  );
}
