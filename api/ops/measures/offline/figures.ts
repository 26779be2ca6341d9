/** What was measured, beside what it may be at most. */
export interface Measured {
  readonly what: string;
  readonly value: number;
  readonly most: number;
  readonly unit: 'ms' | 'KB';
}

/**
 * The value that a share of all values do not exceed, by nearest rank: the smallest that has at least that share at or
 * below it. Throws RangeError for an empty list.
 */
export function percentile(values: readonly number[], share: number): number {
  const ordered = [...values].sort((one, other) => one - other);
  const found = ordered[Math.max(0, Math.ceil(share * ordered.length) - 1)];
  if (found === undefined) throw new RangeError('No values were measured');
  return found;
}

export const isWithin = ({ value, most }: Measured): boolean => value <= most;

/** "reading on the disk, 95 of 100 within: 7.3 ms (at most 20 ms)". */
export function line(measured: Measured): string {
  const { what, value, most, unit } = measured;
  const verdict = isWithin(measured) ? 'kept' : 'MISSED';
  return `${verdict.padEnd(6)}  ${what}: ${value.toFixed(1)} ${unit} (at most ${most} ${unit})`;
}
