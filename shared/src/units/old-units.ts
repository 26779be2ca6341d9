/**
 * Units met in old records. The record's own word is always kept beside a converted value, and where one
 * word stood for several lengths (the aune) each has its own entry: which was meant is never guessed.
 */
import { type Length, lengthOf, UNITS_PER_MM } from './length.js';
import { divideHalfUp } from './rounding.js';

export interface OldUnit {
  readonly id: string;
  readonly name: string;
  /** Millimetres in one unit, as an exact quotient of whole numbers. */
  readonly mm: { readonly numerator: number; readonly denominator: number };
  readonly source: string;
}

const INCH_1959 = 'International yard and pound agreement of 1959 (NBS Circular 572, addendum)';
const METRE_LAW = 'Law of 19 frimaire year VIII (10 December 1799): the metre is 443.296 lines of Paris';

/** Inches are 254/10 mm exactly. */
function inches(id: string, name: string, count: number, note = ''): OldUnit {
  return { id, name, mm: { numerator: count * 254, denominator: 10 }, source: INCH_1959 + note };
}

/** A Paris line is 1000 mm ÷ 443.296; `sixths` counts sixths of a line, since one aune ends in 5/6. */
function parisLines(id: string, name: string, sixths: number, note = ''): OldUnit {
  return {
    id,
    name,
    mm: { numerator: sixths * 1_000_000, denominator: 6 * 443_296 },
    source: METRE_LAW + note,
  };
}

export const oldUnits = [
  // A sixteenth of a yard: 2 1/4 in, written as 9/4 so that the quotient stays whole.
  {
    id: 'nail',
    name: 'nail of cloth (1/16 yard)',
    mm: { numerator: 9 * 254, denominator: 40 },
    source: INCH_1959,
  },
  inches('foot', 'foot', 12),
  inches('yard', 'yard', 36),
  inches('english-ell', 'English ell (45 in)', 45),
  inches('flemish-ell', 'Flemish ell (27 in)', 27),
  inches('french-ell-english-reckoning', 'French ell by English reckoning (54 in)', 54),
  parisLines('paris-line', 'ligne of Paris', 6),
  parisLines('paris-inch', 'pouce of Paris', 12 * 6),
  parisLines('paris-foot', 'pied du roi', 144 * 6),
  parisLines('aune-524', 'aune of Paris, 524 lignes', 524 * 6, '; 524 lignes'),
  parisLines('aune-1742', 'aune of Paris, 526 5/6 lignes', 526 * 6 + 5, '; 526 5/6 lignes, as found in 1742'),
  {
    id: 'aune-usuelle',
    name: 'aune usuelle',
    mm: { numerator: 1200, denominator: 1 },
    source: 'The usual measures allowed in France in 1812: the aune usuelle is 12 decimetres',
  },
] as const satisfies readonly OldUnit[];

export type OldUnitId = (typeof oldUnits)[number]['id'];

export function oldUnit(id: OldUnitId): OldUnit {
  const found = oldUnits.find((unit) => unit.id === id);
  if (!found) throw new RangeError(`expected an old unit, got "${id}"`);
  return found;
}

/** Millimetres in `count` units as a floating number, for showing the factor. */
export function oldUnitMm(id: OldUnitId, count = 1): number {
  const { numerator, denominator } = oldUnit(id).mm;
  return (numerator * count) / denominator;
}

export interface ConvertedLength {
  readonly length: Length;
  /** False where the old unit is no whole number of 0.0001 mm and was rounded, half-up, once. */
  readonly exact: boolean;
}

/** `count` must be a whole number of the old unit. */
export function fromOldUnit(id: OldUnitId, count: number): ConvertedLength {
  const { numerator, denominator } = oldUnit(id).mm;
  const units = BigInt(numerator) * BigInt(count) * BigInt(UNITS_PER_MM);
  return {
    length: lengthOf(Number(divideHalfUp(units, BigInt(denominator)))),
    exact: units % BigInt(denominator) === 0n,
  };
}
