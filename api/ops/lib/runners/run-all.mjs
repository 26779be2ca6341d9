// @ts-check
import { runTasks } from '../tasks.mjs';
import { outcomeOf } from './outcome.mjs';
import { isGreen, outcomeLine, summary } from './summary.mjs';

/** Two cores are what Ellwand asks for; more at once would make slow tests slower still. */
const AT_ONCE = 2;

/**
 * Runs all runners, two at a time, and prints how each ended and the summary.
 * @param {readonly import('./outcome.mjs').Runner[]} runners in the order of the table
 * @returns {Promise<boolean>} whether everything passed and every runner ran something
 */
export async function runAll(runners) {
  /** @type {Map<string, import('./outcome.mjs').RunnerOutcome>} */
  const ended = new Map();
  await runTasks(
    runners.map((runner) => ({
      name: runner.name,
      after: runner.after,
      async work() {
        const outcome = await outcomeOf(runner);
        ended.set(runner.name, outcome);
        console.log(outcomeLine(outcome));
      },
    })),
    AT_ONCE,
  );
  const outcomes = runners.flatMap(({ name }) => ended.get(name) ?? []);
  console.log(summary(outcomes));
  return isGreen(outcomes);
}
