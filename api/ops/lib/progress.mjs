// @ts-check
/** How often a long step says that it is still going on. */
const REMIND_MS = 15_000;
/** Steps shorter than this pass without a word. */
const WORTH_SAYING_MS = 400;

/**
 * Runs one step of a longer work, and says so where it takes a while.
 * @template T
 * @param {string} label in the form "Building site"
 * @param {() => Promise<T>} work
 * @param {(line: string) => void} [say]
 * @returns {Promise<T>}
 */
export async function step(label, work, say = console.log) {
  const begun = Date.now();
  const seconds = () => Math.round((Date.now() - begun) / 1000);
  const announce = setTimeout(() => say(`${label} …`), WORTH_SAYING_MS);
  const remind = setInterval(() => say(`${label}: ${seconds()} s so far`), REMIND_MS);
  try {
    const result = await work();
    if (Date.now() - begun > WORTH_SAYING_MS) say(`${label}: done in ${seconds()} s`);
    return result;
  } finally {
    clearTimeout(announce);
    clearInterval(remind);
  }
}
