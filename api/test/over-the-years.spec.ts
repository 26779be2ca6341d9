import type { Garment } from '@ellwand/shared/records/garment';
import type { PartSheets } from '@ellwand/shared/records/part-sheets';
import type { PublishedGarment } from '@ellwand/shared/records/published-garment';
import type { SheetFactsInput } from '@ellwand/shared/records/sheet';
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

describe('a garment measured over the years', () => {
  let house: House;
  let reader: TestPerson;
  let holder: TestPerson;
  let recorder: Agent;
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
    curator = await house.signInAs(await house.person('curator', 'Hal Brandreth'));
    dress = await makeDress(recorder);
  });

  const now = async () => (await recorder.get(`/api/v1/workroom/garments/${dress.id}`)).body as Garment;
  const partOf = async (kind: string, together = false) => {
    const part = (await now()).parts.find((each) => each.kind === kind && each.wornTogether === together);
    if (!part) throw new Error(`the dress has no ${kind}`);
    return part;
  };
  async function verb(who: Agent, name: string) {
    const { version } = await now();
    return who.post(`/api/v1/workroom/garments/${dress.id}/${name}`).set('If-Match', `"${version}"`);
  }
  async function publish(): Promise<PublishedGarment> {
    const answers = [
      await verb(recorder, 'submit'),
      await verb(curator, 'approve'),
      await verb(curator, 'publish'),
    ];
    expect(answers.map(({ status, body }) => [status, body.detail as unknown])).toEqual(
      Array(3).fill([200, undefined]),
    );
    const { publicNumber } = await now();
    return (await house.visitor().get(`/api/v1/catalogue/garments/${publicNumber}`)).body as PublishedGarment;
  }
  /** A whole sheet; some of its readings as a spec wants them, `{}` to leave a point as it is. */
  async function measure(
    partId: string,
    facts: Partial<SheetFactsInput> = {},
    readings?: (sheet: SheetShown) => object[],
  ): Promise<string> {
    const sheet = await openSheet(recorder, partId, factsWith(reader, holder, facts));
    const path = `/api/v1/workroom/sheets/${sheet.id}`;
    const batch = readings?.(sheet) ?? soundSheet(sheet, reader.id);
    const sent = await recorder.post(`${path}/readings`).send({ readings: batch });
    const outcomes = (sent.body.results as { outcome: string; detail?: string }[]).filter(
      ({ outcome }) => outcome !== 'kept',
    );
    expect(outcomes).toEqual([]);
    const done = await recorder.post(`${path}/complete`).set('If-Match', `"${sent.body.sheetVersion}"`);
    expect(done.body).toMatchObject({ state: 'complete' });
    return sheet.id;
  }
  const withWaist = (typed: string) => (sheet: SheetShown) =>
    soundSheet(sheet, reader.id).map((each) => (each.pointId === 'waistband' ? { ...each, typed } : each));
  const sheetsOf = async (partId: string) =>
    (await recorder.get(`/api/v1/workroom/parts/${partId}/sheets`)).body as PartSheets;
  const choose = async (partId: string, body: object, who = recorder) => {
    const { version } = await now();
    const path = `/api/v1/workroom/parts/${partId}/speaking-sheet`;
    return who.put(path).set('If-Match', `"${version}"`).send(body);
  };
  const waistOf = (garment: PublishedGarment) =>
    garment.parts
      .find(({ kind }) => kind === 'skirt')
      ?.measurements.find(({ pointId }) => pointId === 'waistband')?.valueMm;

  it('publishes left and right apart, and is found by the one that speaks', async () => {
    await measure((await partOf('bodice')).id, {}, (sheet) => [
      ...soundSheet(sheet, reader.id).filter(({ pointId }) => pointId !== 'sleeve-outer'),
      reading('sleeve-outer', '586', reader.id, { worn: 'left' }),
      reading('sleeve-outer', '588', reader.id, { worn: 'right' }),
    ]);
    const garment = await publish();
    const sleeves = garment.parts[0]?.measurements.filter(({ pointId }) => pointId === 'sleeve-outer');
    expect(sleeves?.map(({ worn, valueMm }) => [worn, valueMm])).toEqual([
      ['right', '588'],
      ['left', '586'],
    ]);
    const rows = await house.owner.source.query(
      `SELECT value_mm FROM ellwand_catalogue.published_measurement WHERE point_id = 'sleeve-outer'`,
    );
    expect(rows).toEqual([{ value_mm: '588.0000' }]);
  });

  it('is laid together as worn once, with points that no part has, under its own number', async () => {
    const early = await now();
    const path = `/api/v1/workroom/garments/${dress.id}/worn-together`;
    const ask = (version: number) => recorder.post(path).set('If-Match', `"${version}"`);
    const answers = await Promise.all([ask(early.version), ask(early.version)]);
    expect(answers.map(({ status }) => status)).toEqual([201, 201]);
    expect((await ask(early.version)).status).toBe(201);
    const { parts } = await now();
    expect(parts.map(({ suffix, kind, wornTogether }) => [suffix, kind, wornTogether])).toEqual([
      ['.1', 'bodice', false],
      ['.2', 'skirt', false],
      ['worn', 'dress', true],
    ]);

    const together = await partOf('dress', true);
    for (const part of parts.filter(({ wornTogether }) => !wornTogether)) await measure(part.id);
    const sheetId = await measure(together.id, {}, () => [
      reading('worn-neck-to-hem-front', '1362', reader.id),
      reading('worn-neck-to-hem-back', '34', reader.id, { tapeCount: 1 }),
    ]);
    const sheet = (await recorder.get(`/api/v1/workroom/sheets/${sheetId}`)).body as SheetShown;
    expect(sheet).toMatchObject({ wornTogether: true, protocol: { wornTogether: true } });

    const shown = (await publish()).parts.find(({ wornTogether }) => wornTogether);
    expect(shown).toMatchObject({ number: 'LH.1966.30', name: 'Laid together as worn', notTaken: [] });
    expect(shown?.measurements.map(({ pointId, valueMm }) => [pointId, valueMm])).toEqual([
      ['worn-neck-to-hem-front', '1362'],
      ['worn-neck-to-hem-back', '1534'],
    ]);
    // What lies between bodice and skirt is theirs; the whole adds nothing to it and takes nothing from it.
    expect(shown?.derived).toEqual([]);
  });

  it('is not laid together where it has one part, nor taken apart while it is', async () => {
    const remove = async (id: string) => {
      const { version } = await now();
      return recorder.delete(`/api/v1/workroom/parts/${id}`).set('If-Match', `"${version}"`);
    };
    await verb(recorder, 'worn-together');
    const [bodice, together] = [await partOf('bodice'), await partOf('dress', true)];
    expect((await remove(bodice.id)).body).toMatchObject({ status: 409, code: 'part.worn-together' });
    await openSheet(recorder, together.id, factsWith(reader, holder));
    expect((await remove(together.id)).body).toMatchObject({ status: 409, code: 'part.measured' });
    await house.owner.source.query('DELETE FROM ellwand.sheet_person');
    await house.owner.source.query('DELETE FROM ellwand.sheet');
    expect((await remove(together.id)).status).toBe(200);
    expect((await remove(bodice.id)).status).toBe(200);
    expect((await verb(recorder, 'worn-together')).body).toMatchObject({ status: 409, code: 'part.alone' });
  });

  it('shows its sheets beside one another, oldest first, with what each read and who measured', async () => {
    const skirt = await partOf('skirt');
    const second = await measure(skirt.id, { measuredOn: '2026-11-20' }, withWaist('610'));
    const first = await measure(skirt.id, { measuredOn: '2021-03-02', note: 'Before the hem was mended.' });
    const seen = {
      id: '0190a0a0-0000-7000-8000-00000000beef',
      device: 'tablet 1',
      saidAt: '2021-03-02T10:00:00.000Z',
    };
    const said = { ...seen, about: 'described', thing: 'condition', text: 'The hem is worn through.' };
    await recorder.post(`/api/v1/workroom/sheets/${first}/table-notes`).send({ notes: [said] });
    const shown = await sheetsOf(skirt.id);
    expect(shown).toMatchObject({
      ownNumber: 'LH.1966.30',
      partSuffix: '.2',
      speaking: { sheetId: second },
      chosen: null,
      published: null,
      sheets: [
        {
          id: first,
          measuredOn: '2021-03-02',
          note: 'Before the hem was mended.',
          remarks: [{ text: said.text }],
        },
        { id: second, measuredOn: '2026-11-20', remarks: [] },
      ],
    });
    expect(shown.sheets[1]?.people.map(({ name, duty }) => `${name} ${duty}`)).toContain('Ines Thorne held');
    const waists = shown.sheets.map(
      ({ values }) => values.find(({ pointId }) => pointId === 'waistband')?.valueMm,
    );
    expect(waists).toEqual(['618', '610']);
    expect(shown.points[0]).toMatchObject({ pointId: 'waistband', label: 'Waistband' });
    expect(shown.sheets[0]?.notTaken.every(({ reason }) => reason === 'not-applicable')).toBe(true);
  });

  it('publishes the newest complete sheet, or the one that was chosen, and freezes which and why', async () => {
    const skirt = await partOf('skirt');
    const first = await measure(skirt.id, { measuredOn: '2021-03-02' });
    const second = await measure(skirt.id, { measuredOn: '2026-11-20' }, withWaist('610'));
    expect(waistOf(await publish())).toBe('610');
    expect((await sheetsOf(skirt.id)).published).toEqual({ sheetId: second, version: 1 });

    const reason = 'Measured before the band was let out.';
    const answer = await choose(skirt.id, { sheetId: first, reason });
    expect(answer.body).toMatchObject({
      speaking: { sheetId: first },
      chosen: { sheetId: first, because: reason, by: 'Odile Marsh' },
      published: { sheetId: second, version: 1 },
    });
    expect((await now()).stage).toBe('draft');
    const speaks = (await partOf('skirt')).sheets.map(({ id, speaks: does }) => [id, does]);
    expect(speaks).toEqual([
      [second, false],
      [first, true],
    ]);
    expect(waistOf(await publish())).toBe('618');
    const [frozen] = await house.owner.source.query<{ sheet: object }[]>(
      `SELECT JSON_QUERY(snapshot, '$.parts[1].sheet') AS sheet FROM ellwand.revision ORDER BY number DESC LIMIT 1`,
    );
    expect(frozen?.sheet).toMatchObject({
      id: first,
      chosen: { because: reason, by: 'Odile Marsh' },
    });

    const back = await choose(skirt.id, { sheetId: null, reason: 'The band is as it was made.' });
    expect(back.body).toMatchObject({ speaking: { sheetId: second }, chosen: null });
    const trail = await curator.get('/api/v1/workroom/audit');
    expect(JSON.stringify(trail.body)).toContain('lets the sheet of 2021-03-02 speak');
  });

  it('lets no open sheet, no other part’s and no study sheet speak, and asks for the version that was seen', async () => {
    const [bodice, skirt] = [await partOf('bodice'), await partOf('skirt')];
    const other = await measure(bodice.id);
    const open = (await openSheet(recorder, skirt.id, factsWith(reader, holder))).id;
    const study = await measure(skirt.id, { purpose: 'study', measuredOn: '2026-11-21' });
    const codes = [];
    for (const sheetId of [other, open, study]) {
      codes.push((await choose(skirt.id, { sheetId, reason: 'Because' })).body.code as string);
    }
    expect(codes).toEqual(['sheet.other-part', 'sheet.open', 'sheet.for-study']);
    expect((await choose(skirt.id, { sheetId: null, reason: ' ' })).status).toBe(400);
    const path = `/api/v1/workroom/parts/${skirt.id}/speaking-sheet`;
    const body = { sheetId: null, reason: 'Because' };
    expect((await recorder.put(path).send(body)).status).toBe(428);
    expect((await recorder.put(path).set('If-Match', '"77"').send(body)).status).toBe(412);
    expect((await sheetsOf(skirt.id)).speaking).toBeNull();
  });

  it('never publishes a study sheet, and measuring one leaves the record as it is', async () => {
    const skirt = await partOf('skirt');
    await measure(skirt.id, { purpose: 'study', measuredOn: '2026-11-21' }, withWaist('640'));
    expect((await verb(recorder, 'submit')).body.detail).toContain('Nothing has been measured yet.');
    await measure(skirt.id, { measuredOn: '2026-11-20' });
    expect(waistOf(await publish())).toBe('618');
    const study = await openSheet(
      recorder,
      skirt.id,
      factsWith(reader, holder, { purpose: 'study', measuredOn: '2026-11-22' }),
    );
    await recorder.post(`/api/v1/workroom/sheets/${study.id}/readings`).send({
      readings: [reading('waistband', '641', reader.id), notTaken('hip', 'not-applicable', reader.id)],
    });
    expect((await now()).stage).toBe('published');
    expect((await sheetsOf(skirt.id)).sheets.map(({ purpose }) => purpose)).toEqual([
      'record',
      'study',
      'study',
    ]);
  });
});
