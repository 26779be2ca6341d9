import { execFileSync, spawnSync } from 'node:child_process';
import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { grantStatements, roles, type Role } from './lib/grants.mjs';

interface Started {
  port: number;
  socket: string;
  pid: number;
  accounts: Record<Role, { user: string; password: string; grants: string[] }>;
}

const script = path.join(import.meta.dirname, 'database.mjs');

function database(...args: string[]) {
  return spawnSync(process.execPath, [script, ...args], { encoding: 'utf8' });
}

function start(data: string): Started {
  const { status, stdout, stderr } = database('start', '--data', data);
  if (status !== 0) throw new Error(stderr);
  return JSON.parse(stdout) as Started;
}

/** Asks as an account over TCP, as the API does. */
function ask({ port, accounts }: Started, role: Role, sql: string) {
  const { user, password } = accounts[role];
  return spawnSync(
    'mariadb',
    ['--no-defaults', '-h127.0.0.1', `-P${port}`, `-u${user}`, `-p${password}`, '-BNr', '-e', sql],
    { encoding: 'utf8' },
  );
}

/** Asks as the server's administrator over the socket. */
function administer({ socket }: Started, sql: string): string {
  return execFileSync('mariadb', ['--no-defaults', `--socket=${socket}`, '-BNr', '-e', sql], {
    encoding: 'utf8',
  }).trim();
}

function grantsOf(started: Started, role: Role): string[] {
  const lines = ask(started, role, 'SHOW GRANTS').stdout.trim().split('\n');
  return lines.filter((line) => !line.startsWith('GRANT USAGE ON *.*')).sort();
}

function folderBelow(parent: string): string {
  return fs.mkdtempSync(path.join(parent, 'ellwand-db-'));
}

describe('the embedded database', () => {
  let data: string;
  let started: Started;

  beforeAll(() => {
    const folder = folderBelow(os.tmpdir());
    fs.chmodSync(folder, 0o755);
    data = path.join(folder, 'data');
    started = start(data);
  });

  afterAll(() => {
    database('stop', '--data', data);
    fs.rmSync(path.dirname(data), { recursive: true });
  });

  it.each(roles)('gives the account %s its written grants, and no other', (role) => {
    expect(grantsOf(started, role)).toEqual([...grantStatements(role)].sort());
    expect(grantsOf(started, role)).toEqual([...started.accounts[role].grants].sort());
  });

  it('takes a stray grant back at the next start, and keeps the passwords', () => {
    administer(started, "GRANT ALL PRIVILEGES ON *.* TO 'ellwand_catalogue'@'127.0.0.1'");
    const before = started.accounts;
    started = start(data);
    expect(started.accounts).toEqual(before);
    expect(grantsOf(started, 'catalogue')).toEqual(grantStatements('catalogue'));
  });

  it("lets the catalogue's account neither read a draft nor write a published copy", () => {
    administer(started, 'CREATE TABLE ellwand.draft (id INT); CREATE TABLE ellwand_catalogue.copy (id INT)');
    expect(ask(started, 'catalogue', 'SELECT * FROM ellwand_catalogue.copy').status).toBe(0);
    expect(ask(started, 'catalogue', 'SELECT * FROM ellwand.draft').stderr).toContain('denied');
    expect(ask(started, 'catalogue', 'INSERT INTO ellwand_catalogue.copy VALUES (1)').stderr).toContain(
      'denied',
    );
  });

  it("lets the Workroom's account write into the audit trail, and change nothing there", () => {
    administer(started, 'CREATE TABLE ellwand_audit.entry (id INT)');
    expect(ask(started, 'workroom', 'INSERT INTO ellwand_audit.entry VALUES (1)').status).toBe(0);
    for (const sql of [
      'UPDATE ellwand_audit.entry SET id = 2',
      'DELETE FROM ellwand_audit.entry',
      'TRUNCATE ellwand_audit.entry',
      'DROP TABLE ellwand_audit.entry',
      'ALTER TABLE ellwand.draft ADD note TEXT',
    ]) {
      expect(ask(started, 'workroom', sql).stderr, sql).toContain('denied');
    }
  });

  it('does not take the underscore of a schema for any letter', () => {
    administer(started, 'CREATE DATABASE ellwandXcatalogue; CREATE TABLE ellwandXcatalogue.secret (id INT)');
    expect(ask(started, 'catalogue', 'SELECT * FROM ellwandXcatalogue.secret').stderr).toContain('denied');
  });

  it('writes every commit to the disk, speaks utf8mb4 and UTC, and listens on loopback alone', () => {
    expect(
      administer(
        started,
        'SELECT @@innodb_flush_log_at_trx_commit, @@character_set_server, @@time_zone, @@bind_address, @@local_infile',
      ),
    ).toBe('1\tutf8mb4\t+00:00\t127.0.0.1\t0');
  });

  it('makes further sets of schemas for the same accounts', () => {
    expect(database('schemas', '--data', data, '--suffix', '_w1').status).toBe(0);
    expect(ask(started, 'owner', 'CREATE TABLE ellwand_w1.sheet (id INT)').status).toBe(0);
    expect(ask(started, 'catalogue', 'SELECT * FROM ellwand_w1.sheet').stderr).toContain('denied');
    expect(database('schemas', '--data', data, '--suffix', '`; DROP').status).toBe(1);
  });

  it('keeps what was committed when it is killed', () => {
    ask(started, 'workroom', 'INSERT INTO ellwand.draft VALUES (7)');
    process.kill(started.pid, 'SIGKILL');
    started = start(data);
    expect(administer(started, 'SELECT id FROM ellwand.draft')).toBe('7');
  });

  it('stops, and a second stop finds nothing to do', () => {
    expect(database('stop', '--data', data).status).toBe(0);
    expect(fs.existsSync(started.socket)).toBe(false);
    expect(database('stop', '--data', data).status).toBe(0);
    started = start(data);
  });
});

