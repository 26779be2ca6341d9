import { meanOfNumbers, sampleDeviation } from './spread.js';

export interface Agreement {
  /** Mean of the differences: what one reading is over the other by habit. */
  readonly bias: number;
  readonly deviation: number;
  /** Bias ± 1.96 standard deviations: some 95 in 100 differences lie between. */
  readonly lower: number;
  readonly upper: number;
}

/** Limits of agreement: Bland & Altman, Lancet 1986; i: 307–310. Null for fewer than two differences. */
export function limitsOfAgreement(differences: readonly number[]): Agreement | null {
  const bias = meanOfNumbers(differences);
  const deviation = sampleDeviation(differences);
  if (bias === null || deviation === null) return null;
  return { bias, deviation, lower: bias - 1.96 * deviation, upper: bias + 1.96 * deviation };
}
