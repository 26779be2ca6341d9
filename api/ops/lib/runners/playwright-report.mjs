// @ts-check
import { lastOf } from './outcome.mjs';

/**
 * The JSON that Playwright writes.
 * @typedef {object} PlaywrightReport
 * @property {PlaywrightSuite[]} suites
 * @property {{ message?: string }[]} [errors] outside of any test
 *
 * @typedef {object} PlaywrightSuite
 * @property {string} title
 * @property {PlaywrightSuite[]} [suites]
 * @property {PlaywrightSpec[]} [specs]
 *
 * @typedef {object} PlaywrightSpec
 * @property {string} title
 * @property {string} file
 * @property {{ projectName: string, status: string, results: { errors?: { message?: string }[] }[] }[]} tests
 */

/**
 * Counts a report. Only a test that passed at once has passed: skipped ones have shown nothing, flaky ones too little.
 * @param {PlaywrightReport} report
 * @param {import('../programs.mjs').Outcome} ended
 * @returns {{ passed: number, failures: import('./outcome.mjs').Failure[] }}
 */
export function countPlaywrightReport(report, ended) {
  const runs = report.suites
    .flatMap(specsIn)
    .flatMap((spec) =>
      spec.tests.map((test) => ({ name: `${test.projectName}: ${spec.file}: ${spec.title}`, test })),
    );
  const failures = runs
    .filter(({ test }) => test.status !== 'expected')
    .map(({ name, test }) => ({ test: name, message: messageOf(test) }));
  for (const { message } of report.errors ?? []) {
    failures.push({ test: 'outside of any journey', message: plain(message ?? '') });
  }
  if (ended.code !== 0 && failures.length === 0) {
    failures.push({ test: `the runner ended with code ${ended.code}`, message: lastOf(ended.output) });
  }
  return { passed: runs.length - runs.filter(({ test }) => test.status !== 'expected').length, failures };
}

/**
 * @param {PlaywrightSuite} suite
 * @returns {PlaywrightSpec[]}
 */
function specsIn(suite) {
  return [...(suite.specs ?? []), ...(suite.suites ?? []).flatMap(specsIn)];
}

/** @param {PlaywrightSpec['tests'][number]} test */
function messageOf(test) {
  const errors = test.results.flatMap((result) => result.errors ?? []).map(({ message }) => message ?? '');
  return plain(errors.join('\n')) || `was not run to its end (${test.status})`;
}

/** @param {string} text with a terminal's colours */
function plain(text) {
  // eslint's no-control-regex forbids the escape character in a pattern; a string may hold it.
  const colour = new RegExp(`${String.fromCharCode(27)}\\[[0-9;]*m`, 'g');
  return lastOf(text.replace(colour, ''));
}

/**
 * @param {unknown} value
 * @returns {value is PlaywrightReport}
 */
export function isPlaywrightReport(value) {
  return typeof value === 'object' && value !== null && 'suites' in value && Array.isArray(value.suites);
}
