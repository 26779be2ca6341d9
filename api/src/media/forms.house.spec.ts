import { existsSync } from 'node:fs';
import { readFile, utimes, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import sharp from 'sharp';
import { type House, openHouse } from '../../test/harness/house';
import { PictureRoom } from '../../test/pictures/picture-room';
import * as pictures from '../../test/pictures/test-pictures';
import { ImageRow } from './image.entity';
import { PictureStore } from './store/picture-store';

describe('the smaller forms of pictures', () => {
  let house: House;
  let room: PictureRoom;

  beforeAll(async () => {
    house = await openHouse();
  });
  afterAll(() => house.close());
  beforeEach(async () => {
    room = await PictureRoom.open(house);
  });
  afterEach(() => room.empty());

  it('shows staff a form that is made, to be kept by no cache, and hides it from everyone else', async () => {
    const { body } = await room.send(await pictures.honestJpeg());
    await room.made();
    const form = await room.recorder
      .get(`/api/v1/workroom/images/${body.id as string}/forms/640.jpg`)
      .buffer(true);
    expect(form.status).toBe(200);
    expect(form.headers).toMatchObject({
      'cache-control': 'no-store',
      'content-type': 'image/jpeg',
      'x-content-type-options': 'nosniff',
    });
    expect((await sharp(form.body as Buffer).metadata()).width).toBe(640);
    expect(
      (await room.recorder.get(`/api/v1/workroom/images/${body.id as string}/forms/1280.jpg`)).status,
    ).toBe(404);
    expect(
      (await house.visitor().get(`/api/v1/workroom/images/${body.id as string}/forms/640.jpg`)).status,
    ).toBe(401);
    expect((await house.visitor().get(`/media/${body.id as string}/640.jpg`)).status).toBe(404);
  });

  it('goes on where a dead process left off, and makes no form twice', async () => {
    const { body } = await room.send(await pictures.honestJpeg(700, 700));
    const id = body.id as string;
    await room.made();
    const before = (await room.filesUnder('forms')).length;
    // As after kill -9 in the middle: two forms counted, a lease that nobody renews, the master gone too.
    await room.rows.update(
      ImageRow,
      { id },
      { state: 'making', formsMade: 2, claimedUntil: new Date(Date.now() + 10_000) },
    );
    const firstForm = join(house.environment.dataFolder, 'pictures', 'forms', id.slice(-2), id, '320.jpg');
    await writeFile(firstForm, 'left alone');
    await room.made();
    expect((await room.rows.findOneByOrFail(ImageRow, { id })).formsMade).toBe(2);
    house.clock.advance({ seconds: 16 });
    await room.made();
    expect(await room.rows.findOneByOrFail(ImageRow, { id })).toMatchObject({
      state: 'ready',
      formsMade: 4,
      claimedUntil: null,
    });
    expect(await readFile(firstForm, 'utf8')).toBe('left alone');
    expect((await room.filesUnder('forms')).length).toBe(before);
    expect(await room.filesUnder('masters')).toEqual([]);
  });

  it('refuses a picture whose original has changed on disk, in words', async () => {
    const { body } = await room.send(await pictures.honestJpeg(700, 700));
    const id = body.id as string;
    await room.made();
    const row = await room.rows.findOneByOrFail(ImageRow, { id });
    await room.rows.update(
      ImageRow,
      { id },
      { state: 'making', formsMade: 1, originalSha256: '0'.repeat(64) },
    );
    await room.made();
    const after = await room.rows.findOneByOrFail(ImageRow, { id });
    expect([row.state, after.state, after.refusal]).toEqual([
      'ready',
      'refused',
      expect.stringContaining('Send it again'),
    ]);
  });

  it('sweeps up what a process that died has left half received', async () => {
    const store = house.app.get(PictureStore);
    const [old, fresh] = [await store.incoming('old.part'), await store.incoming('fresh.part')];
    for (const path of [old, fresh]) await writeFile(path, 'half a picture');
    const yesterday = new Date(Date.now() - 86_400_000);
    await utimes(old, yesterday, yesterday);
    await store.sweepIncoming();
    expect([existsSync(old), existsSync(fresh)]).toEqual([false, true]);
  });
});
