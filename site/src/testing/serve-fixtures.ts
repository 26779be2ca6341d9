/**
 * Serves the built site with an invented catalogue on a loopback port, for looking at pages and for browser
 * checks: `npx tsx src/testing/serve-fixtures.ts [port]`. Pictures come from the folder FIXTURE_PICTURES.
 */
import { createServer, type IncomingMessage, type ServerResponse } from 'node:http';
import { readdir, readFile } from 'node:fs/promises';
import { extname, join, normalize } from 'node:path';
import { fileURLToPath } from 'node:url';
import type * as Site from '../entry-server';
import type { SiteManifest } from '../app/site-assets';
import { readSearch } from '../lib/search-address';
import { fixtureCatalogue } from './fixture-catalogue';

const dist = fileURLToPath(new URL('../../dist/', import.meta.url));
const site = (await import(join(dist, 'server/entry-server.js'))) as typeof Site;
const manifest = JSON.parse(await readFile(join(dist, 'client/.vite/manifest.json'), 'utf8')) as SiteManifest;
const assets = site.siteAssets(manifest);
const pictures = process.env.FIXTURE_PICTURES ?? '';

const types: Readonly<Record<string, string>> = {
  '.js': 'text/javascript',
  '.css': 'text/css',
  '.woff2': 'font/woff2',
  '.svg': 'image/svg+xml',
};

const policy = [
  "default-src 'self'",
  `script-src 'self' ${site.inlineScriptHashes.map((hash) => `'${hash}'`).join(' ')}`,
  "style-src 'self'",
  "img-src 'self' data:",
  "object-src 'none'",
  "base-uri 'none'",
  "frame-ancestors 'none'",
  "form-action 'self'",
].join('; ');

async function answer(request: IncomingMessage, response: ServerResponse): Promise<void> {
  const url = new URL(request.url ?? '/', `http://${request.headers.host ?? '127.0.0.1'}`);
  if (url.pathname.startsWith('/api/v1/catalogue/')) return json(response, url);
  if (url.pathname.startsWith('/media/')) return media(response, url.pathname);
  const type = types[extname(url.pathname)];
  if (type) return file(response, join(dist, 'client', normalize(url.pathname)), type);
  if (url.pathname === '/fail') throw new Error('A page that fails, to look at.');
  const page = await site.render({ url: url.href, method: 'GET', headers: {} }, fixtureCatalogue, assets);
  if ('redirect' in page) {
    response.writeHead(page.status, { Location: page.redirect }).end();
    return;
  }
  response.writeHead(page.status, { ...page.headers, 'Content-Security-Policy': policy }).end(page.html);
}

async function json(response: ServerResponse, url: URL): Promise<void> {
  const [, number] = /\/garments\/([^/]+)/.exec(url.pathname) ?? [];
  const version = /\/v\/(\d+)$/.exec(url.pathname)?.[1];
  const send = (status: number, body: unknown) =>
    void response.writeHead(status, { 'Content-Type': 'application/json' }).end(JSON.stringify(body));
  if (url.pathname.endsWith('/front')) return send(200, await fixtureCatalogue.front());
  if (number === undefined) return send(200, await fixtureCatalogue.search(readSearch(url.searchParams)));
  const found = await fixtureCatalogue.garment(number, version === undefined ? undefined : Number(version));
  if (found.found === 'garment') return send(200, found.garment);
  return found.found === 'withdrawn' ? send(410, found.notice) : send(404, {});
}

/** Any picture will do, the same one each time for the same address; whatever its form, browsers look inside. */
async function media(response: ServerResponse, path: string): Promise<void> {
  const all = pictures ? (await readdir(pictures)).filter((name) => name.endsWith('.jpg')).sort() : [];
  const seed = Number(path.split('/')[2]?.slice(-6) ?? 0);
  const name = all[Math.floor(seed / 10 + (seed % 10)) % Math.max(1, all.length)];
  if (name === undefined) {
    response.writeHead(404).end();
    return;
  }
  await file(response, join(pictures, name), 'image/jpeg');
}

async function file(response: ServerResponse, path: string, type: string): Promise<void> {
  const bytes = await readFile(path).catch(() => null);
  response.writeHead(bytes ? 200 : 404, { 'Content-Type': bytes ? type : 'text/plain' }).end(bytes);
}

const port = Number(process.argv[2] ?? 4391);
createServer((request, response) => {
  answer(request, response).catch((error: unknown) => {
    console.error(error);
    response.writeHead(500).end();
  });
}).listen(port, '127.0.0.1', () => console.log(`http://127.0.0.1:${port}/`));
