/**
 * Exact lengths.
 *
 * A length is a whole number of ten-thousandths of a millimetre. The inch is 25.4 mm by definition, so
 * 1/16 in = 1.5875 mm = 15 875 of these units: sixteenths of an inch and every whole millimetre are exact,
 * sums stay exact, and nothing is rounded before it is shown (see format-length.ts).
 */

declare const lengthBrand: unique symbol;

/** A whole number of ten-thousandths of a millimetre; may be negative where it is a difference. */
export type Length = number & { readonly [lengthBrand]: 'ten-thousandths of a millimetre' };

/** How many of the stored units make a millimetre. */
export const UNITS_PER_MM = 10_000;

/** International yard and pound agreement of 1959: 1 in = 25.4 mm, exact by definition. */
export const UNITS_PER_INCH = 254_000;

/** A fault in the program or in stored data, never in what a person typed (for that see parse-length.ts). */
export class LengthError extends Error {
  override readonly name = 'LengthError';

  constructor(
    readonly code: 'not-exact' | 'out-of-reach' | 'not-a-decimal' | 'division-by-zero',
    readonly wanted: string,
    readonly came: string,
  ) {
    super(`expected ${wanted}, got ${came}`);
  }
}

/** A length from its stored units. Throws LengthError unless the number is a safe integer. */
export function lengthOf(tenThousandthsOfMm: number): Length {
  if (!Number.isInteger(tenThousandthsOfMm)) {
    throw new LengthError('not-exact', 'a whole number of 0.0001 mm', String(tenThousandthsOfMm));
  }
  if (!Number.isSafeInteger(tenThousandthsOfMm)) {
    throw new LengthError('out-of-reach', 'a length that can be held exactly', String(tenThousandthsOfMm));
  }
  // Adding zero turns −0 into 0, so that equal lengths are also identical.
  return (tenThousandthsOfMm + 0) as Length;
}

export const ZERO_LENGTH = lengthOf(0);

/** `mm('920.75')`, or `mm(612)` for whole millimetres. Throws LengthError for anything inexact. */
export function mm(value: string | number): Length {
  if (typeof value === 'string') return fromMmString(value);
  if (!Number.isInteger(value)) {
    throw new LengthError('not-exact', 'whole millimetres, or decimals as text', String(value));
  }
  return lengthOf(value * UNITS_PER_MM);
}

// At most twelve digits before the point: more could not be held exactly in any case.
const MM_STRING = /^(-?)(\d{1,12})(?:\.(\d{1,4}))?$/;

/** Whether `fromMmString` would take the text. */
export function isMmString(text: string): boolean {
  const match = MM_STRING.exec(text);
  return match !== null && Number.isSafeInteger(unitsFromMatch(match));
}

/** A length from decimal millimetres with at most four places ("612", "920.75", "-12.5"). */
export function fromMmString(text: string): Length {
  const match = MM_STRING.exec(text);
  if (!match) {
    throw new LengthError('not-a-decimal', 'millimetres with at most four decimal places', `"${text}"`);
  }
  return lengthOf(unitsFromMatch(match));
}

function unitsFromMatch([, sign, whole = '', decimals = '']: RegExpExecArray): number {
  const units = Number(whole) * UNITS_PER_MM + Number(decimals.padEnd(4, '0'));
  return sign === '-' ? -units : units;
}

/** Decimal millimetres without trailing zeros: "612", "920.75". The form lengths take in the API. */
export function toMmString(length: Length): string {
  const magnitude = Math.abs(length);
  const whole = Math.floor(magnitude / UNITS_PER_MM);
  const decimals = String(magnitude % UNITS_PER_MM)
    .padStart(4, '0')
    .replace(/0+$/, '');
  return `${length < 0 ? '-' : ''}${whole}${decimals ? `.${decimals}` : ''}`;
}

/** Millimetres as a floating number, for drawing and for uncertainties; never to be stored. */
export function toMm(length: Length): number {
  return length / UNITS_PER_MM;
}

export function add(first: Length, second: Length): Length {
  return lengthOf(first + second);
}

/** What is left of `from` when `taken` is taken off it; negative when more is taken than there was. */
export function subtract(from: Length, taken: Length): Length {
  return lengthOf(from - taken);
}

/** `count` must be a whole number. */
export function times(length: Length, count: number): Length {
  if (!Number.isInteger(count)) throw new LengthError('not-exact', 'a whole number of times', String(count));
  return lengthOf(length * count);
}

export function sumOf(lengths: readonly Length[]): Length {
  return lengths.reduce(add, ZERO_LENGTH);
}

/** Negative, zero or positive, for sorting shortest first. */
export function compareLengths(first: Length, second: Length): number {
  return first - second;
}

export function isLonger(first: Length, second: Length): boolean {
  return first > second;
}

export function absolute(length: Length): Length {
  return lengthOf(Math.abs(length));
}

export function longestOf(first: Length, ...others: readonly Length[]): Length {
  return others.reduce((longest, length) => (isLonger(length, longest) ? length : longest), first);
}

export function shortestOf(first: Length, ...others: readonly Length[]): Length {
  return others.reduce((shortest, length) => (isLonger(shortest, length) ? length : shortest), first);
}

/** How many times `part` goes into `whole`, as a plain number. Throws LengthError when `part` is zero. */
export function ratio(whole: Length, part: Length): number {
  if (part === 0) throw new LengthError('division-by-zero', 'a length other than zero to divide by', '0 mm');
  return whole / part;
}
