import { type House, openHouse } from './harness/house';
import type { TestPerson } from './harness/people';

const refresh = '/api/v1/session/refresh';

describe('renewing a session', () => {
  let house: House;
  let wenna: TestPerson;
  beforeAll(async () => {
    house = await openHouse();
  });
  afterAll(() => house.close());
  beforeEach(async () => {
    wenna = await house.person('recorder');
  });
  afterEach(() => house.empty());

  async function firstToken(): Promise<string> {
    const { email, password } = wenna;
    const answer = await house.visitor().post('/api/v1/session').send({ email, password });
    return refreshToken(answer.get('Set-Cookie'));
  }
  const show = (token: string) => house.visitor().post(refresh).set('Cookie', `ellwand-refresh=${token}`);
  const renew = async (token: string) => refreshToken((await show(token)).get('Set-Cookie'));

  it('hands out another token each time, and a new access token', async () => {
    const first = await firstToken();
    const answer = await show(first);
    expect(answer.status).toBe(200);
    expect(answer.body.user.id).toBe(wenna.id);
    const second = refreshToken(answer.get('Set-Cookie'));
    expect(second).not.toBe(first);
    expect((await show(second)).status).toBe(200);
  });

  it('hands a second tab the very same successor within half a minute', async () => {
    const first = await firstToken();
    const second = await renew(first);
    house.clock.advance({ seconds: 29 });
    expect(await renew(first)).toBe(second);
    expect((await show(second)).status).toBe(200);
  });

  it('takes a token shown again later for stolen: the thief and the owner are both signed out', async () => {
    const first = await firstToken();
    const second = await renew(first);
    house.clock.advance({ seconds: 31 });
    expect((await show(first)).body.code).toBe('session.ended');
    expect((await show(second)).body.code).toBe('session.ended');
    const trail: { verb: string }[] = await house.owner.source.query('SELECT verb FROM ellwand_audit.entry');
    expect(trail.map((entry) => entry.verb)).toContain('session-stolen');
  });

  it('knows a stolen token also many renewals later', async () => {
    const first = await firstToken();
    let latest = first;
    for (let renewal = 0; renewal < 12; renewal++) latest = await renew(latest);
    await show(first);
    expect((await show(latest)).status).toBe(401);
  });

  it('is not ended by a stranger who knows the session’s id but never had its token', async () => {
    const first = await firstToken();
    const madeUp = `${first.split('.')[0] ?? ''}.${'A'.repeat(43)}`;
    expect((await show(madeUp)).status).toBe(401);
    expect((await show(first)).status).toBe(200);
  });

  it('gives two requests at once the same successor', async () => {
    const first = await firstToken();
    const [one, other] = await Promise.all([renew(first), renew(first)]);
    expect(one).toBe(other);
  });

  it('ends after eight hours unused', async () => {
    const token = await firstToken();
    house.clock.advance({ hours: 8, minutes: 1 });
    expect((await show(token)).status).toBe(401);
  });

  it('ends after seven days however often it is renewed', async () => {
    let token = await firstToken();
    for (let hours = 0; hours < 7 * 24 - 7; hours += 7) {
      house.clock.advance({ hours: 7 });
      token = await renew(token);
    }
    house.clock.advance({ hours: 7 });
    expect((await show(token)).status).toBe(401);
  });

  it('keeps only hashes in the database', async () => {
    const token = await firstToken();
    const second = await renew(token);
    const rows: object[] = await house.owner.source.query('SELECT * FROM ellwand.session');
    const kept = JSON.stringify(rows);
    for (const secret of [token, second].map((each) => each.split('.')[1] ?? 'missing')) {
      expect(kept).not.toContain(secret);
    }
  });

  it('answers without a cookie that there is no session', async () => {
    expect((await house.visitor().post(refresh)).body.code).toBe('session.none');
  });
});

function refreshToken(cookies: string[] | undefined): string {
  const value = /ellwand-refresh=([^;]+)/.exec((cookies ?? []).join('\n'))?.[1];
  if (!value) throw new Error('No refresh token was set');
  return value;
}
