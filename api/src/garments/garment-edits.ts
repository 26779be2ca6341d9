import { Injectable } from '@nestjs/common';
import { mayMove, type RecordStage } from '@ellwand/shared/records/record-moves';
import type { Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { staleVersion } from '../common/if-match';
import { conflict, notFound } from '../common/refusal';
import type { Tx } from '../common/work';
import { UserRow } from '../users/user.entity';
import { GarmentEditor } from './garment-editor.entity';
import { GarmentRow } from './garment.entity';

const lockedBecause: Partial<Record<RecordStage, string>> = {
  'in-review': 'This record is in review. It can be edited again once a curator returns it.',
  approved: 'This record is approved. Return it to draft before editing it.',
};

/**
 * How every room changes a garment: lock the row, compare the version that was seen, change, set the next one.
 * Nothing here uses `save()`: a stale one would silently write old values back.
 */
@Injectable()
export class GarmentEdits {
  constructor(private readonly clock: Clock) {}

  /** The garment's row, locked until the transaction ends. @throws Refusal 404 */
  async lock(tx: Tx, garmentId: string): Promise<GarmentRow> {
    const garment = await tx.findOne(GarmentRow, {
      where: { id: garmentId },
      lock: { mode: 'pessimistic_write' },
    });
    if (!garment) throw notFound('garment.unknown', 'garment');
    return garment;
  }

  /** The same, and refuses with 412 where somebody has changed it since. */
  async lockAt(tx: Tx, garmentId: string, seen: number): Promise<GarmentRow> {
    const garment = await this.lock(tx, garmentId);
    if (garment.version !== seen) {
      const by = await tx.findOne(UserRow, { where: { id: garment.updatedBy } });
      throw staleVersion(seen, garment.version, by?.name ?? null, garment.updatedAt);
    }
    return garment;
  }

  /** Asked before costly work begins; whoever edits asks again under lock. @throws Refusal 404, 409 `record.locked` */
  async refuseUneditable(tx: Tx, garmentId: string): Promise<void> {
    const garment = await tx.findOneBy(GarmentRow, { id: garmentId });
    if (!garment) throw notFound('garment.unknown', 'garment');
    refuseLocked(garment);
  }

  /**
   * Marks that somebody edits this garment's record, parts, sheets or pictures: refuses where it is locked, takes
   * a published record to a draft beside its public version, notes the editor, and counts the version up.
   */
  async noteEdit(tx: Tx, actor: Pick<Actor, 'id'>, garmentId: string): Promise<GarmentRow> {
    const garment = await this.lock(tx, garmentId);
    return this.edit(tx, actor, garment, {});
  }

  /**
   * Marks that a part of this garment is being measured, or its cut sheet written. Who writes on a sheet is an editor
   * too; the record's version stays, so that sheets do not get in the way of whoever describes the garment.
   */
  async noteMeasuring(tx: Tx, actor: Pick<Actor, 'id'>, garmentId: string): Promise<void> {
    const garment = await this.lock(tx, garmentId);
    refuseLocked(garment);
    await this.noteHands(tx, garment.id, [actor.id]);
    if (garment.stage !== 'draft') await this.set(tx, actor, garment, { stage: 'draft' });
  }

  /** `noteEdit` for a row that is already locked, together with the changes to its own columns. */
  async edit(
    tx: Tx,
    actor: Pick<Actor, 'id'>,
    garment: GarmentRow,
    changes: Partial<GarmentRow>,
  ): Promise<GarmentRow> {
    refuseLocked(garment);
    await this.noteHands(tx, garment.id, [actor.id]);
    return this.set(tx, actor, garment, { ...changes, stage: 'draft' });
  }

  /** Moves a locked record along `recordMoves`; anything else is refused with 409. */
  async move(
    tx: Tx,
    actor: Actor,
    garment: GarmentRow,
    to: RecordStage,
    changes: Partial<GarmentRow> = {},
  ): Promise<GarmentRow> {
    if (!mayMove(garment.stage, to)) {
      throw conflict('record.no-such-move', `A record that is ${garment.stage} cannot become ${to}.`, {
        stage: garment.stage,
      });
    }
    return this.set(tx, actor, garment, { ...changes, stage: to });
  }

  /** Keeps in mind whoever had a hand in the garment since it was last published: they may not approve it. */
  async noteHands(tx: Tx, garmentId: string, userIds: readonly string[]): Promise<void> {
    if (userIds.length === 0) return;
    const editedAt = this.clock.now();
    await tx
      .createQueryBuilder()
      .insert()
      .into(GarmentEditor)
      .values(userIds.map((userId) => ({ garmentId, userId, editedAt })))
      .orUpdate(['edited_at'])
      .execute();
  }

  private async set(
    tx: Tx,
    actor: Pick<Actor, 'id'>,
    garment: GarmentRow,
    changes: Partial<GarmentRow>,
  ): Promise<GarmentRow> {
    const next = {
      ...changes,
      version: garment.version + 1,
      updatedAt: this.clock.now(),
      updatedBy: actor.id,
    };
    const { affected } = await tx.update(GarmentRow, { id: garment.id, version: garment.version }, next);
    if (affected !== 1) throw staleVersion(garment.version, garment.version + 1, null, null);
    return { ...garment, ...next };
  }
}

function refuseLocked({ stage }: GarmentRow): void {
  const because = lockedBecause[stage];
  if (because !== undefined) throw conflict('record.locked', because, { stage });
}
