import { execFileSync, spawnSync } from 'node:child_process';
import fs from 'node:fs';
import net from 'node:net';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { isAlive } from './lib/programs.mjs';
import { makeStandInHouse, type StandInHouse, type StartedHouse } from './testing/stand-in-house.js';

const modeOf = (file: string) => (fs.statSync(file).mode & 0o777).toString(8);

/** Ids of all processes that bear the folder's name, which services of the house do. */
function processesOf(folder: string): number[] {
  return fs
    .readdirSync('/proc')
    .filter((name) => /^\d+$/.test(name) && isAlive(Number(name)))
    .filter((name) => commandOf(name).includes(folder))
    .map(Number);
}

function commandOf(pid: string): string {
  try {
    return fs.readFileSync(`/proc/${pid}/cmdline`, 'utf8');
  } catch {
    return '';
  }
}

async function pidOfApi(house: StandInHouse): Promise<number> {
  return Number(await (await fetch(`http://127.0.0.1:${house.port}/`)).text());
}

async function close(started: StartedHouse): Promise<number | null> {
  started.child.kill('SIGINT');
  return started.ended();
}

describe('npm start', () => {
  let house: StandInHouse;

  beforeAll(async () => {
    house = await makeStandInHouse();
  });

  afterAll(() => house.remove());

  it('opens a new house with the demonstration and prints where everything is', async () => {
    const started = house.start();
    await started.opened();
    expect(started.output()).toContain(`http://127.0.0.1:${house.port}/workroom/`);
    expect(started.output()).toContain(path.join(house.data, 'demonstration.json'));
    expect(started.output()).toContain('1 of 1 garments measured');
    expect(started.output()).toMatch(/Mail inbox +http:\/\/127\.0\.0\.1:\d+\//);
    expect(house.told()).toEqual(['mail up', 'migrate as ellwand_owner', 'load', 'api up']);
    expect(await close(started)).toBe(0);
  });

  it('stops the API while the database still answers, and leaves no process behind', () => {
    expect(house.told()).toContain('api down, database up');
    expect(processesOf(house.folder)).toEqual([]);
  });

  it('keeps secret, passwords and logs to the account that started it', () => {
    expect(modeOf(path.join(house.data, 'secret'))).toBe('600');
    expect(modeOf(path.join(house.data, 'database-accounts.json'))).toBe('600');
    expect(modeOf(path.join(house.data, 'logs', 'main.log'))).toBe('600');
    expect(modeOf(house.data)).toMatch(/^7[01]{2}$/);
  });

  it('builds nothing and fills nothing on the second start', async () => {
    const before = house.told().filter((line) => line === 'load').length;
    const begun = Date.now();
    const started = house.start();
    await started.opened();
    expect(Date.now() - begun).toBeLessThan(15_000);
    expect(started.output()).not.toContain('Building');
    expect(house.told().filter((line) => line === 'load')).toHaveLength(before);
    await close(started);
  });

  it('refuses to make an empty house of one with the demonstration', async () => {
    const started = house.start({ args: ['--empty'] });
    expect(await started.ended()).toBe(1);
    expect(started.output()).toContain('already holds the demonstration');
  });

  it('starts a killed API and a killed database again', async () => {
    const started = house.start();
    await started.opened();
    const first = await pidOfApi(house);
    process.kill(first, 'SIGKILL');
    await expect.poll(() => pidOfApi(house).catch(() => first), { timeout: 10_000 }).not.toBe(first);
    const database = Number(fs.readFileSync(path.join(house.data, 'database', 'mariadbd.pid'), 'utf8'));
    process.kill(database, 'SIGKILL');
    await expect
      .poll(() => started.output(), { timeout: 10_000 })
      .toContain('The database stopped unexpectedly');
    const again = () => Number(fs.readFileSync(path.join(house.data, 'database', 'mariadbd.pid'), 'utf8'));
    await expect.poll(again, { timeout: 10_000 }).not.toBe(database);
    expect(await close(started)).toBe(0);
    expect(processesOf(house.folder)).toEqual([]);
  });

  it('takes its services with it when it is killed itself', async () => {
    const started = house.start();
    await started.opened();
    started.child.kill('SIGKILL');
    await started.ended();
    await expect.poll(() => processesOf(house.folder), { timeout: 15_000 }).toEqual([]);
  });

  it('closes when the npm that started it is stopped', async () => {
    const started = house.start({ byNpm: true });
    await started.opened();
    started.child.kill('SIGTERM');
    await expect.poll(() => started.output(), { timeout: 10_000 }).toContain('Ellwand is closed.');
    await started.ended();
    expect(processesOf(house.folder)).toEqual([]);
  });

  it('refuses a second start from the same folder', async () => {
    const started = house.start();
    await started.opened();
    const second = house.start({ env: { ELLWAND_PORT: String(house.port + 1) } });
    expect(await second.ended()).toBe(1);
    expect(second.output()).toContain(`Ellwand already runs from ${house.data}`);
    expect(await pidOfApi(house)).toBeGreaterThan(0);
    await close(started);
  });

  it('builds again what was changed, and only that', async () => {
    fs.appendFileSync(path.join(house.folder, 'api', 'src', 'main.js'), '\n// changed\n');
    const stamp = path.join(house.folder, 'site', 'dist', '.built-from');
    const before = fs.statSync(stamp).mtimeMs;
    const started = house.start();
    await started.opened();
    expect(fs.readFileSync(path.join(house.folder, 'api', 'dist', 'main.js'), 'utf8')).toContain(
      '// changed',
    );
    expect(fs.statSync(stamp).mtimeMs).toBe(before);
    await close(started);
  });
});

describe('npm start, refused', () => {
  let house: StandInHouse;

  beforeAll(async () => {
    house = await makeStandInHouse();
  });

  afterAll(() => house.remove());

  it('names a busy port and how to choose another', async () => {
    const occupant = net.createServer().listen(house.port, '127.0.0.1');
    const started = house.start();
    expect(await started.ended()).toBe(1);
    occupant.close();
    expect(started.output().trim()).toBe(
      `Port ${house.port} is in use by another program: stop it, or choose another port with ELLWAND_PORT=${house.port + 1000 <= 65_535 ? house.port + 1000 : house.port - 1000}.`,
    );
  });

  it('names a data folder that cannot be made', async () => {
    const started = house.start({ env: { ELLWAND_DATA: '/proc/ellwand' } });
    expect(await started.ended()).toBe(1);
    expect(started.output().trim()).toBe('This account may not write to /proc/ellwand (ENOENT).');
  });

  it('names a Node that is too old, before it reads anything else', () => {
    const older = `Object.defineProperty(process, 'versions', { value: { ...process.versions, node: '18.20.4' } })`;
    const { status, stderr } = spawnSync(
      process.execPath,
      ['--import', `data:text/javascript,${encodeURIComponent(older)}`, 'api/ops/start.mjs'],
      { cwd: house.folder, encoding: 'utf8' },
    );
    expect(status).toBe(1);
    expect(stderr.trim()).toBe('Ellwand needs Node 20.19 or newer; this is Node 18.20.4.');
  });

  it('names an option it does not know', async () => {
    const started = house.start({ args: ['--emtpy'] });
    expect(await started.ended()).toBe(1);
    expect(started.output().trim()).toBe(
      '--emtpy is not an option of npm start. Usage: npm start [-- --empty]',
    );
  });

  it('shows what the API had to say when it does not start, and stops the database again', async () => {
    const started = house.start({
      args: ['--empty'],
      env: { STAND_IN_FAULT: 'ELLWAND_TRUST_PROXY: not an address' },
    });
    expect(await started.ended()).toBe(1);
    expect(started.output()).toContain('ELLWAND_TRUST_PROXY: not an address');
    expect(started.output()).toContain('The API did not start');
    expect(processesOf(house.folder)).toEqual([]);
  });

  it('opens an empty house with a one-time address and no demonstration', async () => {
    const started = house.start({ args: ['--empty'] });
    await started.opened();
    expect(started.output()).toContain(`http://127.0.0.1:${house.port}/workroom/first?once=abc`);
    expect(house.told()).not.toContain('load');
    expect(await close(started)).toBe(0);
  });
});

describe('an interrupted first filling', () => {
  it('is started over from empty schemas', async () => {
    const house = await makeStandInHouse();
    fs.mkdirSync(house.data, { recursive: true });
    fs.writeFileSync(path.join(house.data, 'break-load'), '');
    const broken = house.start();
    expect(await broken.ended()).toBe(1);
    expect(broken.output()).toContain('Filling the demonstration failed.');

    const database = ['api/ops/database.mjs', 'start', '--data', house.data];
    const { socket } = JSON.parse(
      execFileSync(process.execPath, database, { cwd: house.folder, encoding: 'utf8' }),
    ) as {
      socket: string;
    };
    const client = ['--no-defaults', `--socket=${socket}`, '--batch', '--skip-column-names'];
    execFileSync('mariadb', [...client, '--execute=CREATE TABLE ellwand.half_done (id INT)']);

    fs.rmSync(path.join(house.data, 'break-load'));
    const whole = house.start();
    await whole.opened();
    const tables = execFileSync('mariadb', [...client, '--execute=SHOW TABLES FROM ellwand'], {
      encoding: 'utf8',
    });
    expect(tables).toBe('');
    expect(house.told()).toContain('load');
    expect(await close(whole)).toBe(0);
    await house.remove();
  });
});
