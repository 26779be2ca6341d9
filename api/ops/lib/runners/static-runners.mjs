// @ts-check
import path from 'node:path';
import { plainEnvironment, run } from '../programs.mjs';
import { oneTest } from './outcome.mjs';

/** @typedef {import('./outcome.mjs').Runner} Runner */

/** Folders with a tsconfig.json of their own: the workspaces, these scripts, and what stands at the root. */
const TYPED = ['shared', 'api', 'api/ops', 'site', 'admin', 'media-samples', '.'];

/** A linter that knows types reads the whole house more than once: the small heap of Node is not enough. */
const LINT_HEAP = '--max-old-space-size=4096';

/**
 * @param {string} root
 * @returns {Runner[]}
 */
export function typeRunners(root) {
  return [
    {
      name: 'types (tsc)',
      after: [],
      async work() {
        /** @type {import('./outcome.mjs').Failure[]} */
        const failures = [];
        for (const folder of TYPED) {
          const ended = await runTool(root, 'tsc', ['--noEmit', '-p', folder]);
          failures.push(...oneTest(`types of ${folder}`, ended).failures);
        }
        return { passed: TYPED.length - failures.length, failures };
      },
    },
  ];
}

/**
 * @param {string} root
 * @returns {Runner[]}
 */
export function lintRunners(root) {
  return [
    {
      name: 'lint (eslint)',
      after: [],
      work: async () => oneTest('lint', await runTool(root, 'eslint', ['.', '--max-warnings', '0'])),
    },
    {
      name: 'format (prettier)',
      after: [],
      work: async () =>
        oneTest('format', await runTool(root, 'prettier', ['--check', '--log-level', 'warn', '.'])),
    },
  ];
}

/**
 * @param {string} root
 * @param {string} name of the tool in node_modules/.bin
 * @param {readonly string[]} args
 */
function runTool(root, name, args) {
  const env = plainEnvironment({ NODE_OPTIONS: LINT_HEAP });
  return run(path.join(root, 'node_modules', '.bin', name), args, { cwd: root, env });
}
