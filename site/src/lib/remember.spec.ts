import { expect, it, vi } from 'vitest';
import { remembering } from './remember';

it('works a thing out once, however often it is asked for', () => {
  const double = vi.fn((of: number) => of * 2);
  const ask = remembering(String, double, 10);
  expect([ask(4), ask(4), ask(4)]).toEqual([8, 8, 8]);
  expect(double).toHaveBeenCalledTimes(1);
});

it('lets go of what was unused longest', () => {
  const same = vi.fn((of: string) => of);
  const ask = remembering((text: string) => text, same, 2);
  ask('a');
  ask('b');
  ask('a');
  ask('c');
  expect(same).toHaveBeenCalledTimes(3);
  ask('a');
  expect(same).toHaveBeenCalledTimes(3);
  ask('b');
  expect(same).toHaveBeenCalledTimes(4);
});
