const minuteMs = 60_000;
const longestMs = 60 * minuteMs;

/** When to try again after so many failed attempts: half a minute, then twice as long each time, up to an hour. */
export function backOffMs(attempts: number): number {
  return Math.min((minuteMs / 2) * 2 ** Math.min(Math.max(0, attempts - 1), 20), longestMs);
}
