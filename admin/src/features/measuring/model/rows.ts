import { type MeasuringHow } from '@ellwand/shared/points/point';
import { allowedSpreadAt } from '@ellwand/shared/points/tolerance';
import { wholeValue } from '@ellwand/shared/readings/whole-value';
import type { NewReading, StoredReading } from '@ellwand/shared/records/sheet';
import { isLonger, type Length, longestOf, mm, shortestOf, subtract } from '@ellwand/shared/units/length';
import { fromTyped } from '@ellwand/shared/units/parse-length';
import type { OutboxEntry } from './outbox.js';
import type { SheetPoint } from './sheet-points.js';

/** What the tape is like: its whole length and what it shows at nothing. */
export interface Tape {
  readonly length: Length;
  readonly zero: Length;
}

/** A reading as a row shows it, wherever it is just now. */
export interface RowReading {
  readonly id: string;
  readonly value: Length | null;
  readonly typed: string;
  readonly unit: 'mm' | 'cm' | 'in';
  readonly tapeCount: number;
  readonly level: StoredReading['levelFoundBy'];
  readonly reason: StoredReading['reason'];
  readonly note: string;
  readonly sent: boolean;
}

/** One line of the sheet: a point in one round. */
export interface SheetRow {
  readonly key: string;
  readonly point: SheetPoint;
  readonly round: number;
  readonly reading: RowReading | null;
  readonly decision: OutboxEntry | null;
  /** A later round of this point is not in yet: until then this value is covered, so that it sways nobody. */
  readonly covered: boolean;
}

export const rowKey = (pointId: string, round: number): string => `${pointId}:${round}`;

/** The whole value of what was typed; null where it cannot be read. */
export function valueOf(
  typed: string,
  unit: RowReading['unit'],
  tapeCount: number,
  how: MeasuringHow,
  tape: Tape,
): Length | null {
  const parsed = fromTyped({ text: typed, unit });
  if (!parsed.ok) return null;
  return wholeValue({
    read: parsed.value.length,
    how,
    tapeCount,
    tapeLength: tape.length,
    tapeZero: tape.zero,
  });
}

function fromStored(reading: StoredReading): RowReading {
  return {
    id: reading.id,
    value: reading.valueMm === null ? null : mm(reading.valueMm),
    typed: reading.typed ?? '',
    unit: reading.unit ?? 'mm',
    tapeCount: reading.tapeCount,
    level: reading.levelFoundBy,
    reason: reading.reason,
    note: reading.note,
    sent: true,
  };
}

function fromOutbox(reading: NewReading, how: MeasuringHow, tape: Tape): RowReading {
  const { id, note } = reading;
  if (reading.state === 'not-taken') {
    return {
      id,
      value: null,
      typed: '',
      unit: 'mm',
      tapeCount: 0,
      level: null,
      reason: reading.reason,
      note,
      sent: false,
    };
  }
  const { typed, unit, tapeCount, levelFoundBy } = reading;
  const value = valueOf(typed, unit, tapeCount, how, tape);
  return { id, value, typed, unit, tapeCount, level: levelFoundBy, reason: null, note, sent: false };
}

/** What stands at each point and round: the API's readings, and over them what still waits here, in order. */
function standing(
  points: readonly SheetPoint[],
  stored: readonly StoredReading[],
  entries: readonly OutboxEntry[],
  tape: Tape,
) {
  const found = new Map<string, RowReading>();
  for (const reading of stored) {
    if (reading.stands) found.set(rowKey(reading.pointId, reading.round), fromStored(reading));
  }
  for (const { reading, state } of entries) {
    const how = points.find(({ id }) => id === reading.pointId)?.point.how ?? 'straight';
    if (state === 'waiting')
      found.set(rowKey(reading.pointId, reading.round), fromOutbox(reading, how, tape));
  }
  return found;
}

export interface RowsAsked {
  readonly points: readonly SheetPoint[];
  readonly stored: readonly StoredReading[];
  readonly entries: readonly OutboxEntry[];
  readonly tape: Tape;
  /** How many rounds a person asked for, by point, where more than one. */
  readonly rounds: Readonly<Record<string, number>>;
}

/** Every row of the sheet in handling order; a point has as many rows as it has rounds. */
export function sheetRows({ points, stored, entries, tape, rounds }: RowsAsked): readonly SheetRow[] {
  const found = standing(points, stored, entries, tape);
  return points.flatMap((point) => {
    const taken = [...stored, ...entries.map(({ reading }) => reading)].filter(
      ({ pointId }) => pointId === point.id,
    );
    const last = Math.max(1, rounds[point.id] ?? 1, ...taken.map(({ round }) => round));
    const blind = last > 1 && !found.has(rowKey(point.id, last));
    return Array.from({ length: last }, (_, index): SheetRow => {
      const round = index + 1;
      const key = rowKey(point.id, round);
      const decision = entries.find(
        ({ reading, state }) => state === 'decision' && rowKey(reading.pointId, reading.round) === key,
      );
      return {
        key,
        point,
        round,
        reading: found.get(key) ?? null,
        decision: decision ?? null,
        covered: blind && round < last,
      };
    });
  });
}

/** How far a point's rounds lie apart and whether that is allowed; null with fewer than two. */
export function spreadOf(
  rows: readonly SheetRow[],
  pointId: string,
): { readonly apart: Length; readonly allowed: Length; readonly within: boolean } | null {
  const own = rows.filter(({ point }) => point.id === pointId);
  const values = own.flatMap(({ reading }) =>
    reading === null || reading.value === null ? [] : [reading.value],
  );
  const [first, ...others] = values;
  if (first === undefined || others.length === 0) return null;
  const apart = subtract(longestOf(first, ...others), shortestOf(first, ...others));
  const joins = Math.max(...own.map(({ reading }) => reading?.tapeCount ?? 0));
  const allowed = allowedSpreadAt(own[0]!.point.point, longestOf(first, ...others), joins);
  return { apart, allowed, within: !isLonger(apart, allowed) };
}

/** A point is done when its first round was read, or when it was said why not. */
export const isDone = ({ reading }: SheetRow): boolean => reading !== null;
