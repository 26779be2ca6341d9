import { v7 as uuidv7 } from 'uuid';
import type { Garment } from '@ellwand/shared/records/garment';
import { type Agent, type House, openHouse } from './harness/house';
import type { TestPerson } from './harness/people';
import { factsWith, makeDress, openSheet, reading, type SheetShown, soundSheet } from './support/garments';

describe('what is said at the table', () => {
  let house: House;
  let reader: TestPerson;
  let holder: TestPerson;
  let table: Agent;
  let dress: Garment;
  let bodice: SheetShown;

  beforeAll(async () => {
    house = await openHouse();
  });
  afterAll(() => house.close());
  beforeEach(async () => {
    await house.empty();
    reader = await house.person('recorder', 'Odile Marsh');
    holder = await house.person('curator', 'Ines Thorne');
    table = await house.signInAs(reader);
    dress = await makeDress(table);
    const part = dress.parts.find((each) => each.kind === 'bodice');
    bodice = await openSheet(table, part?.id ?? '', factsWith(reader, holder));
  });

  const note = (said: object, saidAt = '2026-11-20T09:30:00.000Z') => ({
    id: uuidv7(),
    device: 'tablet 1',
    saidAt,
    ...said,
  });
  const say = (notes: object[]) =>
    table.post(`/api/v1/workroom/sheets/${bodice.id}/table-notes`).send({ notes });
  const sheetNow = async () => (await table.get(`/api/v1/workroom/sheets/${bodice.id}`)).body as SheetShown;

  it('is kept once, however often a tablet says it, and shown in the order in which it was said', async () => {
    const paused = note({ about: 'paused', reason: 'The light is going' }, '2026-11-20T12:00:00.000Z');
    const begun = note({ about: 'begun' });
    expect((await say([paused])).body.results).toMatchObject([{ outcome: 'kept' }]);
    const late = await say([begun, paused]);
    expect(late.body.results).toMatchObject([{ outcome: 'kept' }, { outcome: 'already-kept' }]);
    const version = (await sheetNow()).version;
    expect((await say([begun, paused])).body).toMatchObject({
      sheetVersion: version,
      results: [{ outcome: 'already-kept' }, { outcome: 'already-kept' }],
    });
    expect((await sheetNow()).tableNotes).toMatchObject([
      { about: 'begun', byName: 'Odile Marsh' },
      { about: 'paused', reason: 'The light is going', by: reader.id },
    ]);
  });

  it('says nothing else under an id that was used', async () => {
    const seen = note({ about: 'described', thing: 'label', text: 'Woven: Verrault, Larkmoor' });
    await say([seen]);
    const other = await say([{ ...seen, text: 'Something else' }]);
    expect(other.body.results).toMatchObject([{ outcome: 'refused' }]);
    expect((await sheetNow()).tableNotes).toMatchObject([{ text: 'Woven: Verrault, Larkmoor' }]);
  });

  it('names new hands on the sheet, who may then read, and keeps whoever held before', async () => {
    const third = await house.person('recorder', 'Wenna Oddie');
    const early = await table
      .post(`/api/v1/workroom/sheets/${bodice.id}/readings`)
      .send({ readings: [reading('waist', '612', third.id)] });
    expect(early.body.results[0].outcome).toBe('refused');
    const hands = note({
      about: 'hands',
      people: [
        { userId: third.id, duty: 'read' },
        { userId: reader.id, duty: 'held' },
      ],
    });
    expect((await say([hands])).body.results).toMatchObject([{ outcome: 'kept' }]);
    const { people } = (await sheetNow()).facts;
    expect(people.map(({ name, duty }) => `${name} ${duty}`).sort()).toEqual([
      'Ines Thorne held',
      'Odile Marsh held',
      'Odile Marsh read',
      'Odile Marsh wrote',
      'Wenna Oddie read',
    ]);
    const then = await table
      .post(`/api/v1/workroom/sheets/${bodice.id}/readings`)
      .send({ readings: [reading('waist', '612', third.id, { heldBy: reader.id })] });
    expect(then.body.results[0]).toMatchObject({ outcome: 'kept', reading: { heldBy: reader.id } });
  });

  it('refuses hands that do not work here, and keeps the rest of what was said', async () => {
    const stranger = note({ about: 'hands', people: [{ userId: uuidv7(), duty: 'read' }] });
    const cautions = note({ about: 'cautions', hazards: ['weighted-silk'] });
    expect((await say([stranger, cautions])).body.results).toMatchObject([
      { outcome: 'refused', detail: 'It names somebody who does not work here.' },
      { outcome: 'kept' },
    ]);
  });

  it('refuses a reading held by somebody whom the sheet does not name', async () => {
    const third = await house.person('recorder', 'Wenna Oddie');
    const answer = await table
      .post(`/api/v1/workroom/sheets/${bodice.id}/readings`)
      .send({ readings: [reading('waist', '612', reader.id, { heldBy: third.id })] });
    expect(answer.body.results[0]).toMatchObject({
      outcome: 'refused',
      detail: 'The sheet does not name that person as holding the tape.',
    });
  });

  it('answers a finding that is asked, and keeps an answer that comes too late', async () => {
    await table
      .post(`/api/v1/workroom/sheets/${bodice.id}/readings`)
      .send({ readings: [reading('waist', '1950', reader.id)] });
    const findings = () => table.get(`/api/v1/workroom/sheets/${bodice.id}/findings`);
    const asked = (await findings()).body.findings.find(
      ({ pointIds, severity }: { pointIds: string[]; severity: string }) =>
        pointIds.includes('waist') && severity !== 'note',
    );
    const missing = (await findings()).body.findings.find(
      ({ checkId }: { checkId: string }) => checkId === 'required-missing-without-reason',
    );
    const answers = await say([
      note({ about: 'answer', key: asked.key, reason: 'Read three times' }),
      note({ about: 'answer', key: 'gone:waist:612', reason: 'It was so' }),
      note({ about: 'answer', key: missing.key, reason: 'Forgotten' }),
    ]);
    expect(answers.body.results).toMatchObject([
      { outcome: 'kept' },
      { outcome: 'kept', detail: 'That is not asked any more; the readings have changed.' },
      { outcome: 'refused' },
    ]);
    const after = (await findings()).body.findings.find(({ key }: { key: string }) => key === asked.key);
    expect(after.answer).toMatchObject({ reason: 'Read three times', by: 'Odile Marsh' });
  });

  it('is kept of a sheet that is complete where it was said before, and leaves what is published as it is', async () => {
    const path = `/api/v1/workroom/sheets/${bodice.id}`;
    const sent = await table.post(`${path}/readings`).send({ readings: soundSheet(bodice, reader.id) });
    await table.post(`${path}/complete`).set('If-Match', `"${sent.body.sheetVersion}"`);
    const third = await house.person('curator', 'Wenna Oddie');
    const people = [{ userId: third.id, duty: 'held' }];
    const verb = async (who: Agent, name: string) => {
      const garment = `/api/v1/workroom/garments/${dress.id}`;
      const { version } = (await table.get(garment)).body as Garment;
      return who.post(`${garment}/${name}`).set('If-Match', `"${version}"`);
    };
    expect((await verb(table, 'submit')).status).toBe(200);

    const later = new Date(house.clock.now().getTime() + 60_000).toISOString();
    const late = note({ about: 'hands', people });
    const after = note({ about: 'hands', people }, later);
    const remark = note({ about: 'described', thing: 'remark', text: 'Boxed' }, later);
    expect((await say([late, after, remark])).body.results).toMatchObject([
      { outcome: 'kept' },
      { outcome: 'refused', detail: 'This sheet is complete. Open it again to go on.' },
      { outcome: 'kept' },
    ]);
    const own = await verb(await house.signInAs(third), 'approve');
    expect(own.body).toMatchObject({ status: 403, code: 'review.own-edit' });

    const other = await house.signInAs(await house.person('curator', 'Hal Brandreth'));
    expect((await verb(other, 'approve')).status).toBe(200);
    expect((await verb(other, 'publish')).status).toBe(200);
    const paused = note({ about: 'paused', reason: 'Put away' });
    expect((await say([paused])).body.results).toMatchObject([{ outcome: 'kept' }]);
    const { stage } = (await table.get(`/api/v1/workroom/garments/${dress.id}`)).body as Garment;
    expect(stage).toBe('published');
  });

  it('cannot be added to while the record is in review, and can be said again then without harm', async () => {
    const said = note({ about: 'begun' });
    await say([said]);
    await house.owner.source.query(`UPDATE ellwand.garment SET stage = 'in-review'`);
    expect((await say([note({ about: 'paused', reason: 'Lunch' })])).body.code).toBe('record.locked');
    expect((await say([said])).body.results).toMatchObject([{ outcome: 'already-kept' }]);
  });
});
