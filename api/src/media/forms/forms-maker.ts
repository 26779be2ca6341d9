import { rm } from 'node:fs/promises';
import { Injectable, Logger } from '@nestjs/common';
import { v7 as uuidv7 } from 'uuid';
import { Refusal } from '../../common/refusal';
import { Work } from '../../common/work';
import { type EngineSession, ImageEngine } from '../engine/image-engine';
import { ImageRow } from '../image.entity';
import { type PictureType, pictureTypes } from '../intake/sniff-picture';
import { formKey, formsFor, masterKey, type PictureForm, widthsFor } from '../store/picture-keys';
import { PictureStore } from '../store/picture-store';
import { FormsClaims } from './forms-claims';
import { pictureXmp } from './picture-xmp';

/** Other processes' work that was left behind is found this often; one's own uploads wake the maker at once. */
const askEveryMs = 2_000;

/**
 * Makes the smaller forms of pictures, one picture at a time. Each form is committed when it is safe on disk, so
 * that after a crash whoever claims the picture next goes on with the first form that is not yet there.
 */
@Injectable()
export class FormsMaker {
  private readonly log = new Logger('forms-maker');
  private timer: NodeJS.Timeout | undefined;
  private running: Promise<void> | null = null;
  private stopping = false;

  constructor(
    private readonly work: Work,
    private readonly claims: FormsClaims,
    private readonly engine: ImageEngine,
    private readonly store: PictureStore,
  ) {}

  onApplicationBootstrap(): void {
    this.timer = setInterval(() => this.wake(), askEveryMs);
    this.timer.unref();
  }

  async beforeApplicationShutdown(): Promise<void> {
    this.stopping = true;
    clearInterval(this.timer);
    await this.running;
  }

  /** Looks for work now, unless it is at work already. */
  wake(): void {
    void this.drain().catch((fault: unknown) =>
      this.log.error(fault instanceof Error ? fault.stack : String(fault)),
    );
  }

  /** Resolves once nothing is left to make. */
  async drain(): Promise<void> {
    this.running ??= this.makeAll().finally(() => (this.running = null));
    await this.running;
  }

  private async makeAll(): Promise<void> {
    while (!this.stopping) {
      const row = await this.claims.claim();
      if (!row) return;
      await this.makeFormsOf(row);
    }
  }

  private async makeFormsOf(row: ImageRow): Promise<void> {
    const renewing = this.claims.keepRenewing(row.id);
    try {
      const wanted = formsFor(row.widthPx ?? 0);
      await this.engine.use((session) => this.makeWanted(row, session, wanted));
      await this.finish(row, wanted.length);
      await this.claims.release(row.id);
    } catch (fault) {
      if (fault instanceof Refusal && !this.stopping) return await this.refuse(row, fault.message);
      // Something of ours failed: the lease stays, so that other pictures get their turn before this one's next.
      this.log.error(fault instanceof Error ? fault.stack : String(fault));
    } finally {
      clearInterval(renewing);
    }
  }

  /** Goes on where whoever held the picture before has left off. */
  private async makeWanted(
    row: ImageRow,
    session: EngineSession,
    wanted: readonly PictureForm[],
  ): Promise<void> {
    const master = await this.masterOf(row, session);
    for (const [made, form] of wanted.entries()) {
      if (made < row.formsMade) continue;
      if (this.stopping || !(await this.makeOne(row, session, master, form, made))) return;
    }
  }

  /** The master as it was made at the upload, or made anew from the original. */
  private async masterOf(row: ImageRow, session: EngineSession): Promise<string> {
    const kept = await this.store.find(masterKey(row.id)).catch(() => null);
    if (kept) return kept.path;
    const original = await this.store.find(row.originalKey);
    if (!original || original.sha256 !== row.originalSha256)
      throw new Refusal(422, 'image.refused', 'The original is no longer as it was sent. Send it again.');
    const master = await this.store.incoming(`${uuidv7()}.master.tif`);
    const scratch = await this.store.incoming(`${uuidv7()}.scratch`);
    await session.inspect({ source: original.path, type: typeOf(row), master, scratch });
    return (await this.store.put(masterKey(row.id), master)).path;
  }

  /** @returns false where somebody else has made the form meanwhile, or the picture was removed */
  private async makeOne(
    row: ImageRow,
    session: EngineSession,
    master: string,
    form: PictureForm,
    made: number,
  ): Promise<boolean> {
    const target = await this.store.incoming(`${uuidv7()}.${form.format}`);
    try {
      await session.make({ master, ...form, target, xmp: pictureXmp(row) });
      await this.store.put(formKey(row.id, form), target);
    } finally {
      await rm(target, { force: true });
    }
    return this.claims.count(row.id, made);
  }

  private async finish(row: ImageRow, wanted: number): Promise<void> {
    const { affected } = await this.work.reader.update(
      ImageRow,
      { id: row.id, state: 'making', formsMade: wanted },
      { state: 'ready', widths: widthsFor(row.widthPx ?? 0) },
    );
    if (affected === 1) await this.store.remove(masterKey(row.id));
  }

  private async refuse(row: ImageRow, sentence: string): Promise<void> {
    this.log.warn(`Picture ${row.id}: ${sentence}`);
    await this.work.reader.update(
      ImageRow,
      { id: row.id, state: 'making' },
      { state: 'refused', refusal: sentence, claimedUntil: null },
    );
  }
}

function typeOf(row: ImageRow): PictureType {
  const types = Object.keys(pictureTypes) as PictureType[];
  const found = types.find((type) => pictureTypes[type].mediaType === row.mediaType);
  if (!found) throw new Error(`Picture ${row.id} has the unknown type ${row.mediaType}`);
  return found;
}
