import type { Garment } from '@ellwand/shared/records/garment';
import type { Repeatability } from '@ellwand/shared/records/repeatability';
import type { SheetFactsInput } from '@ellwand/shared/records/sheet';
import { type Agent, type House, openHouse } from './harness/house';
import type { TestPerson } from './harness/people';
import { factsWith, makeDress, openSheet, reading, silkDress } from './support/garments';

describe('how well readings repeat', () => {
  let house: House;
  let odile: TestPerson;
  let ines: TestPerson;
  let table: Agent;
  let made = 0;

  beforeAll(async () => {
    house = await openHouse();
  });
  afterAll(() => house.close());
  beforeEach(async () => {
    await house.empty();
    odile = await house.person('recorder', 'Odile Marsh');
    ines = await house.person('curator', 'Ines Thorne');
    table = await house.signInAs(odile);
  });

  const from = async (source: string, agent = table): Promise<Repeatability> =>
    (await agent.get(`/api/v1/workroom/repeatability?from=${source}`)).body as Repeatability;

  async function bodice(): Promise<string> {
    made += 1;
    const dress: Garment = await makeDress(table, { ...silkDress, ownNumber: `LH.2031.${made}` });
    return dress.parts[0]?.id ?? '';
  }

  /** A sheet on which two people read in turn, `[point, first, second, …]` in mm. */
  async function measured(
    partId: string,
    facts: Partial<SheetFactsInput>,
    ...points: readonly (readonly [string, ...number[]])[]
  ): Promise<string> {
    const people = [odile, ines].flatMap(({ id: userId }) =>
      (['read', 'held'] as const).map((duty) => ({ userId, duty })),
    );
    const sheet = await openSheet(table, partId, factsWith(odile, ines, { people, ...facts }));
    const readings = points.flatMap(([pointId, ...valuesMm]) =>
      valuesMm.map((valueMm, index) =>
        reading(pointId, String(valueMm), index % 2 === 0 ? odile.id : ines.id, { round: index + 1 }),
      ),
    );
    const answer = await table.post(`/api/v1/workroom/sheets/${sheet.id}/readings`).send({ readings });
    const { results } = answer.body as { results: { outcome: string }[] };
    expect(results.filter(({ outcome }) => outcome !== 'kept')).toEqual([]);
    return sheet.id;
  }

  // Four waists of ten, read by two; TEM = √(Σd² ÷ 2N), Ulijaszek & Kerr, Br J Nutr 82 (1999) 165–177.
  it('is worked out for each point by itself, from those that were chosen to be read again', async () => {
    const chosen = { repeatPoints: ['waist'] };
    const pairs = [
      [612, 610],
      [588, 590],
      [701, 698],
      [634, 636],
    ] as const;
    for (const [first, second] of pairs)
      await measured(await bodice(), chosen, ['waist', first, second], ['bust', 850], ['armscye', 400, 409]);
    const { points, more } = await from('record');
    expect(points.map(({ pointId }) => pointId)).toEqual(['waist']);
    expect(more).toBe(false);
    expect(points[0]).toMatchObject({
      ...{ label: 'Waist', n: 4, k: 2, byAnother: 4, meanDifferenceMm: -0.25 },
      temMm: Math.round(Math.sqrt(21 / 8) * 1000) / 1000,
    });
    expect(points[0]?.pairs).toHaveLength(4);
    expect(points[0]?.says).toMatch(/^Only 4 were read twice: .* Every later reading is another reader’s\.$/);
  });

  it('holds what was read of a study piece together, over all its study sheets', async () => {
    const piece = await bodice();
    await measured(piece, { purpose: 'study', measuredOn: '2026-11-19' }, ['waist', 612], ['neck', 352]);
    await measured(piece, { purpose: 'study', measuredOn: '2026-11-20' }, ['waist', 610, 613]);
    await measured(await bodice(), { purpose: 'study' }, ['waist', 588, 590, 590]);
    const { points } = await from('study');
    expect(points.map(({ pointId, n, k }) => [pointId, n, k])).toEqual([['waist', 2, 3]]);
    const differences = points[0]?.pairs.map(({ differenceMm }) => differenceMm) ?? [];
    expect([...differences].sort((one, other) => one - other)).toEqual([-2, 1, 2, 2]);
    // The first reading of the piece is that of its first sheet.
    expect(points[0]?.pairs.map(({ meanMm }) => meanMm)).toContain(611);
  });

  it('keeps study and record, left and right, and what was corrected apart', async () => {
    const sheetId = await measured(await bodice(), { repeatPoints: ['cuff'] }, ['neck', 352]);
    const sided = (worn: string, round: number, typed: string) =>
      reading('cuff', typed, odile.id, { worn, round });
    const wrong = sided('left', 2, '400');
    const readings = [
      ...[sided('left', 1, '200'), wrong, sided('right', 1, '240'), sided('right', 2, '243')],
      { ...sided('left', 2, '201'), replaces: wrong.id },
    ];
    await table.post(`/api/v1/workroom/sheets/${sheetId}/readings`).send({ readings });
    await measured(await bodice(), { purpose: 'study' }, ['cuff', 230, 231]);
    const cuffs = async (source: string) =>
      (await from(source)).points.find(({ pointId }) => pointId === 'cuff');
    expect((await cuffs('record'))?.pairs.map(({ differenceMm }) => differenceMm).sort()).toEqual([1, 3]);
    expect((await cuffs('record'))?.says).toMatch(/Each by one reader/);
    expect(await cuffs('study')).toMatchObject({ n: 1, temMm: null, limitsMm: null });
    expect(await cuffs('all')).toMatchObject({ n: 3, byAnother: 1 });
  });

  it('names nobody, and is open to all who work here', async () => {
    await measured(await bodice(), { purpose: 'study' }, ['waist', 612, 610]);
    const desk = await house.signInAs(await house.person('desk', 'Wren Aldous'));
    const answer = await desk.get('/api/v1/workroom/repeatability');
    expect(answer.status).toBe(200);
    for (const { id, name } of [odile, ines]) {
      expect(answer.text).not.toContain(id);
      expect(answer.text).not.toContain(name);
    }
    expect((await table.get('/api/v1/workroom/repeatability?from=best')).body).toMatchObject({ status: 400 });
  });

  it('is empty where nothing was read twice', async () => {
    await measured(await bodice(), { repeatPoints: ['waist'] }, ['waist', 612]);
    expect(await from('all')).toEqual({ from: 'all', points: [], more: false });
  });
});
