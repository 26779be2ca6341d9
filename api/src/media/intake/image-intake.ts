import { copyFile, rm } from 'node:fs/promises';
import { Injectable } from '@nestjs/common';
import { isPointId } from '@ellwand/shared/points/measuring-points';
import { OwnPointId } from '@ellwand/shared/records/protocol';
import { v7 as uuidv7 } from 'uuid';
import { AuditService } from '../../audit/audit.service';
import type { Actor } from '../../common/actor';
import { Clock } from '../../common/clock';
import { Disk } from '../../common/disk';
import { Refusal } from '../../common/refusal';
import { type Tx, Work } from '../../common/work';
import { GarmentEdits } from '../../garments/garment-edits';
import type { ImageFields } from '../dto/image.dto';
import { ImageEngine, type PictureSize } from '../engine/image-engine';
import { FormsMaker } from '../forms/forms-maker';
import { ImageRow } from '../image.entity';
import { formsFor, masterKey, originalKey } from '../store/picture-keys';
import { PictureStore, type StoredFile } from '../store/picture-store';
import { plainFileName } from './file-name';
import { Gate } from './gate';
import { type PictureType, pictureTypes, sniffPictureFile } from './sniff-picture';

/** A file on this machine and the name it had where it came from. */
export interface ReceivedFile {
  readonly path: string;
  readonly name: string;
}

type By = Pick<Actor, 'id' | 'name'>;

interface Accepted {
  readonly id: string;
  readonly type: PictureType;
  readonly size: PictureSize;
  readonly original: StoredFile;
}

/** Whole decodings at once: each takes up to half a gigabyte. Further uploads wait their turn. */
const decodingsAtOnce = 2;

/** Takes pictures in: looks at them, keeps the original, notes them on the garment, has the smaller forms made. */
@Injectable()
export class ImageIntake {
  private readonly gate = new Gate(decodingsAtOnce);

  constructor(
    private readonly work: Work,
    private readonly garments: GarmentEdits,
    private readonly audit: AuditService,
    private readonly clock: Clock,
    private readonly engine: ImageEngine,
    private readonly store: PictureStore,
    private readonly disk: Disk,
    private readonly forms: FormsMaker,
  ) {}

  /**
   * Takes a file that lies anywhere on this machine; it stays where it is. In the caller's transaction where one
   * is handed in, else in its own.
   * @throws Refusal 415, 422, 507, 409 `record.locked`, 422 `image.id-used`
   */
  async acceptFile(
    actor: By,
    garmentId: string,
    file: ReceivedFile,
    fields: ImageFields,
    tx?: Tx,
  ): Promise<ImageRow> {
    const copy = await this.store.incoming(`${uuidv7()}.part`);
    try {
      await copyFile(file.path, copy);
      return await this.acceptUpload(actor, garmentId, { path: copy, name: file.name }, fields, tx);
    } finally {
      await rm(copy, { force: true });
    }
  }

  /** The same for a file in the incoming area, which the store takes over. */
  async acceptUpload(
    actor: By,
    garmentId: string,
    file: ReceivedFile,
    fields: ImageFields,
    tx?: Tx,
  ): Promise<ImageRow> {
    await this.refuseWhenFull();
    refuseUnknownPoint(fields.pointId);
    const reader = tx ?? this.work.reader;
    const again = await takenBefore(reader, garmentId, fields);
    if (again) return again;
    await this.garments.refuseUneditable(reader, garmentId);
    const accepted = await this.keep(file, fields.id ?? uuidv7());
    const note = (within: Tx) => this.note(within, actor, garmentId, file, fields, accepted);
    try {
      const row = tx ? await note(tx) : await this.work.run(note);
      this.forms.wake();
      return row;
    } catch (fault) {
      // The same picture came twice at once: the files are the other's by now, and so is the answer.
      const other = await takenBefore(this.work.reader, garmentId, fields);
      if (other) return other;
      await this.forget(accepted);
      throw fault;
    }
  }

