import { setTimeout as wait } from 'node:timers/promises';
import type { Garment } from '@ellwand/shared/records/garment';
import type { PublishedGarment, SearchAnswer } from '@ellwand/shared/records/published-garment';
import { type Agent, type House, openHouse } from './harness/house';
import type { TestPerson } from './harness/people';
import { factsWith, makeDress, openSheet, reading, type SheetShown, soundSheet } from './support/garments';
import { loopDepth, makeProtocol, skirtWithLoop } from './support/protocols';

describe('sheets and the protocols they are taken by', () => {
  let house: House;
  let keeper: TestPerson;
  let administrator: Agent;
  let reader: TestPerson;
  let holder: TestPerson;
  let table: Agent;
  let dress: Garment;

  beforeAll(async () => {
    house = await openHouse();
  });
  afterAll(() => house.close());
  beforeEach(async () => {
    await house.empty();
    keeper = await house.person('administrator', 'Maud Ferrers');
    administrator = await house.signInAs(keeper);
    reader = await house.person('recorder', 'Odile Marsh');
    holder = await house.person('curator', 'Ines Thorne');
    table = await house.signInAs(reader);
    dress = await makeDress(table);
  });

  const skirtPart = () => dress.parts.find((part) => part.kind === 'skirt')?.id ?? '';
  const sheetNow = async (id: string) =>
    (await table.get(`/api/v1/workroom/sheets/${id}`)).body as SheetShown;
  const completeSheet = async (who: Agent, { id }: SheetShown, readings: object[]) => {
    const sent = await who.post(`/api/v1/workroom/sheets/${id}/readings`).send({ readings });
    const { sheetVersion } = sent.body as { sheetVersion: number };
    const answer = await who
      .post(`/api/v1/workroom/sheets/${id}/complete`)
      .set('If-Match', `"${sheetVersion}"`);
    expect(answer.status).toBe(200);
  };
  const verb = async (who: Agent, name: string) => {
    const path = `/api/v1/workroom/garments/${dress.id}`;
    const { version } = (await who.get(path)).body as Garment;
    const answer = await who.post(`${path}/${name}`).set('If-Match', `"${version}"`);
    expect(answer.status).toBe(200);
    return answer;
  };
  const newest = (sheet: SheetShown) =>
    table.post(`/api/v1/workroom/sheets/${sheet.id}/newest-protocol`).set('If-Match', `"${sheet.version}"`);
  const asks = (sheet: SheetShown) => sheet.protocol.points.map(({ pointId }) => pointId);

  it('keep the version they were opened with; new sheets are taken by the newest', async () => {
    const old = await openSheet(table, skirtPart(), factsWith(reader, holder));
    await makeProtocol(administrator, 'skirt', 1, skirtWithLoop());
    const kept = await sheetNow(old.id);
    expect(kept).toMatchObject({ protocolVersion: 1, newestProtocolVersion: 2 });
    expect(asks(kept)).not.toContain(loopDepth.id);
    const fresh = await openSheet(table, skirtPart(), factsWith(reader, holder));
    expect(fresh).toMatchObject({ protocolVersion: 2, newestProtocolVersion: 2 });
    expect(asks(fresh)).toContain(loopDepth.id);
    const { parts } = (await table.get(`/api/v1/workroom/garments/${dress.id}`)).body as Garment;
    const sheets = parts.flatMap((part) => part.sheets);
    expect(sheets.map(({ id, pointsWanted }) => [id, pointsWanted]).sort()).toEqual(
      [
        [old.id, 8],
        [fresh.id, 9],
      ].sort(),
    );
  });

  it('follow at once what another process of the API has made', async () => {
    await openSheet(table, skirtPart(), factsWith(reader, holder));
    const { points, ownPoints, note } = skirtWithLoop();
    await house.owner.source.query(
      `INSERT INTO ellwand.protocol (id, kind, worn_together, version, body, note, made_by, made_at)
       VALUES (UUID(), 'skirt', FALSE, 2, ?, ?, ?, NOW(3))`,
      [JSON.stringify({ points, ownPoints }), note, keeper.id],
    );
    const next = await openSheet(table, skirtPart(), factsWith(reader, holder));
    expect(next.protocolVersion).toBe(2);
    expect(asks(next)).toContain(loopDepth.id);
  });

  it('take and check readings of an own point', async () => {
    await makeProtocol(administrator, 'skirt', 1, skirtWithLoop());
    const sheet = await openSheet(table, skirtPart(), factsWith(reader, holder));
    const readings = [...soundSheet(sheet, reader.id), reading(loopDepth.id, '812', reader.id)];
    const sent = await table.post(`/api/v1/workroom/sheets/${sheet.id}/readings`).send({ readings });
    expect(new Set(sent.body.results.map(({ outcome }: { outcome: string }) => outcome))).toEqual(
      new Set(['kept']),
    );
    const old = await table
      .post(`/api/v1/workroom/sheets/${sheet.id}/readings`)
      .send({ readings: [reading('own-nothing-of-the-kind', '812', reader.id)] });
    expect(old.body.results[0].outcome).toBe('refused');
  });

  it('may move to the newest while nothing has been read on them', async () => {
    const facts = factsWith(reader, holder, { repeatPoints: ['opening', 'hem'] });
    const empty = await openSheet(table, skirtPart(), facts);
    const { points, ...rest } = skirtWithLoop();
    const withoutOpening = points.filter(({ pointId }) => pointId !== 'opening');
    await makeProtocol(administrator, 'skirt', 1, { ...rest, points: withoutOpening });
    const moved = await newest(empty);
    expect(moved.status).toBe(200);
    expect(moved.body).toMatchObject({ protocolVersion: 2, version: empty.version + 1 });
    expect(moved.body.facts.repeatPoints).toEqual(['hem']);
    expect((await newest(empty)).status).toBe(412);
  });

  it('are published with the protocol that they were taken by, own points and all, and stay so', async () => {
    await makeProtocol(administrator, 'skirt', 1, skirtWithLoop());
    const skirt = await openSheet(table, skirtPart(), factsWith(reader, holder));
    const more = [reading(loopDepth.id, '812', reader.id)];
    await completeSheet(table, skirt, [...soundSheet(skirt, reader.id), ...more]);
    const bodicePart = dress.parts.find((part) => part.kind === 'bodice')?.id ?? '';
    const bodice = await openSheet(table, bodicePart, factsWith(reader, holder));
    await completeSheet(table, bodice, soundSheet(bodice, reader.id));
    await verb(table, 'submit');
    // Made while the record lies in review: what was frozen keeps the protocol it was measured by.
    const { points, ...rest } = skirtWithLoop({ ownPoints: [] });
    const withoutLoop = points.filter(({ pointId }) => pointId !== loopDepth.id);
    await makeProtocol(administrator, 'skirt', 2, { ...rest, points: withoutLoop });
    const curator = await house.signInAs(await house.person('curator', 'Hal Brandreth'));
    await verb(curator, 'approve');
    const { body: published } = await verb(curator, 'publish');
    const visitor = house.visitor();
    const page = (await visitor.get(`/api/v1/catalogue/garments/${published.publicNumber}`))
      .body as PublishedGarment;
    const part = page.parts.find(({ kind }) => kind === 'skirt');
    expect(part?.protocol).toEqual({
      version: 2,
      pointIds: skirtWithLoop().points.map(({ pointId }) => pointId),
    });
    expect(part?.ownPoints).toEqual([loopDepth]);
    expect(part?.measurements.find(({ pointId }) => pointId === loopDepth.id)).toMatchObject({
      label: 'Band to train loop',
      valueMm: '812',
    });
    // The search answers from what was known a quarter of a second ago at most.
    await wait(260);
    const found = async (measure: string) =>
      (await visitor.get('/api/v1/catalogue/garments').query({ measure })).body as SearchAnswer;
    expect((await found(`${loopDepth.id}:800..820`)).total).toBe(1);
    expect((await found(`${loopDepth.id}:800..820`)).ranges[0]?.label).toBe('Band to train loop');
    expect((await found(`${loopDepth.id}:820..830`)).total).toBe(0);
    // An own point counts in its group: no catalogued point of the skirt is that long.
    expect((await found('skirt-length:800..820')).total).toBe(1);
  });

  it('do not move once something has been read, or they are complete', async () => {
    const begun = await openSheet(table, skirtPart(), factsWith(reader, holder));
    await table
      .post(`/api/v1/workroom/sheets/${begun.id}/readings`)
      .send({ readings: [reading('waistband', '618', reader.id)] });
    await makeProtocol(administrator, 'skirt', 1, skirtWithLoop());
    const answer = await newest(await sheetNow(begun.id));
    expect(answer.body).toMatchObject({ status: 409, code: 'sheet.has-readings' });
    expect((await sheetNow(begun.id)).protocolVersion).toBe(1);
  });
});
