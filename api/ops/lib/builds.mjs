// @ts-check
import fs from 'node:fs';
import path from 'node:path';
import { PlainFailure } from './plain-failure.mjs';
import { plainEnvironment, run } from './programs.mjs';
import { hashSources } from './source-hash.mjs';
import { runTasks } from './tasks.mjs';

/**
 * Workspaces that are built, and what each is built from besides itself.
 * @type {Record<string, { after: string[] }>}
 */
export const builds = {
  shared: { after: [] },
  api: { after: ['shared'] },
  site: { after: ['shared'] },
  admin: { after: ['shared'] },
};

/** Changing any of these changes every build. */
const COMMON_SOURCES = ['package-lock.json', 'tsconfig.base.json'];
/** Two compilers at once fill the small machine that Ellwand is made for. */
const AT_ONCE = 2;

/**
 * Builds the workspaces whose sources have changed since their last build.
 * @param {string} root
 * @param {<T>(label: string, work: () => Promise<T>) => Promise<T>} step
 * @param {{ only?: string[], buildOne?: (root: string, workspace: string) => Promise<void> }} [options]
 * @returns {Promise<string[]>} the workspaces that were built
 */
export async function buildWhatChanged(
  root,
  step,
  { only = Object.keys(builds), buildOne = buildWorkspace } = {},
) {
  const changed = only.filter((name) => !isBuilt(root, name));
  await runTasks(
    changed.map((name) => ({
      name,
      after: (builds[name]?.after ?? []).filter((other) => changed.includes(other)),
      work: () =>
        step(`Building ${name}`, async () => {
          const sources = sourcesOf(root, name);
          fs.rmSync(path.join(root, name, 'dist'), { recursive: true, force: true });
          await buildOne(root, name);
          fs.writeFileSync(stampOf(root, name), sources);
        }),
    })),
    AT_ONCE,
  );
  return changed;
}

/**
 * @param {string} root
 * @param {string} workspace
 */
function isBuilt(root, workspace) {
  const stamp = stampOf(root, workspace);
  return fs.existsSync(stamp) && fs.readFileSync(stamp, 'utf8') === sourcesOf(root, workspace);
}

/**
 * The stamp lies in the build itself: whoever removes the one removes the other.
 * @param {string} root
 * @param {string} workspace
 */
function stampOf(root, workspace) {
  return path.join(root, workspace, 'dist', '.built-from');
}

/**
 * @param {string} root
 * @param {string} workspace
 */
function sourcesOf(root, workspace) {
  return hashSources(root, [...COMMON_SOURCES, workspace, ...(builds[workspace]?.after ?? [])]);
}

/**
 * @param {string} root
 * @param {string} workspace
 */
async function buildWorkspace(root, workspace) {
  const { code, output } = await run('npm', ['run', '--silent', 'build', '-w', workspace], {
    cwd: root,
    env: plainEnvironment(),
  });
  if (code !== 0) throw new PlainFailure(`Building ${workspace} failed.`, { detail: output.slice(-4000) });
}
