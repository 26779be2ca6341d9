// @ts-check
/**
 * The embedded MariaDB: one server for one data folder, on loopback, made of Debian's package alone.
 */
import { spawn } from 'node:child_process';
import { createHash } from 'node:crypto';
import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { PlainFailure } from './plain-failure.mjs';
import { makePrivateFolder } from './private-files.mjs';
import { findProgram, isAlive, pause, run, tailOf } from './programs.mjs';
import { settleServerIdentity } from './server-identity.mjs';

/** A Unix socket's path holds 108 bytes (unix(7)); MariaDB fails somewhat earlier. */
const LONGEST_SOCKET_PATH = 100;
/** Recovery after a power cut replays the log before the server answers. */
const READY_WITHIN_MS = 120_000;
/** A clean stop writes all changed pages first. */
const STOPPED_WITHIN_MS = 60_000;
const POLL_MS = 50;

/**
 * Where a server keeps its things.
 * @typedef {object} Places
 * @property {string} folder
 * @property {string} files the server's data folder
 * @property {string} socket
 * @property {string} pidFile
 * @property {string} log
 */

/**
 * @typedef {object} RunningDatabase
 * @property {number} port on 127.0.0.1
 * @property {string} socket
 * @property {number} pid
 * @property {import('node:child_process').ChildProcess} child
 * @property {string} [remark] a sentence worth printing, as whom the server runs
 */

/**
 * @param {string} dataFolder
 * @returns {Places}
 */
export function databasePlaces(dataFolder) {
  const folder = path.join(path.resolve(dataFolder), 'database');
  return {
    folder,
    files: path.join(folder, 'files'),
    socket: path.join(socketFolder(folder), 'mariadbd.sock'),
    pidFile: path.join(folder, 'mariadbd.pid'),
    log: path.join(folder, 'mariadbd.log'),
  };
}

/** @param {string} folder */
function socketFolder(folder) {
  if (Buffer.byteLength(path.join(folder, 'mariadbd.sock')) <= LONGEST_SOCKET_PATH) return folder;
  const name = createHash('sha256').update(folder).digest('hex').slice(0, 16);
  return path.join(os.tmpdir(), `ellwand-${name}`);
}

/**
 * Starts the server, making its files first where there are none, and resolves once it answers.
 * @param {{ dataFolder: string, port: number, outliveParent?: boolean }} options
 *   `outliveParent`: leave the server running when this process ends; otherwise it is stopped with it,
 *   even by kill -9
 * @returns {Promise<RunningDatabase>}
 */
export async function startDatabase({ dataFolder, port, outliveParent = false }) {
  makePrivateFolder(dataFolder);
  const places = databasePlaces(dataFolder);
  makePrivateFolder(places.folder);
  await stopDatabase(dataFolder);
  const identity = settleServerIdentity(places.folder);
  prepareSocketFolder(places, identity);
  if (!fs.existsSync(path.join(places.files, 'mysql'))) await makeFiles(places, identity);
  const child = spawnServer(places, identity, port, outliveParent);
  await untilAnswering(places, child);
  return { port, socket: places.socket, pid: child.pid ?? 0, child, remark: identity.remark };
}

/**
 * Stops the server of a data folder, if one runs, and resolves once it is gone.
 * @param {string} dataFolder
 * @returns {Promise<void>}
 */
export async function stopDatabase(dataFolder) {
  const places = databasePlaces(dataFolder);
  const pid = runningServer(places);
  if (pid === undefined) return;
  process.kill(pid, 'SIGTERM');
  const deadline = Date.now() + STOPPED_WITHIN_MS;
  while (isAlive(pid)) {
    if (Date.now() > deadline) process.kill(pid, 'SIGKILL');
    await pause(POLL_MS);
  }
}

/**
 * The id of the server process of this folder. A process id is used again by the system sooner or later, so
 * the process must also bear this folder's name.
 * @param {Places} places
 * @returns {number | undefined}
 */
export function runningServer(places) {
  try {
    const pid = Number(fs.readFileSync(places.pidFile, 'utf8').trim());
    const command = fs.readFileSync(`/proc/${pid}/cmdline`, 'utf8').split('\0');
    return command.includes(`--datadir=${places.files}`) ? pid : undefined;
  } catch {
    return undefined;
  }
}

/**
 * Runs statements as the server's own administrator, over the socket.
 * @param {string} dataFolder
 * @param {readonly string[]} statements
 * @returns {Promise<string>} what the client printed, tab-separated, without headings
 */
