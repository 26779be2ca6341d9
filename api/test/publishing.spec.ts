import type { Garment } from '@ellwand/shared/records/garment';
import { type Agent, type House, openHouse } from './harness/house';
import type { TestPerson } from './harness/people';
import { factsWith, makeDress, openSheet, silkDress, soundSheet } from './support/garments';

describe('from the table to the public and back', () => {
  let house: House;
  let reader: TestPerson;
  let holder: TestPerson;
  let recorder: Agent;
  let ines: Agent;
  let curator: Agent;
  let dress: Garment;

  beforeAll(async () => {
    house = await openHouse();
  });
  afterAll(() => house.close());
  beforeEach(async () => {
    await house.empty();
    reader = await house.person('recorder', 'Odile Marsh');
    holder = await house.person('curator', 'Ines Thorne');
    recorder = await house.signInAs(reader);
    ines = await house.signInAs(holder);
    curator = await house.signInAs(await house.person('curator', 'Hal Brandreth'));
    dress = await makeDress(recorder);
  });

  async function measureAll(): Promise<void> {
    for (const part of dress.parts) {
      const sheet = await openSheet(recorder, part.id, factsWith(reader, holder));
      const path = `/api/v1/workroom/sheets/${sheet.id}`;
      const sent = await recorder.post(`${path}/readings`).send({ readings: soundSheet(sheet, reader.id) });
      const done = await recorder.post(`${path}/complete`).set('If-Match', `"${sent.body.sheetVersion}"`);
      expect(done.body.state).toBe('complete');
    }
  }

  const now = async () => (await recorder.get(`/api/v1/workroom/garments/${dress.id}`)).body as Garment;
  async function verb(who: Agent, name: string, body?: object) {
    const { version } = await now();
    return who
      .post(`/api/v1/workroom/garments/${dress.id}/${name}`)
      .set('If-Match', `"${version}"`)
      .send(body);
  }
  async function publish(): Promise<Garment> {
    await verb(recorder, 'submit');
    await verb(curator, 'approve');
    const answer = await verb(curator, 'publish');
    expect(answer.body.stage).toBe('published');
    return answer.body as Garment;
  }
  const publicTables = async () =>
    JSON.stringify(
      await Promise.all(
        ['garment', 'version', 'facet', 'measurement', 'text', 'image'].map((table) =>
          house.owner.source.query(`SELECT * FROM ellwand_catalogue.published_${table}`),
        ),
      ),
    );

  it('is not sent to review before it is measured', async () => {
    const answer = await verb(recorder, 'submit');
    expect(answer.body).toMatchObject({
      status: 409,
      code: 'record.not-ready',
      detail: 'Nothing has been measured yet.',
    });
    expect((await now()).stage).toBe('draft');
  });

  it('is locked while in review', async () => {
    await measureAll();
    await verb(recorder, 'submit');
    const { version } = await now();
    const path = `/api/v1/workroom/garments/${dress.id}/record`;
    const edit = await recorder
      .put(path)
      .set('If-Match', `"${version}"`)
      .send({ ...silkDress, title: 'Another title' });
    expect(edit.body).toMatchObject({ status: 409, code: 'record.locked' });
  });

  it('cannot be approved by whoever held the tape, nor by whoever edited it', async () => {
    await measureAll();
    await verb(recorder, 'submit');
    const held = await verb(ines, 'approve');
    expect(held.body).toMatchObject({ status: 403, code: 'review.own-measuring' });
    const both = await house.signInAs(
      await house.person(['recorder', 'curator', 'administrator'], 'Tam Okoye'),
    );
    await verb(curator, 'return', { reason: 'The title says too little.' });
    const { version } = await now();
    const record = { ...silkDress, title: 'Day dress of teal silk and velvet' };
    await both
      .put(`/api/v1/workroom/garments/${dress.id}/record`)
      .set('If-Match', `"${version}"`)
      .send(record);
    await verb(recorder, 'submit');
    expect((await verb(both, 'approve')).body).toMatchObject({ status: 403, code: 'review.own-edit' });
    expect((await now()).stage).toBe('in-review');
  });

  it('cannot be approved by whoever held the tape and was taken off the sheet afterwards', async () => {
    await measureAll();
    const another = await house.person('recorder', 'Colm Hale');
    for (const part of (await now()).parts) {
      const sheet = `/api/v1/workroom/sheets/${part.sheets[0]?.id}`;
      const shown = (await recorder.get(sheet)).body.version as number;
      const open = await recorder.post(`${sheet}/reopen`).set('If-Match', `"${shown}"`);
      const set = await recorder
        .put(`${sheet}/facts`)
        .set('If-Match', `"${open.body.version}"`)
        .send(factsWith(reader, another));
      const done = await recorder.post(`${sheet}/complete`).set('If-Match', `"${set.body.version}"`);
      expect(done.body.facts.people).not.toContainEqual(expect.objectContaining({ userId: holder.id }));
    }
    await verb(recorder, 'submit');
    expect((await verb(ines, 'approve')).body).toMatchObject({ status: 403, code: 'review.own-edit' });
    expect((await verb(curator, 'approve')).status).toBe(200);
  });

  it('has a number of its own where two with the same one are published at once', async () => {
    await measureAll();
    const first = dress;
    dress = await makeDress(recorder, { ...silkDress, ownNumber: 'LH 1966/30' });
    await measureAll();
    const both = [first, dress];
    for (const each of both) {
      dress = each;
      await verb(recorder, 'submit');
      await verb(curator, 'approve');
    }
    const answers = await Promise.all(
      both.map(async ({ id }) => {
        const { version } = (await curator.get(`/api/v1/workroom/garments/${id}`)).body as Garment;
        return curator.post(`/api/v1/workroom/garments/${id}/publish`).set('If-Match', `"${version}"`);
      }),
    );
    expect(answers.map((answer) => answer.body.publicNumber as string).sort()).toEqual([
      'lh-1966-30',
      'lh-1966-30-2',
    ]);
  });

  it('comes back with its reason, and the reason goes once it is sent again', async () => {
    await measureAll();
    await verb(recorder, 'submit');
    const empty = await verb(curator, 'return', { reason: ' ' });
    expect(empty.status).toBe(400);
    const returned = await verb(curator, 'return', { reason: 'Say how the waist was found.' });
    expect(returned.body).toMatchObject({
      stage: 'draft',
      returned: { reason: 'Say how the waist was found.', by: 'Hal Brandreth' },
    });
    expect((await verb(recorder, 'submit')).body.returned).toBeNull();
  });

  it('forgets why it came back once it was withdrawn and taken up again', async () => {
    await measureAll();
    await publish();
    await verb(recorder, 'revise');
    await verb(recorder, 'submit');
    await verb(curator, 'return', { reason: 'Say where the label sits.' });
    expect((await now()).returned).toMatchObject({ reason: 'Say where the label sits.' });
    house.clock.advance({ minutes: 5 });
    await verb(curator, 'withdraw', { notice: 'Withdrawn while its owner is asked.' });
    await verb(recorder, 'revise');
    expect(await now()).toMatchObject({ stage: 'draft', returned: null });
  });

  it('leaves everything private behind when it is published', async () => {
    await measureAll();
    const { publicNumber, publishedVersion } = await publish();
    expect({ publicNumber, publishedVersion }).toEqual({ publicNumber: 'lh-1966-30', publishedVersion: 1 });
    const written = await publicTables();
    expect(written).toContain('Day dress of teal silk');
    expect(written).not.toContain('PRIVATE-');
    expect(written).not.toContain('Odile Marsh');
    expect(written).not.toContain('Splits along the folds');
  });

  it('names the people and the hazards only when the record says so', async () => {
    const { version } = await now();
    const record = { ...silkDress, showPeople: true, showHazards: true };
    await recorder
      .put(`/api/v1/workroom/garments/${dress.id}/record`)
      .set('If-Match', `"${version}"`)
      .send(record);
    await measureAll();
    await publish();
    const written = await publicTables();
    expect(written).toContain('Odile Marsh');
    expect(written).toContain('Splits along the folds');
  });

  it('leaves the public copy unchanged while a new draft is edited, then tells what changed', async () => {
    await measureAll();
    const published = await publish();
    const record = { ...silkDress, title: 'Day dress, teal silk' };
    const edited = await recorder
      .put(`/api/v1/workroom/garments/${dress.id}/record`)
      .set('If-Match', `"${published.version}"`)
      .send(record);
    expect(edited.body).toMatchObject({ stage: 'draft', isPublic: true, publishedVersion: 1 });
    expect(await publicTables()).not.toContain('Day dress, teal silk');
    const review = await curator.get(`/api/v1/workroom/garments/${dress.id}/review`);
    expect(review.body.changes).toEqual([
      {
        kind: 'changed',
        area: 'record',
        label: 'Title',
        before: 'Day dress of teal silk',
        after: 'Day dress, teal silk',
      },
    ]);
    expect(review.body.nextVersion).toBe(2);
  });

  it('takes every version and search row out of view when it is withdrawn', async () => {
    await measureAll();
    await publish();
    const withdrawn = await verb(curator, 'withdraw', {
      notice: 'Withdrawn while its history is looked into.',
      innerReason: 'INNER',
    });
    expect(withdrawn.body).toMatchObject({ stage: 'withdrawn', isPublic: false });
    const count = async (table: string, where = '1') =>
      Number(
        (
          await house.owner.source.query(
            `SELECT COUNT(*) AS n FROM ellwand_catalogue.published_${table} WHERE ${where}`,
          )
        )[0].n,
      );
    expect(await count('version', "state <> 'withdrawn'")).toBe(0);
    expect(await count('facet')).toBe(0);
    expect(await count('measurement')).toBe(0);
    expect(await publicTables()).not.toContain('INNER');
    expect((await verb(curator, 'withdraw', { notice: 'Again.' })).status).toBe(409);
  });

  it('keeps the whole inner reason of a withdrawal in the trail, and its notice', async () => {
    await measureAll();
    await publish();
    const notice = 'Withdrawn while its history is looked into.';
    const innerReason = `${'A long story. '.repeat(100)}The end.`;
    await verb(curator, 'withdraw', { notice, innerReason });
    const rows: { facts: object | string }[] = await house.owner.source.query(
      "SELECT facts FROM ellwand_audit.entry WHERE verb = 'withdraw'",
    );
    const facts = rows[0]?.facts;
    expect(typeof facts === 'string' ? JSON.parse(facts) : facts).toEqual({ notice, innerReason });
  });

  it('is published once when the button is pressed twice', async () => {
    await measureAll();
    await verb(recorder, 'submit');
    await verb(curator, 'approve');
    const { version } = await now();
    const press = () =>
      curator.post(`/api/v1/workroom/garments/${dress.id}/publish`).set('If-Match', `"${version}"`);
    const answers = await Promise.all(Array.from({ length: 6 }, press));
    expect(answers.filter((answer) => answer.status === 200)).toHaveLength(1);
    expect(answers.filter((answer) => answer.status === 412)).toHaveLength(5);
    const versions = await house.owner.source.query(
      'SELECT version FROM ellwand_catalogue.published_version',
    );
    expect(versions).toHaveLength(1);
  });

  it('never gives a public number twice', async () => {
    await measureAll();
    await publish();
    const second = await makeDress(recorder, { ...silkDress, ownNumber: 'LH 1966/30' });
    dress = second;
    await measureAll();
    expect((await publish()).publicNumber).toBe('lh-1966-30-2');
  });

  it.each([
    ['approve', undefined],
    ['publish', undefined],
    ['return', { reason: 'No reason at all.' }],
    ['withdraw', { notice: 'No notice.' }],
    ['revise', undefined],
  ])('refuses to %s a draft that was never published', async (name, body) => {
    await measureAll();
    expect((await verb(curator, name, body)).status).toBe(409);
    expect((await now()).stage).toBe('draft');
  });

  it('writes each verb into the audit trail', async () => {
    await measureAll();
    await publish();
    const rows: { verb: string; actor_name: string }[] = await house.owner.source.query(
      "SELECT verb, actor_name FROM ellwand_audit.entry WHERE subject_kind = 'garment' ORDER BY at, id",
    );
    expect(rows.map((row) => `${row.actor_name}: ${row.verb}`)).toEqual([
      'Odile Marsh: make',
      'Odile Marsh: submit',
      'Hal Brandreth: approve',
      'Hal Brandreth: publish',
    ]);
  });
});
