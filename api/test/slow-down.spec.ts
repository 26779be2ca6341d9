import { type House, openHouse } from './harness/house';
import { testPassword, type TestPerson } from './harness/people';

describe('the slow-down of guessing (ASVS 6.3.1)', () => {
  let house: House;
  let wenna: TestPerson;
  beforeAll(async () => {
    house = await openHouse({ variables: { ELLWAND_TRUST_PROXY: 'loopback' } });
  });
  afterAll(() => house.close());
  beforeEach(async () => {
    wenna = await house.person('recorder');
  });
  afterEach(() => house.empty());

  const tryFrom = (address: string, email: string, password: string) =>
    house.visitor().post('/api/v1/session').set('X-Forwarded-For', address).send({ email, password });

  async function fail(times: number, address: string, email: string): Promise<void> {
    for (let time = 0; time < times; time++) {
      expect((await tryFrom(address, email, `guess number ${time}`)).status).toBe(401);
    }
  }

  it('makes the sixth try wait, whether or not the account exists, and says for how long', async () => {
    for (const email of [wenna.email, 'nobody@larkmoor.example']) {
      await fail(5, '192.0.2.1', email);
      const answer = await tryFrom('192.0.2.1', email, 'another guess');
      expect(answer.status).toBe(429);
      expect(answer.get('Retry-After')).toBe('2');
      expect(answer.body).toMatchObject({ code: 'sign-in.too-soon', seconds: 2 });
    }
  });

  it('does not even hear the right password before the wait is over, then does', async () => {
    await fail(5, '192.0.2.1', wenna.email);
    expect((await tryFrom('192.0.2.1', wenna.email, testPassword)).status).toBe(429);
    house.clock.advance({ seconds: 3 });
    expect((await tryFrom('192.0.2.1', wenna.email, testPassword)).status).toBe(200);
    await fail(1, '192.0.2.1', wenna.email);
  });

  it('never keeps the owner out at another address', async () => {
    await fail(5, '192.0.2.1', wenna.email);
    expect((await tryFrom('198.51.100.9', wenna.email, testPassword)).status).toBe(200);
  });

  it('hears only five of a burst of guesses at once', async () => {
    const burst = Array.from({ length: 20 }, (_, n) => tryFrom('192.0.2.1', wenna.email, `burst ${n}`));
    const statuses = (await Promise.all(burst)).map((answer) => answer.status);
    expect(statuses.filter((status) => status === 401)).toHaveLength(5);
    expect(statuses.filter((status) => status === 429)).toHaveLength(15);
  });

  it('slows an address down that tries many accounts, which signing in to one’s own does not wash clean', async () => {
    const own = await house.person('recorder');
    for (let account = 0; account < 39; account++) await fail(1, '192.0.2.1', `a${account}@larkmoor.example`);
    expect((await tryFrom('192.0.2.1', own.email, testPassword)).status).toBe(200);
    await fail(1, '192.0.2.1', 'the.fortieth@larkmoor.example');
    expect((await tryFrom('192.0.2.1', own.email, testPassword)).status).toBe(429);
    expect((await tryFrom('192.0.2.2', own.email, testPassword)).status).toBe(200);
  });

  it('keeps neither addresses nor accounts in the clear', async () => {
    await fail(1, '192.0.2.1', wenna.email);
    const rows: { key_hash: string }[] = await house.owner.source.query(
      'SELECT * FROM ellwand.sign_in_slowdown',
    );
    expect(rows).toHaveLength(2);
    for (const row of rows) expect(row.key_hash).toMatch(/^[0-9a-f]{64}$/);
  });
});
