import { emptyCutSheet } from '@ellwand/shared/cut-sheet/keep-lengths';
import type { CutSheet } from '@ellwand/shared/records/cut-sheet';
import type { Garment } from '@ellwand/shared/records/garment';
import type { PublishedGarment } from '@ellwand/shared/records/published-garment';
import type { Change } from '@ellwand/shared/records/publishing';
import type { SheetFindings } from '@ellwand/shared/records/sheet';
import { piece, typedCutSheet } from '@ellwand/shared/testing/sample-cut-sheets';
import { type Agent, type House, openHouse } from './harness/house';
import type { TestPerson } from './harness/people';
import { PictureRoom } from './pictures/picture-room';
import { honestJpeg } from './pictures/test-pictures';
import { factsWith, makeDress, openSheet, soundSheet } from './support/garments';

/** Two panels of 204 and one of 206 at a waist that the sound sheet reads as 612. */
const threePanels = typedCutSheet({
  pieces: [
    piece('Front', { count: 2, widths: { waist: '204', hem: '310' } }),
    piece('Back', { onFold: true, grain: 'straight', widths: { waist: '206', hem: '420' } }),
  ],
  neck: { backWidth: { typed: '5 3/8', unit: 'in' } },
  innerNote: 'PRIVATE ask whether the back was let out',
  note: 'The fronts are cut with the stripe upright.',
});

