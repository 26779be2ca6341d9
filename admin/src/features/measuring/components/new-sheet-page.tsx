import type { SheetFactsInput } from '@ellwand/shared/records/sheet';
import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useNavigate, useParams } from 'react-router-dom';
import { ButtonLink } from '../../../components/ui/button.js';
import { Page } from '../../../components/ui/page.js';
import { Failed, Waiting } from '../../../components/ui/states.js';
import { paths } from '../../../config/paths.js';
import { newId } from '../../../lib/ids.js';
import { today } from '../../../lib/moments.js';
import { readRemembered, remember } from '../../../lib/remembered.js';
import { useSession } from '../../../lib/session.js';
import { garmentQuery } from '../../garments/api/garment.js';
import { openSheet } from '../api/open-sheet.js';
import { sheetQuery } from '../api/sheet.js';

import { FactsForm } from './facts-form.js';

/** The facts a sheet begins with: today, whoever is signed in reads and writes, place and tape as last time. */
function usualFacts(userId: string): SheetFactsInput {
  return {
    people: [
      { userId, duty: 'read' },
      { userId, duty: 'wrote' },
    ],
    aloneBecause: '',
    measuredOn: today(),
    place: readRemembered('sheet-place') ?? '',
    support: 'flat',
    tape: readRemembered('sheet-tape') ?? '',
    tapeLengthMm: readRemembered('sheet-tape-length') ?? '1500',
    tapeZeroMm: '0',
    fasteningPair: '',
    note: '',
    repeatPoints: [],
    purpose: 'record',
  };
}

export function NewSheetPage() {
  const { garmentId = '', partId = '' } = useParams();
  const { user } = useSession();
  const queries = useQueryClient();
  const navigate = useNavigate();
  const [id] = useState(newId);
  const garment = useQuery(garmentQuery(garmentId));
  const part = garment.data?.parts.find((one) => one.id === partId);
  return (
    <Page
      title="New measuring sheet"
      lead={
        part &&
        `${garment.data?.record.ownNumber ?? ''}${part.suffix} ${part.name}, ${garment.data?.record.title ?? ''}`
      }
    >
      {garment.isPending && <Waiting label="Fetching the garment" />}
      {garment.isError && <Failed error={garment.error} onRetry={() => void garment.refetch()} />}
      {garment.data && !part && <p className="text-table">The garment has no such part.</p>}
      {part && (
        <FactsForm
          facts={usualFacts(user.id)}
          verb="Open the sheet"
          aside={
            <ButtonLink tone="quiet" to={paths.garment(garmentId)}>
              Back to the garment
            </ButtonLink>
          }
          onSave={async (facts) => {
            const sheet = await openSheet(partId, id, facts);
            remember('sheet-place', facts.place);
            remember('sheet-tape', facts.tape);
            remember('sheet-tape-length', facts.tapeLengthMm);
            queries.setQueryData(sheetQuery(sheet.id).queryKey, sheet);
            void queries.invalidateQueries({ queryKey: garmentQuery(garmentId).queryKey });
            void navigate(paths.sheet(sheet.id));
          }}
        />
      )}
    </Page>
  );
}
