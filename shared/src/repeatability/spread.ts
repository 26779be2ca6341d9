/** Null for none. */
export function meanOfNumbers(values: readonly number[]): number | null {
  return values.length === 0 ? null : values.reduce((sum, value) => sum + value, 0) / values.length;
}

/** Standard deviation of a sample, over n − 1; null for fewer than two. */
export function sampleDeviation(values: readonly number[]): number | null {
  const mean = meanOfNumbers(values);
  if (mean === null || values.length < 2) return null;
  const squares = values.reduce((sum, value) => sum + (value - mean) ** 2, 0);
  return Math.sqrt(squares / (values.length - 1));
}
