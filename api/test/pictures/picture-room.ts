import { readdir, rm } from 'node:fs/promises';
import { join } from 'node:path';
import { v7 as uuidv7 } from 'uuid';
import { Work } from '../../src/common/work';
import { FormsMaker } from '../../src/media/forms/forms-maker';
import type { Agent, House } from '../harness/house';

/** A recorder signed in, and a draft garment to send pictures to. */
export class PictureRoom {
  private constructor(
    readonly house: House,
    readonly recorder: Agent,
    readonly recorderId: string,
    readonly garmentId: string,
  ) {}

  static async open(house: House): Promise<PictureRoom> {
    const person = await house.person('recorder');
    const garmentId = await draftGarment(house, person.id);
    return new PictureRoom(house, await house.signInAs(person), person.id, garmentId);
  }

  get images(): string {
    return `/api/v1/workroom/garments/${this.garmentId}/images`;
  }

  get rows() {
    return this.house.app.get(Work).reader;
  }

  send(picture: Buffer, name = 'front.jpg', by = this.recorder) {
    return by.post(this.images).field('view', 'front').attach('file', picture, name);
  }

  /** A form as staff are shown it. */
  form(id: string, name: string, by = this.recorder) {
    return by.get(`/api/v1/workroom/images/${id}/forms/${name}`).buffer(true);
  }

  /** Resolves once all smaller forms are made. */
  made(): Promise<void> {
    return this.house.app.get(FormsMaker).drain();
  }

  /** Pictures, whole or half received, in one of the store's folders. */
  async filesUnder(folder: string): Promise<string[]> {
    const names = await readdir(join(this.house.environment.dataFolder, 'pictures', folder), {
      recursive: true,
    }).catch(() => []);
    // What is received has a name without an ending; folders have two letters or the picture's id.
    return names.filter((name) => /\.(jpg|avif|tif|png|part|scratch)$|^[0-9a-f]{32}$/.test(name));
  }

  async empty(): Promise<void> {
    await this.made();
    await this.house.empty();
    await rm(join(this.house.environment.dataFolder, 'pictures'), { recursive: true, force: true });
  }
}

async function draftGarment(house: House, by: string): Promise<string> {
  const id = uuidv7();
  const at = new Date();
  await house.owner.source.query(
    `INSERT INTO ellwand.garment (id, own_number, title, kind, record, stage, version, is_public, created_at,
        created_by, updated_at, updated_by)
      VALUES (?, ?, 'Teal day dress', 'dress', '{}', 'draft', 1, FALSE, ?, ?, ?, ?)`,
    [id, `LH.${id.slice(-6)}`, at, by, at, by],
  );
  return id;
}
