import { type House, openHouse } from '../../test/harness/house';
import { PictureRoom } from '../../test/pictures/picture-room';
import * as pictures from '../../test/pictures/test-pictures';
import { ImageRow } from './image.entity';

describe('pictures that people send', () => {
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

  it('serves nothing of where and when a picture was taken (ASVS 14.2.8)', async () => {
    const jpeg = await pictures.jpegWithGps(800, 700);
    expect(jpeg.includes('Lark Telephone')).toBe(true);
    const { body } = await room.send(jpeg);
    await room.made();
    for (const name of ['320.jpg', '320.avif', '640.jpg']) {
      const form = await room.recorder
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
    const sent = await room.send(await picture(), 'innocent.png');
    expect([sent.status, sent.body.code]).toEqual([status, code]);
    expect(sent.body.detail).toMatch(/^[A-Z].*\.$/);
    expect(await room.rows.countBy(ImageRow, {})).toBe(0);
    expect(await room.filesUnder('incoming')).toEqual([]);
    expect((await house.visitor().get('/health/live')).status).toBe(200);
  });

  it('takes a JPEG that is also a page, and serves only a picture (ASVS 3.2.1, 5.3.1)', async () => {
    const { body, status } = await room.send(await pictures.jpegAndHtml(), 'page.html');
    expect(status).toBe(201);
    await room.made();
    const form = await room.recorder
      .get(`/api/v1/workroom/images/${body.id as string}/forms/320.jpg`)
      .buffer(true);
    expect(form.headers['content-type']).toBe('image/jpeg');
    expect((form.body as Buffer).includes('<script>')).toBe(false);
  });

  it('makes its own names of files, whatever the sender calls them (ASVS 5)', async () => {
    const { body, status } = await room.send(await pictures.honestJpeg(), '../../../etc/cron.d/x.jpg');
    expect([status, body.fileName]).toEqual([201, 'x.jpg']);
    const { originalKey } = await room.rows.findOneByOrFail(ImageRow, { id: body.id as string });
    expect(originalKey).toMatch(/^originals\/[0-9a-f]{2}\/[0-9a-f-]{36}\.jpg$/);
    const broken = await room.send(await pictures.honestJpeg(), 'a\u0000b.jpg');
    expect([broken.status, broken.body.code]).toEqual([400, 'image.upload']);
    expect(await room.filesUnder('incoming')).toEqual([]);
  });

  it('wants a view, a file, and not more than 60 MB', async () => {
    const noView = await room.recorder.post(room.images).attach('file', await pictures.honestJpeg(), 'x.jpg');
    expect([noView.status, noView.body.errors[0].pointer]).toEqual([400, '/view']);
    const noFile = await room.recorder.post(room.images).field('view', 'front');
    expect([noFile.status, noFile.body.code]).toEqual([400, 'image.missing']);
    const huge = await room.send(
      Buffer.concat([await pictures.honestJpeg(), Buffer.alloc(60 * 1024 * 1024)]),
    );
    expect([huge.status, huge.body.code]).toEqual([413, 'image.too-large']);
    expect(await room.filesUnder('incoming')).toEqual([]);
  });

  it('lets nobody but those with image:write send or change pictures', async () => {
    const desk = await house.signInAs('desk');
    expect((await room.send(await pictures.honestJpeg(), 'x.jpg', desk)).status).toBe(403);
    expect((await room.send(await pictures.honestJpeg(), 'x.jpg', house.visitor())).status).toBe(401);
  });
});
