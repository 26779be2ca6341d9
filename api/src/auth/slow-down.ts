/** A hand that mistypes: so many failures cost nothing. */
export const freeFailures = { account: 5, address: 40 } as const;

/** The wait doubles from here… */
const firstWaitMs = 2_000;
/** …and goes no further: a person who comes back after lunch may try again. */
const longestWaitMs = 15 * 60_000;
/** After this long without a failure they are forgotten. */
export const forgottenAfterMs = 60 * 60_000;

export type SlowDownKind = keyof typeof freeFailures;

/**
 * When the next try is heard after so many failures in a row.
 * @returns milliseconds after the last failure; 0 where no wait is due
 */
export function waitAfter(kind: SlowDownKind, failures: number): number {
  const over = failures - freeFailures[kind];
  if (over < 0) return 0;
  return Math.min(firstWaitMs * 2 ** Math.min(over, 30), longestWaitMs);
}
