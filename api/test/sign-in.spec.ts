import { JwtService } from '@nestjs/jwt';
import { accessAudience } from '../src/auth/access-token';
import { Secrets } from '../src/auth/secrets';
import { type House, openHouse } from './harness/house';
import { testPassword, type TestPerson } from './harness/people';

const session = '/api/v1/session';

describe('signing in', () => {
  let house: House;
  let wenna: TestPerson;
  beforeAll(async () => {
    house = await openHouse();
  });
  afterAll(() => house.close());
  beforeEach(async () => {
    wenna = await house.person('recorder', 'Wenna Oddie');
  });
  afterEach(() => house.empty());

  const signIn = (email: string, password: string) => house.visitor().post(session).send({ email, password });

  it('tells who came in, and keeps the tokens in cookies that no script reads and no other site sends', async () => {
    const answer = await signIn(wenna.email.toUpperCase(), testPassword);
    expect(answer.status).toBe(200);
    expect(answer.body).toEqual({
      user: { id: wenna.id, name: 'Wenna Oddie', email: wenna.email, roles: ['recorder'] },
      accessEndsAt: expect.any(String),
    });
    const cookies = answer.get('Set-Cookie') ?? [];
    expect(cookies).toHaveLength(2);
    for (const cookie of cookies) {
      expect(cookie).toMatch(/^ellwand-(access|refresh)=/);
      expect(cookie).toMatch(/; Path=\/;.*; HttpOnly; SameSite=Strict$/);
    }
  });

  it('answers a wrong password, an unknown address and somebody who has left in the very same way', async () => {
    const left = await house.person('curator');
    await house.owner.source.query('UPDATE ellwand.user SET active = FALSE WHERE id = ?', [left.id]);
    const answers = await Promise.all([
      signIn(wenna.email, 'not the password'),
      signIn('nobody@larkmoor.example', testPassword),
      signIn(left.email, testPassword),
    ]);
    for (const answer of answers) {
      expect(answer.status).toBe(401);
      expect(answer.body.code).toBe('sign-in.refused');
      expect(answer.body).toEqual(answers[0]?.body);
      expect(answer.get('Set-Cookie')).toBeUndefined();
    }
  });

  it('leads to what the roles allow, until signed out; a copied cookie is worth nothing afterwards', async () => {
    const agent = await house.signInAs(wenna);
    expect((await agent.get(session)).body.user.name).toBe('Wenna Oddie');
    const copied = (await signIn(wenna.email, testPassword)).get('Set-Cookie')?.join('; ') ?? '';
    const copy = () => house.visitor().get(session).set('Cookie', copied);
    expect((await copy()).status).toBe(200);
    expect((await house.visitor().delete(session).set('Cookie', copied)).status).toBe(204);
    expect((await copy()).body.code).toBe('session.ended');
    expect((await agent.get(session)).status).toBe(200);
  });

  it('says whether there was no session or one that has ended', async () => {
    expect((await house.visitor().get(session)).body).toMatchObject({ status: 401, code: 'session.none' });
    const agent = await house.signInAs(wenna);
    house.clock.advance({ minutes: 11 });
    expect((await agent.get(session)).body).toMatchObject({ status: 401, code: 'session.ended' });
  });

  it('ends with the next request of somebody who no longer works here', async () => {
    const agent = await house.signInAs(wenna);
    await house.owner.source.query('UPDATE ellwand.user SET active = FALSE WHERE id = ?', [wenna.id]);
    expect((await agent.get(session)).status).toBe(401);
  });

  it('refuses bodies of other shapes by the field', async () => {
    const bodies = [
      { email: wenna.email },
      { email: [wenna.email], password: testPassword },
      { email: wenna.email, password: { $gt: '' } },
      { email: wenna.email, password: testPassword, roles: ['administrator'] },
    ];
    for (const body of bodies) {
      const answer = await house.visitor().post(session).send(body);
      expect(answer.status).toBe(400);
      expect(answer.body.code).toBe('request.invalid');
      expect(answer.body.errors[0].pointer).toMatch(/^\//);
    }
  });

  describe('with a forged access token (ASVS 9.1.1, 9.1.2, 9.2.1–9.2.3)', () => {
    let sid: string;
    beforeEach(async () => {
      await house.signInAs(wenna);
      const rows: { id: string }[] = await house.owner.source.query('SELECT id FROM ellwand.session');
      sid = rows[0]?.id ?? '';
    });

    const signed = (changes: object, options: object = {}) =>
      house.app.get(JwtService, { strict: false }).sign(
        { sub: wenna.id, sid, purpose: 'access', exp: 4e9, ...changes },
        {
          algorithm: 'HS256',
          secret: house.app.get(Secrets).key('access-token'),
          audience: accessAudience,
          issuer: house.environment.publicUrl,
          ...options,
        },
      );
    const ask = (token: string) => house.visitor().get(session).set('Cookie', `ellwand-access=${token}`);

    it('lets in the right one, so that the others fail for their own reason', async () => {
      expect((await ask(signed({}))).status).toBe(200);
    });

    it.each([
      ['no algorithm', () => withoutSignature(signed({}))],
      ['another algorithm', () => signed({}, { algorithm: 'HS512' })],
      ['another key', () => signed({}, { secret: house.app.get(Secrets).key('refresh-successor') })],
      ['another audience', () => signed({}, { audience: 'site' })],
      ['another issuer', () => signed({}, { issuer: 'https://elsewhere.example' })],
      ['another purpose', () => signed({ purpose: 'reset' })],
      ['an end that has passed', () => signed({ exp: 1_000_000_000 })],
      ['a session of somebody else', () => signed({ sub: '0190f3b0-0000-7000-8000-000000000001' })],
      ['a session that there is not', () => signed({ sid: '0190f3b0-0000-7000-8000-000000000002' })],
    ])('keeps out one with %s', async (_, forge) => {
      expect((await ask(forge())).body.code).toBe('session.ended');
    });
  });
});

function withoutSignature(token: string): string {
  const head = Buffer.from(JSON.stringify({ alg: 'none', typ: 'JWT' })).toString('base64url');
  return `${head}.${token.split('.')[1] ?? ''}.`;
}
