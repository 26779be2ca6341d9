// @ts-check
import { spawn, spawnSync } from 'node:child_process';
import fs from 'node:fs';
import path from 'node:path';

/**
 * @typedef {object} Outcome
 * @property {number} code exit code; 1 where a signal ended it, 127 where it could not be run
 * @property {string} output stdout and stderr as they came
 */

/**
 * Finds a program on PATH or among the system's own, where Debian keeps servers out of a person's PATH.
 * @param {string} name
 * @returns {string | undefined} absolute path
 */
export function findProgram(name) {
  const folders = [...(process.env['PATH'] ?? '').split(path.delimiter), '/usr/sbin', '/sbin', '/usr/bin'];
  return folders
    .filter((folder) => folder !== '')
    .map((folder) => path.join(folder, name))
    .find(isExecutable);
}

/** @param {string} file */
function isExecutable(file) {
  try {
    fs.accessSync(file, fs.constants.X_OK);
    return fs.statSync(file).isFile();
  } catch {
    return false;
  }
}

/**
 * This process's environment for tools whose output is kept and shown again: without the colours of a terminal.
 * @param {NodeJS.ProcessEnv} [more]
 * @returns {NodeJS.ProcessEnv}
 */
export function plainEnvironment(more = {}) {
  const kept = Object.entries(process.env).filter(([name]) => name !== 'FORCE_COLOR');
  return { ...Object.fromEntries(kept), NO_COLOR: '1', ...more };
}

/** @type {Set<import('node:child_process').ChildProcess>} */
const runningPrograms = new Set();

/** Asks every program that `run` waits for to end; their callers see them fail. */
export function stopRunningPrograms() {
  for (const child of runningPrograms) child.kill('SIGTERM');
}

/**
 * Runs a program to its end and keeps what it says.
 * @param {string} program
 * @param {readonly string[]} args
 * @param {{ cwd?: string, env?: NodeJS.ProcessEnv, input?: string, uid?: number, gid?: number,
 *           timeoutMs?: number, onOutput?: (text: string) => void }} [options] after `timeoutMs` the program is killed;
 *   `onOutput` hears what it says while it says it
 * @returns {Promise<Outcome>}
 */
export function run(program, args, { input, timeoutMs, onOutput, ...options } = {}) {
  return new Promise((resolve) => {
    const child = spawn(program, args, {
      ...options,
      timeout: timeoutMs,
      killSignal: 'SIGKILL',
      stdio: ['pipe', 'pipe', 'pipe'],
    });
    runningPrograms.add(child);
    let output = '';
    const keep = (/** @type {Buffer} */ chunk) => {
      output += chunk.toString();
      onOutput?.(chunk.toString());
    };
    child.stdout.on('data', keep);
    child.stderr.on('data', keep);
    // A child that ends before it has read its input is reported by its exit code, not by a broken pipe.
    child.stdin.on('error', () => {});
    const end = (/** @type {Outcome} */ outcome) => {
      runningPrograms.delete(child);
      resolve(outcome);
    };
    child.on('error', (error) => end({ code: 127, output: `${output}${error.message}\n` }));
    child.on('close', (code) => end({ code: code ?? 1, output }));
    child.stdin.end(input ?? '');
  });
}

/**
 * The first line a program prints, or undefined where it fails.
 * @param {string} program
 * @param {readonly string[]} args
 * @returns {string | undefined}
 */
export function firstLineOf(program, args) {
  const { status, stdout } = spawnSync(program, args, { encoding: 'utf8' });
  return status === 0 ? stdout.split('\n')[0] : undefined;
}

/**
 * @param {number} ms
 * @returns {Promise<void>}
 */
export function pause(ms) {
  return new Promise((resolve) => setTimeout(resolve, ms));
}

/**
 * The last lines of a file, for a message about what went wrong.
 * @param {string} file
 * @param {number} [lines]
 */
export function tailOf(file, lines = 15) {
  if (!fs.existsSync(file)) return '';
  return fs.readFileSync(file, 'utf8').trimEnd().split('\n').slice(-lines).join('\n');
}

/**
 * @param {number} pid
 * @returns {boolean} whether a process of this id exists and has not ended (a zombie has)
 */
export function isAlive(pid) {
  try {
    return !/^State:\s+Z/m.test(fs.readFileSync(`/proc/${pid}/status`, 'utf8'));
  } catch {
    return false;
  }
}
