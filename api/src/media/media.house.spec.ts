import { existsSync } from 'node:fs';
import { readdir, readFile, rm, utimes, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import type { Image } from '@ellwand/shared/records/image';
import sharp from 'sharp';
import { v7 as uuidv7 } from 'uuid';
import { type Agent, type House, openHouse } from '../../test/harness/house';
import { Publisher } from '../../test/catalogue/published-documents';
import * as pictures from '../../test/pictures/test-pictures';
import { Work } from '../common/work';
import { GarmentRow } from '../garments/garment.entity';
import { FormsMaker } from './forms/forms-maker';
import { ImageRow } from './image.entity';
import { ImageIntake } from './intake/image-intake';
import { PictureStore } from './store/picture-store';

describe('pictures of a garment', () => {
  let house: House;
  let recorder: Agent;
  let garmentId: string;
  let recorderId: string;

  beforeAll(async () => {
    house = await openHouse();
  });
  afterAll(() => house.close());
  beforeEach(async () => {
    const person = await house.person('recorder');
    recorder = await house.signInAs(person);
    recorderId = person.id;
    garmentId = await draftGarment(house, person.id);
  });
  afterEach(async () => {
    await made();
    await house.empty();
    await rm(join(house.environment.dataFolder, 'pictures'), { recursive: true, force: true });
  });

  const made = () => house.app.get(FormsMaker).drain();
  const rows = () => house.app.get(Work).reader;

  const send = (picture: Buffer, name = 'front.jpg', by = recorder) =>
    by
      .post(`/api/v1/workroom/garments/${garmentId}/images`)
      .field('view', 'front')
      .attach('file', picture, name);

  const incoming = () => filesUnder(house, 'incoming');

  it('keeps the original, makes all forms, none wider than it, and says how far it has come', async () => {
    const jpeg = await pictures.honestJpeg(1300, 1500);
    const sent = await send(jpeg, 'the front.jpg').field('alt', 'Front view');
    expect(sent.status).toBe(201);
    expect(sent.body).toMatchObject({
      fileName: 'the front.jpg',
      alt: 'Front view',
      widthPx: 1300,
      heightPx: 1500,
    });
    expect(sent.body).toMatchObject({ state: 'received', formsMade: 0, formsWanted: 6, widths: [] });
    await made();
    const list = await recorder.get(`/api/v1/workroom/garments/${garmentId}/images`);
    expect(list.body.items).toHaveLength(1);
    expect(list.body.items[0]).toMatchObject({
      state: 'ready',
      formsMade: 6,
      widths: [320, 640, 1280],
      version: 1,
    });
    const row = await rows().findOneByOrFail(ImageRow, { id: sent.body.id as string });
    expect(await readFile(join(house.environment.dataFolder, 'pictures', row.originalKey))).toEqual(jpeg);
    expect(await incoming()).toEqual([]);
  });

  it('shows staff a form that is made, to be kept by no cache, and hides it from everyone else', async () => {
    const { body } = await send(await pictures.honestJpeg());
    await made();
    const form = await recorder
      .get(`/api/v1/workroom/images/${body.id as string}/forms/640.jpg`)
      .buffer(true);
    expect(form.status).toBe(200);
    expect(form.headers).toMatchObject({
      'cache-control': 'no-store',
      'content-type': 'image/jpeg',
      'x-content-type-options': 'nosniff',
    });
    expect((await sharp(form.body as Buffer).metadata()).width).toBe(640);
    expect((await recorder.get(`/api/v1/workroom/images/${body.id as string}/forms/1280.jpg`)).status).toBe(
      404,
    );
    expect(
      (await house.visitor().get(`/api/v1/workroom/images/${body.id as string}/forms/640.jpg`)).status,
    ).toBe(401);
    expect((await house.visitor().get(`/media/${body.id as string}/640.jpg`)).status).toBe(404);
  });

  it('serves nothing of where and when a picture was taken (ASVS 14.2.8)', async () => {
    const jpeg = await pictures.jpegWithGps(800, 700);
    expect(jpeg.includes('Lark Telephone')).toBe(true);
    const { body } = await send(jpeg);
    await made();
    for (const name of ['320.jpg', '320.avif', '640.jpg']) {
      const form = await recorder
        .get(`/api/v1/workroom/images/${body.id as string}/forms/${name}`)
        .buffer(true);
      const bytes = form.body as Buffer;
      expect(bytes.length).toBeGreaterThan(0);
      expect([bytes.includes('Exif'), bytes.includes('Lark Telephone'), bytes.includes('GPS')]).toEqual([
        false,
        false,
        false,
      ]);
    }
  });

  it.each([
    ['SVG named .png (ASVS 1.3.4)', 415, 'image.type', async () => Promise.resolve(pictures.svg)],
    ['a moving GIF', 415, 'image.type', pictures.animatedGif],
    ['a moving WebP', 422, 'image.refused', pictures.animatedWebp],
    ['a moving PNG', 422, 'image.refused', async () => Promise.resolve(pictures.animatedPng())],
    [
      'a bomb of 400 megapixels',
      422,
      'image.refused',
      async () => Promise.resolve(pictures.pngBomb(20_000, 20_000)),
    ],
    [
      'a JPEG that breaks off',
      422,
      'image.refused',
      async () => (await pictures.honestJpeg()).subarray(0, 3000),
    ],
    ['nothing', 415, 'image.type', async () => Promise.resolve(Buffer.alloc(0))],
  ])('refuses %s and leaves nothing behind (ASVS 5)', async (_, status, code, picture) => {
    const sent = await send(await picture(), 'innocent.png');
    expect([sent.status, sent.body.code]).toEqual([status, code]);
    expect(sent.body.detail).toMatch(/^[A-Z].*\.$/);
    expect(await rows().countBy(ImageRow, {})).toBe(0);
    expect(await incoming()).toEqual([]);
    expect((await house.visitor().get('/health/live')).status).toBe(200);
  });

  it('takes a JPEG that is also a page, and serves only a picture (ASVS 3.2.1, 5.3.1)', async () => {
    const { body, status } = await send(await pictures.jpegAndHtml(), 'page.html');
    expect(status).toBe(201);
    await made();
    const form = await recorder
      .get(`/api/v1/workroom/images/${body.id as string}/forms/320.jpg`)
      .buffer(true);
    expect(form.headers['content-type']).toBe('image/jpeg');
    expect((form.body as Buffer).includes('<script>')).toBe(false);
  });

  it('makes its own names of files, whatever the sender calls them (ASVS 5)', async () => {
    const { body, status } = await send(await pictures.honestJpeg(), '../../../etc/cron.d/x.jpg');
    expect([status, body.fileName]).toEqual([201, 'x.jpg']);
    const { originalKey } = await rows().findOneByOrFail(ImageRow, { id: body.id as string });
    expect(originalKey).toMatch(/^originals\/[0-9a-f]{2}\/[0-9a-f-]{36}\.jpg$/);
    const broken = await send(await pictures.honestJpeg(), 'a\u0000b.jpg');
    expect([broken.status, broken.body.code]).toEqual([400, 'image.upload']);
    expect(await incoming()).toEqual([]);
  });

  it('wants a view, a file, and not more than 60 MB', async () => {
    const noView = await recorder
      .post(`/api/v1/workroom/garments/${garmentId}/images`)
      .attach('file', await pictures.honestJpeg(), 'x.jpg');
    expect([noView.status, noView.body.errors[0].pointer]).toEqual([400, '/view']);
    const noFile = await recorder
      .post(`/api/v1/workroom/garments/${garmentId}/images`)
      .field('view', 'front');
    expect([noFile.status, noFile.body.code]).toEqual([400, 'image.missing']);
    const huge = await send(Buffer.concat([await pictures.honestJpeg(), Buffer.alloc(60 * 1024 * 1024)]));
    expect([huge.status, huge.body.code]).toEqual([413, 'image.too-large']);
    expect(await incoming()).toEqual([]);
  });

  it('lets nobody but those with image:write send or change pictures', async () => {
    const desk = await house.signInAs('desk');
    expect((await send(await pictures.honestJpeg(), 'x.jpg', desk)).status).toBe(403);
    expect((await send(await pictures.honestJpeg(), 'x.jpg', house.visitor())).status).toBe(401);
  });

  it('refuses pictures while the record is in review, and keeps no file of them', async () => {
    await rows().update(GarmentRow, { id: garmentId }, { stage: 'in-review' });
    const sent = await send(await pictures.honestJpeg());
    expect([sent.status, sent.body.code]).toEqual([409, 'record.locked']);
    expect(await filesUnder(house, 'originals')).toEqual([]);
  });

  it('changes words and order only for whoever saw the last version', async () => {
    const first = (await send(await pictures.honestJpeg(), 'a.jpg')).body as Image;
    const second = (await send(await pictures.honestJpeg(), 'b.jpg')).body as Image;
    const change = (version: string, body: object) =>
      recorder.patch(`/api/v1/workroom/images/${second.id}`).set('If-Match', version).send(body);
    const changed = await change('"1"', { alt: 'From behind', view: 'back', position: 0 });
    expect(changed.body).toMatchObject({ alt: 'From behind', view: 'back', position: 0, version: 2 });
    const stale = await change('"1"', { alt: 'Lost?' });
    expect([stale.status, stale.body.code, stale.body.current]).toEqual([412, 'version.stale', 2]);
    expect(stale.body.changedBy).toMatch(/^Recorder/);
    const list = (await recorder.get(`/api/v1/workroom/garments/${garmentId}/images`)).body.items as Image[];
    expect(list.map((image) => [image.id, image.position])).toEqual([
      [second.id, 0],
      [first.id, 1],
    ]);
    expect((await recorder.patch(`/api/v1/workroom/images/${second.id}`).send({ alt: 'x' })).status).toBe(
      428,
    );
    expect((await change('"2"', { pointId: 'no-such-point' })).body.errors[0].pointer).toBe('/pointId');
  });

  it('removes a picture from the garment but not its files, and says who did', async () => {
    const { body } = await send(await pictures.honestJpeg());
    const id = body.id as string;
    expect((await recorder.delete(`/api/v1/workroom/images/${id}`).set('If-Match', '"1"')).status).toBe(204);
    expect((await recorder.get(`/api/v1/workroom/garments/${garmentId}/images`)).body.items).toEqual([]);
    expect(await filesUnder(house, 'masters')).toEqual([]);
    expect((await recorder.delete(`/api/v1/workroom/images/${id}`).set('If-Match', '"2"')).status).toBe(404);
    expect(await filesUnder(house, 'originals')).not.toEqual([]);
    const told = await house.owner.source.query(
      'SELECT verb, actor_id FROM ellwand_audit.entry WHERE subject_id = ? ORDER BY at',
      [id],
    );
    expect(told).toEqual([
      { verb: 'add-picture', actor_id: recorderId },
      { verb: 'remove-picture', actor_id: recorderId },
    ]);
  });

  it('goes on where a dead process left off, and makes no form twice', async () => {
    const { body } = await send(await pictures.honestJpeg(700, 700));
    const id = body.id as string;
    await made();
    const before = (await filesUnder(house, 'forms')).length;
    // As after kill -9 in the middle: two forms counted, a lease that nobody renews, the master gone too.
    await rows().update(
      ImageRow,
      { id },
      { state: 'making', formsMade: 2, claimedUntil: new Date(Date.now() + 10_000) },
    );
    const firstForm = join(house.environment.dataFolder, 'pictures', 'forms', id.slice(-2), id, '320.jpg');
    await writeFile(firstForm, 'left alone');
    await made();
    expect((await rows().findOneByOrFail(ImageRow, { id })).formsMade).toBe(2);
    house.clock.advance({ seconds: 16 });
    await made();
    expect(await rows().findOneByOrFail(ImageRow, { id })).toMatchObject({
      state: 'ready',
      formsMade: 4,
      claimedUntil: null,
    });
    expect(await readFile(firstForm, 'utf8')).toBe('left alone');
    expect((await filesUnder(house, 'forms')).length).toBe(before);
    expect(await filesUnder(house, 'masters')).toEqual([]);
  });

  it('refuses a picture whose original has changed on disk, in words', async () => {
    const { body } = await send(await pictures.honestJpeg(700, 700));
    const id = body.id as string;
    await made();
    const row = await rows().findOneByOrFail(ImageRow, { id });
    await rows().update(ImageRow, { id }, { state: 'making', formsMade: 1, originalSha256: '0'.repeat(64) });
    await made();
    const after = await rows().findOneByOrFail(ImageRow, { id });
    expect([row.state, after.state, after.refusal]).toEqual([
      'ready',
      'refused',
      expect.stringContaining('Send it again'),
    ]);
  });

  it('shows the public a picture of a published version, and nothing of it once it is withdrawn', async () => {
    const { id, widthPx, heightPx } = (await send(await pictures.honestJpeg(700, 900))).body as Image;
    await made();
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

  it('sweeps up what a process that died has left half received', async () => {
    const store = house.app.get(PictureStore);
    const [old, fresh] = [await store.incoming('old.part'), await store.incoming('fresh.part')];
    for (const path of [old, fresh]) await writeFile(path, 'half a picture');
    const yesterday = new Date(Date.now() - 86_400_000);
    await utimes(old, yesterday, yesterday);
    await store.sweepIncoming();
    expect([existsSync(old), existsSync(fresh)]).toEqual([false, true]);
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
      .acceptFile({ id: recorderId, name: 'A script' }, garmentId, { path, name: 'LH.1.jpg' }, fields);
    expect(existsSync(path)).toBe(true);
    expect(await rows().findOneByOrFail(ImageRow, { id: row.id })).toMatchObject({
      caption: 'Rendered',
      takenOn: '2026-02-03',
    });
  });
});

async function filesUnder(house: House, folder: string): Promise<string[]> {
  const names = await readdir(join(house.environment.dataFolder, 'pictures', folder), {
    recursive: true,
  }).catch(() => []);
  return names.filter((name) => /\.(jpg|avif|tif|png|part|scratch)$/.test(name));
}

async function draftGarment(house: House, by: string): Promise<string> {
  const id = uuidv7();
  const at = new Date();
  await house.owner.source.query(
    `INSERT INTO ellwand.garment (id, own_number, title, kind, record, stage, version, is_public, created_at, created_by, updated_at, updated_by)
     VALUES (?, ?, 'Teal day dress', 'dress', '{}', 'draft', 1, FALSE, ?, ?, ?, ?)`,
    [id, `LH.${id.slice(-6)}`, at, by, at, by],
  );
  return id;
}
