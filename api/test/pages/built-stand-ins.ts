import { createHash } from 'node:crypto';
import { mkdirSync, mkdtempSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import type { BuiltFolders } from '../../src/pages/built-folders';

export const inlineScript = 'document.documentElement.dataset.unit="mm"';
export const inlineScriptHash = `sha256-${createHash('sha256').update(inlineScript).digest('base64')}`;

/** Pages as the real build makes them, but for their looks: it asks the catalogue and answers by what it says. */
const entryServer = `
exports.inlineScriptHashes = ['${inlineScriptHash}'];
exports.siteAssets = (manifest) => ({ entryScript: '/' + manifest['src/entry-client.tsx'].file });
exports.render = async ({ url }, catalogue, assets) => {
  const { pathname, searchParams } = new URL(url);
  if (pathname === '/breaks') throw new Error('a fault with a secret in it');
  if (pathname === '/old') return { redirect: '/search?q=old', status: 301 };
  if (pathname === '/away') return { redirect: searchParams.get('to'), status: 302 };
  const number = /^\\/g\\/([^/]+)$/.exec(pathname)?.[1];
  const found = number ? await catalogue.garment(number) : { found: pathname === '/' ? 'garment' : 'nothing' };
  const status = { garment: 200, withdrawn: 410, nothing: 404 }[found.found];
  const html = '<!doctype html><title>' + (found.garment?.title ?? found.found) + '</title>' +
    '<script type="module" src="' + assets.entryScript + '"></script><link rel="canonical" href="' + url.split('?')[0] + '">';
  return { status, html, headers: { 'Content-Type': 'text/html; charset=utf-8', 'Cache-Control': 'public, no-cache', ETag: '"' + html.length + status + '"' } };
};
`;

const files: Readonly<Record<string, string>> = {
  'site/server/entry-server.js': entryServer,
  'site/client/.vite/manifest.json':
    '{"src/entry-client.tsx":{"file":"assets/entry-1a2b3c.js","isEntry":true}}',
  'site/client/assets/entry-1a2b3c.js': `export const text = "${'measured '.repeat(500)}";`,
  'site/client/assets/entry-1a2b3c.js.map': '{"sources":["secret.ts"]}',
  'site/client/favicon.svg': '<svg xmlns="http://www.w3.org/2000/svg"/>',
  'workroom/index.html': '<!doctype html><title>Workroom</title>',
  'workroom/assets/main-4d5e6f.js': 'export {};',
  'workroom/.vite/manifest.json': '{}',
};

/** The two builds in a folder of their own. */
export function standInBuilds(): BuiltFolders {
  const folder = mkdtempSync(join(tmpdir(), 'ellwand-built-'));
  for (const [name, content] of Object.entries(files)) {
    mkdirSync(dirname(join(folder, name)), { recursive: true });
    writeFileSync(join(folder, name), content);
  }
  return { site: join(folder, 'site'), workroom: join(folder, 'workroom') };
}
