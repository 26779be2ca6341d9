import { v7 as uuidv7 } from 'uuid';
import type { Garment } from '@ellwand/shared/records/garment';
import { type Agent, type House, openHouse } from './harness/house';
import type { TestPerson } from './harness/people';
import {
  factsWith,
  makeDress,
  notTaken,
  openSheet,
  reading,
  type SheetShown,
  soundSheet,
} from './support/garments';

describe('the measuring sheet', () => {
  let house: House;
  let reader: TestPerson;
  let holder: TestPerson;
  let table: Agent;
  let dress: Garment;
  let skirt: SheetShown;

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
    const part = dress.parts.find((each) => each.kind === 'skirt');
    skirt = await openSheet(table, part?.id ?? '', factsWith(reader, holder));
  });

  const send = (readings: object[], sheet = skirt.id) =>
    table.post(`/api/v1/workroom/sheets/${sheet}/readings`).send({ readings });
  const sheetNow = async () => (await table.get(`/api/v1/workroom/sheets/${skirt.id}`)).body as SheetShown;

  it('is opened once, however often and at once the request comes', async () => {
    const [bodice, other] = dress.parts.map((part) => part.id);
    const body = { id: uuidv7(), facts: factsWith(reader, holder) };
    const open = (part = bodice) => table.post(`/api/v1/workroom/parts/${part}/sheets`).send(body);
    const answers = await Promise.all([open(), open(), open()]);
    expect(answers.map((answer) => answer.status)).toEqual([201, 201, 201]);
    const sheets = (await table.get(`/api/v1/workroom/garments/${dress.id}`)).body.parts[0].sheets;
    expect(sheets).toHaveLength(1);
    expect((await open(other)).body).toMatchObject({ status: 409, code: 'sheet.id-used' });
  });

  it('was not measured on a day to come', async () => {
    const facts = { ...factsWith(reader, holder), measuredOn: '2999-01-01' };
    const answer = await table
      .put(`/api/v1/workroom/sheets/${skirt.id}/facts`)
      .set('If-Match', '"1"')
      .send(facts);
    expect(answer.body).toMatchObject({ status: 400, code: 'sheet.future' });
    expect(answer.body.errors[0].pointer).toBe('/measuredOn');
  });

  it('keeps what was typed beside its exact millimetres', async () => {
    const answer = await send([reading('waistband', '24 3/8', reader.id, { unit: 'in' })]);
    // 24 3/8 in = 619.125 mm exactly: international yard and pound agreement, 1959.
    expect(answer.body.results[0]).toMatchObject({
      outcome: 'kept',
      reading: { valueMm: '619.125', typed: '24 3/8', unit: 'in', readBy: reader.id, recordedBy: reader.id },
    });
  });

  it('adds tape lengths and the rest', async () => {
    const answer = await send([reading('hem', '742', reader.id, { tapeCount: 3 })]);
    expect(answer.body.results[0].reading).toMatchObject({
      valueMm: '5242',
      tapeCount: 3,
      tapeLengthMm: '1500',
      typed: '742',
    });
  });

  it('takes the tape’s zero off each time the tape was laid', async () => {
    const part = dress.parts.find((each) => each.kind === 'bodice');
    const worn = await openSheet(table, part?.id ?? '', factsWith(reader, holder, { tapeZeroMm: '2' }));
    const answer = await send([reading('waist', '612', reader.id)], worn.id);
    expect(answer.body.results[0].reading.valueMm).toBe('610');
  });

  it('changes nothing when the same batch comes again', async () => {
    const batch = [reading('waistband', '618', reader.id), notTaken('hip', 'not-applicable', reader.id)];
    const first = await send(batch);
    const again = await send(batch);
    expect(first.body.results.map((each: { outcome: string }) => each.outcome)).toEqual(['kept', 'kept']);
    expect(again.body.results.map((each: { outcome: string }) => each.outcome)).toEqual([
      'already-kept',
      'already-kept',
    ]);
    expect(again.body.sheetVersion).toBe(first.body.sheetVersion);
    expect((await sheetNow()).readings).toHaveLength(2);
  });

  it('answers a batch that comes again after the garment was published, and leaves it published', async () => {
    const batch = soundSheet(skirt, reader.id);
    const { sheetVersion } = (await send(batch)).body as { sheetVersion: number };
    const complete = `/api/v1/workroom/sheets/${skirt.id}/complete`;
    expect((await table.post(complete).set('If-Match', `"${sheetVersion}"`)).status).toBe(200);
    const path = `/api/v1/workroom/garments/${dress.id}`;
    const verb = async (who: Agent, name: string) => {
      const { version } = (await table.get(path)).body as Garment;
      return (await who.post(`${path}/${name}`).set('If-Match', `"${version}"`)).status;
    };
    const outcomes = async () => {
      const { results } = (await send(batch)).body as { results: { outcome: string }[] };
      return new Set(results.map(({ outcome }) => outcome));
    };
    const other = await house.signInAs(await house.person('curator', 'Hal Brandreth'));
    expect(await verb(table, 'submit')).toBe(200);
    expect(await outcomes()).toEqual(new Set(['already-kept']));
    expect(await verb(other, 'approve')).toBe(200);
    expect(await verb(other, 'publish')).toBe(200);
    expect(await outcomes()).toEqual(new Set(['already-kept']));
    expect((await table.get(path)).body.stage).toBe('published');
  });

  it('takes ids in capitals for the same ids', async () => {
    const first = reading('waistband', '618', reader.id);
    await send([{ ...first, id: first.id.toUpperCase(), readBy: reader.id.toUpperCase() }]);
    const corrected = { replaces: first.id.toUpperCase() };
    const answer = await send([reading('waistband', '619', reader.id, corrected)]);
    expect(answer.body.results[0]).toMatchObject({ outcome: 'kept', reading: { replaces: first.id } });
  });

  it('keeps one of a batch that arrives many times at once', async () => {
    const batch = [reading('waistband', '618', reader.id)];
    await Promise.all(Array.from({ length: 8 }, () => send(batch)));
    expect((await sheetNow()).readings.filter((each) => each.stands)).toHaveLength(1);
  });

  it('refuses another value under an id that was used', async () => {
    const first = reading('waistband', '618', reader.id);
    await send([first]);
    const answer = await send([{ ...first, typed: '681' }]);
    expect(answer.body.results[0].outcome).toBe('refused');
    expect((await sheetNow()).readings[0]?.typed).toBe('618');
  });

  it('lets a correction replace a reading and keeps both', async () => {
    const slip = reading('waistband', '681', reader.id);
    await send([slip]);
    await send([reading('waistband', '618', reader.id, { replaces: slip.id })]);
    const kept = (await sheetNow()).readings.map(({ typed, stands }) => ({ typed, stands }));
    expect(kept).toContainEqual({ typed: '681', stands: false });
    expect(kept).toContainEqual({ typed: '618', stands: true });
  });

  it('shows both sides when two people read the same point and round', async () => {
    const first = reading('waistband', '618', reader.id);
    await send([first]);
    const answer = await send([reading('waistband', '621', reader.id)]);
    expect(answer.body.results[0]).toMatchObject({
      outcome: 'conflict',
      standing: { id: first.id, typed: '618' },
    });
    expect((await sheetNow()).readings).toHaveLength(1);
  });

  it.each([
    ['a point that a skirt has not', reading('sleeve-outer', '500', ''), /no measuring point/],
    ['words', reading('waistband', 'about six', ''), /number/i],
    ['a reader whom the sheet does not name', reading('waistband', '618', uuidv7()), /does not name/],
  ])('refuses %s, says why, and keeps the rest of the batch', async (_what, bad, says) => {
    const readBy = bad.readBy || reader.id;
    const answer = await send([{ ...bad, readBy }, reading('hip', '982', reader.id)]);
    expect(answer.body.results[0].outcome).toBe('refused');
    expect(answer.body.results[0].detail).toMatch(says);
    expect(answer.body.results[1].outcome).toBe('kept');
  });

  it('asks for the version of the sheet, and says who changed it when it is stale', async () => {
    const path = `/api/v1/workroom/sheets/${skirt.id}/facts`;
    const facts = factsWith(reader, holder, { place: 'The long gallery' });
    expect((await table.put(path).send(facts)).body).toMatchObject({ status: 428, code: 'version.required' });
    await send([reading('waistband', '618', reader.id)]);
    const stale = await table.put(path).set('If-Match', `"${skirt.version}"`).send(facts);
    expect(stale.body).toMatchObject({
      status: 412,
      code: 'version.stale',
      current: 2,
      changedBy: 'Odile Marsh',
    });
    expect((await table.put(path).set('If-Match', '"2"').send(facts)).body.facts.place).toBe(
      'The long gallery',
    );
  });

  it('wants a second pair of hands, or the reason why there was none', async () => {
    const part = dress.parts[0]?.id ?? '';
    const alone = { ...factsWith(reader, holder), people: [{ userId: reader.id, duty: 'read' }] };
    const refused = await table.post(`/api/v1/workroom/parts/${part}/sheets`).send({ facts: alone });
    expect(refused.body).toMatchObject({ status: 400, errors: [{ pointer: '/facts/aloneBecause' }] });
    const reasoned = { ...alone, aloneBecause: 'A small bodice; the second person was ill.' };
    expect((await table.post(`/api/v1/workroom/parts/${part}/sheets`).send({ facts: reasoned })).status).toBe(
      201,
    );
  });

  it('works out what need not be measured and shows the working', async () => {
    await send(soundSheet(skirt, reader.id));
    const answer = await table.get(`/api/v1/workroom/sheets/${skirt.id}/findings`);
    const derived = new Map(answer.body.derived.map((each: { id: string }) => [each.id, each]));
    // 1184 − 1020 = 164; 5242 ÷ 618 = 8.48
    expect(derived.get('back-over-front-excess')).toMatchObject({
      valueMm: '164',
      worked: '1184 mm − 1020 mm = 164 mm',
    });
    expect(derived.get('hem-to-waist-ratio')).toMatchObject({ ratio: '8.48' });
  });

  it('does not let a sheet be completed while a point has neither reading nor reason', async () => {
    const all = soundSheet(skirt, reader.id);
    const sent = await send(all.slice(1));
    const complete = (version: number) =>
      table.post(`/api/v1/workroom/sheets/${skirt.id}/complete`).set('If-Match', `"${version}"`);
    const early = await complete(sent.body.sheetVersion);
    expect(early.body).toMatchObject({ status: 409, code: 'sheet.points-missing' });
    const rest = await send(all.slice(0, 1));
    expect((await complete(rest.body.sheetVersion)).body.state).toBe('complete');
    const late = await send([reading('waistband', '700', reader.id)]);
    expect(late.body).toMatchObject({ status: 409, code: 'sheet.complete' });
  });

  it('takes no answer for a point that was left out: it is read, or has its reason on the sheet', async () => {
    const path = `/api/v1/workroom/sheets/${skirt.id}/findings`;
    const missing = (await table.get(path)).body.findings.find(
      (each: { checkId: string }) => each.checkId === 'required-missing-without-reason',
    );
    const answer = await table.post(`${path}/answers`).send({ key: missing.key, reason: 'Later.' });
    expect(answer.body).toMatchObject({ status: 409, code: 'finding.unread', detail: missing.sentence });
  });

  it('names whoever has left as before, but nobody anew who does not work here', async () => {
    const left = await house.person('recorder', 'Colm Hale');
    await house.owner.source.query('UPDATE ellwand.user SET active = FALSE WHERE id IN (?)', [
      [left.id, holder.id],
    ]);
    const setFacts = async (facts: object) => {
      const { version } = await sheetNow();
      const path = `/api/v1/workroom/sheets/${skirt.id}/facts`;
      return table.put(path).set('If-Match', `"${version}"`).send(facts);
    };
    const same = await setFacts(factsWith(reader, holder, { place: 'The long gallery' }));
    expect(same.body.facts).toMatchObject({ place: 'The long gallery' });
    expect(same.body.facts.people).toContainEqual({ userId: holder.id, duty: 'held', name: 'Ines Thorne' });
    const anew = await setFacts(factsWith(reader, left));
    expect(anew.body).toMatchObject({
      status: 400,
      code: 'sheet.unknown-person',
      errors: [{ pointer: '/people' }],
    });
    expect((await sheetNow()).facts.people).toHaveLength(3);
  });

  it('keeps an answer as long as the figures stay', async () => {
    const low = reading('waistband', '61.8', reader.id);
    await send([low]);
    const path = `/api/v1/workroom/sheets/${skirt.id}/findings`;
    const [finding] = (await table.get(path)).body.findings.filter(
      (each: { checkId: string }) => each.checkId === 'reading-decimal-slip',
    );
    expect(finding.sentence).toContain('618');
    const answered = await table
      .post(`${path}/answers`)
      .send({ key: finding.key, reason: 'A doll’s skirt.' });
    expect(
      answered.body.findings.find((each: { key: string }) => each.key === finding.key).answer,
    ).toMatchObject({
      reason: 'A doll’s skirt.',
      by: 'Odile Marsh',
    });
    await send([reading('waistband', '62.8', reader.id, { replaces: low.id })]);
    const anew = (await table.get(path)).body.findings.find(
      (each: { checkId: string }) => each.checkId === 'reading-decimal-slip',
    );
    expect(anew.answer).toBeNull();
  });

  it('works readings out again where the tape turns out to be another, and keeps what was keyed', async () => {
    await send([reading('waistband', '618', reader.id), reading('hem', '742', reader.id, { tapeCount: 3 })]);
    const facts = factsWith(reader, holder, { tapeZeroMm: '2', tapeLengthMm: '1501' });
    const { version } = await sheetNow();
    const set = (body: object, seen: number) =>
      table.put(`/api/v1/workroom/sheets/${skirt.id}/facts`).set('If-Match', `"${seen}"`).send(body);
    const answer = await set(facts, version);
    const kept = (answer.body as SheetShown).readings.map(({ pointId, typed, valueMm }) => [
      pointId,
      typed,
      valueMm,
    ]);
    // 618 − 2; 3 × 1501 + 742, less 2 for each of the four times that the tape was laid.
    expect(kept).toEqual(
      expect.arrayContaining([
        ['waistband', '618', '616'],
        ['hem', '742', '5237'],
      ]),
    );
    const absurd = await set(factsWith(reader, holder, { tapeZeroMm: '700' }), answer.body.version as number);
    expect(absurd.body).toMatchObject({
      status: 400,
      code: 'sheet.tape',
      errors: [{ pointer: '/tapeZeroMm' }],
    });
    expect((await sheetNow()).facts.tapeZeroMm).toBe('2');
  });
});
