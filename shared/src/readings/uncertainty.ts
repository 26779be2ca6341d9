/**
 * Standard uncertainties, in millimetres as plain numbers: they are estimates and are shown with two digits.
 * Parts that have nothing to do with one another are combined by the root of the sum of squares.
 */
import type { MeasuringHow } from '../points/point.js';
import { lengthOf, mm, type Length, toMm, UNITS_PER_MM } from '../units/length.js';

/** House settings without a published source: how well a tape can be laid, in mm. */
export const methodUncertaintyMm = {
  straight: 1,
  round: 2,
  curve: 2,
  'flat-doubled': 1,
  tapeJoin: 1,
} as const;

/**
 * A value known only to lie within ±half-width is spread evenly over it: u = a ÷ √3 (NIST TN 1297, on type B
 * evaluation with a rectangular distribution).
 */
export function rectangularMm(halfWidth: Length): number {
  return toMm(halfWidth) / Math.sqrt(3);
}

/** A half that was read counts twice in the whole. */
function doubling(how: MeasuringHow): number {
  return how === 'flat-doubled' ? 2 : 1;
}

export function stepUncertaintyMm(step: Length, how: MeasuringHow): number {
  return (doubling(how) * (toMm(step) / 2)) / Math.sqrt(3);
}

/** How the tape was laid; each join of one tape length to the next adds its own part. */
export function layingUncertaintyMm(how: MeasuringHow, tapeJoins: number): number {
  return rootOfSquares([
    doubling(how) * methodUncertaintyMm[how],
    Math.sqrt(tapeJoins) * methodUncertaintyMm.tapeJoin,
  ]);
}

/** Rounds that lie `spread` apart: half of it to either side of the middle. */
export function spreadUncertaintyMm(spread: Length): number {
  return toMm(spread) / 2 / Math.sqrt(3);
}

export function rootOfSquares(partsMm: readonly number[]): number {
  return Math.sqrt(partsMm.reduce((sum, part) => sum + part * part, 0));
}

/** As it is kept and shown: to a tenth of a millimetre, upwards, so that nothing is claimed too well. */
export function shownUncertainty(uncertaintyMm: number): Length {
  // Less a trifle, so that 2.0000000000000004 is 2.0 and not 2.1.
  const tenths = Math.ceil(uncertaintyMm * 10 - 1e-9);
  return Number.isSafeInteger(tenths) && tenths > 0 ? lengthOf((tenths * UNITS_PER_MM) / 10) : mm(0);
}
