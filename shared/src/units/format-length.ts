/** How lengths are shown. Each function rounds once, half-up, straight from the exact length. */
import { deservedDenominator, type InchDenominator, toMixedInches } from './fractions.js';
import { type Length, UNITS_PER_MM } from './length.js';
import { divideHalfUp } from './rounding.js';

/** The units people read and type. */
export type LengthUnit = 'mm' | 'cm' | 'in';

export const lengthUnits: readonly LengthUnit[] = ['mm', 'cm', 'in'];

export const unitLabels: Readonly<Record<LengthUnit, string>> = {
  mm: 'millimetres',
  cm: 'centimetres',
  in: 'inches',
};

const MINUS = '\u2212';

const unitsPerMetric = { mm: UNITS_PER_MM, cm: 10 * UNITS_PER_MM, m: 1000 * UNITS_PER_MM } as const;

export interface LengthFormat {
  /** Decimal places; mm are shown whole and cm with one place unless said otherwise. */
  readonly places?: number;
  /** Steps of an inch; eighths unless said otherwise. */
  readonly denominator?: InchDenominator;
}

/** A metric length without its unit, with exactly `places` decimals: `decimalText(mm('1018.54'), 'cm', 1)` is "101.9". */
export function decimalText(length: Length, unit: keyof typeof unitsPerMetric, places: number): string {
  const steps = divideHalfUp(BigInt(length) * 10n ** BigInt(places), BigInt(unitsPerMetric[unit]));
  const digits = (steps < 0n ? -steps : steps).toString().padStart(places + 1, '0');
  const cut = digits.length - places;
  return `${steps < 0n ? MINUS : ''}${digits.slice(0, cut)}${places ? `.${digits.slice(cut)}` : ''}`;
}

/** Inches without the unit: "12 3/16", "24", "3/8", "0". */
export function inchText(length: Length, denominator: InchDenominator = 8): string {
  const { negative, whole, numerator, denominator: over } = toMixedInches(length, denominator);
  const fraction = numerator ? `${numerator}/${over}` : '';
  const figure = whole && fraction ? `${whole} ${fraction}` : fraction || String(whole);
  return negative ? `${MINUS}${figure}` : figure;
}

/** The figure alone, in the unit asked for; the column or field names the unit. */
export function figureText(length: Length, unit: LengthUnit, format: LengthFormat = {}): string {
  if (unit === 'in') return inchText(length, format.denominator);
  return decimalText(length, unit, format.places ?? (unit === 'cm' ? 1 : 0));
}

/** "612 mm", "61.2 cm", "24 1/8 in". */
export function formatLength(length: Length, unit: LengthUnit, format: LengthFormat = {}): string {
  return `${figureText(length, unit, format)} ${unit}`;
}

/** Whole millimetres as they are read at the table; tenths where the length has them: "612 mm", "711.2 mm". */
export function readMm(length: Length): string {
  return `${decimalText(length, 'mm', length % UNITS_PER_MM === 0 ? 0 : 1)} mm`;
}

/** Metric first, inches after, as the house writes lengths: "612 mm (24 1/8 in)". */
export function formatBoth(length: Length, denominator: InchDenominator = 8): string {
  return `${formatLength(length, 'mm')} (${formatLength(length, 'in', { denominator })})`;
}

/** Inches no finer than the standard uncertainty (mm) deserves. */
export function formatDeservedInches(
  length: Length,
  uncertaintyMm: number,
  wanted: InchDenominator = 8,
): string {
  return formatLength(length, 'in', { denominator: deservedDenominator(uncertaintyMm, wanted) });
}
