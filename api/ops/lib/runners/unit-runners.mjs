// @ts-check
import os from 'node:os';
import path from 'node:path';
import { readJsonIfThere } from '../private-files.mjs';
import { plainEnvironment, run } from '../programs.mjs';
import { countJestReport, isJestReport } from './jest-report.mjs';
import { lastOf } from './outcome.mjs';

/** @typedef {import('./outcome.mjs').Runner} Runner */

/** Two runners share the machine. */
const WORKERS = Math.max(1, Math.floor(os.availableParallelism() / 2));
/** A runner that hangs ends here, and counts as failed. */
const LONGEST_MS = 12 * 60_000;

/** Folders whose tests vitest runs. */
const VITEST = ['shared', 'site', 'admin', 'media-samples', 'api/ops'];

/**
 * @param {string} root
 * @param {string} reports folder for the JSON reports
 * @returns {Runner[]}
 */
export function vitestRunners(root, reports) {
  return VITEST.map((folder) => ({
    name: `${folder} (vitest)`,
    after: [],
    work: () => {
      const report = path.join(reports, `vitest-${folder.replace('/', '-')}.json`);
      const args = ['run', '--reporter=json', `--outputFile=${report}`, `--maxWorkers=${WORKERS}`];
      return runAndCount(root, folder, 'vitest', args, report, {});
    },
  }));
}

/**
 * @param {string} root
 * @param {string} reports
 * @param {{ name: string, after: string[], env: () => Promise<NodeJS.ProcessEnv>, args?: string[] }} options
 *   `env` is asked for when the runner begins: it may start the database that the tests need
 * @returns {Runner}
 */
export function jestRunner(root, reports, { name, after, env, args = [] }) {
  return {
    name,
    after,
    async work() {
      const report = path.join(reports, 'jest.json');
      const all = ['--ci', '--json', `--outputFile=${report}`, ...args];
      return runAndCount(root, 'api', 'jest', all, report, await env());
    },
  };
}

/**
 * @param {string} root
 * @param {string} folder
 * @param {string} tool
 * @param {string[]} args
 * @param {string} report
 * @param {NodeJS.ProcessEnv} env
 */
async function runAndCount(root, folder, tool, args, report, env) {
  const program = path.join(root, 'node_modules', '.bin', tool);
  const ended = await run(program, args, {
    cwd: path.join(root, folder),
    env: plainEnvironment(env),
    timeoutMs: LONGEST_MS,
  });
  const written = readJsonIfThere(report);
  if (isJestReport(written)) return countJestReport(written, ended, root);
  const message = lastOf(ended.output) || `ended with code ${ended.code}`;
  return { passed: 0, failures: [{ test: `${tool} left no report`, message }] };
}
