import { Sweep } from '../src/auth/sweep.service';
import { type House, openHouse } from './harness/house';

describe('what is erased on schedule (ASVS 14.2.7)', () => {
  let house: House;
  beforeAll(async () => {
    house = await openHouse();
  });
  afterAll(() => house.close());
  afterEach(() => house.empty());

  const count = async (table: string) => {
    const rows: { n: string }[] = await house.owner.source.query(
      `SELECT COUNT(*) AS n FROM ellwand.${table}`,
    );
    return Number(rows[0]?.n);
  };

  it('is a session a month after it ended, and none before', async () => {
    await house.signInAs('recorder');
    house.clock.advance({ days: 36 });
    await house.app.get(Sweep).sweep();
    expect(await count('session')).toBe(1);
    house.clock.advance({ days: 2 });
    await house.app.get(Sweep).sweep();
    expect(await count('session')).toBe(0);
  });

  it('is a failed sign-in an hour after the last, and none before', async () => {
    await house.visitor().post('/api/v1/session').send({ email: 'a@larkmoor.example', password: 'x' });
    house.clock.advance({ minutes: 59 });
    await house.app.get(Sweep).sweep();
    expect(await count('sign_in_slowdown')).toBe(2);
    house.clock.advance({ minutes: 2 });
    await house.app.get(Sweep).sweep();
    expect(await count('sign_in_slowdown')).toBe(0);
  });
});
