import { backOffMs } from './back-off';

it.each([
  [1, 30_000],
  [2, 60_000],
  [5, 480_000],
  [8, 3_600_000],
  [1_000, 3_600_000],
])('after %i failed attempts a letter waits %i ms', (attempts, ms) => {
  expect(backOffMs(attempts)).toBe(ms);
});
