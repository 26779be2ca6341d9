import { Button } from '../../../components/ui/button.js';
import { canReadAloud } from '../model/read-aloud.js';
import type { SheetDesk } from '../model/use-sheet-desk.js';
import { KeysQuestion } from './keys-question.js';
import { NotTakenQuestion } from './not-taken-question.js';
import { rowLabel } from './row-label.js';
import { TapeProgress } from './tape-progress.js';

export interface BarWays {
  readonly asking: boolean;
  readonly setAsking: (asking: boolean) => void;
  readonly keysShown: boolean;
  readonly setKeysShown: (shown: boolean) => void;
}

interface BottomBarProps {
  readonly desk: SheetDesk;
  readonly ways: BarWays;
  readonly onReadings: () => void;
}

/** Within reach of a thumb: back, not taken, how far along the tape one is, and the next point. */
export function BottomBar({ desk, ways, onReadings }: BottomBarProps) {
  const { asking, setAsking, keysShown, setKeysShown } = ways;
  if (desk.locked) return <LockedBar desk={desk} />;
  return (
    <div
      role="region"
      aria-label="Measuring"
      className="z-10 flex shrink-0 flex-wrap items-end gap-3 border-t border-hair bg-sheet px-4 py-2 max-sm:gap-2 max-sm:px-2"
    >
      <Button
        height="table"
        className="max-sm:px-2"
        onClick={() => {
          onReadings();
          desk.step(-1);
        }}
      >
        Back
      </Button>
      <Button height="table" className="max-sm:px-2" onClick={() => setAsking(true)}>
        Cannot be taken
      </Button>
      <Button height="table" className="max-sm:px-2" disabled={!desk.canUndo} onClick={desk.undo}>
        Undo
      </Button>
      <Button height="table" onClick={() => desk.setPausing('')} className="max-md:hidden">
        Pause
      </Button>
      <div className="min-w-0 grow max-xl:order-first max-xl:w-full">
        <TapeProgress done={desk.done} wanted={desk.points.length} />
      </div>
      <Button
        height="table"
        aria-pressed={desk.keypad}
        onClick={() => {
          desk.setKeypad(!desk.keypad);
          desk.go(desk.current.key);
        }}
        className="aria-pressed:bg-well max-sm:hidden"
      >
        Keypad
      </Button>
      <Button height="table" onClick={() => setKeysShown(true)} className="max-lg:hidden">
        Keys
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
        className="max-xl:ml-auto max-sm:px-3"
        onClick={() => {
          onReadings();
          desk.next();
        }}
      >
        Next point
      </Button>
      <KeysQuestion open={keysShown} onClose={() => setKeysShown(false)} />
      <NotTakenQuestion
        open={asking}
        label={rowLabel(desk.current)}
        onClose={() => setAsking(false)}
        onSaid={(reason, note) => {
          setAsking(false);
          desk.setAside(desk.current, reason, note);
          if (reason === 'stopped-damage-seen') desk.setPausing(`Damage seen: ${note}`);
          else desk.next();
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
