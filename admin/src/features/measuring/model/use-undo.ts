import { useState } from 'react';
import type { NewReading } from '@ellwand/shared/records/sheet';
import { newId } from '../../../lib/ids.js';
import type { Draft } from './drafts.js';
import type { OutboxView, SheetOutbox } from './outbox.js';
import type { RowReading, SheetRow } from './rows.js';

/** How many steps back a hand may go. */
const LONGEST = 20;

interface Step {
  readonly row: string;
  readonly reading: NewReading;
  /** What stood there before. */
  readonly before: RowReading | null;
}

export interface UndoWays {
  readonly outbox: SheetOutbox;
  readonly view: OutboxView;
  readonly putBack: (row: string, draft: Draft) => void;
  readonly go: (row: string) => void;
}

/**
 * Takes back what was committed last. What has not been sent goes back into its box; in place of what was sent the
 * earlier reading is entered again, or the box is filled to be keyed over. What the museum holds is never deleted.
 */
export function useUndo({ outbox, view, putBack, go }: UndoWays) {
  const [steps, setSteps] = useState<readonly Step[]>([]);
  const did = (row: SheetRow, reading: NewReading) =>
    setSteps((all) => [...all, { row: row.key, reading, before: row.reading }].slice(-LONGEST));
  const undo = () => {
    const step = steps.at(-1);
    if (!step) return;
    setSteps((all) => all.slice(0, -1));
    const waits = view.entries.some(
      ({ reading, state }) => reading.id === step.reading.id && state === 'waiting',
    );
    if (waits && view.sending === 0) void outbox.decide(step.reading.id);
    else if (step.before) void outbox.add(asBefore(step.reading, step.before));
    if (!step.before) putBack(step.row, draftOf(step.reading));
    go(step.row);
  };
  return { did, undo, canUndo: steps.length > 0 };
}

function asBefore({ id, ...carried }: NewReading, before: RowReading): NewReading {
  const { pointId, round, worn, readBy, heldBy, device } = carried;
  const base = { pointId, round, worn, readBy, heldBy, device, note: before.note };
  const again = { ...base, id: newId(), replaces: id, keyedAt: new Date().toISOString() };
  if (before.reason) return { ...again, state: 'not-taken', reason: before.reason };
  return {
    ...again,
    state: 'taken',
    typed: before.typed,
    unit: before.unit,
    tapeCount: before.tapeCount,
    gapTyped: before.gapTyped || null,
    depthTyped: before.depthTyped || null,
    method: before.doubled ? 'flat-doubled' : null,
    levelFoundBy: before.level,
  };
}

function draftOf(reading: NewReading): Draft {
  const nothing = {
    text: '',
    unit: 'mm' as const,
    count: '',
    level: null,
    gap: '',
    depth: '',
    doubled: false,
  };
  if (reading.state === 'not-taken') return nothing;
  return {
    text: reading.typed,
    unit: reading.unit,
    count: reading.tapeCount > 0 ? String(reading.tapeCount) : '',
    level: reading.levelFoundBy,
    gap: reading.gapTyped ?? '',
    depth: reading.depthTyped ?? '',
    doubled: reading.method === 'flat-doubled',
  };
}
