import { Button } from '../../../components/ui/button.js';
import { momentText } from '../../../lib/moments.js';
import { newId } from '../../../lib/ids.js';
import type { OutboxEntry } from '../model/outbox.js';
import type { SheetRow } from '../model/rows.js';
import type { SheetDesk } from '../model/use-sheet-desk.js';

const said = ({
  state,
  typed,
  unit,
  tapeCount,
}: {
  state: string;
  typed?: string | null;
  unit?: string | null;
  tapeCount?: number;
}) =>
  state === 'taken' ? `${tapeCount ? `${tapeCount} tapes + ` : ''}${typed ?? ''} ${unit ?? ''}` : 'not taken';

/** Two readings of one point, or one that was refused: shown side by side, never guessed. */
export function DecisionCard({
  desk,
  row,
  entry,
}: {
  readonly desk: SheetDesk;
  readonly row: SheetRow;
  readonly entry: OutboxEntry;
}) {
  const { reading, standing, why } = entry;
  const { outbox } = desk;
  const fresh = { ...reading, id: newId() };
  return (
    <div className="mb-2 ml-[2.375rem] rounded-sm border border-madder bg-sheet p-3 text-table">
      <p className="font-medium text-madder">{why}</p>
      <dl className="mt-2 grid gap-3 sm:grid-cols-2">
        <div>
          <dt className="text-label text-ink-3">
            Keyed here, {momentText(reading.keyedAt)}, {reading.device}
          </dt>
          <dd className="figures text-value">{said(reading)}</dd>
        </div>
        {standing && (
          <div>
            <dt className="text-label text-ink-3">
              Stands, {momentText(standing.keyedAt)}, {standing.device}
            </dt>
            <dd className="figures text-value">{said(standing)}</dd>
          </div>
        )}
      </dl>
      <div className="mt-3 flex flex-wrap gap-2">
        {standing ? (
          <>
            <Button
              height="table"
              onClick={() => void outbox.decide(reading.id, { ...fresh, replaces: standing.id })}
            >
              Keep the one keyed here
            </Button>
            <Button height="table" onClick={() => void outbox.decide(reading.id)}>
              Keep the one that stands
            </Button>
            <Button
              height="table"
              onClick={() =>
                void outbox.decide(reading.id, { ...fresh, round: row.round + 1, replaces: null })
              }
            >
              Keep both and read again
            </Button>
          </>
        ) : (
          <>
            <Button height="table" onClick={() => void outbox.decide(reading.id, fresh)}>
              Send it again
            </Button>
            <Button height="table" onClick={() => void outbox.decide(reading.id)}>
              Drop this reading
            </Button>
          </>
        )}
      </div>
    </div>
  );
}
