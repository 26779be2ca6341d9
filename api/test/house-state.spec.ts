import { Work } from '../src/common/work';
import { clearUnfinished, houseState, markHouse } from '../src/demonstration/house-state';
import { type House, openHouse } from './harness/house';
import { makeProtocol, skirtWithLoop } from './support/protocols';
import { factsWith, makeDress, openSheet, reading } from './support/garments';

describe('a house and its demonstration', () => {
  let house: House;
  let work: Work;
  beforeAll(async () => {
    house = await openHouse();
    work = house.app.get(Work);
  });
  afterAll(() => house.close());
  beforeEach(() => house.empty());

  it('is new, then begun, then filled', async () => {
    expect(await houseState(work)).toBe('new');
    await markHouse(work, 'begun', 'Larkmoor House');
    expect(await houseState(work)).toBe('unfinished');
    await markHouse(work, 'finished', 'Larkmoor House');
    expect(await houseState(work)).toBe('filled');
  });

  it('is somebody’s own as soon as anybody works there', async () => {
    await house.person('administrator');
    expect(await houseState(work)).toBe('in-use');
  });

  it('is cleared of what an interrupted filling left, corrected readings and protocols too', async () => {
    const reader = await house.person('recorder');
    const recorder = await house.signInAs(reader);
    const dress = await makeDress(recorder);
    const sheet = await openSheet(
      recorder,
      dress.parts[1]?.id ?? '',
      factsWith(reader, await house.person('recorder')),
    );
    const slip = reading('waistband', '681', reader.id);
    const path = `/api/v1/workroom/sheets/${sheet.id}/readings`;
    await recorder.post(path).send({ readings: [slip] });
    await recorder
      .post(path)
      .send({ readings: [reading('waistband', '618', reader.id, { replaces: slip.id })] });
    const administrator = await house.signInAs('administrator');
    expect((await makeProtocol(administrator, 'skirt', 1, skirtWithLoop())).status).toBe(201);
    await markHouse(work, 'begun', 'Larkmoor House');
    await clearUnfinished(work);
    expect(await houseState(work)).toBe('new');
    for (const table of ['reading', 'protocol']) {
      const rows: { n: string }[] = await house.owner.source.query(
        `SELECT COUNT(*) AS n FROM ellwand.${table}`,
      );
      expect(Number(rows[0]?.n)).toBe(0);
    }
  });
});