  /** Also for what does not come over HTTP: a full disk would take the database with it. */
  private async refuseWhenFull(): Promise<void> {
    if ((await this.disk.state()) === 'enough') return;
    throw new Refusal(
      507,
      'disk.full',
      'The disk is nearly full: no pictures are taken until there is room.',
    );
  }

  /** Decodes the picture whole, once, and stores the original and the master that the forms are made of. */
  private async keep({ path }: ReceivedFile, id: string): Promise<Accepted> {
    const type = await sniffPictureFile(path);
    // Names of their own: the same picture may come twice at once, under one id.
    const work = uuidv7();
    const master = await this.store.incoming(`${work}.master.tif`);
    const scratch = await this.store.incoming(`${work}.scratch`);
    try {
      const size = await this.gate.pass(() =>
        this.engine.use((session) => session.inspect({ source: path, type, master, scratch })),
      );
      await this.store.put(masterKey(id), master);
      return { id, type, size, original: await this.store.put(originalKey(id, type), path) };
    } finally {
      await Promise.all([master, scratch].map((leftover) => rm(leftover, { force: true })));
    }
  }

  private async forget({ id, type }: Accepted): Promise<void> {
    await this.store.remove(masterKey(id));
    await this.store.remove(originalKey(id, type));
  }

  private async note(
    tx: Tx,
    actor: By,
    garmentId: string,
    file: ReceivedFile,
    fields: ImageFields,
    { id, type, size, original }: Accepted,
  ): Promise<ImageRow> {
    await this.garments.noteEdit(tx, actor, garmentId);
    // The garment's row is locked now: no second picture takes the same place.
    const last = await tx.maximum(ImageRow, 'position', { garmentId });
    const row: ImageRow = {
      ...fields,
      id,
      garmentId,
      position: (last ?? -1) + 1,
      version: 1,
      hidden: false,
      fileName: plainFileName(file.name),
      state: 'received',
      formsMade: 0,
      formsWanted: formsFor(size.widthPx).length,
      refusal: null,
      widthPx: size.widthPx,
      heightPx: size.heightPx,
      widths: [],
      originalKey: originalKey(id, type),
      originalSha256: original.sha256,
      originalBytes: original.bytes,
      mediaType: pictureTypes[type].mediaType,
      createdAt: this.clock.now(),
      createdBy: actor.id,
      claimedUntil: null,
      deletedAt: null,
    };
    await tx.insert(ImageRow, row);
    await this.audit.note(tx, actor, {
      verb: 'add-picture',
      subjectKind: 'image',
      subjectId: id,
      summary: `Added the picture ${row.fileName} (${fields.view})`,
      facts: {
        garmentId,
        view: fields.view,
        bytes: original.bytes,
        widthPx: size.widthPx,
        heightPx: size.heightPx,
      },
    });
    return row;
  }
}

/**
 * The picture that was taken in under this id before, if any.
 * @throws Refusal 422 where it is another garment's
 */
async function takenBefore(reader: Tx, garmentId: string, { id }: ImageFields): Promise<ImageRow | null> {
  if (id === undefined) return null;
  const row = await reader.findOneBy(ImageRow, { id });
  if (row && row.garmentId !== garmentId)
    throw new Refusal(422, 'image.id-used', 'Another picture was sent under this id before.');
  return row;
}

/** @throws Refusal 400 where a picture is said to lie at a measuring point that does not exist */
export function refuseUnknownPoint(pointId: string | null | undefined): void {
  if (pointId === null || pointId === undefined || isPointId(pointId)) return;
  if (OwnPointId.safeParse(pointId).success) return;
  throw new Refusal(400, 'request.invalid', 'Some of what was sent needs mending.', {}, [
    { pointer: '/pointId', detail: 'Choose one of the measuring points' },
  ]);
}
