import { ContentSecurity } from '../src/common/content-security';
import { defaultLimits } from '../src/common/limits';
import { type House, openHouse } from './harness/house';

const policy =
  "default-src 'self';script-src 'self';style-src 'self';img-src 'self' data:;object-src 'none';" +
  "base-uri 'none';frame-ancestors 'none';form-action 'self'";

describe('the headers of every kind of answer (ASVS 3.4, 4.1.1)', () => {
  let house: House;
  beforeAll(async () => {
    house = await openHouse();
  });
  afterAll(() => house.close());
  afterEach(() => house.empty());

  const kinds: [string, number, () => PromiseLike<{ status: number; headers: unknown }>][] = [
    ['a record', 200, async () => (await house.signInAs('curator')).get('/api/v1/session')],
    ['a page', 200, () => house.visitor().get('/api/docs')],
    ['health', 200, () => house.visitor().get('/health/live')],
    ['a body that is no JSON', 400, () => post().set('Content-Type', 'application/json').send('{"email":')],
    ['a refusal for want of a session', 401, () => house.visitor().get('/api/v1/session')],
    [
      'a refusal for want of a role',
      403,
      async () => (await house.signInAs('desk')).get('/api/v1/workroom/users'),
    ],
    ['an unknown address of the API', 404, () => house.visitor().get('/api/v1/nothing')],
    [
      'an unknown picture',
      404,
      () => house.visitor().get('/media/0190f3b0-0000-7000-8000-000000000000/320.jpg'),
    ],
    ['a body that is too large', 413, () => post().send({ email: 'x'.repeat(1_100_000) })],
    ['an address that cannot be decoded', 400, () => house.visitor().get('/media/%zz/320.jpg')],
    ['a fault of ours', 500, () => withTableAway('user', () => post().send(signIn))],
  ];
  const signIn = { email: 'nobody@larkmoor.example', password: 'x' };
  const post = () => house.visitor().post('/api/v1/session');

  it.each(kinds)('%s: %i', async (_, status, ask) => {
    const answer = await ask();
    expect(answer.status).toBe(status);
    expect(answer.headers).toMatchObject({
      'content-security-policy': expect.stringMatching(/^default-src 'self';script-src 'self'/),
      'x-content-type-options': 'nosniff',
      'referrer-policy': 'same-origin',
      'x-frame-options': 'DENY',
      'cross-origin-resource-policy': 'same-origin',
    });
    expect(answer.headers).not.toHaveProperty('x-powered-by');
    expect(answer.headers).not.toHaveProperty('access-control-allow-origin');
    if (status >= 400)
      expect(answer.headers).toMatchObject({ 'content-type': 'application/problem+json; charset=utf-8' });
  });

  it('tell no more of a fault than that there was one (ASVS 16.5.1)', async () => {
    const answer = await withTableAway('user', () => post().send(signIn));
    expect(answer.body).toEqual({
      type: 'about:blank',
      title: 'Something went wrong here',
      status: 500,
      code: 'service.fault',
      detail: 'Nothing was changed. The fault has been noted.',
    });
  });

  it('let a page run the scripts that its renderer has named, and no others', async () => {
    const before = (await house.visitor().get('/health/live')).get('Content-Security-Policy');
    expect(before).toBe(policy);
    const hash = `sha256-${'A'.repeat(43)}=`;
    house.app.get(ContentSecurity).allowScripts([hash]);
    const after = (await house.visitor().get('/health/live')).get('Content-Security-Policy');
    expect(after).toContain(`script-src 'self' '${hash}';`);
    expect(() => house.app.get(ContentSecurity).allowScripts(["'unsafe-inline'"])).toThrow(
      'Expected the hash',
    );
  });

  it('keep what the API answers out of caches', async () => {
    expect((await house.visitor().get('/api/v1/session')).get('Cache-Control')).toBe('no-store');
    const agent = await house.signInAs('curator');
    expect((await agent.get('/api/v1/workroom/garments')).get('Cache-Control')).toBe('no-store');
  });

  it('speak brotli to whoever understands it', async () => {
    const answer = await house.visitor().get('/api/openapi.json').set('Accept-Encoding', 'br');
    expect(answer.get('Content-Encoding')).toBe('br');
  });

  async function withTableAway<T>(table: string, work: () => PromiseLike<T>): Promise<T> {
    await house.owner.source.query(`RENAME TABLE ellwand.${table} TO ellwand.${table}_away`);
    try {
      return await work();
    } finally {
      await house.owner.source.query(`RENAME TABLE ellwand.${table}_away TO ellwand.${table}`);
    }
  }
});

describe('with TLS before it', () => {
  let house: House;
  beforeAll(async () => {
    house = await openHouse({ variables: { ELLWAND_PUBLIC_URL: 'https://larkmoor.example' } });
  });
  afterAll(() => house.close());

  it('the cookies belong to this host alone, and browsers are told to keep to TLS (ASVS 3.3.1, 3.4.1)', async () => {
    const { email, password } = await house.person('curator');
    const answer = await house.visitor().post('/api/v1/session').send({ email, password });
    for (const cookie of answer.get('Set-Cookie') ?? []) {
      expect(cookie).toMatch(
        /^__Host-ellwand-(access|refresh)=.*; Path=\/;.*; HttpOnly; Secure; SameSite=Strict$/,
      );
    }
    expect(answer.get('Set-Cookie')).toHaveLength(2);
    expect(answer.get('Strict-Transport-Security')).toContain('max-age=15552000');
  });
});

describe('one request too many', () => {
  let house: House;
  beforeAll(async () => {
    const variables = { ELLWAND_TRUST_PROXY: 'loopback' };
    house = await openHouse({ limits: { ...defaultLimits, 'sign-in': 3, public: 5 }, variables });
  });
  afterAll(() => house.close());

  const signInFrom = (address: string) =>
    house.visitor().post('/api/v1/session').set('X-Forwarded-For', address).send({});

  it('is refused with the time to wait, under the same headers, and harms nobody else (ASVS 2.4.1)', async () => {
    const address = '192.0.2.1';
    for (let tries = 0; tries < 3; tries++) expect((await signInFrom(address)).status).toBe(400);
    const refused = await signInFrom(address);
    expect(refused.body).toMatchObject({ status: 429, code: 'request.too-many' });
    expect(Number(refused.get('Retry-After'))).toBeGreaterThan(0);
    expect(refused.get('X-Content-Type-Options')).toBe('nosniff');
    expect(refused.get('Content-Security-Policy')).toBe(policy);
    expect((await signInFrom('192.0.2.2')).status).toBe(400);
    const browsing = house.visitor().get('/api/openapi.json').set('X-Forwarded-For', address);
    expect((await browsing).status).toBe(200);
  });

  it('cannot be got round by walking through the addresses of one IPv6 network', async () => {
    for (let tries = 0; tries < 3; tries++) await signInFrom(`2001:db8:1:2::${tries}`);
    expect((await signInFrom('2001:db8:1:2::99')).status).toBe(429);
  });
});

describe('without a proxy before it', () => {
  let house: House;
  beforeAll(async () => {
    house = await openHouse({ limits: { ...defaultLimits, 'sign-in': 3 } });
  });
  afterAll(() => house.close());

  it('the application does not believe a forwarded address (ASVS 4.1.3)', async () => {
    const statuses: number[] = [];
    for (let tries = 0; tries < 5; tries++) {
      const request = house.visitor().post('/api/v1/session').set('X-Forwarded-For', `192.0.2.${tries}`);
      statuses.push((await request.send({})).status);
    }
    expect(statuses).toEqual([400, 400, 400, 429, 429]);
  });
});
