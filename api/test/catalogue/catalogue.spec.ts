import { setTimeout as wait } from 'node:timers/promises';
import { getDataSourceToken } from '@nestjs/typeorm';
import { v7 as uuidv7 } from 'uuid';
import { InProcessCatalogue } from '../../src/catalogue/site-catalogue.service';
import { CATALOGUE } from '../../src/common/catalogue-connection';
import { type Agent, type House, openHouse } from '../harness/house';
import { measured, publishedDocument, Publisher } from './published-documents';
import { query } from './indexed-garments';

describe('the public catalogue', () => {
  let house: House;
  let visitor: Agent;
  let publisher: Publisher;

  beforeAll(async () => {
    house = await openHouse();
  });
  afterAll(() => house.close());
  beforeEach(() => {
    visitor = house.visitor();
    publisher = new Publisher(house);
  });
  afterEach(() => house.empty());

  const get = (path: string) => visitor.get(`/api/v1/catalogue${path}`);

  /** A search is at most a quarter of a second behind. */
  const settled = () => wait(260);

  it('reads with an account that can read the published tables and nothing else', async () => {
    const source = house.app.get<{ query(sql: string): Promise<unknown> }>(getDataSourceToken(CATALOGUE));
    await expect(source.query('SELECT COUNT(*) FROM ellwand.garment')).rejects.toThrow(/denied/);
    await expect(source.query('DELETE FROM ellwand_catalogue.published_garment')).rejects.toThrow(/denied/);
  });

  it('answers the whole published copy, its state and its versions', async () => {
    await publisher.publish();
    const answer = await get('/garments/lh-1966-30');
    expect(answer.status).toBe(200);
    const { publishedAt } = answer.body.versions[0];
    expect(answer.body).toEqual({
      ...publishedDocument(),
      state: 'current',
      versions: [{ version: 1, state: 'current', publishedAt }],
    });
  });

  it('keeps each version as it was published', async () => {
    await publisher.publish();
    await publisher.publish({ version: 2, title: 'Blue-green bodice' });
    expect((await get('/garments/lh-1966-30')).body).toMatchObject({
      title: 'Blue-green bodice',
      version: 2,
    });
    const first = await get('/garments/lh-1966-30/v/1');
    expect(first.body).toMatchObject({ title: 'Teal bodice', version: 1, state: 'superseded' });
    expect(first.body.versions).toHaveLength(2);
  });

  it.each([
    '/garments/lh-0',
    '/garments/LH-1966-30',
    '/garments/..%2Fx',
    '/garments/%00',
    '/garments/lh-1966-30/v/2',
    '/garments/lh-1966-30/v/99999999999',
  ])('answers 404 for what was never published: %s', async (path) => {
    await publisher.publish();
    const answer = await get(path);
    expect([answer.status, answer.body.code]).toEqual([404, 'garment.unknown']);
  });

  it('answers 410 with the public notice for every version of a withdrawn garment, at once', async () => {
    await publisher.publish();
    await publisher.publish({ version: 2 });
    await get('/garments/lh-1966-30');
    await publisher.withdraw('lh-1966-30');
    for (const path of ['', '/v/1', '/v/2']) {
      const answer = await get(`/garments/lh-1966-30${path}`);
      expect(answer.status).toBe(410);
      expect(answer.body).toMatchObject({
        number: 'lh-1966-30',
        notice: 'Withdrawn at the lender’s wish.',
        withdrawnOn: '2026-05-06',
      });
      expect(JSON.stringify(answer.body)).not.toContain('Teal');
    }
    expect((await get('/garments/lh-1966-30/v/3')).status).toBe(404);
  });

  it('shows a garment published anew, while the versions from before stay withdrawn', async () => {
    await publisher.publish();
    await publisher.withdraw('lh-1966-30');
    await publisher.publish({ version: 2, title: 'Teal bodice, again' });
    expect((await get('/garments/lh-1966-30')).body).toMatchObject({
      title: 'Teal bodice, again',
      version: 2,
    });
    const old = await get('/garments/lh-1966-30/v/1');
    expect([old.status, old.body.withdrawnOn]).toEqual([410, new Date().toISOString().slice(0, 10)]);
  });

  it('may be kept by caches that ask: 304 while nothing changed, never after a withdrawal', async () => {
    await publisher.publish();
    for (const path of ['/garments/lh-1966-30', '/garments?kind=bodice', '/points', '/kinds', '/front']) {
      const first = await get(path);
      expect(first.headers['cache-control']).toBe('public, no-cache');
      const again = await get(path).set('If-None-Match', String(first.headers['etag']));
      expect([path, again.status]).toEqual([path, 304]);
    }
    const { headers } = await get('/garments/lh-1966-30');
    await publisher.withdraw('lh-1966-30');
    expect((await get('/garments/lh-1966-30').set('If-None-Match', String(headers['etag']))).status).toBe(
      410,
    );
  });

  it('finds what was published and forgets what was withdrawn, within half a second', async () => {
    await publisher.publish();
    await settled();
    const found = await get('/garments?q=teal&measure=bust:850..851');
    expect(found.body).toMatchObject({ total: 1, page: 1, size: 24, advice: null });
    expect(found.body.items[0]).toEqual({
      number: 'lh-1966-30',
      title: 'Teal bodice',
      kind: 'bodice',
      dateDisplay: 'about 1885',
      image: null,
      measurements: [
        { pointId: 'bust', label: 'Bust or chest', partName: 'Bodice', valueMm: '850.5' },
        { pointId: 'waist', label: 'Waist', partName: 'Bodice', valueMm: '612' },
      ],
    });
    expect(found.body.facets.find(({ name }: { name: string }) => name === 'decade').values).toEqual([
      { value: '1880', label: '1880s', count: 1 },
    ]);
    await publisher.withdraw('lh-1966-30');
    await settled();
    expect((await get('/garments')).body.total).toBe(0);
  });

  it('learns of a change that commits after a later one', async () => {
    await publisher.publish();
    await settled();
    await get('/garments');
    const late = house.owner.source.createQueryRunner();
    await late.startTransaction();
    await late.query(
      "INSERT INTO ellwand_catalogue.published_change (number, happened, at) VALUES ('lh-1966-30', 'published', NOW(3))",
    );
    await publisher.publish({ number: 'lh-2', title: 'Violet bodice' });
    await settled();
    expect((await get('/garments')).body.total).toBe(2);
    await late.query(
      "UPDATE ellwand_catalogue.published_garment SET title = 'Renamed bodice' WHERE number = 'lh-1966-30'",
    );
    await late.commitTransaction();
    await late.release();
    await settled();
    expect((await get('/garments?q=renamed')).body.total).toBe(1);
  });

  it('begins anew when the database was put back to an earlier day', async () => {
    await publisher.publish();
    await settled();
    expect((await get('/garments')).body.total).toBe(1);
    await house.empty();
    await settled();
    expect((await get('/garments')).body.total).toBe(0);
  });

  it('says which part of an address cannot be read', async () => {
    const answer = await get('/garments?measure=waist:wide&size=1000&sort=price');
    expect(answer.status).toBe(400);
    expect(answer.body.errors.map(({ pointer }: { pointer: string }) => pointer).sort()).toEqual([
      '/measure/0',
      '/size',
      '/sort',
    ]);
  });

  it('hands pages the same answers in process as over HTTP', async () => {
    await publisher.publish();
    await settled();
    const inProcess = house.app.get(InProcessCatalogue, { strict: false });
    expect(await inProcess.search(query({ kind: 'bodice' }))).toEqual(
      (await get('/garments?kind=bodice')).body,
    );
    expect(await inProcess.front()).toEqual((await get('/front')).body);
    expect(await inProcess.garment('lh-1966-30')).toEqual({
      found: 'garment',
      garment: (await get('/garments/lh-1966-30')).body,
    });
    expect(await inProcess.garment('lh-0')).toEqual({ found: 'nothing' });
  });

  it('counts on the front page, newest measured first, what is not measured last', async () => {
    await publisher.publish();
    await publisher.publish({ number: 'lh-2', title: 'Second bodice', parts: [] });
    await settled();
    const { body } = await get('/front');
    expect(body).toMatchObject({ total: 2, kinds: [{ kind: 'bodice', count: 2 }] });
    expect(body.newest.map(({ number }: { number: string }) => number)).toEqual(['lh-1966-30', 'lh-2']);
  });

  it('defines every measuring point and kind in words', async () => {
    const { items, groups } = (await get('/points')).body as {
      items: { id: string; group: string; definition: string }[];
      groups: { id: string }[];
    };
    expect(items.find(({ id }) => id === 'waist')?.definition).toContain('waist');
    for (const { group } of items) expect(groups.map(({ id }) => id)).toContain(group);
    expect((await get('/kinds')).body.items[0]).toEqual({
      id: 'dress',
      singular: 'Dress',
      plural: 'Dresses',
    });
  });

  it('answers 410 for a withdrawn picture, 404 for one that is nowhere shown', async () => {
    const id = uuidv7();
    const image = {
      id,
      view: 'front',
      alt: 'Front',
      caption: '',
      credit: '',
      widthPx: 700,
      heightPx: 900,
      widths: [320, 640],
    } as const;
    await publisher.publish({ images: [{ ...image, widths: [...image.widths] }] });
    // Its files are not there, so it cannot be shown; but it is not withdrawn.
    expect((await visitor.get(`/media/${id}/320.jpg`)).status).toBe(404);
    await publisher.withdraw('lh-1966-30');
    const gone = await visitor.get(`/media/${id}/320.jpg`);
    expect([gone.status, gone.body.code]).toEqual([410, 'picture.withdrawn']);
    for (const path of [`${uuidv7()}/320.jpg`, 'x/320.jpg', `${id}/320.png`, `${id}/original.jpg`]) {
      expect([path, (await visitor.get(`/media/${path}`)).status]).toEqual([path, 404]);
    }
  });

  it('measures by exact lengths, not by rounded ones', async () => {
    const [part] = publishedDocument().parts;
    if (!part) throw new Error('The document has a part');
    await publisher.publish({ parts: [{ ...part, measurements: [measured('waist', '609.6001')] }] });
    await settled();
    expect((await get('/garments?measure=waist:..609.6')).body.total).toBe(0);
    expect((await get('/garments?measure=waist:..609.6001')).body.total).toBe(1);
  });
});
