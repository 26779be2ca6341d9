import { createHash } from 'node:crypto';
import { createReadStream, existsSync } from 'node:fs';
import { mkdir, open, readdir, readFile, rename, rm, stat, writeFile } from 'node:fs/promises';
import { dirname, join } from 'node:path';
import { Inject, Injectable } from '@nestjs/common';
import { ENVIRONMENT } from '../../common/environment.token';
import type { Environment } from '../../config/environment';

export interface StoredFile {
  /** Absolute path, for streaming. */
  readonly path: string;
  readonly bytes: number;
  readonly sha256: string;
}

/** No upload and no making of a form takes so long. */
const leftoverMs = 60 * 60 * 1_000;

/**
 * Where pictures lie: files under the data folder, named by keys such as `forms/3f/<id>/640.avif`. What `put`
 * has returned survives a power cut (file and folders are synced first), is there whole or not at all (rename),
 * and is the same when it is read again (SHA-256, kept beside it).
 */
@Injectable()
export class PictureStore {
  private readonly root: string;
  /** Keys whose content has been compared with its sum since this process began. */
  private readonly compared = new Map<string, StoredFile>();

  constructor(@Inject(ENVIRONMENT) environment: Pick<Environment, 'dataFolder'>) {
    this.root = join(environment.dataFolder, 'pictures');
  }

  async onApplicationBootstrap(): Promise<void> {
    await this.sweepIncoming();
  }

  /** Removes what dead processes left half received or half made. Other living ones may still be at work there. */
  async sweepIncoming(): Promise<void> {
    for (const name of await readdir(this.incomingFolder).catch(() => [])) {
      const path = await this.incoming(name);
      const { mtimeMs } = await stat(path).catch(() => ({ mtimeMs: Infinity }));
      if (Date.now() - mtimeMs > leftoverMs) await rm(path, { force: true });
    }
  }

  /** Where files are received and made. Nothing there is ever served. */
  get incomingFolder(): string {
    return join(this.root, 'incoming');
  }

  /** A name in the incoming area, which is made if it is not there. */
  async incoming(name: string): Promise<string> {
    await mkdir(this.incomingFolder, { recursive: true, mode: 0o700 });
    return join(this.incomingFolder, name);
  }

  /** Takes a file from the incoming area (by moving it) into the store. */
  async put(key: string, source: string): Promise<StoredFile> {
    const path = this.pathOf(key);
    await mkdir(dirname(path), { recursive: true, mode: 0o700 });
    const sha256 = await sumOf(source);
    await writeFile(sumPath(path), `${sha256}\n`, { mode: 0o600 });
    await syncFile(sumPath(path));
    await syncFile(source);
    await rename(source, path);
    await this.syncFolders(dirname(path));
    return { path, bytes: (await stat(path)).size, sha256 };
  }

  /**
   * Finds a file again and makes sure, once in a process, that it is what was put there.
   * @returns null where there is no such file
   * @throws Error where its content has changed
   */
  async find(key: string): Promise<StoredFile | null> {
    const known = this.compared.get(key);
    if (known && existsSync(known.path)) return known;
    const path = this.pathOf(key);
    if (!existsSync(path)) return null;
    const [sha256, kept] = await Promise.all([sumOf(path), readFile(sumPath(path), 'utf8')]);
    if (sha256 !== kept.trim()) throw new Error(`The stored picture ${key} is not what was stored`);
    const found = { path, bytes: (await stat(path)).size, sha256 };
    this.compared.set(key, found);
    return found;
  }

  async remove(key: string): Promise<void> {
    this.compared.delete(key);
    const path = this.pathOf(key);
    await rm(path, { force: true });
    await rm(sumPath(path), { force: true });
  }

  private pathOf(key: string): string {
    if (!/^[a-z0-9-]+(\/[a-z0-9-]+)*\.[a-z0-9]+$/.test(key))
      throw new Error(`Not a key of the store: ${key}`);
    return join(this.root, key);
  }

  /** A new name is safe only once every folder above it that may be new is synced, too. */
  private async syncFolders(from: string): Promise<void> {
    for (let folder = from; folder.length >= this.root.length; folder = dirname(folder))
      await syncFile(folder);
  }
}

const sumPath = (path: string) => `${path}.sha256`;

async function sumOf(path: string): Promise<string> {
  const hash = createHash('sha256');
  for await (const piece of createReadStream(path)) hash.update(piece as Buffer);
  return hash.digest('hex');
}

async function syncFile(path: string): Promise<void> {
  const file = await open(path, 'r');
  try {
    await file.sync();
  } finally {
    await file.close();
  }
}
