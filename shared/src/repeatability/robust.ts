/** Middle and spread that a single wild figure cannot move. Plain numbers: statistics of lengths, never lengths. */

/** The middle figure, or the mean of the two in the middle; null for none. */
export function medianOf(values: readonly number[]): number | null {
  const sorted = [...values].sort((first, second) => first - second);
  const half = Math.floor(sorted.length / 2);
  const upper = sorted[half];
  if (upper === undefined) return null;
  const lower = sorted.length % 2 === 1 ? upper : (sorted[half - 1] ?? upper);
  return (lower + upper) / 2;
}

/** The median of the distances from the median; null for none. */
export function medianAbsoluteDeviation(values: readonly number[]): number | null {
  const median = medianOf(values);
  return median === null ? null : medianOf(values.map((value) => Math.abs(value - median)));
}

/** Beyond this a figure is flagged: Iglewicz & Hoaglin, "How to Detect and Handle Outliers" (1993). */
export const FLAGGED_ABOVE = 3.5;

/**
 * 0.6745 (x − median) ÷ MAD (Iglewicz & Hoaglin 1993). Null where there is nothing to compare with, and where more than
 * half of the figures are the same: the distance of any other could then not be told.
 */
export function modifiedZ(value: number, among: readonly number[]): number | null {
  const median = medianOf(among);
  const deviation = medianAbsoluteDeviation(among);
  if (median === null || deviation === null || deviation === 0) return null;
  return (0.6745 * (value - median)) / deviation;
}
