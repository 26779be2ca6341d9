// @ts-check
import path from 'node:path';
import { CHROMIUM } from '../debian-packages.mjs';
import { PlainFailure } from '../plain-failure.mjs';
import { readJsonIfThere } from '../private-files.mjs';
import { findProgram, plainEnvironment, run } from '../programs.mjs';
import { closeTestHouses, openTestHouse } from '../test-house.mjs';
import { lastOf } from './outcome.mjs';
import { countPlaywrightReport, isPlaywrightReport } from './playwright-report.mjs';

/** A browser that hangs ends here, and counts as failed. */
const LONGEST_MS = 14 * 60_000;

/**
 * The browser journeys, through two houses of their own: one with the demonstration, one empty. The journeys
 * find them in the environment; playwright.config.ts says which variables there are.
 * @param {string} root
 * @param {string} folder of this run
 * @param {string[]} after
 * @returns {import('./outcome.mjs').Runner}
 */
export function journeysRunner(root, folder, after) {
  return {
    name: 'journeys (playwright)',
    after,
    async work() {
      try {
        const demonstration = await openTestHouse(root, path.join(folder, 'demonstration'), []);
        const empty = await openTestHouse(root, path.join(folder, 'empty'), ['--empty']);
        return await walk(root, path.join(folder, 'playwright.json'), {
          ELLWAND_E2E_URL: demonstration.url,
          ELLWAND_E2E_INBOX_URL: demonstration.inboxUrl,
          ELLWAND_E2E_DEMONSTRATION: demonstration.demonstration,
          ELLWAND_E2E_EMPTY_URL: empty.url,
          ELLWAND_E2E_EMPTY_INBOX_URL: empty.inboxUrl,
          ELLWAND_E2E_FIRST_ADMINISTRATOR: empty.firstAdministrator,
        });
      } finally {
        await closeTestHouses();
      }
    },
  };
}

/**
 * @param {string} root
 * @param {string} report
 * @param {NodeJS.ProcessEnv} houses
 */
async function walk(root, report, houses) {
  const chromium = findProgram(CHROMIUM.program);
  if (!chromium) throw new PlainFailure(`chromium is missing. Run: sudo apt-get install ${CHROMIUM.package}`);
  const env = plainEnvironment({
    ...houses,
    ELLWAND_E2E_CHROMIUM: chromium,
    PLAYWRIGHT_JSON_OUTPUT_NAME: report,
  });
  const ended = await run(
    path.join(root, 'node_modules', '.bin', 'playwright'),
    ['test', '--reporter=json'],
    {
      cwd: root,
      env,
      timeoutMs: LONGEST_MS,
    },
  );
  const written = readJsonIfThere(report);
  if (isPlaywrightReport(written)) return countPlaywrightReport(written, ended);
  return { passed: 0, failures: [{ test: 'playwright left no report', message: lastOf(ended.output) }] };
}
