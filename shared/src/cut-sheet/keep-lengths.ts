/** From a cut sheet as it was sent to one as it is kept: every typed length with its exact millimetres. */
import { CutSheetBody, type KeptLength, type NewCutSheet, TypedLength } from '../records/cut-sheet.js';
import { toMmString } from '../units/length.js';
import { fromTyped } from '../units/parse-length.js';

/** Throws RangeError for text that `TypedLength` would have refused. */
export function keptLength({ typed, unit }: TypedLength): KeptLength {
  const read = fromTyped({ text: typed, unit });
  if (!read.ok) throw new RangeError(`expected a length, got “${typed}” (${read.problem.code})`);
  return { typed, unit: read.value.unit, mm: toMmString(read.value.length) };
}

/** The cut sheet with every length worked out; everything else is as it was. */
export function keptCutSheet(sheet: NewCutSheet): CutSheetBody {
  return CutSheetBody.parse(withLengths(sheet));
}

function withLengths(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(withLengths);
  if (typeof value !== 'object' || value === null) return value;
  const length = TypedLength.safeParse(value);
  if (length.success) return keptLength(length.data);
  return Object.fromEntries(Object.entries(value).map(([name, inner]) => [name, withLengths(inner)]));
}

/** Nothing said at all: what a part has before anybody writes. */
export const emptyCutSheet: CutSheetBody = CutSheetBody.parse({
  pieces: [],
  darts: [],
  neck: {},
  underarm: {},
  fullness: [],
  bones: [],
  seams: [],
});

/** Whether there is anything on it beside the unit of its boxes. */
export function isEmptyCutSheet(sheet: CutSheetBody): boolean {
  return JSON.stringify({ ...sheet, unit: 'mm' }) === JSON.stringify(emptyCutSheet);
}
