import { Injectable } from '@nestjs/common';
import { GarmentRecord, PartKind, type Garment } from '@ellwand/shared/records/garment';
import { IsNull, MoreThan } from 'typeorm';
import { AuditEntryRow } from '../audit/audit-entry.entity';
import { notFound } from '../common/refusal';
import type { Tx } from '../common/work';
import { ProtocolBook } from '../measuring/protocols/protocol-book';
import { ImageRow } from '../media/image.entity';
import { toImage } from '../media/image-view';
import { RevisionRow } from '../publishing/revision.entity';
import { UserRow } from '../users/user.entity';
import { GarmentRow } from './garment.entity';
import { PartRow } from './part.entity';
import { sheetSummaries } from './sheet-summaries';

/** Puts together a garment as the Workroom sees it: record, parts with their sheets, pictures, the last return. */
@Injectable()
export class GarmentView {
  constructor(private readonly protocols: ProtocolBook) {}

  /** @throws Refusal 404 */
  async of(tx: Tx, garmentId: string): Promise<Garment> {
    const garment = await tx.findOne(GarmentRow, { where: { id: garmentId } });
    if (!garment) throw notFound('garment.unknown', 'garment');
    const parts = await tx.find(PartRow, { where: { garmentId }, order: { position: 'ASC' } });
    const sheets = await sheetSummaries(tx, parts, this.protocols);
    const images = await tx.find(ImageRow, {
      where: { garmentId, deletedAt: IsNull() },
      order: { position: 'ASC', id: 'ASC' },
    });
    return {
      id: garment.id,
      version: garment.version,
      stage: garment.stage,
      publicNumber: garment.publicNumber,
      publishedVersion: garment.publishedVersion,
      isPublic: garment.isPublic,
      record: GarmentRecord.parse(garment.record),
      parts: parts.map((part) => ({
        id: part.id,
        garmentId: part.garmentId,
        suffix: part.suffix,
        kind: PartKind.parse(part.kind),
        name: part.name,
        position: part.position,
        wornTogether: part.wornTogether,
        sheets: sheets.filter((sheet) => sheet.partId === part.id),
      })),
      images: images.map(toImage),
      returned: await lastReturn(tx, garment),
      createdAt: garment.createdAt.toISOString(),
      updatedAt: garment.updatedAt.toISOString(),
    };
  }
}

/** Why the record came back from review, until it is sent again. */
async function lastReturn(tx: Tx, garment: GarmentRow): Promise<Garment['returned']> {
  if (garment.stage !== 'draft') return null;
  const last = await tx.findOne(RevisionRow, { where: { garmentId: garment.id }, order: { number: 'DESC' } });
  if (last?.outcome !== 'returned' || !last.decidedBy || !last.decidedAt) return null;
  // Whoever withdrew the garment since, and took it up again, began anew.
  const sinceReturned = { subjectId: garment.id, verb: 'withdraw', at: MoreThan(last.decidedAt) };
  if (await tx.existsBy(AuditEntryRow, sinceReturned)) return null;
  const by = await tx.findOne(UserRow, { where: { id: last.decidedBy } });
  return { reason: last.reason ?? '', by: by?.name ?? '', at: last.decidedAt.toISOString() };
}
