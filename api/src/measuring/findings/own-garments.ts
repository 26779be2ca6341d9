import type { PeerValues } from '@ellwand/shared/checks/sheet-view';
import { acceptedValues } from '@ellwand/shared/readings/accepted-value';
import { shareDecade } from '@ellwand/shared/records/decades';
import { readDate } from '@ellwand/shared/records/edtf-date';
import { toReading } from '@ellwand/shared/records/measured';
import { toMm } from '@ellwand/shared/units/length';
import { In } from 'typeorm';
import { grouped } from '../../common/grouped';
import type { Tx } from '../../common/work';
import { GarmentRow } from '../../garments/garment.entity';
import type { PartRow } from '../../garments/part.entity';
import { ReadingRow } from '../readings/reading.entity';
import { toStored } from '../readings/stored-reading';

/** How far the house is searched, and how many sheets are compared: enough for any decade, and never the whole house. */
const SEARCHED = 1000;
const COMPARED = 120;

interface Candidate {
  readonly sheetId: string;
  readonly date: string | null;
}

/**
 * What the museum's other garments came to, point by point: parts of the same kind, dated within the same decade, each
 * by the sheet that speaks for it. Nothing where the garment's own date cannot be read or is too wide.
 */
export async function ownGarments(tx: Tx, part: PartRow): Promise<readonly PeerValues[]> {
  const garment = await tx.findOneOrFail(GarmentRow, { where: { id: part.garmentId } });
  const own = readDate(garment.record.date);
  if (!own || part.wornTogether) return [];
  const sheetIds = (await candidates(tx, part))
    .filter(({ date }) => {
      const other = date === null ? undefined : readDate(date);
      return other !== undefined && shareDecade(own, other);
    })
    .map(({ sheetId }) => sheetId)
    .slice(0, COMPARED);
  if (sheetIds.length === 0) return [];
  const rows = await tx.find(ReadingRow, { where: { sheetId: In(sheetIds), stands: true, state: 'taken' } });
  return valuesByPoint(rows);
}

/** Newest garments first, so that a large house compares with what it measured lately. */
async function candidates(tx: Tx, { kind, garmentId }: PartRow): Promise<Candidate[]> {
  const rows: unknown = await tx.query(
    `SELECT * FROM (
       SELECT JSON_VALUE(g.record, '$.date') AS date, g.created_at AS made, g.id AS garment_id,
         (SELECT s.id FROM ellwand.sheet s
           WHERE s.part_id = p.id AND s.state = 'complete' AND s.purpose = 'record'
           ORDER BY (s.id <=> p.speaking_sheet_id) DESC, s.measured_on DESC, s.created_at DESC LIMIT 1) AS sheetId
       FROM ellwand.part p JOIN ellwand.garment g ON g.id = p.garment_id
       WHERE p.kind = ? AND p.garment_id <> ? AND NOT p.worn_together) found
     WHERE sheetId IS NOT NULL ORDER BY made DESC, garment_id LIMIT ?`,
    [kind, garmentId, SEARCHED],
  );
  return rows as Candidate[];
}

function valuesByPoint(rows: readonly ReadingRow[]): readonly PeerValues[] {
  const bySheet = grouped(rows, ({ sheetId }) => sheetId);
  const values = [...bySheet.values()].flatMap((own) => [
    ...acceptedValues(own.map((row) => toReading(toStored(row)))).values(),
  ]);
  return [...grouped(values, ({ pointId }) => pointId)].map(([pointId, found]) => ({
    pointId,
    valuesMm: found.map(({ value }) => toMm(value)),
  }));
}
