import type { Garment } from '@ellwand/shared/records/garment';
import { type Agent, type House, openHouse } from './harness/house';
import type { TestPerson } from './harness/people';
import { factsWith, makeDress, openSheet, silkDress } from './support/garments';

const garments = '/api/v1/workroom/garments';

describe('the record of a garment', () => {
  let house: House;
  let person: TestPerson;
  let recorder: Agent;
  let dress: Garment;

  beforeAll(async () => {
    house = await openHouse();
  });
  afterAll(() => house.close());
  beforeEach(async () => {
    await house.empty();
    person = await house.person('recorder', 'Odile Marsh');
    recorder = await house.signInAs(person);
    dress = await makeDress(recorder);
  });

  const rewrite = (version: number, record: object) =>
    recorder.put(`${garments}/${dress.id}/record`).set('If-Match', `"${version}"`).send(record);

  it('is made once, however often the request comes', async () => {
    const id = '01930000-0000-7000-8000-000000000abc';
    const body = {
      id,
      record: { ...silkDress, ownNumber: 'LH.2026.1' },
      parts: [{ kind: 'dress', name: 'Dress' }],
    };
    const answers = await Promise.all([1, 2].map(() => recorder.post(garments).send(body)));
    expect(answers.map(({ status, body }) => ({ status, id: String(body.id) }))).toEqual([
      { status: 201, id },
      { status: 201, id },
    ]);
    await recorder.post(garments).send(body);
    expect((await recorder.get(`${garments}?q=LH.2026.1`)).body.total).toBe(1);
    const other = await recorder.post(garments).send({ ...body, record: { ...body.record, title: 'Other' } });
    expect(other.body).toMatchObject({ status: 422, code: 'garment.id-used' });
    expect((await recorder.get(`${garments}/${id}`)).body.record.title).toBe(silkDress.title);
  });

  it('is not made without what identifies it, and says where each thing is missing', async () => {
    const answer = await recorder
      .post(garments)
      .send({ record: { ...silkDress, title: ' ', creditLine: '' }, parts: [] });
    expect(answer.body).toMatchObject({ status: 400, code: 'request.invalid' });
    const pointers = answer.body.errors.map((error: { pointer: string }) => error.pointer);
    expect(pointers).toEqual(expect.arrayContaining(['/record/title', '/record/creditLine', '/parts']));
  });

  it('refuses a date that is no date, at its box', async () => {
    const answer = await rewrite(dress.version, { ...silkDress, date: '1885-13' });
    expect(answer.body).toMatchObject({ status: 400, code: 'garment.date', errors: [{ pointer: '/date' }] });
  });

  it('never has the number of another', async () => {
    const answer = await recorder
      .post(garments)
      .send({ record: silkDress, parts: [{ kind: 'dress', name: 'Dress' }] });
    expect(answer.body).toMatchObject({
      status: 409,
      code: 'garment.number-used',
      errors: [{ pointer: '/record/ownNumber' }],
    });
  });

  it('takes a number from one of two who want it at once, and tells the other at its box', async () => {
    const other = await makeDress(recorder, { ...silkDress, ownNumber: 'LH.1.1' });
    const answers = await Promise.all(
      [dress, other].map(({ id, version }) =>
        recorder
          .put(`${garments}/${id}/record`)
          .set('If-Match', `"${version}"`)
          .send({ ...silkDress, ownNumber: 'LH.2.2' }),
      ),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    expect(answers.find(({ status }) => status === 409)?.body).toMatchObject({
      code: 'garment.number-used',
      errors: [{ pointer: '/ownNumber' }],
    });
  });

  it('has no two parts of one number, also in capitals', async () => {
    const record = { ...silkDress, ownNumber: 'LH.1.1' };
    const made = await recorder.post(garments).send({
      record,
      parts: [
        { kind: 'bodice', name: 'Bodice', suffix: '.a' },
        { kind: 'skirt', name: 'Skirt', suffix: '.A' },
      ],
    });
    expect(made.body).toMatchObject({ status: 400, errors: [{ pointer: '/parts/1/suffix' }] });
    const add = (version: number, suffix: string) =>
      recorder
        .post(`${garments}/${dress.id}/parts`)
        .set('If-Match', `"${version}"`)
        .send({ kind: 'cape', name: 'Cape', suffix });
    const { version } = (await add(dress.version, '.a')).body as Garment;
    expect((await add(version, '.A')).body).toMatchObject({ status: 409, code: 'part.number-used' });
  });

  it('loses no edit: of two people who saw the same version one is told what happened', async () => {
    const second = await house.signInAs(await house.person('recorder', 'Colm Hale'));
    expect((await rewrite(dress.version, { ...silkDress, title: 'First title' })).status).toBe(200);
    const late = await second
      .put(`${garments}/${dress.id}/record`)
      .set('If-Match', `"${dress.version}"`)
      .send({ ...silkDress, title: 'Second title' });
    expect(late.body).toMatchObject({
      status: 412,
      code: 'version.stale',
      current: 2,
      changedBy: 'Odile Marsh',
    });
    expect((await recorder.get(`${garments}/${dress.id}`)).body.record.title).toBe('First title');
  });

  it('loses none of twenty edits that come at once, each acknowledged or refused', async () => {
    const titles = Array.from({ length: 20 }, (_, number) => `Title ${number}`);
    const answers = await Promise.all(titles.map((title) => rewrite(dress.version, { ...silkDress, title })));
    const kept = answers.filter((answer) => answer.status === 200);
    expect(kept).toHaveLength(1);
    expect(answers.filter((answer) => answer.status === 412)).toHaveLength(19);
    const { body } = await recorder.get(`${garments}/${dress.id}`);
    expect(body).toMatchObject({ version: 2, record: { title: kept[0]?.body.record.title } });
  });

  it('asks for the version', async () => {
    const answer = await recorder.put(`${garments}/${dress.id}/record`).send(silkDress);
    expect(answer.body).toMatchObject({ status: 428, code: 'version.required' });
  });

  it('takes parts and gives them up until they are measured', async () => {
    const more = await recorder
      .post(`${garments}/${dress.id}/parts`)
      .set('If-Match', `"${dress.version}"`)
      .send({ kind: 'cape', name: 'Cape', suffix: '.3' });
    expect(more.body.parts.map((part: { suffix: string }) => part.suffix)).toEqual(['.1', '.2', '.3']);
    const cape = more.body.parts[2].id as string;
    const gone = await recorder
      .delete(`/api/v1/workroom/parts/${cape}`)
      .set('If-Match', `"${more.body.version}"`);
    expect(gone.body.parts).toHaveLength(2);
    const bodice = dress.parts[0]?.id ?? '';
    await openSheet(recorder, bodice, factsWith(person, await house.person('recorder')));
    const kept = await recorder
      .delete(`/api/v1/workroom/parts/${bodice}`)
      .set('If-Match', `"${gone.body.version}"`);
    expect(kept.body).toMatchObject({ status: 409, code: 'part.measured' });
  });

  it.each([
    ['its number', '1966'],
    ['its title', 'teal silk'],
    ['its maker', 'verrault'],
  ])('is found by %s', async (_what, q) => {
    await makeDress(recorder, { ...silkDress, ownNumber: 'LH.1.1', title: 'Plain shirt', maker: null });
    const { body } = await recorder.get(`${garments}?q=${encodeURIComponent(q)}`);
    expect(body.items.map((item: { ownNumber: string }) => item.ownNumber)).toEqual(['LH.1966.30']);
  });

  it('takes percent and underline for what they are when looking', async () => {
    expect((await recorder.get(`${garments}?q=%25`)).body.total).toBe(0);
    expect((await recorder.get(`${garments}?q=_H`)).body.total).toBe(0);
  });
});