export async function runAsAdministrator(dataFolder, statements) {
  const { socket } = databasePlaces(dataFolder);
  const { code, output } = await run(
    program('mariadb'),
    [...clientFlags(socket), '--batch', '--skip-column-names'],
    {
      input: statements.map((statement) => `${statement};\n`).join(''),
    },
  );
  if (code !== 0)
    throw new PlainFailure('The database refused a statement of its set-up.', { detail: output });
  return output;
}

/** @param {string} socket */
function clientFlags(socket) {
  const user = os.userInfo().username;
  return ['--no-defaults', `--socket=${socket}`, `--user=${user}`, '--default-character-set=utf8mb4'];
}

/**
 * @param {Places} places
 * @param {import('./server-identity.mjs').ServerIdentity} identity
 */
function prepareSocketFolder(places, identity) {
  const folder = path.dirname(places.socket);
  if (folder === places.folder) return;
  makePrivateFolder(folder);
  const wanted = identity.uid ?? process.getuid?.() ?? 0;
  const owner = fs.statSync(folder).uid;
  if (owner !== wanted && owner !== process.getuid?.()) {
    throw new PlainFailure(`${folder} belongs to another account: remove it, then start again.`);
  }
  if (owner !== wanted) fs.chownSync(folder, wanted, identity.gid ?? 0);
}

/**
 * @param {Places} places
 * @param {import('./server-identity.mjs').ServerIdentity} identity
 */
async function makeFiles(places, { uid, gid, flags }) {
  const { code, output } = await run(
    program('mariadb-install-db'),
    [
      '--no-defaults',
      ...flags,
      `--datadir=${places.files}`,
      '--auth-root-authentication-method=socket',
      `--auth-root-socket-user=${os.userInfo().username}`,
      '--skip-test-db',
    ],
    { uid, gid, cwd: '/' },
  );
  if (code !== 0) throw new PlainFailure('MariaDB could not make its files.', { detail: output });
}

/**
 * @param {Places} places
 * @param {import('./server-identity.mjs').ServerIdentity} identity
 * @param {number} port
 * @param {boolean} outliveParent
 */
function spawnServer(places, { uid, gid, flags }, port, outliveParent) {
  const server = [program('mariadbd'), ...serverFlags(places, port), ...flags];
  // Own process group: Ctrl-C in the terminal reaches the start script alone, which stops the API first.
  const command = outliveParent ? server : [program('setpriv'), '--pdeathsig', 'TERM', ...server];
  const [first = '', ...rest] = command;
  const child = spawn(first, rest, { uid, gid, cwd: '/', detached: true, stdio: 'ignore' });
  if (outliveParent) child.unref();
  return child;
}

/**
 * @param {Places} places
 * @param {number} port
 */
function serverFlags(places, port) {
  return [
    '--no-defaults',
    `--datadir=${places.files}`,
    '--bind-address=127.0.0.1',
    `--port=${port}`,
    `--socket=${places.socket}`,
    `--pid-file=${places.pidFile}`,
    `--log-error=${places.log}`,
    '--character-set-server=utf8mb4',
    '--collation-server=utf8mb4_uca1400_ai_ci',
    '--default-time-zone=+00:00',
    '--skip-name-resolve',
    // Every commit reaches the disk before it is acknowledged; with 2 or 0 a power cut loses what people typed.
    '--innodb-flush-log-at-trx-commit=1',
    '--innodb-buffer-pool-size=256M',
    '--local-infile=0',
  ];
}

/**
 * @param {Places} places
 * @param {import('node:child_process').ChildProcess} child
 */
async function untilAnswering(places, child) {
  const deadline = Date.now() + READY_WITHIN_MS;
  while (!(await answers(places.socket))) {
    if (child.exitCode !== null || child.signalCode !== null || Date.now() > deadline) {
      child.kill('SIGKILL');
      throw new PlainFailure(`MariaDB did not start; its log is ${places.log}.`, {
        detail: tailOf(places.log),
      });
    }
    await pause(POLL_MS);
  }
}

/** @param {string} socket */
async function answers(socket) {
  if (!fs.existsSync(socket)) return false;
  const { code } = await run(program('mariadb'), [...clientFlags(socket), '--execute=SELECT 1']);
  return code === 0;
}

/** @param {string} name */
function program(name) {
  const found = findProgram(name);
  if (!found) throw new PlainFailure(`${name} is missing. Run: sudo apt-get install mariadb-server`);
  return found;
}
