import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { buildWhatChanged } from './builds.mjs';

const step = <T>(_label: string, work: () => Promise<T>) => work();

describe('building what changed', () => {
  let root: string;
  let order: string[];

  const write = (name: string, text: string) => {
    fs.mkdirSync(path.dirname(path.join(root, name)), { recursive: true });
    fs.writeFileSync(path.join(root, name), text);
  };
  const buildOne = (_root: string, workspace: string) => {
    order.push(workspace);
    write(`${workspace}/dist/built.js`, '');
    return Promise.resolve();
  };
  const build = async () => {
    order = [];
    await buildWhatChanged(root, step, { buildOne });
    return order;
  };

  beforeEach(async () => {
    root = fs.mkdtempSync(path.join(os.tmpdir(), 'ellwand-builds-'));
    write('package-lock.json', '{}');
    for (const workspace of ['shared', 'api', 'site', 'admin']) write(`${workspace}/src/main.ts`, workspace);
    await build();
  });

  afterEach(() => {
    fs.rmSync(root, { recursive: true });
  });

  it('builds everything at first, shared before those that use it', () => {
    expect(order[0]).toBe('shared');
    expect([...order].sort()).toEqual(['admin', 'api', 'shared', 'site']);
  });

  it('builds nothing when nothing changed', async () => {
    expect(await build()).toEqual([]);
  });

  it('builds one workspace when a file of it changed', async () => {
    write('site/src/page.tsx', 'new');
    expect(await build()).toEqual(['site']);
  });

  it('builds everything that uses shared when shared changed', async () => {
    write('shared/src/main.ts', 'changed');
    expect((await build()).sort()).toEqual(['admin', 'api', 'shared', 'site']);
  });

  it('builds everything when the lock file changed', async () => {
    write('package-lock.json', '{ "changed": true }');
    expect(await build()).toHaveLength(4);
  });

  it('builds again what was removed', async () => {
    fs.rmSync(path.join(root, 'admin/dist'), { recursive: true });
    expect(await build()).toEqual(['admin']);
  });

  it.each(['api/src/main.spec.ts', 'api/test/house.ts', 'site/e2e/search.ts'])(
    'does not build for %s',
    async (name) => {
      write(name, 'a test');
      expect(await build()).toEqual([]);
    },
  );

  it('removes the old build first, so that a removed source leaves nothing behind', async () => {
    write('api/dist/removed-migration.js', '');
    write('api/src/main.ts', 'changed');
    await build();
    expect(fs.existsSync(path.join(root, 'api/dist/removed-migration.js'))).toBe(false);
  });

  it('counts a failed build as not built', async () => {
    write('api/src/main.ts', 'broken');
    const failing = () => Promise.reject(new Error('does not compile'));
    await expect(buildWhatChanged(root, step, { buildOne: failing })).rejects.toThrow('does not compile');
    expect(await build()).toEqual(['api']);
  });
});
