import type { GarmentKind } from '@ellwand/shared/points/kinds';
import type { RepeatabilitySource } from '@ellwand/shared/records/repeatability';
import type { SheetPurpose } from '@ellwand/shared/records/sheet';
import type { WornSide } from '@ellwand/shared/readings/worn-side';
import type { Tx } from '../../common/work';

/** As many sheets as are worked out at once, the newest first. */
export const MOST_SHEETS = 1000;

/** A sheet on which something was read more than once. */
export interface RepeatedSheet {
  readonly id: string;
  readonly partId: string;
  readonly kind: GarmentKind;
  readonly wornTogether: boolean;
  readonly protocolVersion: number;
  readonly repeatPoints: readonly string[];
  readonly purpose: SheetPurpose;
}

export interface RepeatedRow {
  readonly sheetId: string;
  readonly pointId: string;
  readonly worn: WornSide | null;
  readonly valueMm: string;
  readonly readBy: string;
}

/**
 * Study sheets, and record sheets with a second round: newest first, one more than are worked out, so that it can be
 * told whether there are more. Study sheets of one part belong together, so one round each may do.
 */
export async function repeatedSheets(tx: Tx, from: RepeatabilitySource): Promise<RepeatedSheet[]> {
  const rows = await tx.query<(Omit<RepeatedSheet, 'repeatPoints' | 'wornTogether'> & Raw)[]>(
    `SELECT s.id, s.part_id AS partId, p.kind, p.worn_together AS wornTogether,
       s.protocol_version AS protocolVersion, s.repeat_points AS repeatPoints, s.purpose
     FROM ellwand.sheet s JOIN ellwand.part p ON p.id = s.part_id
     WHERE (? = 'all' OR s.purpose = ?)
       AND (s.purpose = 'study' OR EXISTS (SELECT 1 FROM ellwand.reading r
         WHERE r.sheet_id = s.id AND r.stands AND r.state = 'taken' AND r.round >= 2))
     ORDER BY s.measured_on DESC, s.created_at DESC, s.id LIMIT ?`,
    [from, from, MOST_SHEETS + 1],
  );
  return rows.map(({ wornTogether, repeatPoints, ...sheet }) => ({
    ...sheet,
    wornTogether: Boolean(wornTogether),
    repeatPoints: pointIds(repeatPoints),
  }));
}

interface Raw {
  readonly wornTogether: number | boolean;
  readonly repeatPoints: unknown;
}

function pointIds(json: unknown): readonly string[] {
  const list: unknown = typeof json === 'string' ? JSON.parse(json) : json;
  return Array.isArray(list) ? list.filter((id) => typeof id === 'string') : [];
}

/** What was taken and stands on these sheets, in the order in which it was read. */
export function rowsOf(tx: Tx, sheetIds: readonly string[]): Promise<RepeatedRow[]> {
  if (sheetIds.length === 0) return Promise.resolve([]);
  return tx.query<RepeatedRow[]>(
    `SELECT r.sheet_id AS sheetId, r.point_id AS pointId, r.worn, r.value_mm AS valueMm, r.read_by AS readBy
     FROM ellwand.reading r JOIN ellwand.sheet s ON s.id = r.sheet_id
     WHERE r.sheet_id IN (?) AND r.stands AND r.state = 'taken' AND r.value_mm IS NOT NULL
     ORDER BY s.measured_on, s.created_at, r.round, r.keyed_at, r.id`,
    [sheetIds],
  );
}
