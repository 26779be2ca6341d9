import { createHash } from 'node:crypto';
import { existsSync } from 'node:fs';
import { mkdtemp, readdir, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { PictureStore } from './picture-store';

describe('the store of pictures', () => {
  let dataFolder: string;
  let store: PictureStore;
  const content = Buffer.from('a picture');
  const key = 'forms/3f/0190/640.avif';

  beforeEach(async () => {
    dataFolder = await mkdtemp(join(tmpdir(), 'ellwand-store-'));
    store = new PictureStore({ dataFolder });
  });
  afterEach(() => rm(dataFolder, { recursive: true, force: true }));

  async function put(): Promise<string> {
    const source = await store.incoming('received.part');
    await writeFile(source, content);
    await store.put(key, source);
    return source;
  }

  it('gives back what was put there, with its size and sum', async () => {
    const source = await put();
    const found = await store.find(key);
    expect(found?.bytes).toBe(content.length);
    expect(found?.sha256).toBe(createHash('sha256').update(content).digest('hex'));
    expect(await readFile(found?.path ?? '')).toEqual(content);
    expect(existsSync(source)).toBe(false);
  });

  it('does not serve a file whose content has changed', async () => {
    await put();
    await writeFile(join(dataFolder, 'pictures', key), 'another one');
    await expect(new PictureStore({ dataFolder }).find(key)).rejects.toThrow('not what was stored');
  });

  it('knows nothing of a key that was removed or never was', async () => {
    await put();
    await store.find(key);
    await store.remove(key);
    expect(await store.find(key)).toBeNull();
    expect(await readdir(join(dataFolder, 'pictures', 'forms/3f/0190'))).toEqual([]);
  });

  it.each(['../outside.jpg', '/etc/passwd', 'forms/../../x.jpg', 'forms//x.jpg', 'forms/x', 'forms/X.jpg\0'])(
    'refuses %j as a key',
    async (wrong) => {
      await expect(store.find(wrong)).rejects.toThrow('Not a key');
    },
  );
});
