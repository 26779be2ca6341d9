import { setImmediate as turn } from 'node:timers/promises';
import { Gate } from './gate';

describe('a gate for two', () => {
  it('never lets a third in, and lets all through in the end, also past one that failed', async () => {
    const gate = new Gate(2);
    let within = 0;
    let most = 0;
    const work = (fails: boolean) => async () => {
      most = Math.max(most, ++within);
      await turn();
      within -= 1;
      if (fails) throw new Error('failed');
      return 'done';
    };
    const ends = await Promise.allSettled([1, 2, 3, 4, 5].map((n) => gate.pass(work(n === 2))));
    expect(ends.map((end) => end.status)).toEqual([
      'fulfilled',
      'rejected',
      'fulfilled',
      'fulfilled',
      'fulfilled',
    ]);
    expect(most).toBe(2);
  });
});
