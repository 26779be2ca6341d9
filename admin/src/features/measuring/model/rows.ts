import type { MeasuringHow } from '@ellwand/shared/points/point';
import { allowedSpreadAt } from '@ellwand/shared/points/tolerance';
import type { WornSide } from '@ellwand/shared/readings/worn-side';
import type { NewReading, Sheet, StoredReading } from '@ellwand/shared/records/sheet';
import { isLonger, type Length, longestOf, mm, shortestOf, subtract } from '@ellwand/shared/units/length';
import type { OutboxEntry } from './outbox.js';
import { asStored } from './pending-reading.js';
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
  readonly gapTyped: string;
  readonly depthTyped: string;
  /** Read flat and doubled where its point says otherwise. */
  readonly doubled: boolean;
  readonly level: StoredReading['levelFoundBy'];
  readonly reason: StoredReading['reason'];
  readonly note: string;
  readonly sent: boolean;
}

/** One line of the sheet: a point in one round, on one side where left and right are told apart. */
export interface SheetRow {
  readonly key: string;
  readonly point: SheetPoint;
  readonly worn: WornSide | null;
  readonly round: number;
  readonly reading: RowReading | null;
  readonly decision: OutboxEntry | null;
  /** A later round of this point is not in yet: until then this value is covered, so that it sways nobody. */
  readonly covered: boolean;
}

export const rowKey = (pointId: string, round: number, worn: WornSide | null = null): string =>
  [pointId, round, ...(worn ? [worn] : [])].join(':');

/** How a row's reading is laid: flat and doubled where that was said, else as its point says. */
export const howOf = ({ point }: SheetRow, doubled: boolean): MeasuringHow =>
  doubled ? 'flat-doubled' : point.point.how;

function rowReading(reading: StoredReading, sent: boolean): RowReading {
  return {
    id: reading.id,
    value: reading.valueMm === null ? null : mm(reading.valueMm),
    typed: reading.typed ?? '',
    unit: reading.unit ?? 'mm',
    tapeCount: reading.tapeCount,
    gapTyped: reading.gapTyped ?? '',
    depthTyped: reading.depthTyped ?? '',
    doubled: reading.method === 'flat-doubled',
    level: reading.levelFoundBy,
    reason: reading.reason,
    note: reading.note,
    sent,
  };
}

/** What stands at each place: the API's readings, and over them what still waits here, in order. */
function standing({ sheet, entries }: RowsAsked): ReadonlyMap<string, RowReading> {
  const found = new Map<string, RowReading>();
  const place = ({ pointId, round, worn }: StoredReading | NewReading) => rowKey(pointId, round, worn);
  for (const reading of sheet.readings) {
    if (reading.stands) found.set(place(reading), rowReading(reading, true));
  }
  for (const { reading, state } of entries) {
    const kept = state === 'waiting' ? asStored(reading, sheet, reading.readBy) : null;
    if (kept) found.set(place(reading), rowReading(kept, false));
  }
  return found;
}

export interface RowsAsked {
  readonly points: readonly SheetPoint[];
  readonly sheet: Sheet;
  readonly entries: readonly OutboxEntry[];
  /** How many rounds a person asked for, by point, where more than the sheet does. */
  readonly rounds: Readonly<Record<string, number>>;
  /** Points of which a person tells left from right. */
  readonly sided: ReadonlySet<string>;
}

/** Every row of the sheet in handling order; a point has as many rows as it has rounds, on each side. */
export function sheetRows(asked: RowsAsked): readonly SheetRow[] {
  const found = standing(asked);
  const all = [...asked.sheet.readings, ...asked.entries.map(({ reading }) => reading)];
  return asked.points.flatMap((point) => {
    const own = all.filter(({ pointId }) => pointId === point.id);
    return sidesOf(own, asked.sided.has(point.id)).flatMap((worn) => {
      const rounds = own.filter((reading) => reading.worn === worn).map(({ round }) => round);
      const last = Math.max(point.rounds, asked.rounds[point.id] ?? 1, ...rounds);
      return rowsOf({ point, worn, last, found, entries: asked.entries });
    });
  });
}

/** One row for the point; two where left and right are told apart, and a third for what was read before that. */
function sidesOf(
  own: readonly { readonly worn: WornSide | null }[],
  isSided: boolean,
): readonly (WornSide | null)[] {
  const told = isSided || own.some(({ worn }) => worn !== null);
  if (!told) return [null];
  return [...(own.some(({ worn }) => worn === null) ? [null] : []), 'right', 'left'];
}

interface OfSide {
  readonly point: SheetPoint;
  readonly worn: WornSide | null;
  readonly last: number;
  readonly found: ReadonlyMap<string, RowReading>;
  readonly entries: readonly OutboxEntry[];
}

function rowsOf({ point, worn, last, found, entries }: OfSide): readonly SheetRow[] {
  const isRead = (round: number) => found.has(rowKey(point.id, round, worn));
  const begun = Array.from({ length: last }, (_, index) => index + 1).filter(isRead).length > 0;
  // What was not taken at all is not asked for again; a second round shows once there is a first.
  const first = found.get(rowKey(point.id, 1, worn));
  const shown =
    begun && first?.reason === null ? last : Math.max(1, ...roundsWithReading(found, point.id, worn));
  const blind = shown > 1 && !isRead(shown);
  return Array.from({ length: shown }, (_, index): SheetRow => {
    const round = index + 1;
    const key = rowKey(point.id, round, worn);
    const decision = entries.find(
      ({ reading, state }) =>
        state === 'decision' && rowKey(reading.pointId, reading.round, reading.worn) === key,
    );
    const reading = found.get(key) ?? null;
    const covered = blind && round < shown;
    return { key, point, worn, round, reading, decision: decision ?? null, covered };
  });
}

const roundsWithReading = (
  found: ReadonlyMap<string, RowReading>,
  pointId: string,
  worn: WornSide | null,
): readonly number[] =>
  Array.from({ length: 9 }, (_, index) => index + 1).filter((round) =>
    found.has(rowKey(pointId, round, worn)),
  );

/** How far the rounds of a row's place lie apart and whether that is allowed; null with fewer than two. */
export function spreadOf(
  rows: readonly SheetRow[],
  { point: { id }, worn }: Pick<SheetRow, 'point' | 'worn'>,
): { readonly apart: Length; readonly allowed: Length; readonly within: boolean } | null {
  const own = rows.filter((row) => row.point.id === id && row.worn === worn);
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

/** Whether a point can be read again at this row: a first time blind, or once more where two lie apart already. */
export type Again = 'no' | 'blind' | 'once-more';

/** Only after its last reading, and only one that was taken and may be seen. */
export function againOf(row: SheetRow, rows: readonly SheetRow[]): Again {
  const { point, worn, round, reading, covered } = row;
  const isTaken = !covered && reading !== null && reading.reason === null;
  const isLast = !rows.some(
    (other) => other.point.id === point.id && other.worn === worn && other.round > round,
  );
  if (!isTaken || !isLast) return 'no';
  return spreadOf(rows, row) ? 'once-more' : 'blind';
}
