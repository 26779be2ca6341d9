import type { Sheet } from '@ellwand/shared/records/sheet';
import { type ReactNode, useState } from 'react';
import { Button, ButtonLink } from '../../../components/ui/button.js';
import { Page } from '../../../components/ui/page.js';
import { paths } from '../../../config/paths.js';
import { today } from '../../../lib/moments.js';
import { readRemembered, remember } from '../../../lib/remembered.js';
import { useOutbox } from '../model/use-outbox.js';
import { useSession } from '../../../lib/session.js';
import {
  hazardCautions,
  hazardLabels,
  isHazardId,
  standingLabels,
} from '@ellwand/shared/records/hazard-words';

/** Hazards and handling notes, read and acknowledged before the box is opened: each person, each day. */
export function HazardGate({ sheet, children }: { readonly sheet: Sheet; readonly children: ReactNode }) {
  const { user } = useSession();
  const outbox = useOutbox(sheet.id);
  const name = `cautions.${sheet.id}.${user.id}`;
  const [read, setRead] = useState(() => readRemembered(name) === today());
  const hazards = sheet.garment.hazards.filter(({ standing }) => standing !== 'tested-absent');
  const nothingToSay = hazards.length === 0 && sheet.garment.handling.trim() === '';
  if (read || nothingToSay || sheet.state === 'complete') return children;
  return (
    <main>
      <Page
        title="Before you open the box"
        lead={`${sheet.garment.ownNumber}${sheet.garment.partSuffix}, ${sheet.garment.title}`}
      >
        <div className="max-w-text space-y-6">
          {hazards.map((hazard) => (
            <HazardCaution key={hazard.id} {...hazard} />
          ))}
          {sheet.garment.handling.trim() !== '' && (
            <section>
              <h2 className="title text-title-25">Handling</h2>
              <p className="mt-1 whitespace-pre-line text-body">{sheet.garment.handling}</p>
            </section>
          )}
          <p className="text-table text-ink-2">Follow your institution’s and country’s rules first.</p>
          <div className="flex flex-wrap gap-3">
            <Button
              tone="action"
              height="table"
              onClick={() => {
                remember(name, today());
                void outbox.say({ about: 'cautions', hazards: hazards.map(({ id }) => id) });
                setRead(true);
              }}
            >
              We have read this: open the sheet
            </Button>
            <ButtonLink height="table" to={paths.garment(sheet.garmentId)}>
              Back to the garment
            </ButtonLink>
          </div>
        </div>
      </Page>
    </main>
  );
}

function HazardCaution({
  id,
  standing,
  note,
}: {
  readonly id: string;
  readonly standing: string;
  readonly note: string;
}) {
  return (
    <section className="border-l-4 border-madder bg-madder-tint p-4">
      <h2 className="text-body font-semibold text-madder">{isHazardId(id) ? hazardLabels[id] : id}</h2>
      <p className="text-label text-ink-2">
        {standing in standingLabels ? standingLabels[standing as keyof typeof standingLabels] : standing}
      </p>
      {isHazardId(id) && <p className="mt-2 text-body">{hazardCautions[id]}</p>}
      {note && <p className="mt-1 whitespace-pre-line text-table">{note}</p>}
    </section>
  );
}
