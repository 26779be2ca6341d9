import { createHash } from 'node:crypto';
import { readdirSync, readFileSync, statSync } from 'node:fs';
import { extname, join } from 'node:path';
import { promisify } from 'node:util';
import { brotliCompress, constants } from 'node:zlib';
import type { Request, Response } from 'express';

/** Everything the builds put out; what is not named here (source maps, manifests) is not served. */
const mediaTypes: Readonly<Record<string, string>> = {
  '.css': 'text/css; charset=utf-8',
  '.html': 'text/html; charset=utf-8',
  '.ico': 'image/x-icon',
  '.js': 'text/javascript; charset=utf-8',
  '.png': 'image/png',
  '.svg': 'image/svg+xml',
  '.txt': 'text/plain; charset=utf-8',
  '.webmanifest': 'application/manifest+json',
  '.woff2': 'font/woff2',
};
const compressible = new Set(['.css', '.html', '.js', '.svg', '.txt', '.webmanifest']);

/** Names under `assets/` carry a hash of what is in them: the same name is the same file for ever. */
const forEver = 'public, max-age=31536000, immutable';

const compress = promisify(brotliCompress);

interface StaticFile {
  readonly content: Buffer;
  readonly mediaType: string;
  readonly etag: string;
  readonly brotli: Promise<Buffer> | null;
}

/** The files of a built folder, looked up in a list that was made beforehand: no address leads anywhere else. */
export class StaticFiles {
  private names: ReadonlySet<string> | null = null;
  private readonly read = new Map<string, StaticFile>();

  constructor(private readonly folder: string) {}

  has(name: string): boolean {
    return this.list().has(name);
  }

  /** Sends a file that is there (see `has`). */
  async send(name: string, request: Request, response: Response, cacheControl?: string): Promise<void> {
    const file = this.file(name);
    response.set({
      'Content-Type': file.mediaType,
      'Cache-Control': cacheControl ?? (name.startsWith('assets/') ? forEver : 'public, no-cache'),
      ETag: file.etag,
    });
    response.vary('Accept-Encoding');
    if (file.brotli && request.acceptsEncodings('br') === 'br') {
      response.set('Content-Encoding', 'br').send(await file.brotli);
      return;
    }
    response.send(file.content);
  }

  private list(): ReadonlySet<string> {
    if (!this.names || this.names.size === 0) this.names = new Set(namesIn(this.folder));
    return this.names;
  }

  private file(name: string): StaticFile {
    const known = this.read.get(name);
    if (known) return known;
    const path = join(this.folder, name);
    const content = readFileSync(path);
    const file: StaticFile = {
      content,
      mediaType: mediaTypes[extname(name)] ?? 'application/octet-stream',
      etag: `W/"${createHash('sha256').update(content).digest('base64url').slice(0, 22)}"`,
      brotli: compressible.has(extname(name)) ? compressed(path, content) : null,
    };
    this.read.set(name, file);
    return file;
  }
}

/** The compressed file beside it, where the build made one and it is not older; else made here, once. */
async function compressed(path: string, content: Buffer): Promise<Buffer> {
  const beside = statSync(`${path}.br`, { throwIfNoEntry: false });
  if (beside && beside.mtimeMs >= statSync(path).mtimeMs) return readFileSync(`${path}.br`);
  return compress(content, { params: { [constants.BROTLI_PARAM_QUALITY]: 9 } });
}

function namesIn(folder: string): string[] {
  if (!statSync(folder, { throwIfNoEntry: false })?.isDirectory()) return [];
  return readdirSync(folder, { recursive: true, encoding: 'utf8' }).filter(
    (name) => !name.startsWith('.') && extname(name) in mediaTypes,
  );
}
