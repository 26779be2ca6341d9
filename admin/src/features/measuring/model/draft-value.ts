import type { Sheet } from '@ellwand/shared/records/sheet';
import { type Length, mm } from '@ellwand/shared/units/length';
import type { Draft } from './drafts.js';
import { keyedReading } from './keyed-reading.js';
import { asStored } from './pending-reading.js';
import type { SheetRow } from './rows.js';

/** What a draft would come to, with tapes, doubling, gap and the tape’s zero; null where it cannot be read yet. */
export function draftValue(sheet: Sheet, row: SheetRow, draft: Draft): Length | null {
  const keyed = keyedReading({ row, readBy: '', heldBy: null }, draft);
  const kept = keyed.ok ? asStored(keyed.reading, sheet, '') : null;
  return kept?.valueMm ? mm(kept.valueMm) : null;
}
