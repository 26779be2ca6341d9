import { describedLabels, describedThings } from '@ellwand/shared/records/table-note';
import { Button } from '../../../components/ui/button.js';
import { TextArea } from '../../../components/ui/field.js';
import { momentText } from '../../../lib/moments.js';
import { useDescribed } from '../model/use-described.js';
import type { SheetDesk } from '../model/use-sheet-desk.js';
import { SittingList } from './pause.js';

type Thing = (typeof describedThings)[number];

const hints: Readonly<Record<Thing, string>> = {
  label: 'Letter for letter, and where it sits; or that there is none.',
  fastenings: 'Hooks, buttons, laces; how many, where, which are missing.',
  condition: 'Tears, stains, splits, repairs. Say where.',
  remark: 'Anything else that was seen.',
};

/** Everything that identifies the garment is noted while it is out: it should not be handled again for a label. */
export function DescribedPanel({ desk }: { readonly desk: SheetDesk }) {
  return (
    <div className="max-w-text space-y-8 p-4">
      <h2 className="title text-title-25">Noted at the table</h2>
      {describedThings.map((thing) => (
        <DescribedThingBox key={thing} desk={desk} thing={thing} />
      ))}
      <SittingList desk={desk} />
    </div>
  );
}

function DescribedThingBox({ desk, thing }: { readonly desk: SheetDesk; readonly thing: Thing }) {
  const { said, draft, type, keep } = useDescribed(desk.sheet, desk.outbox, desk.view, thing);
  return (
    <section className="space-y-2">
      {said.length > 0 && (
        <ul className="space-y-1 border-l-2 border-hair pl-3 text-table">
          {said.map(({ id, text, byName, saidAt }) => (
            <li key={id}>
              <span className="whitespace-pre-line">{text}</span>
              <span className="block text-label text-ink-3">
                {describedLabels[thing]}, {byName}, {momentText(saidAt)}
              </span>
            </li>
          ))}
        </ul>
      )}
      {!desk.locked && (
        <>
          <TextArea
            id={`note-${thing}`}
            label={describedLabels[thing]}
            hint={hints[thing]}
            value={draft}
            maxLength={4000}
            onChange={(event) => type(event.target.value)}
          />
          <Button height="table" disabled={draft.trim() === ''} onClick={keep}>
            Keep<span className="sr-only"> what was said of: {describedLabels[thing]}</span>
          </Button>
        </>
      )}
    </section>
  );
}
