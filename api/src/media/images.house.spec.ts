import { existsSync } from 'node:fs';
import { readFile, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import type { Image } from '@ellwand/shared/records/image';
import { Publisher } from '../../test/catalogue/published-documents';
import { type House, openHouse } from '../../test/harness/house';
import { PictureRoom } from '../../test/pictures/picture-room';
import * as pictures from '../../test/pictures/test-pictures';
import { v7 as uuidv7 } from 'uuid';
import { GarmentRow } from '../garments/garment.entity';
import { ImageRow } from './image.entity';
import { ImageIntake } from './intake/image-intake';

describe('pictures of a garment', () => {
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

  it('keeps the original, makes all forms, none wider than it, and says how far it has come', async () => {
    const jpeg = await pictures.honestJpeg(1300, 1500);
    const sent = await room.send(jpeg, 'the front.jpg').field('alt', 'Front view');
    expect(sent.status).toBe(201);
    expect(sent.body).toMatchObject({
      fileName: 'the front.jpg',
      alt: 'Front view',
      widthPx: 1300,
      heightPx: 1500,
    });
    expect(sent.body).toMatchObject({ state: 'received', formsMade: 0, formsWanted: 6, widths: [] });
    await room.made();
    const list = await room.recorder.get(room.images);
    expect(list.body.items).toHaveLength(1);
    expect(list.body.items[0]).toMatchObject({
      state: 'ready',
      formsMade: 6,
      widths: [320, 640, 1280],
      version: 1,
    });
    const row = await room.rows.findOneByOrFail(ImageRow, { id: sent.body.id as string });
    expect(await readFile(join(house.environment.dataFolder, 'pictures', row.originalKey))).toEqual(jpeg);
    expect(await room.filesUnder('incoming')).toEqual([]);
  });

  it('is one picture, however often a tablet sends it', async () => {
    const jpeg = await pictures.honestJpeg();
    const id = uuidv7();
    const first = await room.send(jpeg, 'hem.jpg').field('id', id);
    expect(first.body).toMatchObject({ id, fileName: 'hem.jpg' });
    const again = await room.send(jpeg, 'hem.jpg').field('id', id);
    expect([again.status, again.body.id]).toEqual([201, id]);
    const both = await Promise.all(
      [uuidv7()].flatMap((other) => [1, 2].map(() => room.send(jpeg, 'cuff.jpg').field('id', other))),
    );
    expect(both.map(({ status }) => status)).toEqual([201, 201]);
    expect((await room.recorder.get(room.images)).body.items).toHaveLength(2);
  });

  it('refuses pictures while the record is in review, and keeps no file of them', async () => {
    await room.rows.update(GarmentRow, { id: room.garmentId }, { stage: 'in-review' });
    const sent = await room.send(await pictures.honestJpeg());
    expect([sent.status, sent.body.code]).toEqual([409, 'record.locked']);
    expect(await room.filesUnder('originals')).toEqual([]);
  });

  it('changes words and order only for whoever saw the last version', async () => {
    const first = (await room.send(await pictures.honestJpeg(), 'a.jpg')).body as Image;
    const second = (await room.send(await pictures.honestJpeg(), 'b.jpg')).body as Image;
    const change = (version: string, body: object) =>
      room.recorder.patch(`/api/v1/workroom/images/${second.id}`).set('If-Match', version).send(body);
    const changed = await change('"1"', { alt: 'From behind', view: 'back', position: 0 });
    expect(changed.body).toMatchObject({ alt: 'From behind', view: 'back', position: 0, version: 2 });
    const stale = await change('"1"', { alt: 'Lost?' });
    expect([stale.status, stale.body.code, stale.body.current]).toEqual([412, 'version.stale', 2]);
    expect(stale.body.changedBy).toMatch(/^Recorder/);
    const list = (await room.recorder.get(room.images)).body.items as Image[];
    expect(list.map((image) => [image.id, image.position])).toEqual([
      [second.id, 0],
      [first.id, 1],
    ]);
    expect(
      (await room.recorder.patch(`/api/v1/workroom/images/${second.id}`).send({ alt: 'x' })).status,
    ).toBe(428);
    expect((await change('"2"', { pointId: 'no-such-point' })).body.errors[0].pointer).toBe('/pointId');
  });

  it('removes a picture from the garment but not its files, and says who did', async () => {
    const { body } = await room.send(await pictures.honestJpeg());
    const id = body.id as string;
    expect((await room.recorder.delete(`/api/v1/workroom/images/${id}`).set('If-Match', '"1"')).status).toBe(
      204,
    );
    expect((await room.recorder.get(room.images)).body.items).toEqual([]);
    expect(await room.filesUnder('masters')).toEqual([]);
    expect((await room.recorder.delete(`/api/v1/workroom/images/${id}`).set('If-Match', '"2"')).status).toBe(
      404,
    );
    expect(await room.filesUnder('originals')).not.toEqual([]);
    const told = await house.owner.source.query(
      'SELECT verb, actor_id FROM ellwand_audit.entry WHERE subject_id = ? ORDER BY at',
      [id],
    );
    expect(told).toEqual([
      { verb: 'add-picture', actor_id: room.recorderId },
      { verb: 'remove-picture', actor_id: room.recorderId },
    ]);
  });

  it('shows the public a picture of a published version, and nothing of it once it is withdrawn', async () => {
    const { id, widthPx, heightPx } = (await room.send(await pictures.honestJpeg(700, 900))).body as Image;
    await room.made();
    const image = {
      id,
      view: 'front',
      alt: 'Front',
      caption: '',
      credit: '',
      widthPx: widthPx ?? 0,
      heightPx: heightPx ?? 0,
      widths: [320, 640],
    } as const;
    const publisher = new Publisher(house);
    await publisher.publish({ images: [{ ...image, widths: [...image.widths] }] });
    const visitor = house.visitor();
    const shown = await visitor.get(`/media/${id}/640.avif`).buffer(true);
    expect(shown.status).toBe(200);
    expect(shown.headers).toMatchObject({
      'cache-control': 'public, no-cache',
      'content-type': 'image/avif',
      'x-content-type-options': 'nosniff',
      'content-length': String((shown.body as Buffer).length),
    });
    const again = () =>
      visitor.get(`/media/${id}/640.avif`).set('If-None-Match', String(shown.headers['etag']));
    expect((await again()).status).toBe(304);
    expect((await visitor.head(`/media/${id}/640.avif`)).headers['content-length']).toBe(
      shown.headers['content-length'],
    );
    expect((await visitor.get(`/media/${id}/1280.avif`)).status).toBe(404);
    await publisher.withdraw('lh-1966-30');
    expect((await again()).status).toBe(410);
  });

  it('takes a file from a script, and leaves that file where it lies', async () => {
    const path = join(house.environment.dataFolder, 'from-a-script.jpg');
    await writeFile(path, await pictures.honestJpeg());
    const fields = {
      view: 'front',
      alt: '',
      caption: 'Rendered',
      credit: '',
      pointId: null,
      takenOn: '2026-02-03',
    } as const;
    const row = await house.app
      .get(ImageIntake)
      .acceptFile(
        { id: room.recorderId, name: 'A script' },
        room.garmentId,
        { path, name: 'LH.1.jpg' },
        fields,
      );
    expect(existsSync(path)).toBe(true);
    expect(await room.rows.findOneByOrFail(ImageRow, { id: row.id })).toMatchObject({
      caption: 'Rendered',
      takenOn: '2026-02-03',
    });
  });
});
