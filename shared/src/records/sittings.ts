/** A sheet is measured in one or more sittings: from opening the box until it is put away. */
import type { StoredReading } from './sheet.js';
import type { NewTableNote, StoredTableNote } from './table-note.js';

export interface Sitting {
  /** When it began, as it was said; where nobody said so, when its first reading was keyed. */
  readonly begunAt: string;
  /** When it was put away; null while the garment is out. */
  readonly pausedAt: string | null;
  readonly pausedBecause: string;
  /** How many readings were keyed in it. */
  readonly readings: number;
}

type Moment =
  | { readonly at: string; readonly what: 'begun' }
  | { readonly at: string; readonly what: 'paused'; readonly reason: string }
  | { readonly at: string; readonly what: 'read' };

function momentOf(note: StoredTableNote | NewTableNote): Moment[] {
  if (note.about === 'begun') return [{ at: note.saidAt, what: 'begun' }];
  if (note.about === 'paused') return [{ at: note.saidAt, what: 'paused', reason: note.reason }];
  return [];
}

const orderAtOnce: Readonly<Record<Moment['what'], number>> = { begun: 0, read: 1, paused: 2 };

/**
 * The sittings of a sheet, first to last, whatever order its notes came in. Readings keyed while nobody said that a
 * sitting had begun make one all the same; saying twice that one begins makes one.
 */
export function sittingsOf(
  notes: readonly (StoredTableNote | NewTableNote)[],
  readings: readonly Pick<StoredReading, 'keyedAt'>[],
): readonly Sitting[] {
  const moments: Moment[] = [
    ...notes.flatMap(momentOf),
    ...readings.map(({ keyedAt }): Moment => ({ at: keyedAt, what: 'read' })),
  ];
  const ordered = moments.toSorted(
    (one, other) => one.at.localeCompare(other.at) || orderAtOnce[one.what] - orderAtOnce[other.what],
  );
  return ordered.reduce<readonly Sitting[]>(withMoment, []);
}

function withMoment(sittings: readonly Sitting[], moment: Moment): readonly Sitting[] {
  const last = sittings.at(-1);
  const open = last?.pausedAt === null ? last : undefined;
  if (moment.what === 'paused') {
    if (!open) return sittings;
    return [...sittings.slice(0, -1), { ...open, pausedAt: moment.at, pausedBecause: moment.reason }];
  }
  const read = moment.what === 'read' ? 1 : 0;
  if (open) return [...sittings.slice(0, -1), { ...open, readings: open.readings + read }];
  return [...sittings, { begunAt: moment.at, pausedAt: null, pausedBecause: '', readings: read }];
}
