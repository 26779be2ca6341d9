import type { SheetSummary } from '@ellwand/shared/records/sheet';
import { protocolFor } from '@ellwand/shared/protocols/standard-protocols';
import { In } from 'typeorm';
import type { Tx } from '../common/work';
import { ReadingRow } from '../measuring/readings/reading.entity';
import { SheetRow } from '../measuring/sheets/sheet.entity';
import type { PartRow } from './part.entity';

/** The sheets of some parts, newest first, each with how many of its protocol's points are done. */
export async function sheetSummaries(tx: Tx, parts: readonly PartRow[]): Promise<SheetSummary[]> {
  if (parts.length === 0) return [];
  const sheets = await tx.find(SheetRow, {
    where: { partId: In(parts.map((part) => part.id)) },
    order: { measuredOn: 'DESC', createdAt: 'DESC' },
  });
  const done = await pointsDone(tx, sheets);
  const kindOf = new Map(parts.map((part) => [part.id, part.kind]));
  return sheets.map((sheet) => {
    const kind = kindOf.get(sheet.partId);
    return {
      id: sheet.id,
      partId: sheet.partId,
      state: sheet.state,
      measuredOn: sheet.measuredOn,
      pointsDone: done.get(sheet.id) ?? 0,
      pointsWanted: kind ? protocolFor(kind).points.length : 0,
    };
  });
}

async function pointsDone(tx: Tx, sheets: readonly SheetRow[]): Promise<Map<string, number>> {
  if (sheets.length === 0) return new Map();
  const rows = await tx
    .createQueryBuilder(ReadingRow, 'reading')
    .select('reading.sheetId', 'sheetId')
    .addSelect('COUNT(DISTINCT reading.pointId)', 'points')
    .where('reading.sheetId IN (:...ids) AND reading.stands', { ids: sheets.map((sheet) => sheet.id) })
    .groupBy('reading.sheetId')
    .getRawMany<{ sheetId: string; points: string }>();
  return new Map(rows.map((row) => [row.sheetId, Number(row.points)]));
}
