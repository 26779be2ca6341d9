import type { SheetSummary } from '@ellwand/shared/records/sheet';
import { In } from 'typeorm';
import type { Tx } from '../common/work';
import type { ProtocolBook } from '../measuring/protocols/protocol-book';
import { ReadingRow } from '../measuring/readings/reading.entity';
import { SheetRow } from '../measuring/sheets/sheet.entity';
import { speakingOf } from '../measuring/sheets/speaking-sheet';
import type { PartRow } from './part.entity';

/** The sheets of some parts, newest first, each with how many of its own protocol's points are done. */
export async function sheetSummaries(
  tx: Tx,
  parts: readonly PartRow[],
  protocols: ProtocolBook,
): Promise<SheetSummary[]> {
  if (parts.length === 0) return [];
  const sheets = await tx.find(SheetRow, {
    where: { partId: In(parts.map((part) => part.id)) },
    order: { measuredOn: 'DESC', createdAt: 'DESC' },
  });
  const done = await pointsDone(tx, sheets);
  const speaking = new Set(
    parts.map(
      (part) =>
        speakingOf(
          part,
          sheets.filter(({ partId }) => partId === part.id),
        )?.id,
    ),
  );
  return Promise.all(
    sheets.map(async (sheet) => ({
      id: sheet.id,
      partId: sheet.partId,
      state: sheet.state,
      purpose: sheet.purpose,
      speaks: speaking.has(sheet.id),
      measuredOn: sheet.measuredOn,
      pointsDone: done.get(sheet.id) ?? 0,
      pointsWanted: await pointsWanted(tx, sheet, parts, protocols),
    })),
  );
}

async function pointsWanted(
  tx: Tx,
  sheet: SheetRow,
  parts: readonly PartRow[],
  protocols: ProtocolBook,
): Promise<number> {
  const part = parts.find(({ id }) => id === sheet.partId);
  return part ? (await protocols.at(tx, part, sheet.protocolVersion)).points.length : 0;
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
