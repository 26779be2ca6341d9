// @ts-check
import { lastOf } from './outcome.mjs';

/**
 * The JSON that jest writes, and vitest after it.
 * @typedef {object} JestReport
 * @property {JestFile[]} testResults
 *
 * @typedef {object} JestFile
 * @property {string} name of the file
 * @property {string} status
 * @property {string} [message] why the file as a whole failed
 * @property {{ fullName: string, status: string, failureMessages?: string[] | null }[]} assertionResults
 */

/**
 * Counts a report. A test that was skipped has shown nothing: it counts as failed, and so does a file that broke
 * before its first test, or a runner that ended badly although every test passed.
 * @param {JestReport} report
 * @param {import('../programs.mjs').Outcome} ended
 * @param {string} root file names are shown from here
 * @returns {{ passed: number, failures: import('./outcome.mjs').Failure[] }}
 */
export function countJestReport(report, ended, root) {
  const tests = report.testResults.flatMap((file) => file.assertionResults);
  const passed = tests.filter(({ status }) => status === 'passed').length;
  const failures = report.testResults.flatMap((file) => failuresIn(file, root));
  if (ended.code !== 0 && failures.length === 0) {
    failures.push({ test: `the runner ended with code ${ended.code}`, message: lastOf(ended.output) });
  }
  return { passed, failures };
}

/**
 * @param {JestFile} file
 * @param {string} root
 * @returns {import('./outcome.mjs').Failure[]}
 */
function failuresIn(file, root) {
  const place = file.name.replace(`${root}/`, '');
  const failed = file.assertionResults
    .filter(({ status }) => status !== 'passed')
    .map(({ fullName, status, failureMessages }) => ({
      test: `${place}: ${fullName}`,
      message: lastOf((failureMessages ?? []).join('\n')) || `was not run (${status})`,
    }));
  const brokeAsWhole = file.status === 'failed' && failed.length === 0;
  return brokeAsWhole ? [{ test: place, message: lastOf(file.message ?? '') }] : failed;
}

/**
 * @param {unknown} value
 * @returns {value is JestReport}
 */
export function isJestReport(value) {
  return (
    typeof value === 'object' && value !== null && 'testResults' in value && Array.isArray(value.testResults)
  );
}
