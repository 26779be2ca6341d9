import { Injectable } from '@nestjs/common';
import type { Image, ImageChange } from '@ellwand/shared/records/image';
import { IsNull } from 'typeorm';
import { AuditEntryRow } from '../audit/audit-entry.entity';
import { AuditService } from '../audit/audit.service';
import type { Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { staleVersion } from '../common/if-match';
import { notFound } from '../common/refusal';
import { type Tx, Work } from '../common/work';
import { GarmentEdits } from '../garments/garment-edits';
import { GarmentRow } from '../garments/garment.entity';
import { toImage } from './image-view';
import { ImageRow } from './image.entity';
import { refuseUnknownPoint } from './intake/image-intake';
import { formKey, formsFor, masterKey, parseFormName, type PictureForm } from './store/picture-keys';
import { PictureStore, type StoredFile } from './store/picture-store';

/** A form's file together with what it is. */
export interface StoredForm extends PictureForm {
  readonly file: StoredFile;
}

/** The pictures of a garment as the Workroom works with them. */
@Injectable()
export class ImagesService {
  constructor(
    private readonly work: Work,
    private readonly garments: GarmentEdits,
    private readonly audit: AuditService,
    private readonly clock: Clock,
    private readonly store: PictureStore,
  ) {}

  async list(garmentId: string): Promise<{ items: Image[] }> {
    const { reader } = this.work;
    if (!(await reader.existsBy(GarmentRow, { id: garmentId }))) throw notFound('garment.unknown', 'garment');
    return { items: (await inOrder(reader, garmentId)).map(toImage) };
  }

  /** @throws Refusal 404, 409 `record.locked`, 412 */
  change(id: string, seen: number, { position, ...change }: ImageChange, actor: Actor): Promise<Image> {
    refuseUnknownPoint(change.pointId);
    return this.work.run(async (tx) => {
      const before = await this.lockAt(tx, actor, id, seen);
      await tx.update(ImageRow, { id, version: seen }, { ...change, version: seen + 1 });
      if (position !== undefined) await moveTo(tx, before, position);
      await this.note(
        tx,
        actor,
        before,
        'change-picture',
        'Changed',
        Object.keys({ ...change, ...(position !== undefined && { position }) }),
      );
      return toImage(await tx.findOneByOrFail(ImageRow, { id }));
    });
  }

  /** Removed from the garment; what was published with it stays as it was published. */
  async remove(id: string, seen: number, actor: Actor): Promise<void> {
    await this.work.run(async (tx) => {
      const before = await this.lockAt(tx, actor, id, seen);
      await tx.update(ImageRow, { id, version: seen }, { deletedAt: this.clock.now(), version: seen + 1 });
      await this.note(tx, actor, before, 'remove-picture', 'Removed', []);
    });
    // No more forms will be made of it; the original stays.
    await this.store.remove(masterKey(id));
  }

  /** Any form that is ready, for staff, also before publication. @throws Refusal 404 */
  async form(id: string, name: string): Promise<StoredForm> {
    const wanted = parseFormName(name);
    const row = await this.work.reader.findOneBy(ImageRow, { id, deletedAt: IsNull() });
    const made = formsFor(row?.widthPx ?? 0).slice(0, row?.formsMade ?? 0);
    const form = made.find(({ widthPx, format }) => widthPx === wanted?.widthPx && format === wanted.format);
    const file = form && (await this.store.find(formKey(id, form)));
    if (!form || !file) throw notFound('image.no-such-form', 'form of this picture');
    return { ...form, file };
  }

  /** Notes the edit on the garment first (it is locked by every verb before its pictures), then locks the picture. */
  private async lockAt(tx: Tx, actor: Actor, id: string, seen: number): Promise<ImageRow> {
    const found = await tx.findOneBy(ImageRow, { id, deletedAt: IsNull() });
    if (!found) throw notFound('image.unknown', 'picture');
    await this.garments.noteEdit(tx, actor, found.garmentId);
    const row = await tx.findOne(ImageRow, {
      where: { id, deletedAt: IsNull() },
      lock: { mode: 'pessimistic_write' },
    });
    if (!row) throw notFound('image.unknown', 'picture');
    if (row.version !== seen) {
      const last = await tx.findOne(AuditEntryRow, { where: { subjectId: id }, order: { at: 'DESC' } });
      throw staleVersion(seen, row.version, last?.actorName ?? null, last?.at ?? null);
    }
    return row;
  }

  private note(
    tx: Tx,
    actor: Actor,
    row: ImageRow,
    verb: string,
    did: string,
    changed: string[],
  ): Promise<void> {
    return this.audit.note(tx, actor, {
      verb,
      subjectKind: 'image',
      subjectId: row.id,
      summary: `${did} the picture ${row.fileName} (${row.view})`,
      facts: { garmentId: row.garmentId, changed },
    });
  }
}

function inOrder(manager: Tx, garmentId: string): Promise<ImageRow[]> {
  return manager.find(ImageRow, {
    where: { garmentId, deletedAt: IsNull() },
    order: { position: 'ASC', createdAt: 'ASC' },
  });
}

/** Puts a picture at a place in its garment's order; the others close up and make room, keeping their versions. */
async function moveTo(tx: Tx, moved: ImageRow, position: number): Promise<void> {
  const order = (await inOrder(tx, moved.garmentId)).filter((row) => row.id !== moved.id);
  order.splice(position, 0, moved);
  for (const [place, row] of order.entries()) {
    if (row.position !== place) await tx.update(ImageRow, { id: row.id }, { position: place });
  }
}
