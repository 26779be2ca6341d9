import { describe, expect, it } from 'vitest';
import { pause } from './programs.mjs';
import { runTasks } from './tasks.mjs';

function watched() {
  const order: string[] = [];
  let running = 0;
  let most = 0;
  const task = (name: string, after: string[] = [], ms = 5) => ({
    name,
    after,
    async work() {
      most = Math.max(most, ++running);
      await pause(ms);
      running -= 1;
      order.push(name);
    },
  });
  return { order, most: () => most, task };
}

describe('tasks', () => {
  it('wait for those they need', async () => {
    const { order, task } = watched();
    await runTasks(
      [task('api', ['shared']), task('journeys', ['api', 'site']), task('site'), task('shared')],
      2,
    );
    expect(order.indexOf('shared')).toBeLessThan(order.indexOf('api'));
    expect(order.at(-1)).toBe('journeys');
  });

  it('run two at a time, and never more', async () => {
    const { most, task } = watched();
    await runTasks(
      ['a', 'b', 'c', 'd', 'e'].map((name) => task(name)),
      2,
    );
    expect(most()).toBe(2);
  });

  it('end with the first failure, after what runs has ended, and begin nothing new', async () => {
    const { order, task } = watched();
    const broken = { name: 'broken', after: [], work: () => Promise.reject(new Error('broken')) };
    await expect(runTasks([broken, task('long', [], 30), task('late')], 2)).rejects.toThrow('broken');
    expect(order).toEqual(['long']);
  });

  it('say so where one waits for a task that is not there', async () => {
    const { task } = watched();
    await expect(runTasks([task('site', ['sharde'])], 2)).rejects.toThrow(
      'site waits for a task that is not there',
    );
  });
});
