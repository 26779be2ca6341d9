/**
 * What people type into a length field, read exactly or refused in words. Nothing here throws and nothing
 * rounds: a typed value that has no exact place among 0.0001 mm is a problem for the person to decide.
 */
import { type LengthUnit, lengthUnits } from './format-length.js';
import { type Length, lengthOf } from './length.js';

export interface TypedLength {
  readonly text: string;
  /** The unit of the field; a unit typed in the text wins over it. */
  readonly unit: LengthUnit;
}

/** A length as read from text: the exact value, the unit it was given in, and the text as it came. */
export interface ParsedLength {
  readonly length: Length;
  readonly unit: LengthUnit;
  readonly typed: string;
}

export type LengthProblemCode =
  | 'empty'
  | 'too-long'
  | 'unknown-unit'
  | 'not-a-number'
  | 'negative'
  | 'improper-fraction'
  | 'zero-denominator'
  | 'too-fine'
  | 'too-large';

export interface LengthProblem {
  readonly code: LengthProblemCode;
  /** Where in the typed text (from 0) the trouble begins. */
  readonly at: number;
  readonly wanted: string;
  readonly came: string;
}

export type LengthResult =
  | { readonly ok: true; readonly value: ParsedLength }
  | { readonly ok: false; readonly problem: LengthProblem };

/** Longest text worth reading; keeps hostile input cheap. */
const LONGEST_TEXT = 40;

/** Nothing in dress is longer than 100 m: a greater figure is a slip of the key. */
const LONGEST_LENGTH = lengthOf(100_000 * 10_000);

const unitWords: Readonly<Record<string, LengthUnit>> = {
  mm: 'mm',
  millimetre: 'mm',
  millimetres: 'mm',
  millimeter: 'mm',
  millimeters: 'mm',
  cm: 'cm',
  centimetre: 'cm',
  centimetres: 'cm',
  centimeter: 'cm',
  centimeters: 'cm',
  in: 'in',
  'in.': 'in',
  ins: 'in',
  inch: 'in',
  inches: 'in',
  '"': 'in',
  '″': 'in',
  '”': 'in',
};

const vulgarFractions: Readonly<Record<string, string>> = {
  '½': '1/2',
  '¼': '1/4',
  '¾': '3/4',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
};

/** A fraction numerator ÷ (denominator) of the unit, before it is turned into a length. */
interface Quotient {
  readonly numerator: bigint;
  readonly denominator: bigint;
}

type NumberResult = { ok: true; value: Quotient } | { ok: false; code: LengthProblemCode; wanted: string };

/** Stored units (0.0001 mm) in one of each unit. */
const unitsPer: Readonly<Record<LengthUnit, bigint>> = { mm: 10_000n, cm: 100_000n, in: 254_000n };

/** Reads `612`, `61,5 cm`, `24 3/8`, `24-3/8 in`, `24.375"`. */
export function fromTyped({ text, unit }: TypedLength): LengthResult {
  const start = text.length - text.trimStart().length;
  const refuse = (code: LengthProblemCode, wanted: string, came = text.trim(), at = start): LengthResult => ({
    ok: false,
    problem: { code, at, wanted, came },
  });
  if (text.length > LONGEST_TEXT) {
    return refuse('too-long', `at most ${LONGEST_TEXT} characters`, `${text.length} characters`);
  }
  if (text.trim() === '') return refuse('empty', 'a length', 'nothing');

  const { figure, unitText } = splitUnit(text.trim());
  const typedUnit = unitText === '' ? unit : unitWords[unitText.toLowerCase()];
  if (!typedUnit) return refuse('unknown-unit', lengthUnits.join(', '), unitText, text.indexOf(unitText));
  if (/^[-\u2212\u2013]/.test(figure)) return refuse('negative', 'a length of 0 or more');

  const number = typedUnit === 'in' ? readInches(figure) : readDecimal(figure.replace(/\s+/g, ''));
  if (!number.ok) return refuse(number.code, number.wanted);

  const units = number.value.numerator * unitsPer[typedUnit];
  if (units % number.value.denominator !== 0n) {
    return refuse(
      'too-fine',
      typedUnit === 'in'
        ? 'sixteenths of an inch at the finest'
        : 'at most four decimal places of a millimetre',
    );
  }
  const length = units / number.value.denominator;
  if (length > BigInt(LONGEST_LENGTH)) return refuse('too-large', 'at most 100 m');
  return { ok: true, value: { length: lengthOf(Number(length)), unit: typedUnit, typed: text } };
}

/** The figure and whatever comes after its last digit (or fraction sign). */
function splitUnit(text: string): { figure: string; unitText: string } {
  const tail = /[^\d½¼¾⅛⅜⅝⅞]*$/.exec(text)?.[0] ?? '';
  const figure = text.slice(0, text.length - tail.length);
  // No figure at all ("mm"), or one not finished ("612."): not a matter of the unit.
  if (figure === '' || /^[.,/]/.test(tail)) return { figure: text, unitText: '' };
  return { figure, unitText: tail.trim() };
}

function readDecimal(figure: string): NumberResult {
  const match = /^(\d+)(?:[.,](\d+))?$/.exec(figure) ?? /^()[.,](\d+)$/.exec(figure);
  if (!match) return { ok: false, code: 'not-a-number', wanted: 'a number such as 612 or 61.5' };
  const [, whole = '', decimals = ''] = match;
  return {
    ok: true,
    value: { numerator: BigInt(whole + decimals), denominator: 10n ** BigInt(decimals.length) },
  };
}

function readInches(figure: string): NumberResult {
  const plain = figure
    .replace(/\u2044/g, '/')
    .replace(/[½¼¾⅛⅜⅝⅞]/g, (sign) => ` ${vulgarFractions[sign] ?? sign}`)
    .trim();
  const match = /^(?:(\d+)(?:\s+|\s*[-\u2013]\s*))?(\d+)\s*\/\s*(\d+)$/.exec(plain);
  if (!match) {
    const decimal = readDecimal(plain);
    return decimal.ok ? decimal : { ...decimal, wanted: 'inches such as 24, 24 3/8, 24-3/8 or 24.375' };
  }
  const whole = match[1] === undefined ? undefined : BigInt(match[1]);
  const numerator = BigInt(match[2] ?? '0');
  const denominator = BigInt(match[3] ?? '1');
  if (denominator === 0n) return { ok: false, code: 'zero-denominator', wanted: 'a fraction such as 3/8' };
  if (whole !== undefined && numerator >= denominator) {
    return { ok: false, code: 'improper-fraction', wanted: 'a fraction smaller than one, such as 3/8' };
  }
  return { ok: true, value: { numerator: (whole ?? 0n) * denominator + numerator, denominator } };
}

/** The problem as a sentence for the person who typed; the field's label goes before it. */
export function lengthProblemSentence({ code, wanted, came }: LengthProblem): string {
  switch (code) {
    case 'empty':
      return `Enter ${wanted}.`;
    case 'unknown-unit':
      return `“${came}” is not a unit used here. Use ${wanted}.`;
    default:
      return `“${came}” cannot be kept: ${wanted} is wanted.`;
  }
}