describe('a data folder in an awkward place', () => {
  it('may have a path too long for a socket, which then lies in the temporary folder', () => {
    const folder = folderBelow(os.tmpdir());
    fs.chmodSync(folder, 0o755);
    const data = path.join(folder, 'a-long-name-'.repeat(8), 'data');
    const { socket } = start(data);
    expect(socket.startsWith(path.join(os.tmpdir(), 'ellwand-'))).toBe(true);
    expect(Buffer.byteLength(socket)).toBeLessThanOrEqual(100);
    expect(database('stop', '--data', data).status).toBe(0);
    fs.rmSync(folder, { recursive: true });
    fs.rmSync(path.dirname(socket), { recursive: true, force: true });
  });

  it('may be closed to the account mysql: the server then runs as who started it, and says so to root', () => {
    const folder = folderBelow(os.tmpdir());
    fs.chmodSync(folder, 0o700);
    const data = path.join(folder, 'data');
    const { status, stdout, stderr } = database('start', '--data', data);
    const { pid } = JSON.parse(stdout) as Started;
    expect(status).toBe(0);
    expect(fs.statSync(`/proc/${pid}`).uid).toBe(process.getuid?.());
    expect(stderr.includes('the database server runs as root instead')).toBe(process.getuid?.() === 0);
    expect(database('stop', '--data', data).status).toBe(0);
    fs.rmSync(folder, { recursive: true });
  });

  it('belongs to who made it: another account is told so', () => {
    const folder = folderBelow(os.tmpdir());
    fs.mkdirSync(path.join(folder, 'database', 'files'), { recursive: true });
    // Root alone can give a folder away; for everyone else, root's own folder is the other account's.
    const data = process.getuid?.() === 0 ? folder : '/';
    if (process.getuid?.() === 0) fs.chownSync(path.join(folder, 'database', 'files'), 65_533, 65_533);
    const { status, stderr } = database('start', '--data', data);
    expect(status).toBe(1);
    expect(stderr).toMatch(/was made by another account \(user id 65533\)|may not write/);
    fs.rmSync(folder, { recursive: true });
  });
});

describe('the command line', () => {
  it.each([[], ['start'], ['stop', '--datta', 'x'], ['begin', '--data', 'x']])(
    'explains itself for %j',
    (...args) => {
      const { status, stderr } = database(...args);
      expect(status).toBe(1);
      expect(stderr).toMatch(/^Usage: node api\/ops\/database\.mjs/);
    },
  );
});
