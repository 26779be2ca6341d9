import { lengthOf, type Length, UNITS_PER_INCH, UNITS_PER_MM } from './length.js';
import { divideHalfUp } from './rounding.js';

/** How finely inches are shown: visitors read eighths, makers sixteenths, drawings sometimes coarser. */
export type InchDenominator = 1 | 2 | 4 | 8 | 16;

export const inchDenominators: readonly InchDenominator[] = [16, 8, 4, 2, 1];

/** A whole number and a proper fraction in lowest terms; `numerator` is 0 when there is no fraction. */
export interface MixedNumber {
  readonly negative: boolean;
  readonly whole: number;
  readonly numerator: number;
  readonly denominator: number;
}

/** The nearest whole number of `1/denominator` inches, rounded once, half-up, from the exact length. */
export function toInchSteps(length: Length, denominator: InchDenominator): number {
  return Number(divideHalfUp(BigInt(length) * BigInt(denominator), BigInt(UNITS_PER_INCH)));
}

/** Exact: the inch is a whole number of stored units, and so is its sixteenth. */
export function fromInchSteps(steps: number, denominator: InchDenominator): Length {
  return lengthOf(steps * (UNITS_PER_INCH / denominator));
}

/** 12 3/16 rather than 12 6/32: the fraction comes in lowest terms. */
export function toMixedInches(length: Length, denominator: InchDenominator): MixedNumber {
  const steps = toInchSteps(length, denominator);
  const magnitude = Math.abs(steps);
  const left = magnitude % denominator;
  const divisor = left === 0 ? denominator : greatestCommonDivisor(left, denominator);
  return {
    negative: steps < 0,
    whole: Math.floor(magnitude / denominator),
    numerator: left / divisor,
    denominator: denominator / divisor,
  };
}

function greatestCommonDivisor(first: number, second: number): number {
  return second === 0 ? first : greatestCommonDivisor(second, first % second);
}

/**
 * The finest step in inches that the uncertainty deserves: a step is never smaller than the standard
 * uncertainty `uncertaintyMm`, nor finer than what was `wanted`. House decision.
 */
export function deservedDenominator(uncertaintyMm: number, wanted: InchDenominator): InchDenominator {
  const inchMm = UNITS_PER_INCH / UNITS_PER_MM;
  return inchDenominators.find((step) => step <= wanted && inchMm / step >= uncertaintyMm) ?? 1;
}
