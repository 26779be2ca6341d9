import { useState } from 'react';
import { Button } from '../../../components/ui/button.js';
import { canReadAloud } from '../model/read-aloud.js';
import type { SheetDesk } from '../model/use-sheet-desk.js';
import { NotTakenQuestion } from './not-taken-question.js';
import { rowLabel } from './reading-row.js';
import { TapeProgress } from './tape-progress.js';

/** Within reach of a thumb: back, not taken, how far along the tape one is, and the next point. */
export function BottomBar({
  desk,
  onReadings,
}: {
  readonly desk: SheetDesk;
  readonly onReadings: () => void;
}) {
  const [asking, setAsking] = useState(false);
  if (desk.locked) return <LockedBar desk={desk} />;
  return (
    <div
      role="region"
      aria-label="Measuring"
      className="z-10 flex shrink-0 flex-wrap items-end gap-3 border-t border-hair bg-sheet px-4 py-2 max-sm:gap-2 max-sm:px-2"
    >
      <Button
        height="table"
        onClick={() => {
          onReadings();
          desk.step(-1);
        }}
      >
        Back
      </Button>
      <Button height="table" onClick={() => setAsking(true)}>
        Cannot be taken
      </Button>
      <div className="min-w-0 grow max-sm:order-first max-sm:w-full">
        <TapeProgress done={desk.done} wanted={desk.points.length} />
      </div>
      <Button
        height="table"
        aria-pressed={desk.keypad}
        onClick={() => desk.setKeypad(!desk.keypad)}
        className="aria-pressed:bg-well max-sm:hidden"
      >
        Keypad
      </Button>
      {canReadAloud() && (
        <Button
          height="table"
          aria-pressed={desk.aloud}
          onClick={() => desk.setAloud(!desk.aloud)}
          className="aria-pressed:bg-well max-lg:hidden"
        >
          Read aloud
        </Button>
      )}
      <Button
        tone="action"
        height="table"
        className="max-sm:ml-auto"
        onClick={() => {
          onReadings();
          desk.next();
        }}
      >
        Next point
      </Button>
      <NotTakenQuestion
        open={asking}
        label={rowLabel(desk.current)}
        onClose={() => setAsking(false)}
        onSaid={(reason, note) => {
          setAsking(false);
          desk.setAside(desk.current, reason, note);
          desk.next();
        }}
      />
    </div>
  );
}

function LockedBar({ desk }: { readonly desk: SheetDesk }) {
  return (
    <div
      role="region"
      aria-label="Measuring"
      className="flex shrink-0 flex-wrap items-end gap-4 border-t border-hair bg-sheet px-4 py-2"
    >
      <div className="grow">
        <TapeProgress done={desk.done} wanted={desk.points.length} />
      </div>
      <p className="text-table text-ink-2">
        This sheet is complete. Reopen it under “Box list” to change a reading.
      </p>
    </div>
  );
}
