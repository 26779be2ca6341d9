import { Disk, type DiskState } from '../src/common/disk';
import { Lifecycle } from '../src/common/lifecycle';
import { type House, openHouse } from './harness/house';

describe('health', () => {
  let house: House;
  beforeEach(async () => {
    house = await openHouse();
  });
  afterEach(() => house.close());

  const ready = () => house.visitor().get('/health/ready');
  const diskIs = (state: DiskState) => jest.spyOn(house.app.get(Disk), 'state').mockResolvedValue(state);

  it('is ready when both connections answer, migrations are current and the disk is there', async () => {
    expect((await ready()).body).toEqual({
      ready: true,
      database: 'answers',
      migrations: 'current',
      disk: 'enough',
      ending: false,
    });
  });

  it('is not ready while a migration is missing', async () => {
    const name = 'Catalogue1764550000002';
    const { source } = house.owner;
    await source.query("UPDATE ellwand.migration SET name = 'Away' WHERE name = ?", [name]);
    const answer = await ready();
    await source.query("UPDATE ellwand.migration SET name = ? WHERE name = 'Away'", [name]);
    expect(answer.status).toBe(503);
    expect(answer.body).toMatchObject({ ready: false, migrations: 'behind' });
  });

  it('is not ready while the database keeps it waiting, which it does not wait for; alive it is', async () => {
    const runner = house.owner.source.createQueryRunner();
    await runner.query('LOCK TABLES ellwand.migration WRITE');
    const began = Date.now();
    const answer = await ready();
    const waitedMs = Date.now() - began;
    const live = await house.visitor().get('/health/live');
    await runner.query('UNLOCK TABLES');
    await runner.release();
    expect(answer.status).toBe(503);
    expect(answer.body).toMatchObject({ database: 'silent', migrations: 'unknown' });
    expect(waitedMs).toBeLessThan(900);
    expect(live.status).toBe(200);
  });

  it('is not ready any more once it was told to stop', async () => {
    house.app.get(Lifecycle).end();
    const answer = await ready();
    expect(answer.status).toBe(503);
    expect(answer.body).toMatchObject({ ready: false, ending: true });
  });

  it('stays ready on a disk that is nearly full: reading goes on, writing is refused, signing in is not', async () => {
    const administrator = await house.signInAs('administrator');
    diskIs('low');
    expect((await ready()).status).toBe(200);
    expect((await administrator.get('/api/v1/workroom/users')).status).toBe(200);
    const written = await administrator.post('/api/v1/workroom/invitations').send({});
    expect(written.body).toMatchObject({ status: 507, code: 'disk.full' });
    expect((await administrator.delete('/api/v1/session')).status).toBe(204);
  });

  it('is not ready where the data folder cannot be reached', async () => {
    diskIs('unreachable');
    expect((await ready()).status).toBe(503);
  });
});
