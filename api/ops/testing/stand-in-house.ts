/**
 * A house small enough to start in a second: the real operations scripts and a real MariaDB around stand-ins
 * for the built applications. It proves starting and stopping, not what is served.
 */
import { spawn, type ChildProcess } from 'node:child_process';
import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { freePort } from '../lib/ports.mjs';

const OPS = path.resolve(import.meta.dirname, '..');

/** The stand-ins of `api/dist`, by file name. Each leaves a line in `told.txt` of the data folder. */
const scripts = {
  'database/migrate.js': `tell('migrate as ' + process.env.ELLWAND_DB_OWNER_USER);`,
  'demonstration/load.js': `
    if (fs.existsSync(path.join(process.env.ELLWAND_DATA, 'break-load'))) process.exit(3);
    fs.writeFileSync(path.join(process.env.ELLWAND_DATA, 'demonstration.json'), '{}');
    console.log('1 of 1 garments measured');
    tell('load');`,
  'auth/first-administrator.js': `console.log(process.env.ELLWAND_PUBLIC_URL + '/workroom/first?once=abc');`,
  'mail/drop.js': `serve(process.env.ELLWAND_MAIL_DROP_HTTP_PORT, 'mail');`,
  'main.js': `
    if (process.env.STAND_IN_FAULT) { console.error(process.env.STAND_IN_FAULT); process.exit(1); }
    serve(process.env.ELLWAND_PORT, 'api');`,
} as const;

/** Shared by all stand-ins. On SIGTERM the API asks whether the database still answers, as a drain would need. */
const preamble = `
  const fs = require('node:fs'), http = require('node:http'), net = require('node:net'), path = require('node:path');
  const tell = (line) => fs.appendFileSync(path.join(process.env.ELLWAND_DATA, 'told.txt'), line + '\\n');
  function serve(port, name) {
    http.createServer((request, answer) => answer.end(String(process.pid))).listen(Number(port), '127.0.0.1');
    tell(name + ' up');
    process.on('SIGTERM', () => {
      const database = net.connect(Number(process.env.ELLWAND_DB_PORT), '127.0.0.1');
      database.on('connect', () => { tell(name + ' down, database up'); process.exit(0); });
      database.on('error', () => { tell(name + ' down, database gone'); process.exit(0); });
    });
  }
`;

export interface StandInHouse {
  readonly folder: string;
  readonly data: string;
  readonly port: number;
  /** Runs `start.mjs`, by itself or as `npm start`, until it ends or is stopped. */
  start(options?: { args?: string[]; env?: NodeJS.ProcessEnv; byNpm?: boolean }): StartedHouse;
  /** Lines that the stand-ins have left, in order. */
  told(): string[];
  /** Ends what still runs and removes the folder. */
  remove(): Promise<void>;
}

export interface StartedHouse {
  readonly child: ChildProcess;
  output(): string;
  /** Resolves once addresses are printed; rejects with the output where the script ends before. */
  opened(): Promise<void>;
  /** Resolves to the exit code. */
  ended(): Promise<number | null>;
}

/** Makes a stand-in house in the temporary folder, with a free port of its own. */
export async function makeStandInHouse(): Promise<StandInHouse> {
  const folder = fs.mkdtempSync(path.join(os.tmpdir(), 'ellwand-ops-'));
  fs.chmodSync(folder, 0o755);
  const data = path.join(folder, '.data');
  const port = await freePort();
  fs.cpSync(OPS, path.join(folder, 'api', 'ops'), { recursive: true });
  writeWorkspaces(folder);
  const started: StartedHouse[] = [];
  return {
    folder,
    data,
    port,
    start: ({ args = [], env = {}, byNpm = false } = {}) => {
      const command = byNpm
        ? ['npm', 'start', '--', ...args]
        : [process.execPath, 'api/ops/start.mjs', ...args];
      const house = startIn(folder, command, { ELLWAND_PORT: String(port), ...env });
      started.push(house);
      return house;
    },
    told: () => linesOf(path.join(data, 'told.txt')),
    remove: async () => {
      for (const house of started) {
        house.child.kill('SIGTERM');
        await house.ended();
      }
      fs.rmSync(folder, { recursive: true, force: true });
    },
  };
}

function writeWorkspaces(folder: string): void {
  const workspaces = ['shared', 'api', 'site', 'admin'];
  write(
    folder,
    'package.json',
    JSON.stringify({
      name: 'stand-in',
      private: true,
      workspaces,
      scripts: { start: 'node api/ops/start.mjs' },
    }),
  );
  for (const name of workspaces) {
    const build = name === 'api' ? 'cp -r src dist' : 'mkdir dist && cp package.json dist';
    write(folder, `${name}/package.json`, JSON.stringify({ name, version: '0.0.0', scripts: { build } }));
  }
  for (const [name, text] of Object.entries(scripts)) write(folder, `api/src/${name}`, preamble + text);
}

function write(folder: string, name: string, text: string): void {
  const file = path.join(folder, name);
  fs.mkdirSync(path.dirname(file), { recursive: true });
  fs.writeFileSync(file, text);
}

function startIn(folder: string, [program = '', ...args]: string[], env: NodeJS.ProcessEnv): StartedHouse {
  const child = spawn(program, args, {
    cwd: folder,
    env: { ...withoutSettings(process.env), ...env },
  });
  let output = '';
  const ended = new Promise<number | null>((resolve) => {
    child.on('close', (code) => {
      resolve(code);
    });
  });
  const opened = new Promise<void>((resolve, reject) => {
    const keep = (chunk: Buffer) => {
      output += chunk.toString();
      if (output.includes('Ellwand is open')) resolve();
    };
    child.stdout.on('data', keep);
    child.stderr.on('data', keep);
    void ended.then(() => {
      reject(new Error(`ended before it was open:\n${output}`));
    });
  });
  opened.catch(() => undefined);
  return { child, output: () => output, opened: () => opened, ended: () => ended };
}

/** The tests' own settings, as those of `npm test`, do not reach the house. */
function withoutSettings(env: NodeJS.ProcessEnv): NodeJS.ProcessEnv {
  return Object.fromEntries(Object.entries(env).filter(([name]) => !/^(ELLWAND_|npm_)/.test(name)));
}

function linesOf(file: string): string[] {
  return fs.existsSync(file) ? fs.readFileSync(file, 'utf8').trimEnd().split('\n') : [];
}
