// @ts-check
import { PlainFailure } from './plain-failure.mjs';
import { findProgram, firstLineOf, run } from './programs.mjs';

/**
 * @typedef {{ program: string, package: string }} Need a program and the Debian package that brings it
 * @typedef {{ findProgram: typeof findProgram, run: typeof run, isRoot: boolean, maySudo: () => boolean }} System
 */

/** @type {Need} */
export const MARIADB = { program: 'mariadbd', package: 'mariadb-server' };
/** @type {Need} */
export const CHROMIUM = { program: 'chromium', package: 'chromium' };

/** Read back what is printed, in tests. @type {Need[]} */
export const PDF_READERS = [
  { program: 'pdftotext', package: 'poppler-utils' },
  { program: 'qpdf', package: 'qpdf' },
];

/** @type {System} */
const thisSystem = {
  findProgram,
  run,
  isRoot: process.getuid?.() === 0,
  maySudo: () => firstLineOf('sudo', ['-n', 'true']) !== undefined,
};

/**
 * Installs what is missing from Debian's packages: as root, or through a sudo that asks for no password. Where
 * neither works, says the one command that a person with rights has to run.
 * @param {readonly Need[]} needs
 * @param {<T>(label: string, work: () => Promise<T>) => Promise<T>} step
 * @param {System} [system]
 */
export async function installDebianPackages(needs, step, system = thisSystem) {
  const missing = needs.filter((need) => !system.findProgram(need.program)).map((need) => need.package);
  if (missing.length === 0) return;
  const names = missing.join(', ').replace(/, ([^,]+)$/, ' and $1');
  const byHand = `sudo apt-get install ${missing.join(' ')}`;
  if (!system.findProgram('apt-get')) {
    throw new PlainFailure(
      `Missing on this machine: ${names}, and it has no apt-get: install what is missing, then start again.`,
    );
  }
  if (!system.isRoot && !system.maySudo()) {
    throw new PlainFailure(
      `Missing on this machine: ${names}. This account may not install packages. Run: ${byHand}`,
    );
  }
  const { code, output } = await step(`Installing ${names}`, () => installWithApt(missing, system));
  if (code !== 0) {
    throw new PlainFailure(`${names} could not be installed. Try: ${byHand}`, {
      detail: output.slice(-3000),
    });
  }
}

/**
 * A fresh machine has no package lists, and old lists name files that are gone: on failure they are renewed once.
 * @param {readonly string[]} packages
 * @param {System} system
 */
async function installWithApt(packages, system) {
  const apt = (/** @type {string[]} */ ...args) => {
    const [program = '', ...rest] = [
      ...(system.isRoot ? [] : ['sudo', '-n']),
      'env',
      'DEBIAN_FRONTEND=noninteractive',
    ];
    return system.run(program, [...rest, 'apt-get', '-o', 'DPkg::Lock::Timeout=120', ...args]);
  };
  const install = () => apt('install', '-y', '--no-install-recommends', ...packages);
  const first = await install();
  if (first.code === 0) return first;
  await apt('update');
  return install();
}
