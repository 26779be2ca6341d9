import { Injectable } from '@nestjs/common';
import type { Actor } from '../../common/actor';
import { Clock } from '../../common/clock';
import { staleVersion } from '../../common/if-match';
import { notFound } from '../../common/refusal';
import type { Tx } from '../../common/work';
import { GarmentEdits } from '../../garments/garment-edits';
import { PartRow } from '../../garments/part.entity';
import { UserRow } from '../../users/user.entity';
import { SheetRow } from './sheet.entity';

export interface SheetInHand {
  readonly sheet: SheetRow;
  readonly part: PartRow;
}

/** How every verb of the measuring room changes a sheet: garment first, then sheet, both locked in that order. */
@Injectable()
export class SheetEdits {
  constructor(
    private readonly garments: GarmentEdits,
    private readonly clock: Clock,
  ) {}

  /**
   * The sheet, its garment noted as being measured. A study sheet is never published, so that it leaves the record
   * alone. @throws Refusal 404, 409 where the record is locked
   */
  async take(tx: Tx, actor: Actor, sheetId: string): Promise<SheetInHand> {
    const inHand = await this.lock(tx, sheetId);
    const { sheet, part } = inHand;
    if (sheet.purpose === 'record') await this.garments.noteMeasuring(tx, actor, part.garmentId);
    return inHand;
  }

  /**
   * The same for what was said at the table: of a sheet that is complete it tells the past. The record stays as it is,
   * in review or published; whoever is named counts as a hand in it all the same.
   */
  async takeToNote(tx: Tx, actor: Actor, sheetId: string): Promise<SheetInHand> {
    const inHand = await this.lock(tx, sheetId);
    if (inHand.sheet.state === 'open') return this.take(tx, actor, sheetId);
    await this.noteHands(tx, inHand, [actor.id]);
    return inHand;
  }

  /** Keeps in mind who had a hand in what a sheet measured, where that may be published. */
  async noteHands(tx: Tx, { sheet, part }: SheetInHand, userIds: readonly string[]): Promise<void> {
    if (sheet.purpose === 'record') await this.garments.noteHands(tx, part.garmentId, userIds);
  }

  private async lock(tx: Tx, sheetId: string): Promise<SheetInHand> {
    const found = await tx.findOne(SheetRow, { where: { id: sheetId } });
    if (!found) throw notFound('sheet.unknown', 'measuring sheet');
    const part = await tx.findOneOrFail(PartRow, { where: { id: found.partId } });
    await this.garments.lock(tx, part.garmentId);
    const sheet = await tx.findOneOrFail(SheetRow, {
      where: { id: sheetId },
      lock: { mode: 'pessimistic_write' },
    });
    return { sheet, part };
  }

  /** The same, and refuses with 412 where somebody has written on it since. */
  async takeAt(tx: Tx, actor: Actor, sheetId: string, seen: number): Promise<SheetInHand> {
    const inHand = await this.take(tx, actor, sheetId);
    const { sheet } = inHand;
    if (sheet.version !== seen) {
      const by = await tx.findOne(UserRow, { where: { id: sheet.updatedBy } });
      throw staleVersion(seen, sheet.version, by?.name ?? null, sheet.updatedAt);
    }
    return inHand;
  }

  async set(tx: Tx, actor: Actor, sheet: SheetRow, changes: Partial<SheetRow>): Promise<SheetRow> {
    const next = { ...changes, version: sheet.version + 1, updatedAt: this.clock.now(), updatedBy: actor.id };
    const { affected } = await tx.update(SheetRow, { id: sheet.id, version: sheet.version }, next);
    if (affected !== 1) throw staleVersion(sheet.version, sheet.version + 1, null, null);
    return { ...sheet, ...next };
  }
}
