import { get as httpGet, type IncomingHttpHeaders } from 'node:http';
import { brotliDecompressSync } from 'node:zlib';
import { Publisher } from '../catalogue/published-documents';
import { type Agent, type House, openHouse } from '../harness/house';
import { inlineScriptHash, standInBuilds } from './built-stand-ins';

describe('the pages that the API serves', () => {
  let house: House;
  let visitor: Agent;

  beforeAll(async () => {
    house = await openHouse({ built: standInBuilds() });
  });
  afterAll(() => house.close());
  beforeEach(() => {
    visitor = house.visitor();
  });
  afterEach(() => house.empty());

  it('allows the site’s one inline script from the very first page on, and nothing else inline', async () => {
    const page = await visitor.get('/');
    expect(page.status).toBe(200);
    expect(page.headers['content-security-policy']).toContain(`script-src 'self' '${inlineScriptHash}';`);
    expect(page.headers['content-security-policy']).not.toContain('unsafe');
  });

  it('answers a garment’s page 200, then 410 once it is withdrawn, and 404 where there is none', async () => {
    const publisher = new Publisher(house);
    await publisher.publish();
    const page = await visitor.get('/g/lh-1966-30?unit=in');
    expect([page.status, page.type]).toEqual([200, 'text/html']);
    expect(page.text).toContain('<title>Teal bodice</title>');
    expect(page.text).toContain('<script type="module" src="/assets/entry-1a2b3c.js">');
    expect(page.text).toContain(`href="${house.environment.publicUrl}/g/lh-1966-30"`);
    await publisher.withdraw('lh-1966-30');
    expect((await visitor.get('/g/lh-1966-30')).status).toBe(410);
    expect((await visitor.get('/g/lh-0')).status).toBe(404);
    expect((await visitor.get('/no/such/page')).status).toBe(404);
  });

  it('lets caches ask: 304 for an unchanged page, never for one that was withdrawn', async () => {
    const publisher = new Publisher(house);
    await publisher.publish();
    const { headers } = await visitor.get('/g/lh-1966-30');
    expect(headers['cache-control']).toBe('public, no-cache');
    const ask = () => visitor.get('/g/lh-1966-30').set('If-None-Match', String(headers['etag']));
    expect((await ask()).status).toBe(304);
    await publisher.withdraw('lh-1966-30');
    expect((await ask()).status).toBe(410);
  });

  it('tells no more of a fault than that there was one (ASVS 16.5.1)', async () => {
    const page = await visitor.get('/breaks');
    expect([page.status, page.type]).toEqual([500, 'text/html']);
    expect(page.text).toContain('This page could not be made');
    expect(page.text).not.toContain('secret');
  });

  it('redirects within the house and never out of it (ASVS 3.7.2)', async () => {
    const old = await visitor.get('/old').redirects(0);
    expect([old.status, old.headers['location']]).toEqual([301, '/search?q=old']);
    for (const to of [
      '//evil.example/x',
      'https://evil.example',
      '/\\evil.example',
      '%09//evil.example',
      'javascript:alert(1)',
    ]) {
      const { location } = (await visitor.get(`/away?to=${encodeURIComponent(to)}`).redirects(0)).headers;
      expect(new URL(String(location), house.url).origin).toBe(house.url);
      expect(location).toMatch(/^\/(?![/\\])/);
    }
    expect((await visitor.get('//evil.example/x')).text).toContain(
      `href="${house.environment.publicUrl}//evil.example/x"`,
    );
  });

  it('serves built files for ever, compressed, and no source maps or manifests', async () => {
    const script = await raw('/assets/entry-1a2b3c.js', { 'Accept-Encoding': 'br' });
    expect(script.headers).toMatchObject({
      'cache-control': 'public, max-age=31536000, immutable',
      'content-type': 'text/javascript; charset=utf-8',
      'content-encoding': 'br',
      vary: expect.stringContaining('Accept-Encoding'),
    });
    expect(brotliDecompressSync(script.body).toString()).toContain('measured measured');
    expect(script.body.length).toBeLessThan(200);
    const plain = await raw('/assets/entry-1a2b3c.js', { 'Accept-Encoding': 'identity' });
    expect([plain.headers['content-encoding'], plain.body.length > 4000]).toEqual([undefined, true]);
    expect((await visitor.get('/favicon.svg')).headers['cache-control']).toBe('public, no-cache');
    for (const path of [
      '/assets/entry-1a2b3c.js.map',
      '/assets/entry-0.js',
      '/assets/',
      '/assets/..%2f..%2fserver%2fentry-server.js',
    ]) {
      const answer = await visitor.get(path);
      expect([path, answer.status, answer.type]).toEqual([path, 404, 'application/problem+json']);
    }
    expect((await visitor.get('/.vite/manifest.json')).text).toContain('<title>nothing</title>');
  });

  it.each(['/api/v1/nothing', '/api', '/media/x', '/health/x'])(
    'answers %s as a program’s address, not as a page',
    async (path) => {
      const answer = await visitor.get(path);
      expect([answer.status, answer.type]).toEqual([404, 'application/problem+json']);
    },
  );

  it('opens the Workroom at its own address, for all of its routes, kept by no cache', async () => {
    const door = await visitor.get('/workroom?from=mail').redirects(0);
    expect([door.status, door.headers['location']]).toEqual([308, '/workroom/?from=mail']);
    for (const path of [
      '/workroom/',
      '/workroom/sheets/0190',
      '/workroom/index.html',
      '/workroom/.vite/manifest.json',
    ]) {
      const shell = await visitor.get(path);
      expect([path, shell.status, shell.headers['cache-control']]).toEqual([path, 200, 'no-store']);
      expect(shell.text).toContain('<title>Workroom</title>');
    }
    const built = await visitor.get('/workroom/assets/main-4d5e6f.js');
    expect(built.headers['cache-control']).toBe('public, max-age=31536000, immutable');
    expect((await visitor.get('/workroom/assets/main-old.js')).status).toBe(404);
  });

  it('answers HEAD like GET, without the page', async () => {
    const head = await visitor.head('/');
    expect([head.status, head.type, head.text]).toEqual([200, 'text/html', undefined]);
  });

  function raw(
    path: string,
    headers: Record<string, string>,
  ): Promise<{ headers: IncomingHttpHeaders; body: Buffer }> {
    return new Promise((resolve, reject) => {
      httpGet(house.url + path, { headers }, (answer) => {
        const pieces: Buffer[] = [];
        answer.on('data', (piece: Buffer) => pieces.push(piece));
        answer.on('end', () => resolve({ headers: answer.headers, body: Buffer.concat(pieces) }));
      }).on('error', reject);
    });
  }
});

describe('before anything is built', () => {
  it('says so in a plain page, and the API works', async () => {
    const house = await openHouse();
    for (const path of ['/', '/workroom/', '/g/lh-1']) {
      const page = await house.visitor().get(path);
      expect([path, page.status, page.type]).toEqual([path, 503, 'text/html']);
      expect(page.text).toContain('not built yet');
    }
    expect((await house.visitor().get('/api/v1/catalogue/front')).status).toBe(200);
    await house.close();
  });
});
