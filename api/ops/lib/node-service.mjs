// @ts-check
import { spawn } from 'node:child_process';
import fs from 'node:fs';
import path from 'node:path';
import { PlainFailure } from './plain-failure.mjs';
import { findProgram, pause, tailOf } from './programs.mjs';
import { endProcess, hasEnded } from './supervised.mjs';

/** Nest on a busy small machine takes up to ten seconds; a minute and a half is a fault. */
const READY_WITHIN_MS = 90_000;
const ASK_WITHIN_MS = 2_000;
const POLL_MS = 100;

/**
 * @typedef {object} NodeService
 * @property {string} name as it stands in messages
 * @property {string} script absolute
 * @property {string} root working folder
 * @property {NodeJS.ProcessEnv} env
 * @property {string} log file that takes what the process prints; the previous one is kept as .1
 * @property {string} readyUrl answers 200 once the service works
 */

/**
 * Starts a Node script as a service of this process and resolves once it answers.
 * @param {NodeService} service
 * @returns {Promise<import('node:child_process').ChildProcess>}
 */
export async function launchNodeService(service) {
  const child = spawnService(service);
  const deadline = Date.now() + READY_WITHIN_MS;
  while (!(await isReady(service.readyUrl))) {
    if (hasEnded(child) || Date.now() > deadline) {
      await endProcess(child, 0);
      throw new PlainFailure(`${service.name} did not start; its log is ${service.log}.`, {
        detail: tailOf(service.log),
      });
    }
    await pause(POLL_MS);
  }
  return child;
}

/** @param {NodeService} service */
function spawnService({ script, root, env, log }) {
  fs.mkdirSync(path.dirname(log), { recursive: true });
  if (fs.existsSync(log)) fs.renameSync(log, `${log}.1`);
  const output = fs.openSync(log, 'a', 0o600);
  // The kernel stops the service when this process dies, even by kill -9: nothing is left behind.
  const setpriv = findProgram('setpriv');
  const [program = '', ...args] = [
    ...(setpriv ? [setpriv, '--pdeathsig', 'TERM'] : []),
    process.execPath,
    '--enable-source-maps',
    script,
  ];
  // Own process group: Ctrl-C in the terminal reaches the start script alone, which stops all in order.
  const child = spawn(program, args, { cwd: root, env, detached: true, stdio: ['ignore', output, output] });
  fs.closeSync(output);
  return child;
}

/** @param {string} url */
async function isReady(url) {
  try {
    const answer = await fetch(url, { signal: AbortSignal.timeout(ASK_WITHIN_MS) });
    await answer.body?.cancel();
    return answer.ok;
  } catch {
    return false;
  }
}
