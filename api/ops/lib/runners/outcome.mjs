// @ts-check
import { PlainFailure } from '../plain-failure.mjs';

/**
 * What one runner has to say after its run.
 * @typedef {object} RunnerOutcome
 * @property {string} name
 * @property {number} passed
 * @property {Failure[]} failures one for each failed test; a runner that ran nothing has failed as such
 * @property {number} seconds
 */

/** @typedef {{ test: string, message: string }} Failure */

/**
 * @typedef {object} Runner
 * @property {string} name
 * @property {string[]} after names of runners that must have ended before, whether well or not
 * @property {() => Promise<Omit<RunnerOutcome, 'name' | 'seconds'>>} work
 */

/**
 * Runs a runner; whatever it throws is a failure of its own.
 * @param {Runner} runner
 * @returns {Promise<RunnerOutcome>}
 */
export async function outcomeOf(runner) {
  const begun = Date.now();
  const outcome = await runner.work().catch((error) => broken(error));
  const failures =
    outcome.passed + outcome.failures.length === 0
      ? [{ test: runner.name, message: 'ran no test at all' }]
      : outcome.failures;
  return { name: runner.name, ...outcome, failures, seconds: Math.round((Date.now() - begun) / 1000) };
}

/** @param {unknown} error */
function broken(error) {
  const detail = error instanceof PlainFailure ? (error.detail ?? '') : '';
  const message = error instanceof Error ? error.message : String(error);
  return { passed: 0, failures: [{ test: 'could not run', message: `${detail}\n${message}`.trim() }] };
}

/**
 * The outcome of a tool that knows only good or bad: one test.
 * @param {string} test
 * @param {import('../programs.mjs').Outcome} ended
 * @returns {Omit<RunnerOutcome, 'name' | 'seconds'>}
 */
export function oneTest(test, { code, output }) {
  return code === 0
    ? { passed: 1, failures: [] }
    : { passed: 0, failures: [{ test, message: lastOf(output) || `ended with code ${code}` }] };
}

/** Enough to see what is wrong, not so much that the first failure scrolls away. */
const LONGEST_MESSAGE = 4_000;

/** @param {string} text */
export function lastOf(text) {
  const trimmed = text.trim();
  return trimmed.length <= LONGEST_MESSAGE ? trimmed : `…${trimmed.slice(-LONGEST_MESSAGE)}`;
}
