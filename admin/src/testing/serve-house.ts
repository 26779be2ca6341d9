/**
 * Serves the built Workroom over a house in memory, on loopback: `npm run look -w admin -- 4391 curator`, with the
 * port, the role to be signed in as, and where the build lies. For looking at screens; nothing is kept.
 */
import { createReadStream, existsSync } from 'node:fs';
import { createServer, type IncomingMessage, type ServerResponse } from 'node:http';
import { extname, join, normalize } from 'node:path';
import { fakeApi } from './fake-api/fake-api.js';
import { House } from './fake-api/house.js';
import { staff } from './fake-api/people.js';

const [port = '4391', role = 'recorder', built = join(import.meta.dirname, '../../dist')] =
  process.argv.slice(2);
const types: Readonly<Record<string, string>> = {
  '.html': 'text/html; charset=utf-8',
  '.js': 'text/javascript',
  '.css': 'text/css',
  '.woff2': 'font/woff2',
};

function newHouse(): House {
  const person = Object.entries(staff).find(([name]) => name === role)?.[1];
  const house = new House(person ?? null);
  house.refreshes = person !== undefined;
  return house;
}
let house = newHouse();

async function asRequest(incoming: IncomingMessage): Promise<Request> {
  const chunks: Buffer[] = [];
  for await (const chunk of incoming) chunks.push(chunk as Buffer);
  const headers = new Headers(
    Object.entries(incoming.headers).flatMap(([name, value]) =>
      typeof value === 'string' ? [[name, value] as [string, string]] : [],
    ),
  );
  const hasBody = chunks.length > 0 && incoming.method !== 'GET';
  return new Request(`http://127.0.0.1:${port}${incoming.url ?? '/'}`, {
    method: incoming.method,
    headers,
    ...(hasBody ? { body: Buffer.concat(chunks) } : {}),
  });
}

/** Cloth in place of a photograph, so that the screens have something of the right shape to show. */
const cloth =
  '<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 240 320"><rect width="240" height="320" fill="#d9d4c8"/><path d="M92 60q28 22 56 0l14 70-16 10 46 150q-72 22-144 0l46-150-16-10z" fill="#23565c"/></svg>';

async function answer(incoming: IncomingMessage, outgoing: ServerResponse): Promise<void> {
  const path = new URL(incoming.url ?? '/', 'http://127.0.0.1').pathname;
  if (path === '/again') {
    house = newHouse();
    outgoing.end();
    return;
  }
  if (path.includes('/forms/')) {
    outgoing.writeHead(200, { 'Content-Type': 'image/svg+xml' }).end(cloth);
    return;
  }
  if (path.startsWith('/api/')) {
    const response = await fakeApi(house)(await asRequest(incoming));
    outgoing
      .writeHead(response.status, Object.fromEntries(response.headers))
      .end(Buffer.from(await response.arrayBuffer()));
    return;
  }
  const wanted = join(built, normalize(path.replace(/^\/workroom/, '')));
  const file =
    extname(wanted) !== '' && wanted.startsWith(built) && existsSync(wanted)
      ? wanted
      : join(built, 'index.html');
  outgoing.writeHead(200, {
    'Content-Type': types[extname(file)] ?? 'application/octet-stream',
    'Content-Security-Policy':
      "default-src 'self'; style-src 'self'; img-src 'self' data:; object-src 'none'; base-uri 'none'",
  });
  createReadStream(file).pipe(outgoing);
}

createServer((incoming, outgoing) => {
  answer(incoming, outgoing).catch((error: unknown) => {
    console.error(error);
    outgoing.writeHead(500).end();
  });
}).listen(Number(port), '127.0.0.1', () => console.log(`http://127.0.0.1:${port}/workroom/ as ${role}`));
