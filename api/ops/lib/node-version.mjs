// @ts-check
/** The oldest Node that Ellwand runs on; the same as `engines` in package.json. */
export const OLDEST_NODE = '20.19';

/**
 * What is wrong with a version of Node, as a sentence. Written in old words: old versions read it.
 * @param {string} version like 20.19.4
 * @returns {string | undefined}
 */
export function nodeFault(version) {
  const have = version.split('.').map(Number);
  const want = OLDEST_NODE.split('.').map(Number);
  const [major = 0, minor = 0] = have;
  const [wantedMajor = 0, wantedMinor = 0] = want;
  if (major > wantedMajor || (major === wantedMajor && minor >= wantedMinor)) return undefined;
  return 'Ellwand needs Node ' + OLDEST_NODE + ' or newer; this is Node ' + version + '.';
}

/**
 * Ends the process with a sentence where Node is too old.
 * @param {string} version
 */
export function requireNode(version) {
  const fault = nodeFault(version);
  if (fault === undefined) return;
  console.error(fault);
  process.exit(1);
}
