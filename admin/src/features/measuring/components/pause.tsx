import { useState } from 'react';
import { Button } from '../../../components/ui/button.js';
import { Question } from '../../../components/ui/dialog.js';
import { TextField } from '../../../components/ui/field.js';
import { momentText } from '../../../lib/moments.js';
import type { SheetDesk } from '../model/use-sheet-desk.js';

/** The garment is put away for now; the sheet goes on another time, on this device or another. */
export function PauseQuestion({ desk }: { readonly desk: SheetDesk }) {
  const { pausing, setPausing } = desk;
  const [reason, setReason] = useState('');
  const close = () => setPausing(null);
  const put = () => {
    desk.sittings.pause(reason.trim() || (pausing ?? ''));
    close();
  };
  return (
    <Question
      open={pausing !== null}
      onClose={close}
      title="Put it away for now"
      actions={
        <>
          <Button tone="action" height="table" onClick={put}>
            Put it away
          </Button>
          <Button height="table" onClick={close}>
            Back to the sheet
          </Button>
        </>
      }
    >
      <p>What was read stays. Close what you have opened, and lay the garment back as it came.</p>
      <TextField
        id="pause-reason"
        optional
        label="Why, or how far you came"
        value={reason}
        maxLength={500}
        onChange={(event) => setReason(event.target.value)}
      />
    </Question>
  );
}

/** Above the rows while the garment is away. */
export function PausedNotice({ desk }: { readonly desk: SheetDesk }) {
  const { paused, goOn } = desk.sittings;
  if (!paused?.pausedAt || desk.locked) return null;
  return (
    <div className="flex flex-wrap items-center gap-3 border-b border-hair bg-well px-4 py-3 text-table">
      <p className="min-w-0 grow">
        <span className="font-medium">Put away {momentText(paused.pausedAt)}.</span> {paused.pausedBecause}
      </p>
      <Button height="table" onClick={goOn}>
        It is out again: go on
      </Button>
    </div>
  );
}

/** When it was out, for how long, and why it was put away. */
export function SittingList({ desk }: { readonly desk: SheetDesk }) {
  const { all } = desk.sittings;
  if (all.length === 0) return null;
  return (
    <section>
      <h2 className="title text-title-25">Sittings</h2>
      <ol className="mt-2 divide-y divide-hair border-y border-hair text-table">
        {all.map((sitting) => (
          <li key={sitting.begunAt} className="figures flex flex-wrap gap-x-4 py-2">
            <span>
              {momentText(sitting.begunAt)}{' '}
              {sitting.pausedAt ? `to ${momentText(sitting.pausedAt)}` : 'and on'}
            </span>
            <span>{sitting.readings === 1 ? '1 reading' : `${sitting.readings} readings`}</span>
            <span className="text-ink-2">{sitting.pausedBecause}</span>
          </li>
        ))}
      </ol>
    </section>
  );
}
