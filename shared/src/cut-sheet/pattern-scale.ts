/**
 * The scale of a hand-drawn pattern that was photographed or scanned. Two marks a known distance apart give it; every
 * other pair of marks is read by it. A diagonal in pixels is a square root, so the scale is held as its exact square,
 * a fraction of whole numbers, and a root is taken once, when a length is wanted.
 */
import { rootOfSquares } from '../readings/uncertainty.js';
import { fromMmString, type Length, lengthOf, toMm } from '../units/length.js';
import { divideHalfUp } from '../units/rounding.js';
import { type LengthKept, straightUncertaintyMm } from './straight-reading.js';

/** A place in the picture, in whole pixels of the original. */
export interface PixelMark {
  readonly x: number;
  readonly y: number;
}

export interface MarkPair {
  readonly from: PixelMark;
  readonly to: PixelMark;
}

/** Stored units of length (0.0001 mm) for a pixel, squared: numerator ÷ denominator. */
export interface PatternScale {
  readonly numerator: bigint;
  readonly denominator: bigint;
  /** The known distance, how well it is known (standard, mm), and the pixels between its marks. */
  readonly distance: Length;
  readonly distanceUncertaintyMm: number;
  readonly pixels: number;
}

export interface PatternLength {
  readonly length: Length;
  /** Standard uncertainty in mm: how well both pairs of marks could be set, and the known distance itself. */
  readonly uncertaintyMm: number;
}

function squaredPixels({ from, to }: MarkPair): bigint {
  const across = BigInt(to.x) - BigInt(from.x);
  const down = BigInt(to.y) - BigInt(from.y);
  return across * across + down * down;
}

const pixelsOf = (pair: MarkPair): number => Math.sqrt(Number(squaredPixels(pair)));

/** Nothing where the marks lie on one another or the distance is zero: no scale comes of that. */
export function patternScale(
  marks: MarkPair,
  distance: Length,
  distanceUncertaintyMm: number,
): PatternScale | undefined {
  const denominator = squaredPixels(marks);
  if (denominator === 0n || distance <= 0) return undefined;
  const numerator = BigInt(distance) * BigInt(distance);
  return { numerator, denominator, distance, distanceUncertaintyMm, pixels: pixelsOf(marks) };
}

/** The scale of a pattern on a cut sheet; nothing while its distance is not known. */
export function scaleOfPattern(pattern: {
  readonly marks: MarkPair;
  readonly distance: LengthKept | null;
}): PatternScale | undefined {
  const { marks, distance } = pattern;
  if (distance === null) return undefined;
  return patternScale(marks, fromMmString(distance.mm), straightUncertaintyMm(distance));
}

/** How many pixels of the original one pixel of the largest form is, which is what marks are set on. */
export function markStepPx(image: {
  readonly widthPx: number | null;
  readonly widths: readonly number[];
}): number {
  const largest = Math.max(0, ...image.widths);
  return image.widthPx === null || largest === 0 ? 1 : Math.max(1, image.widthPx / largest);
}

/** Whole root of a whole number, rounded down (Newton's method on whole numbers). */
function wholeRoot(square: bigint): bigint {
  if (square < 2n) return square;
  let root = 1n << BigInt((square.toString(2).length + 1) >> 1);
  for (;;) {
    const next = (root + square / root) >> 1n;
    if (next >= root) return root;
    root = next;
  }
}

/** The root of numerator ÷ denominator, rounded once, half-up. */
function rootHalfUp(numerator: bigint, denominator: bigint): bigint {
  // √(n/d) in halves, rounded down, then the last half decides: exact, for halves are whole here.
  const halves = wholeRoot((4n * numerator) / denominator);
  return (halves + 1n) / 2n;
}

/** How well the middle of a mark can be set: within a pixel either way, evenly (NIST TN 1297, type B). */
export function markUncertaintyPx(stepPx: number): number {
  return (Math.SQRT2 * stepPx) / Math.sqrt(3);
}

/**
 * The distance between a pair of marks on the garment, rounded once to 0.0001 mm. `stepPx` is how many pixels of the
 * original the finest step of a mark is: more than one where only a smaller form of the picture is shown.
 */
export function readPair(scale: PatternScale, pair: MarkPair, stepPx = 1): PatternLength {
  const length = lengthOf(Number(rootHalfUp(scale.numerator * squaredPixels(pair), scale.denominator)));
  const mmPerPx = toMm(scale.distance) / scale.pixels;
  const setting = markUncertaintyPx(stepPx) * mmPerPx;
  const share = toMm(length) / toMm(scale.distance);
  return {
    length,
    uncertaintyMm: rootOfSquares([setting, share * setting, share * scale.distanceUncertaintyMm]),
  };
}

/** Pixels of the original for a millimetre of the garment, to two places: "3.21". */
export function pixelsPerMm({ numerator, denominator }: PatternScale): string {
  // px/mm = 10 000 ÷ √(n/d); its hundredfold, squared, is 10¹² · d ÷ n.
  return hundredths(rootHalfUp(1_000_000n * 1_000_000n * denominator, numerator));
}

/** The scale that the paper was drawn to: "1:4", "1:4.01"; nothing where the paper was not measured. */
export function drawnScale(onGarment: Length, onPaper: Length): string | undefined {
  if (onGarment <= 0 || onPaper <= 0) return undefined;
  if (onGarment >= onPaper) return `1:${plain(divideHalfUp(BigInt(onGarment) * 100n, BigInt(onPaper)))}`;
  return `${plain(divideHalfUp(BigInt(onPaper) * 100n, BigInt(onGarment)))}:1`;
}

function hundredths(value: bigint): string {
  const digits = value.toString().padStart(3, '0');
  return `${digits.slice(0, -2)}.${digits.slice(-2)}`;
}

const plain = (value: bigint): string => hundredths(value).replace(/\.?0+$/, '');
