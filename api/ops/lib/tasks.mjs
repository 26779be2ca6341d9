// @ts-check
/**
 * @typedef {object} Task
 * @property {string} name
 * @property {string[]} after names of tasks that must have ended well before
 * @property {() => Promise<void>} work
 */

/**
 * Runs tasks, each after those it needs, at most so many at once, in the given order where there is a choice.
 * After a failure nothing new begins; what runs is awaited, then the first failure is thrown.
 * @param {readonly Task[]} tasks
 * @param {number} atOnce
 * @returns {Promise<void>}
 */
export async function runTasks(tasks, atOnce) {
  const waiting = [...tasks];
  const done = new Set();
  /** @type {Set<Promise<void>>} */
  const running = new Set();
  /** @type {unknown[]} */
  const failures = [];
  const begin = (/** @type {Task} */ task) => {
    const end = task
      .work()
      .then(() => void done.add(task.name))
      .catch((failure) => void failures.push(failure))
      .finally(() => running.delete(end));
    running.add(end);
  };
  for (;;) {
    while (running.size < atOnce && failures.length === 0) {
      const next = waiting.findIndex((task) => task.after.every((name) => done.has(name)));
      if (next < 0) break;
      waiting.splice(next, 1).forEach(begin);
    }
    if (running.size === 0) break;
    await Promise.race(running);
  }
  if (failures.length > 0) throw failures[0];
  const [stuck] = waiting;
  if (stuck) throw new Error(`${stuck.name} waits for a task that is not there: ${stuck.after.join(', ')}`);
}