describe('the cut sheet of a part', () => {
  let house: House;
  let odile: TestPerson;
  let ines: TestPerson;
  let recorder: Agent;
  let other: Agent;
  let dress: Garment;

  beforeAll(async () => {
    house = await openHouse();
  });
  afterAll(() => house.close());
  beforeEach(async () => {
    await house.empty();
    odile = await house.person('recorder', 'Odile Marsh');
    ines = await house.person('recorder', 'Ines Thorne');
    recorder = await house.signInAs(odile);
    other = await house.signInAs(ines);
    dress = await makeDress(recorder);
  });

  const partId = (index = 0) => dress.parts[index]?.id ?? '';
  const path = (index = 0) => `/api/v1/workroom/parts/${partId(index)}/cut-sheet`;
  const write = (seen: number, sheet: object = threePanels, who = recorder) =>
    who.put(path()).set('If-Match', `"${seen}"`).send(sheet);
  const now = async () => (await recorder.get(path())).body as CutSheet;
  const garment = async () => (await recorder.get(`/api/v1/workroom/garments/${dress.id}`)).body as Garment;
  async function verb(who: Agent, name: string) {
    const { version } = await garment();
    return who.post(`/api/v1/workroom/garments/${dress.id}/${name}`).set('If-Match', `"${version}"`);
  }
  async function measure(index: number): Promise<void> {
    const sheet = await openSheet(recorder, partId(index), factsWith(odile, ines));
    const room = `/api/v1/workroom/sheets/${sheet.id}`;
    const sent = await recorder.post(`${room}/readings`).send({ readings: soundSheet(sheet, odile.id) });
    await recorder.post(`${room}/complete`).set('If-Match', `"${sent.body.sheetVersion}"`);
  }

  it('is an empty one at version 0 before anybody writes', async () => {
    expect(await now()).toEqual({
      partId: partId(),
      version: 0,
      body: emptyCutSheet,
      rounds: [],
      updatedAt: null,
      updatedBy: null,
    });
    const nowhere = await recorder.get(`/api/v1/workroom/parts/${dress.id}/cut-sheet`);
    expect(nowhere.body).toMatchObject({ status: 404, code: 'part.unknown' });
  });

  it('gives the measuring sheet the sum of its panels', async () => {
    await write(0);
    const sheet = await openSheet(recorder, partId(), factsWith(odile, ines));
    const { derived } = (await recorder.get(`/api/v1/workroom/sheets/${sheet.id}/findings`))
      .body as SheetFindings;
    expect(derived).toMatchObject([
      { id: 'sum-of-panels:waist', valueMm: '614', worked: '204 mm + 204 mm + 206 mm = 614 mm' },
      { id: 'sum-of-panels:hem', valueMm: '1040' },
    ]);
  });

  it('keeps what was typed beside its exact millimetres, and leaves the record’s version alone', async () => {
    const before = (await garment()).version;
    const answer = await write(0);
    expect(answer.headers.etag).toBe('"1"');
    expect(answer.body).toMatchObject({ version: 1, updatedBy: 'Odile Marsh' });
    const { body } = await now();
    // 5 3/8 in = 136.525 mm exactly: international yard and pound agreement, 1959.
    expect(body.neck).toEqual({
      frontWidth: null,
      frontDepth: null,
      backWidth: { typed: '5 3/8', unit: 'in', mm: '136.525' },
      backDepth: null,
    });
    expect(body.pieces[0]?.widths).toMatchObject({ bust: null, waist: { typed: '204', mm: '204' } });
    expect((await garment()).version).toBe(before);
  });

  it('shows the rounds that were read on the part’s sheet', async () => {
    await measure(0);
    expect((await now()).rounds).toEqual([
      { level: 'bust', label: 'Bust or chest', valueMm: '872' },
      { level: 'waist', label: 'Waist', valueMm: '612' },
    ]);
  });

  it('tells a second writer who wrote in between, and keeps the first one’s words', async () => {
    await write(0);
    const mine = { ...threePanels, note: 'The stripe runs slantwise.' };
    expect((await write(0, mine, other)).body).toMatchObject({
      status: 412,
      code: 'version.stale',
      current: 1,
      changedBy: 'Odile Marsh',
    });
    expect((await now()).body.note).toBe(threePanels.note);
    expect((await write(1, mine, other)).body).toMatchObject({ version: 2, updatedBy: 'Ines Thorne' });
    expect((await recorder.put(path()).send(mine)).status).toBe(428);
  });

  it('lets one of several write at once, whoever they are', async () => {
    const answers = await Promise.all(
      [1, 2, 3, 4].map((each) =>
        write(0, { ...threePanels, note: `Note ${each}` }, each % 2 ? recorder : other),
      ),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 412, 412, 412]);
    expect((await now()).version).toBe(1);
  });

  it('changes nothing when the same is sent again after a lost answer', async () => {
    await write(0);
    const again = await write(0);
    expect(again.body).toMatchObject({ version: 1 });
    const trail = await house.owner.source.query(
      `SELECT summary, facts FROM ellwand_audit.entry WHERE subject_id = ?`,
      [partId()],
    );
    expect(trail).toHaveLength(1);
    expect(trail[0].summary).toBe('Odile Marsh wrote the cut sheet of Bodice');
    expect(JSON.stringify(trail)).not.toContain('PRIVATE');
  });

  it('says at the field what cannot be kept', async () => {
    const sheet = typedCutSheet({ pieces: [piece('Front', { widths: { waist: '20b' } })] });
    const answer = await write(0, sheet);
    expect(answer.body).toMatchObject({
      status: 400,
      errors: [{ pointer: '/pieces/0/widths/waist', detail: expect.stringContaining('“b” is not a unit') }],
    });
  });

  it('takes a pattern from this garment’s pictures alone, with marks that lie on it', async () => {
    const room = await PictureRoom.open(house);
    const sent = await room.send(await honestJpeg(400, 300));
    const strange = sent.body.id as string;
    const mine = (
      await recorder
        .post(`/api/v1/workroom/garments/${dress.id}/images`)
        .field('view', 'pattern')
        .attach('file', await honestJpeg(400, 300), 'pattern.jpg')
    ).body.id as string;
    const withPattern = (imageId: string, x: number) =>
      typedCutSheet({
        pattern: {
          imageId,
          marks: { from: { x: 0, y: 0 }, to: { x, y: 0 } },
          distance: { typed: '100', unit: 'mm' },
          pairs: [],
        },
      });
    expect((await write(0, withPattern(strange, 200))).body).toMatchObject({
      status: 400,
      errors: [{ pointer: '/pattern/imageId' }],
    });
    expect((await write(0, withPattern(mine, 401))).body).toMatchObject({
      status: 400,
      errors: [{ pointer: '/pattern/marks/to', detail: 'The picture is 400 × 300 pixels' }],
    });
    expect((await write(0, withPattern(mine, 400))).status).toBe(200);
    await room.made();
  });

  it('keeps its part from being taken away, while there is anything on it', async () => {
    const remove = async () => {
      const { version } = await garment();
      return recorder.delete(`/api/v1/workroom/parts/${partId()}`).set('If-Match', `"${version}"`);
    };
    await write(0);
    expect((await remove()).body).toMatchObject({ status: 409, code: 'part.cut-sheet' });
    await write(1, typedCutSheet());
    expect((await remove()).status).toBe(200);
  });

  it('counts as a hand in the garment, is locked in review, and makes a draft beside a public version', async () => {
    for (const index of [0, 1]) await measure(index);
    const both = await house.signInAs(await house.person(['recorder', 'curator'], 'Tam Okoye'));
    const curator = await house.signInAs(await house.person('curator', 'Hal Brandreth'));
    await write(0, threePanels, both);
    await verb(recorder, 'submit');
    expect((await verb(both, 'approve')).body).toMatchObject({ status: 403, code: 'review.own-edit' });
    expect((await write(1, typedCutSheet())).body).toMatchObject({ status: 409, code: 'record.locked' });
    await verb(curator, 'approve');
    await verb(curator, 'publish');
    await write(1, { ...threePanels, neck: {} });
    expect(await garment()).toMatchObject({ stage: 'draft', isPublic: true });
  });

  it('is public once it is published, without its inner note, and each change is told field by field', async () => {
    for (const index of [0, 1]) await measure(index);
    const curator = await house.signInAs(await house.person('curator', 'Hal Brandreth'));
    await write(0);
    for (const step of ['submit', 'approve', 'publish'])
      await verb(step === 'submit' ? recorder : curator, step);
    const shown = await house.visitor().get('/api/v1/catalogue/garments/lh-1966-30');
    const [bodice, skirt] = (shown.body as PublishedGarment).parts;
    expect(shown.text).not.toContain('PRIVATE');
    expect(skirt?.cutSheet).toBeNull();
    expect(bodice?.cutSheet).toMatchObject({
      note: 'The fronts are cut with the stripe upright.',
      neck: { backWidth: '136.525' },
      sums: [
        { level: 'waist', panels: 3, sumMm: '614', read: { label: 'Waist', valueMm: '612' } },
        { level: 'hem', panels: 3, sumMm: '1040', read: null },
      ],
    });
    await write(1, {
      ...threePanels,
      pieces: threePanels.pieces.slice(0, 1),
      neck: {},
      innerNote: 'PRIVATE 2',
    });
    const review = await curator.get(`/api/v1/workroom/garments/${dress.id}/review`);
    const changes = (review.body.changes as Change[]).map(({ kind, label }) => `${kind} ${label}`);
    expect(changes).toEqual([
      'removed Piece Back, cut (Bodice)',
      'removed Piece Back, grain (Bodice)',
      'removed Piece Back, layer (Bodice)',
      'removed Piece Back, waist width (Bodice)',
      'removed Piece Back, hem width (Bodice)',
      'removed Neck width, back (Bodice)',
    ]);
  });
});
