// @ts-check
import path from 'node:path';
import { buildWhatChanged, builds } from './builds.mjs';
import { CHROMIUM, installDebianPackages, MARIADB, PDF_READERS } from './debian-packages.mjs';
import { installNpmPackages } from './npm-packages.mjs';
import { root } from './places.mjs';
import { runMain } from './plain-failure.mjs';
import { stopRunningPrograms } from './programs.mjs';
import { step } from './progress.mjs';
import { drillRunner } from './runners/drill-runner.mjs';
import { journeysRunner } from './runners/journeys-runner.mjs';
import { runAll } from './runners/run-all.mjs';
import { lintRunners, typeRunners } from './runners/static-runners.mjs';
import { jestRunner, vitestRunners } from './runners/unit-runners.mjs';
import { startTestDatabase } from './test-database.mjs';
import { closeTestHouses } from './test-house.mjs';
import { makeTestFolder, removeTestFolder } from './test-folder.mjs';

/** @typedef {import('./runners/outcome.mjs').Runner} Runner */

const NOTHING_FAILED = 0;
const SOMETHING_FAILED = 1;

/** What `npm test` runs, in the order of its table. @type {(folder: string) => Runner[]} */
const everything = (folder) => {
  const others = Object.keys(builds).filter((name) => name !== 'shared');
  const together = [
    buildRunner('build shared', ['shared'], []),
    ...lintRunners(root).reverse(),
    ...typeRunners(root),
    buildRunner('build applications', others, ['build shared']),
    ...vitestRunners(root, folder),
  ];
  // The API's tests measure time, and a browser that waits for a core fails what is right: each has the machine
  // to itself.
  const api = jestRunner(root, folder, {
    name: 'api (jest)',
    after: together.map(({ name }) => name),
    env: () => startTestDatabase(path.join(folder, 'jest')),
  });
  const journeys = journeysRunner(root, folder, [api.name]);
  return [...together, api, journeys, drillRunner(root, [journeys.name])];
};

/** Parts of a check, by name. @type {Record<string, (folder: string) => Runner[]>} */
const parts = {
  types: () => typeRunners(root),
  lint: () => lintRunners(root),
  // The API's specs that stand beside their sources; those that need a database are for npm test.
  unit: (folder) => [
    ...vitestRunners(root, folder),
    jestRunner(root, folder, {
      name: 'api (jest, unit)',
      after: [],
      env: () => Promise.resolve({}),
      args: ['--selectProjects', 'unit'],
    }),
  ],
};

/** `npm test`: everything, with database folder and ports of its own. */
export function testEllwand() {
  return runMain(async () => {
    await installDebianPackages([MARIADB, CHROMIUM, ...PDF_READERS], step);
    await installNpmPackages(root, step);
    return runInFolder(everything);
  });
}

/**
 * `npm run check` and its parts: what can be known in three minutes, without the whole house.
 * @param {readonly string[]} names of parts
 */
export function checkEllwand(names) {
  return runMain(async () => {
    await installDebianPackages([MARIADB], step);
    await installNpmPackages(root, step);
    return runInFolder((folder) => names.flatMap((name) => parts[name]?.(folder) ?? []));
  });
}

/** @param {(folder: string) => Runner[]} choose */
async function runInFolder(choose) {
  const folder = await makeTestFolder(root);
  const onSignal = () => {
    stopRunningPrograms();
    void closeTestHouses()
      .then(() => removeTestFolder(folder))
      .finally(() => process.exit(SOMETHING_FAILED));
  };
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.once(signal, onSignal);
  try {
    return (await runAll(choose(folder))) ? NOTHING_FAILED : SOMETHING_FAILED;
  } finally {
    await removeTestFolder(folder);
  }
}

/**
 * A build is a test as well: that the house can be built.
 * @param {string} name
 * @param {string[]} workspaces
 * @param {string[]} after
 * @returns {Runner}
 */
function buildRunner(name, workspaces, after) {
  return {
    name,
    after,
    async work() {
      await buildWhatChanged(root, step, { only: workspaces });
      return { passed: workspaces.length, failures: [] };
    },
  };
}
