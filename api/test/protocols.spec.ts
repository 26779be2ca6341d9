import type { ProtocolList } from '@ellwand/shared/records/protocol';
import { type Agent, type House, openHouse } from './harness/house';
import type { TestPerson } from './harness/people';
import { historyOf, loopDepth, makeProtocol, skirtWithLoop } from './support/protocols';

describe('protocols, as an administrator keeps them', () => {
  let house: House;
  let keeper: TestPerson;
  let administrator: Agent;

  beforeAll(async () => {
    house = await openHouse();
  });
  afterAll(() => house.close());
  beforeEach(async () => {
    await house.empty();
    keeper = await house.person('administrator', 'Maud Ferrers');
    administrator = await house.signInAs(keeper);
  });

  it('begin with the house’s own for every kind, and one for parts laid together as worn', async () => {
    const { items } = (await administrator.get('/api/v1/workroom/protocols')).body as ProtocolList;
    expect(items).toHaveLength(20);
    expect(new Set(items.map(({ version, versions }) => `${version} of ${versions}`))).toEqual(
      new Set(['1 of 1']),
    );
    expect(items.filter(({ wornTogether }) => wornTogether)).toMatchObject([
      { kind: 'dress', madeBy: null, madeAt: null },
    ]);
  });

  it('get a new version that says who made it, when and why, beside the old one', async () => {
    const made = await makeProtocol(administrator, 'skirt', 1, skirtWithLoop());
    expect(made.status).toBe(201);
    expect(made.headers['etag']).toBe('"2"');
    expect(made.body).toMatchObject({
      kind: 'skirt',
      version: 2,
      ownPoints: [loopDepth],
      note: 'The loops tell trained skirts that were worn for walking.',
      madeBy: 'Maud Ferrers',
      madeAt: expect.stringMatching(/^\d{4}-\d\d-\d\dT/) as string,
      warnings: [],
    });
    const { version, versions } = await historyOf(administrator, 'skirt');
    expect(version).toBe(2);
    expect(versions.map((each) => [each.version, each.madeBy, each.points.length])).toEqual([
      [2, 'Maud Ferrers', 9],
      [1, null, 8],
    ]);
    expect((await historyOf(administrator, 'petticoat')).version).toBe(1);
    const { items } = (await administrator.get('/api/v1/workroom/protocols')).body as ProtocolList;
    expect(items.find(({ kind }) => kind === 'skirt')).toMatchObject({ version: 2, versions: 2 });
    const trail = (await administrator.get('/api/v1/workroom/audit')).body.items as { summary: string }[];
    expect(trail[0]?.summary).toBe(
      'Maud Ferrers made version 2 of the protocol for skirts: ' +
        'The loops tell trained skirts that were worn for walking.',
    );
  });

  it('tell whoever comes second who was first, and keep one of many that come at once', async () => {
    const answers = await Promise.all(
      [1, 2, 3, 4].map(() => makeProtocol(administrator, 'skirt', 1, skirtWithLoop())),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 412, 412, 412]);
    const second = answers.find(({ status }) => status === 412);
    expect(second?.body).toMatchObject({
      code: 'version.stale',
      seen: 1,
      current: 2,
      changedBy: 'Maud Ferrers',
    });
    expect(second?.body.changedAt).toMatch(/^\d{4}-/);
    expect((await historyOf(administrator, 'skirt')).versions).toHaveLength(2);
    const without = await administrator.post('/api/v1/workroom/protocols/skirt').send(skirtWithLoop());
    expect(without.status).toBe(428);
  });

  it('are refused where the garment would be turned back, at the point that stands wrong', async () => {
    const { points } = skirtWithLoop({ ownPoints: [] });
    const catalogued = points.filter(({ pointId }) => pointId !== loopDepth.id);
    const turned = [...catalogued.slice(1), ...catalogued.slice(0, 1)];
    const answer = await makeProtocol(
      administrator,
      'skirt',
      1,
      skirtWithLoop({ points: turned, ownPoints: [] }),
    );
    expect(answer.status).toBe(400);
    expect(answer.body).toMatchObject({
      code: 'protocol.unfit',
      errors: [
        {
          pointer: '/points/7/pointId',
          detail: expect.stringContaining('the garment would be turned back') as string,
        },
      ],
    });
    expect((await historyOf(administrator, 'skirt')).version).toBe(1);
  });

  it('are refused without a reason, without a change, and for parts together that have none', async () => {
    expect((await makeProtocol(administrator, 'skirt', 1, skirtWithLoop({ note: ' ' }))).status).toBe(400);
    await makeProtocol(administrator, 'skirt', 1, skirtWithLoop());
    const same = await makeProtocol(administrator, 'skirt', 2, skirtWithLoop({ note: 'Once more.' }));
    expect(same.body).toMatchObject({ status: 409, code: 'protocol.unchanged' });
    const together = await administrator.get('/api/v1/workroom/protocols/hat?wornTogether=true');
    expect(together.status).toBe(404);
    expect((await administrator.get('/api/v1/workroom/protocols/dress?wornTogether=true')).body.version).toBe(
      1,
    );
  });

  it('warn, and no more, of what could be worked out', async () => {
    const { versions } = await historyOf(administrator, 'bodice');
    const points = [
      ...(versions[0]?.points ?? []),
      { pointId: 'neck-to-waist-back', required: false, rounds: 1 },
    ];
    const made = await makeProtocol(administrator, 'bodice', 1, {
      points,
      ownPoints: [],
      note: 'To compare.',
    });
    expect(made.status).toBe(201);
    expect(made.body.warnings).toEqual([
      '“Neck to waist, back” can be worked out from “Neck to hem, back” and “Waist to hem, back”: it need not be measured.',
    ]);
  });

  it('keep the meaning of an own point’s id, in other kinds too; its line and range may be bettered', async () => {
    await makeProtocol(administrator, 'skirt', 1, skirtWithLoop());
    const otherEnd = { ...loopDepth, to: 'the lower end of the loop' };
    const changed = await makeProtocol(administrator, 'skirt', 2, skirtWithLoop({ ownPoints: [otherEnd] }));
    expect(changed.body).toMatchObject({
      status: 400,
      errors: [
        {
          pointer: '/ownPoints/0/id',
          detail: expect.stringContaining('Different here: where it ends.') as string,
        },
      ],
    });
    const besides = { ...otherEnd, line: { ...otherEnd.line, view: 'side' as const } };
    const elsewhere = await makeProtocol(
      administrator,
      'petticoat',
      1,
      skirtWithLoop({ ownPoints: [besides] }),
    );
    expect(elsewhere.body).toMatchObject({
      status: 400,
      errors: [
        {
          pointer: '/ownPoints/0/id',
          detail: expect.stringContaining('version 2 of the protocol for skirts') as string,
        },
        {
          pointer: '/ownPoints/0/line/view',
          detail: 'The diagram has no view “side”; it has front, back, inside.',
        },
      ],
    });
    const bettered = { ...loopDepth, range: { fromMm: '450', toMm: '1150' } };
    expect(
      (await makeProtocol(administrator, 'skirt', 2, skirtWithLoop({ ownPoints: [bettered] }))).status,
    ).toBe(201);
  });
});
