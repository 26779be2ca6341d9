// @ts-check
import { buildWhatChanged } from './builds.mjs';
import { installDebianPackages, MARIADB } from './debian-packages.mjs';
import { announce, leaveHouse, takeHouse } from './house-lock.mjs';
import { House } from './house.mjs';
import { installNpmPackages } from './npm-packages.mjs';
import { root } from './places.mjs';
import { printFailure } from './plain-failure.mjs';
import { requirePort } from './ports.mjs';
import { makePrivateFolder } from './private-files.mjs';
import { stopRunningPrograms } from './programs.mjs';
import { step } from './progress.mjs';
import { readSettings } from './settings.mjs';

/** Files made from here on, by this process and its services, are their owner's alone. */
const PRIVATE_UMASK = 0o077;
const PARENT_WATCH_MS = 300;

/**
 * Opens Ellwand and keeps it open until a signal comes or a service can no longer be kept running; the
 * process's exit code says which.
 * @returns {Promise<void>}
 */
export async function openEllwand() {
  const stop = stopSignal();
  /** @type {House | undefined} */
  let house;
  /** @type {string | undefined} */
  let taken;
  try {
    const settings = readSettings(process.env, process.argv.slice(2), root);
    await requirePort(settings.port, 'ELLWAND_PORT');
    makePrivateFolder(settings.dataFolder);
    takeHouse(settings.dataFolder);
    taken = settings.dataFolder;
    await prepare(settings.ownDatabase, stop.stepUnlessCalled);
    process.umask(PRIVATE_UMASK);
    house = new House(root, settings, stop.stepUnlessCalled, stop.fail);
    const addresses = await house.open();
    announce(settings.dataFolder, { pid: process.pid, ready: true, ...addresses });
    printAddresses(addresses);
    await stop.called;
  } catch (failure) {
    if (!stop.isCalled()) {
      printFailure(failure);
      process.exitCode = 1;
    }
  }
  await house?.close();
  if (taken !== undefined) leaveHouse(taken);
  if (stop.isCalled() && process.exitCode === undefined) console.log('Ellwand is closed.');
}

/**
 * @param {boolean} ownDatabase
 * @param {import('./house.mjs').Step} step
 */
async function prepare(ownDatabase, step) {
  if (ownDatabase) await installDebianPackages([MARIADB], step);
  await installNpmPackages(root, step);
  await buildWhatChanged(root, step);
}

/**
 * One promise for all reasons to close: rejects where a service failed for good, resolves on a signal.
 */
function stopSignal() {
  let isCalled = false;
  /** @type {() => void} */
  let resolve = () => {};
  /** @type {(failure: unknown) => void} */
  let fail = () => {};
  /** @type {Promise<void>} */
  const called = new Promise((accept, refuse) => {
    resolve = accept;
    fail = refuse;
  });
  // Whoever awaits it hears of the failure; a failure while still opening ends the opening by itself.
  called.catch(() => {});
  const onSignal = () => {
    if (isCalled) return;
    isCalled = true;
    console.log('\nClosing …');
    stopRunningPrograms();
    resolve();
  };
  /** @type {import('./house.mjs').Step} */
  const stepUnlessCalled = (label, work) => {
    if (isCalled) throw new Error('asked to stop while starting');
    return step(label, work);
  };
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, onSignal);
  if (process.env['npm_lifecycle_event'] !== undefined) whenParentIsGone(onSignal);
  return {
    called,
    fail,
    isCalled: () => isCalled,
    stepUnlessCalled,
  };
}

/**
 * npm hands a SIGTERM to its shell, and the shell does not hand it on: the script would live on unseen.
 * @param {() => void} close
 */
function whenParentIsGone(close) {
  const parent = process.ppid;
  const watch = setInterval(() => {
    if (process.ppid === parent) return;
    clearInterval(watch);
    close();
  }, PARENT_WATCH_MS);
  watch.unref();
}

/** @param {Omit<import('./house-lock.mjs').Running, 'pid' | 'ready'>} addresses */
function printAddresses({ url, workroomUrl, inboxUrl, demonstration, firstAdministrator }) {
  const lines = [
    ['Catalogue', url],
    ['Workroom', workroomUrl],
    ['Mail inbox', inboxUrl],
    ['People and passwords', demonstration],
    ['First administrator, once', firstAdministrator],
  ];
  const shown = lines.filter(([, value]) => value !== undefined);
  const width = Math.max(...shown.map(([label = '']) => label.length));
  const listed = shown.map(([label = '', value = '']) => `  ${label.padEnd(width)}  ${value}\n`);
  console.log(`\nEllwand is open. Ctrl-C closes it.\n\n${listed.join('')}`);
}
