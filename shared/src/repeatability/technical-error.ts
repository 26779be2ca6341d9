/**
 * How well readings of one measuring point repeat, as plain numbers in mm. Never over several points at once: what waists
 * and hems have in common is not how they were read. Each row is one thing measured, with every reading of it.
 */
import { meanOfNumbers, sampleDeviation } from './spread.js';

export type Row = readonly number[];

/** Lengths are kept to this: what differs by less is alike. */
const FINEST_MM = 0.0001;

/**
 * Mean square within rows: Σᵢ[ΣM² − (ΣM)² ÷ Kᵢ] ÷ Σᵢ(Kᵢ − 1). Rows read once say nothing and are left out; null where no row was read twice.
 */
export function withinMeanSquare(rows: readonly Row[]): number | null {
  const repeated = rows.filter((row) => row.length > 1);
  const freedom = repeated.reduce((sum, row) => sum + row.length - 1, 0);
  if (freedom === 0) return null;
  return repeated.reduce((sum, row) => sum + squaresAbout(row), 0) / freedom;
}

function squaresAbout(row: Row): number {
  const mean = meanOfNumbers(row) ?? 0;
  return row.reduce((sum, value) => sum + (value - mean) ** 2, 0);
}

/**
 * Technical error of measurement: √(Σd² ÷ 2N) for pairs, for K readers TEM² = Σᵢ[ΣM² − (ΣM)² ÷ K] ÷ N(K − 1). Ulijaszek &
 * Kerr, Br J Nutr 82 (1999) 165–177. Null with fewer than two rows that were read twice.
 */
export function technicalError(rows: readonly Row[]): number | null {
  if (rows.filter((row) => row.length > 1).length < 2) return null;
  const square = withinMeanSquare(rows);
  return square === null ? null : Math.sqrt(square);
}

/** 100 · TEM ÷ mean of all readings; null where the mean is not above nothing. */
export function percentTechnicalError(error: number, rows: readonly Row[]): number | null {
  const mean = meanOfNumbers(rows.flat());
  return mean === null || mean <= 0 ? null : (100 * error) / mean;
}

/**
 * The share of what readings differ by that is not error: R = 1 − TEM² ÷ SD², SD of all readings (Ulijaszek & Kerr
 * 1999). Null where everything read is alike: then there is nothing to tell apart.
 */
export function reliability(error: number, rows: readonly Row[]): number | null {
  const deviation = sampleDeviation(rows.flat());
  return deviation === null || deviation < FINEST_MM ? null : 1 - error ** 2 / deviation ** 2;
}

/** Two readings of one thing differ by no more than this in 95 of 100 cases: 1.96 · √2 · TEM (Bland & Altman 1986). */
export function repeatabilityCoefficient(error: number): number {
  return 1.96 * Math.SQRT2 * error;
}
