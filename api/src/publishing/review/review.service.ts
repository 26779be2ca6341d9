import { Injectable } from '@nestjs/common';
import type { PublishedDocument } from '@ellwand/shared/records/published-garment';
import type { Review, Revisions } from '@ellwand/shared/records/publishing';
import { In } from 'typeorm';
import type { z } from 'zod';
import type { Actor } from '../../common/actor';
import { Clock } from '../../common/clock';
import { notFound } from '../../common/refusal';
import { type Tx, Work } from '../../common/work';
import { GarmentView } from '../../garments/garment-view';
import { GarmentRow } from '../../garments/garment.entity';
import { FindingsService } from '../../measuring/findings/findings.service';
import { ProtocolBook } from '../../measuring/protocols/protocol-book';
import { museumName } from '../../users/museum';
import { UserRow } from '../../users/user.entity';
import { projectGarment } from '../projection/project-garment';
import { freePublicNumber } from '../public-number';
import { RevisionRow } from '../revision.entity';
import type { Snapshot } from '../snapshot';
import { takeSnapshot } from '../snapshot-taker';
import { mayNotApprove } from './approval';
import { withLateHands } from './late-hands';
import { changesBetween } from './changes';
import { readiness } from './readiness';

type Entry = z.output<typeof Review>['readiness'][number];

/** What a curator looks at before deciding: the garment as the public would see it, what changed, what is open. */
@Injectable()
export class ReviewService {
  constructor(
    private readonly work: Work,
    private readonly view: GarmentView,
    private readonly findings: FindingsService,
    private readonly protocols: ProtocolBook,
    private readonly clock: Clock,
  ) {}

  async review(garmentId: string, actor: Actor): Promise<z.output<typeof Review>> {
    const tx = this.work.reader;
    const garment = await garmentRow(tx, garmentId);
    const snapshot = await this.underReview(tx, garment);
    const next = await this.documentOf(tx, garment, snapshot);
    return {
      garmentId,
      version: garment.version,
      nextVersion: next.version,
      changes: changesBetween(await lastPublished(tx, garment), next),
      readiness: await this.readiness(tx, garmentId),
      mayNotApprove: mayNotApprove(await withLateHands(tx, garmentId, snapshot), actor.id)?.message ?? null,
      people: await this.people(tx, snapshot),
    };
  }

  async preview(garmentId: string): Promise<PublishedDocument> {
    const garment = await garmentRow(this.work.reader, garmentId);
    return this.documentOf(this.work.reader, garment, await this.underReview(this.work.reader, garment));
  }

  async revisions(garmentId: string): Promise<z.output<typeof Revisions>> {
    const tx = this.work.reader;
    await garmentRow(tx, garmentId);
    const rows = await tx.find(RevisionRow, { where: { garmentId }, order: { number: 'DESC' } });
    const names = await namesOf(
      tx,
      rows.flatMap((row) => [row.submittedBy, row.decidedBy ?? []].flat()),
    );
    return {
      items: rows.map((row) => ({
        id: row.id,
        number: row.number,
        outcome: row.outcome,
        submittedBy: names.get(row.submittedBy) ?? '',
        submittedAt: row.submittedAt.toISOString(),
        decidedBy: row.decidedBy ? (names.get(row.decidedBy) ?? '') : null,
        decidedAt: row.decidedAt?.toISOString() ?? null,
        reason: row.reason,
        publishedVersion: row.publishedVersion,
      })),
    };
  }

  /** What keeps the garment from being sent, approved or published. */
  async readiness(tx: Tx, garmentId: string): Promise<Entry[]> {
    const garment = await this.view.of(tx, garmentId);
    const openQuestions = [];
    for (const part of garment.parts) {
      const speaking = part.sheets.find((sheet) => sheet.speaks);
      if (!speaking) continue;
      const count = await this.findings.openQuestions(tx, speaking.id);
      openQuestions.push({ sheetId: speaking.id, partName: part.name, count });
    }
    const { record, parts, images } = garment;
    return readiness({ garmentId, record, parts, images, openQuestions });
  }

  /** In review and after it, what was frozen; before, the draft as it stands. */
  private async underReview(tx: Tx, garment: GarmentRow): Promise<Snapshot> {
    if (garment.stage === 'draft') return takeSnapshot(tx, garment, this.protocols);
    const last = await tx.findOne(RevisionRow, {
      where: { garmentId: garment.id },
      order: { number: 'DESC' },
    });
    return last?.snapshot ?? takeSnapshot(tx, garment, this.protocols);
  }

  private async documentOf(tx: Tx, garment: GarmentRow, snapshot: Snapshot): Promise<PublishedDocument> {
    return projectGarment(snapshot, {
      number: garment.publicNumber ?? (await freePublicNumber(tx, garment.ownNumber)),
      version:
        garment.stage === 'published' ? (garment.publishedVersion ?? 1) : (garment.publishedVersion ?? 0) + 1,
      publishedAt: this.clock.now().toISOString(),
      museum: await museumName(tx),
    });
  }

  private async people(tx: Tx, snapshot: Snapshot): Promise<{ name: string; did: string }[]> {
    const editors = await namesOf(tx, snapshot.editedBy);
    const measurers = snapshot.parts.flatMap((part) =>
      (part.sheet?.people ?? []).map(({ name, duty }) => ({ name, did: `${did[duty]} (${part.name})` })),
    );
    return [...[...editors.values()].map((name) => ({ name, did: 'edited' })), ...measurers];
  }
}

const did = { read: 'read the tape', held: 'held the tape', wrote: 'wrote the readings' } as const;

async function garmentRow(tx: Tx, id: string): Promise<GarmentRow> {
  const garment = await tx.findOne(GarmentRow, { where: { id } });
  if (!garment) throw notFound('garment.unknown', 'garment');
  return garment;
}

async function namesOf(tx: Tx, ids: readonly string[]): Promise<Map<string, string>> {
  if (ids.length === 0) return new Map();
  const users = await tx.find(UserRow, { where: { id: In([...new Set(ids)]) } });
  return new Map(users.map((user) => [user.id, user.name]));
}

/** The version that the public sees now, or saw last. */
async function lastPublished(tx: Tx, garment: GarmentRow): Promise<PublishedDocument | null> {
  if (garment.publishedVersion === null) return null;
  const rows: { document: PublishedDocument | string }[] = await tx.query(
    'SELECT document FROM ellwand_catalogue.published_version WHERE number = ? AND version = ?',
    [garment.publicNumber, garment.publishedVersion],
  );
  const document = rows[0]?.document;
  if (document === undefined) return null;
  return typeof document === 'string' ? (JSON.parse(document) as PublishedDocument) : document;
}
