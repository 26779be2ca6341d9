// @ts-check
import path from 'node:path';
import { plainEnvironment, run } from '../programs.mjs';
import { lastOf } from './outcome.mjs';

/** A drill that hangs ends here, and counts as failed. */
const LONGEST_MS = 5 * 60_000;
const ROUNDS = 10;

/**
 * A few rounds of `npm run drill:offline`: what was typed at the table against what the database has kept.
 * @param {string} root
 * @param {string[]} after
 * @returns {import('./outcome.mjs').Runner}
 */
export function drillRunner(root, after) {
  return {
    name: 'drill (offline)',
    after,
    async work() {
      const script = path.join(root, 'api', 'ops', 'drills', 'offline', 'run.ts');
      const tsx = path.join(root, 'node_modules', '.bin', 'tsx');
      const { code, output } = await run(tsx, [script, '--rounds', String(ROUNDS)], {
        cwd: root,
        env: plainEnvironment({}),
        timeoutMs: LONGEST_MS,
      });
      if (code === 0 && output.includes(`${ROUNDS} rounds: 0 lost, 0 doubled`))
        return { passed: ROUNDS, failures: [] };
      return {
        passed: 0,
        failures: [{ test: `${ROUNDS} rounds of the offline drill`, message: lastOf(output) }],
      };
    },
  };
}
