import type { GarmentKind } from '@ellwand/shared/points/kinds';
import { softRangeFor } from '@ellwand/shared/points/measuring-points';
import { formatLength } from '@ellwand/shared/units/format-length';
import { isLonger } from '@ellwand/shared/units/length';
import { type SheetRow, spreadOf } from './rows.js';

export interface RowState {
  readonly word: string;
  readonly tone: 'open' | 'good' | 'look' | 'decide' | 'aside';
  /** A sentence for the line under the point's name; a warning, never a refusal. */
  readonly sentence?: string;
}

/** The state word of a row, and what there is to say of it while the garment is still on the table. */
export function rowState(row: SheetRow, rows: readonly SheetRow[], kind: GarmentKind): RowState {
  const { reading, decision, covered, point } = row;
  if (decision) return { word: 'your decision', tone: 'decide' };
  if (covered) return { word: 'covered', tone: 'open', sentence: 'Covered until the next reading is in.' };
  if (!reading) return { word: point.required ? 'to do' : 'if it applies', tone: 'open' };
  if (reading.reason !== null) return { word: 'not taken', tone: 'aside' };
  const spread = spreadOf(rows, row);
  if (spread && row.round > 1) {
    const word = `${formatLength(spread.apart, 'mm')} apart`;
    if (spread.within) return { word, tone: 'good' };
    return {
      word,
      tone: 'look',
      sentence: `Readings ${word}; ${formatLength(spread.allowed, 'mm')} is usual. Read it once more.`,
    };
  }
  const range = softRangeFor(point.point, kind);
  const value = reading.value;
  if (value !== null && (isLonger(range.from, value) || isLonger(value, range.to))) {
    const usual = `${formatLength(range.from, 'mm')} to ${formatLength(range.to, 'mm')}`;
    return {
      word: 'look again',
      tone: 'look',
      sentence: `${formatLength(value, 'mm')}; usual here is ${usual}. Look again while it lies open.`,
    };
  }
  return { word: reading.sent ? 'taken' : 'kept here', tone: 'good' };
}
