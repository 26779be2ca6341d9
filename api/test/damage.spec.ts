import { v7 as uuidv7 } from 'uuid';
import type { Garment } from '@ellwand/shared/records/garment';
import type { NotedList } from '@ellwand/shared/records/noted';
import { type Agent, type House, openHouse } from './harness/house';
import type { TestPerson } from './harness/people';
import { factsWith, makeDress, notTaken, openSheet, type SheetShown } from './support/garments';

describe('what the table has to tell the rest of the house', () => {
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
    bodice = await openSheet(table, dress.parts[0]?.id ?? '', factsWith(reader, holder));
  });

  const stop = (pointId: string, note = '') => ({
    ...notTaken(pointId, 'stopped-damage-seen', reader.id),
    note,
  });
  const send = (readings: object[]) =>
    table.post(`/api/v1/workroom/sheets/${bodice.id}/readings`).send({ readings });
  const lettersTo = async () =>
    (await house.inbox()).map(({ recipients, mail }) => ({
      to: recipients,
      subject: mail.subject,
      text: mail.text,
    }));
  const setting = '/api/v1/workroom/settings/damage-reports';

  describe('damage', () => {
    it('is told to every curator who works here, once, with where it was seen', async () => {
      const left = await house.person('curator', 'Colm Hale');
      await house.owner.source.query('UPDATE ellwand.user SET active = FALSE WHERE id = ?', [left.id]);
      const batch = [
        stop('armscye', 'Silk splitting along the seam.'),
        notTaken('neck', 'not-applicable', reader.id),
      ];
      await send(batch);
      await send(batch);
      const letters = await lettersTo();
      expect(letters).toMatchObject([{ to: [holder.email], subject: 'Damage seen on LH.1966.30.1' }]);
      expect(letters[0]?.text).toContain('Odile Marsh stopped measuring LH.1966.30.1, bodice');
      expect(letters[0]?.text).toContain('Armscye: Silk splitting along the seam.');
      expect(letters[0]?.text).toContain(`/workroom/sheets/${bodice.id}`);
      const curator = await house.signInAs(holder);
      const trail = JSON.stringify((await curator.get('/api/v1/workroom/audit')).body);
      expect(trail).toContain('Odile Marsh stopped measuring LH.1966.30.1 at armscye: damage was seen');
    });

    it('is told to nobody where the reading was not kept', async () => {
      await send([{ ...stop('armscye'), readBy: uuidv7() }, stop('no-such-point')]);
      expect(await lettersTo()).toEqual([]);
    });

    it('is told to whoever the museum names, as long as they work here', async () => {
      const administrator = await house.signInAs('administrator');
      const mender = await house.person('desk', 'Wenna Oddie');
      expect((await administrator.get(setting)).body).toEqual({ userIds: [] });
      const named = await administrator.put(setting).send({ userIds: [mender.id, mender.id] });
      expect(named.body).toEqual({ userIds: [mender.id] });
      await send([stop('armscye')]);
      expect((await lettersTo()).flatMap(({ to }) => to)).toEqual([mender.email]);

      await house.owner.source.query('UPDATE ellwand.user SET active = FALSE WHERE id = ?', [mender.id]);
      await send([stop('side-seam')]);
      expect((await lettersTo()).flatMap(({ to }) => to)).toEqual([mender.email, holder.email]);
      const refused = await administrator.put(setting).send({ userIds: [mender.id] });
      expect(refused.body).toMatchObject({ status: 400, errors: [{ pointer: '/userIds' }] });
    });
  });

  describe('what was described there', () => {
    const noted = async () =>
      (await table.get(`/api/v1/workroom/garments/${dress.id}/noted-at-table`)).body as NotedList;
    const seen = (thing: string, text: string, saidAt: string) => ({
      id: uuidv7(),
      device: 'tablet 1',
      saidAt,
      about: 'described',
      thing,
      text,
    });
    const say = (notes: object[]) =>
      table.post(`/api/v1/workroom/sheets/${bodice.id}/table-notes`).send({ notes });

    it('waits until it is laid into the record or set aside, by whoever may write it', async () => {
      const label = seen('label', 'Woven: Verrault, Larkmoor', '2026-11-20T10:00:00.000Z');
      const torn = seen('condition', 'A tear of 22 mm at the left underarm.', '2026-11-20T09:00:00.000Z');
      await say([label, torn, { ...label, id: uuidv7(), about: 'begun', thing: undefined, text: undefined }]);
      expect((await noted()).items).toMatchObject([
        { id: torn.id, thing: 'condition', text: torn.text, partName: 'Bodice', byName: 'Odile Marsh' },
        { id: label.id, thing: 'label', sheetId: bodice.id },
      ]);
      const settle = (id: string, how: string, who = table) =>
        who.post(`/api/v1/workroom/table-notes/${id}/settle`).send({ how });
      const desk = await house.signInAs('desk');
      expect((await settle(torn.id, 'set-aside', desk)).status).toBe(403);
      expect((await settle(torn.id, 'set-aside')).body.items).toMatchObject([{ id: label.id }]);
      expect((await settle(label.id, 'laid-in')).body).toEqual({ items: [] });
      expect((await settle(label.id, 'laid-in')).status).toBe(200);
      expect((await settle(uuidv7(), 'laid-in')).body).toMatchObject({ status: 404, code: 'note.unknown' });

      const sheet = (await table.get(`/api/v1/workroom/sheets/${bodice.id}`)).body as SheetShown;
      expect(sheet.tableNotes.filter(({ about }) => about === 'described')).toHaveLength(2);
      const trail = (await (await house.signInAs(holder)).get('/api/v1/workroom/audit')).body;
      const told = (trail.items as { summary: string }[]).filter(({ summary }) =>
        summary.includes('at the table: '),
      );
      expect(told.filter(({ summary }) => summary.includes('laid into the record'))).toHaveLength(1);
    });
  });
});
