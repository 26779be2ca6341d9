// @ts-check
import { PlainFailure } from './plain-failure.mjs';
import { pause } from './programs.mjs';

/** @typedef {import('node:child_process').ChildProcess} ChildProcess */

/**
 * @typedef {object} Service
 * @property {string} name as it stands in messages
 * @property {() => Promise<ChildProcess>} launch resolves once the service answers
 * @property {number} stopWithinMs after this a stop becomes a kill
 */

/** Three deaths within a minute are no accident: a fourth start would not help. */
const MOST_RESTARTS = 3;
const WITHIN_MS = 60_000;
const REST_MS = 250;

/**
 * Keeps one service running: starts it again when it dies, until it dies too often.
 */
export class Supervised {
  /** @type {ChildProcess | undefined} */
  #child;
  #stopping = false;
  /** @type {number[]} */
  #deaths = [];

  /**
   * @param {Service} service
   * @param {(failure: unknown) => void} giveUp called once, when starting again no longer helps
   * @param {(line: string) => void} [say]
   */
  constructor(service, giveUp, say = console.error) {
    this.service = service;
    this.giveUp = giveUp;
    this.say = say;
  }

  /** Starts the service; rejects where the first start fails. */
  async start() {
    this.#child = await this.service.launch();
    if (hasEnded(this.#child)) void this.#startAgain();
    else this.#child.once('exit', () => void this.#startAgain());
  }

  /** Stops the service and resolves once its process is gone. */
  async stop() {
    this.#stopping = true;
    const child = this.#child;
    if (child) await endProcess(child, this.service.stopWithinMs);
  }

  async #startAgain() {
    if (this.#stopping) return;
    const { name } = this.service;
    const now = Date.now();
    this.#deaths = [...this.#deaths.filter((death) => now - death < WITHIN_MS), now];
    if (this.#deaths.length > MOST_RESTARTS) {
      this.giveUp(
        new PlainFailure(`${name} stopped ${this.#deaths.length} times within a minute: Ellwand closes.`),
      );
      return;
    }
    this.say(`${name} stopped unexpectedly and is started again.`);
    await pause(REST_MS);
    if (this.#stopping) return;
    try {
      await this.start();
      // A stop that came while the service was starting found no process yet.
      if (this.#stopping) await this.stop();
    } catch (failure) {
      this.giveUp(failure);
    }
  }
}

/**
 * Asks a process to end, kills it when it does not, and resolves once it is gone.
 * @param {ChildProcess} child
 * @param {number} withinMs
 * @returns {Promise<void>}
 */
export async function endProcess(child, withinMs) {
  if (hasEnded(child)) return;
  const gone = new Promise((resolve) => child.once('exit', resolve));
  child.kill('SIGTERM');
  const kill = setTimeout(() => child.kill('SIGKILL'), withinMs);
  await gone;
  clearTimeout(kill);
}

/** @param {ChildProcess} child */
export function hasEnded(child) {
  return child.exitCode !== null || child.signalCode !== null;
}
