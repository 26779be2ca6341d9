import type { Sheet } from '@ellwand/shared/records/sheet';
import { type Sitting, sittingsOf } from '@ellwand/shared/records/sittings';
import type { OutboxView, SheetOutbox } from './outbox.js';

export interface SittingsSeen {
  readonly all: readonly Sitting[];
  /** The last sitting, where the garment has been put away since; null while it is out. */
  readonly paused: Sitting | null;
  readonly pause: (reason: string) => void;
  readonly goOn: () => void;
}

/** The sittings of a sheet, with what this device has said and not sent yet. */
export function useSittings(sheet: Sheet, outbox: SheetOutbox, { notes, entries }: OutboxView): SittingsSeen {
  const said = [...sheet.tableNotes, ...notes.map(({ note }) => note)];
  const readings = [...sheet.readings, ...entries.map(({ reading }) => reading)];
  const all = sittingsOf(said, readings);
  const last = all.at(-1);
  return {
    all,
    paused: last && last.pausedAt !== null ? last : null,
    pause: (reason) => void outbox.say({ about: 'paused', reason }),
    goOn: () => void outbox.say({ about: 'begun' }),
  };
}
