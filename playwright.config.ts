/**
 * Browser journeys through both applications. `npm test` opens two houses for them and says where they are:
 *
 * - ELLWAND_E2E_URL, ELLWAND_E2E_INBOX_URL: site and mail inbox of a house with the demonstration
 * - ELLWAND_E2E_DEMONSTRATION: its demonstration.json, with people and passwords
 * - ELLWAND_E2E_EMPTY_URL, ELLWAND_E2E_EMPTY_INBOX_URL, ELLWAND_E2E_FIRST_ADMINISTRATOR: an empty house, and the
 *   one-time address for its first administrator
 *
 * Run by hand (`npx playwright test`), the journeys take the Ellwand that `npm start` has opened.
 */
import fs from 'node:fs';
import path from 'node:path';
import { defineConfig } from '@playwright/test';

interface Running {
  url?: string;
  inboxUrl?: string;
  demonstration?: string;
}

// Playwright loads this file as CommonJS: `import.meta` would make it something else.
const started = path.join(__dirname, '.data/running.json');

if (process.env['ELLWAND_E2E_URL'] === undefined && fs.existsSync(started)) {
  const { url, inboxUrl, demonstration } = JSON.parse(fs.readFileSync(started, 'utf8')) as Running;
  Object.assign(process.env, {
    ELLWAND_E2E_URL: url,
    ELLWAND_E2E_INBOX_URL: inboxUrl,
    ELLWAND_E2E_DEMONSTRATION: demonstration,
  });
}

export default defineConfig({
  projects: [
    { name: 'site', testDir: 'site/e2e' },
    { name: 'workroom', testDir: 'admin/e2e' },
  ],
  outputDir: 'test-results',
  forbidOnly: true,
  // Journeys share a house, and the machine is small.
  workers: 1,
  fullyParallel: false,
  retries: 0,
  timeout: 120_000,
  expect: { timeout: 10_000 },
  use: {
    baseURL: process.env['ELLWAND_E2E_URL'],
    locale: 'en-GB',
    timezoneId: 'UTC',
    screenshot: 'only-on-failure',
    actionTimeout: 15_000,
    launchOptions: {
      executablePath: process.env['ELLWAND_E2E_CHROMIUM'] ?? '/usr/bin/chromium',
      args: [
        '--no-sandbox',
        '--disable-gpu',
        '--disable-background-networking',
        '--disable-component-update',
        '--disable-sync',
        '--disable-quic',
        '--no-first-run',
      ],
    },
  },
});
