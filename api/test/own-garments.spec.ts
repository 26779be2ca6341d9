import type { Garment } from '@ellwand/shared/records/garment';
import { type Agent, type House, openHouse } from './harness/house';
import type { TestPerson } from './harness/people';
import { factsWith, openSheet, reading, silkDress } from './support/garments';

describe('a sheet beside the museum’s own garments', () => {
  let house: House;
  let reader: TestPerson;
  let holder: TestPerson;
  let table: Agent;
  let made = 0;

  beforeAll(async () => {
    house = await openHouse();
  });
  afterAll(() => house.close());
  beforeEach(async () => {
    await house.empty();
    reader = await house.person('recorder', 'Odile Marsh');
    holder = await house.person('curator', 'Ines Thorne');
    table = await house.signInAs(reader);
  });

  /** A pair of gloves with its sheet, read and completed unless told otherwise. */
  async function gloves(lengthMm: number, date: string, more: { open?: boolean; study?: boolean } = {}) {
    made += 1;
    const record = { ...silkDress, ownNumber: `LH.2030.${made}`, kind: 'glove', hazards: [], date };
    const parts = [{ kind: 'glove', name: 'Gloves', suffix: '' }];
    const garment = await table.post('/api/v1/workroom/garments').send({ record, parts });
    const facts = factsWith(reader, holder, { purpose: more.study ? 'study' : 'record' });
    const sheet = await openSheet(table, (garment.body as Garment).parts[0]?.id ?? '', facts);
    const readings = [reading('palm', '92', reader.id), reading('glove-length', String(lengthMm), reader.id)];
    await table.post(`/api/v1/workroom/sheets/${sheet.id}/readings`).send({ readings });
    if (!more.open) await table.post(`/api/v1/workroom/sheets/${sheet.id}/complete`).set('If-Match', '"2"');
    return sheet.id;
  }

  const asked = async (sheetId: string): Promise<string[]> => {
    const { findings } = (await table.get(`/api/v1/workroom/sheets/${sheetId}/findings`)).body as {
      findings: { checkId: string; sentence: string }[];
    };
    return findings.flatMap(({ checkId, sentence }) =>
      checkId === 'outside-own-garments' ? [sentence] : [],
    );
  };

  it('asks about what lies far from eight others of its kind and decade', async () => {
    for (const lengthMm of [300, 302, 298, 305, 296, 301, 299]) await gloves(lengthMm, '1884/1886');
    const far = await gloves(420, '1880~', { open: true });
    // Seven complete sheets are too few, and neither another decade, a study nor an open sheet makes them eight.
    await gloves(303, '1874');
    await gloves(303, '1885', { study: true });
    await gloves(303, '1885', { open: true });
    expect(await asked(far)).toEqual([]);
    await gloves(303, '188X');
    expect(await asked(far)).toEqual([
      'Glove length comes to 420 mm, while the museum’s 8 others of this kind and decade lie close about 300.5 mm. Is it so?',
    ]);
    expect(await asked(await gloves(304, '1885'))).toEqual([]);
    expect(await asked(await gloves(420, '1840/1890'))).toEqual([]);
  });
});
