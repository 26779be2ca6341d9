import type { NewReading } from '@ellwand/shared/records/sheet';
import { fromTyped, lengthProblemSentence } from '@ellwand/shared/units/parse-length';
import { newId } from '../../../lib/ids.js';
import type { Draft } from './drafts.js';
import { deviceName } from '../../../offline/device.js';
import type { SheetRow } from './rows.js';

export type Keyed =
  { readonly ok: true; readonly reading: NewReading } | { readonly ok: false; readonly sentence: string };

export interface Keying {
  readonly row: SheetRow;
  readonly readBy: string;
  readonly heldBy: string | null;
  readonly note?: string;
}

function base({ row, readBy, heldBy, note }: Keying) {
  return {
    id: newId(),
    pointId: row.point.id,
    round: row.round,
    worn: row.worn,
    // A correction is a new reading that takes the old one's place; nothing is overwritten.
    replaces: row.reading?.id ?? null,
    note: note ?? row.reading?.note ?? '',
    readBy,
    heldBy,
    device: deviceName(),
    keyedAt: new Date().toISOString(),
  };
}

/** A draft as a reading, exactly as keyed; or the sentence that says how to mend it. */
export function keyedReading(keying: Keying, draft: Draft): Keyed {
  const countText = draft.count.trim() === '' ? '0' : draft.count.trim();
  if (!/^\d{1,2}$/.test(countText) || Number(countText) > 20) {
    return { ok: false, sentence: 'Whole tapes are counted from 0 to 20.' };
  }
  // Whole tapes that come out even have no rest: an empty box then means nought, and only then.
  const text = draft.text.trim() === '' && Number(countText) > 0 ? '0' : draft.text.trim();
  const parsed = fromTyped({ text, unit: draft.unit });
  if (!parsed.ok) return { ok: false, sentence: lengthProblemSentence(parsed.problem) };
  const gap = beside(draft.gap, draft.unit);
  if (gap === false) return { ok: false, sentence: 'The gap cannot be read as a length.' };
  const depth = beside(draft.depth, draft.unit);
  if (depth === false)
    return { ok: false, sentence: 'The depth below the waist cannot be read as a length.' };
  const reading: NewReading = {
    ...base(keying),
    state: 'taken',
    typed: text,
    unit: parsed.value.unit,
    tapeCount: Number(countText),
    gapTyped: gap,
    method: draft.doubled ? 'flat-doubled' : null,
    depthTyped: depth,
    levelFoundBy: draft.level,
  };
  return { ok: true, reading };
}

/** A length keyed beside the reading: null where there is none, false where it cannot be read. */
function beside(text: string, unit: Draft['unit']): string | null | false {
  if (text.trim() === '') return null;
  return fromTyped({ text: text.trim(), unit }).ok && text.trim();
}

export function notTakenReading(
  keying: Keying,
  reason: Extract<NewReading, { state: 'not-taken' }>['reason'],
): NewReading {
  return { ...base(keying), state: 'not-taken', reason };
}

/** Whether the draft says anything that the standing reading does not. */
export function saysSomethingNew(draft: Draft, row: SheetRow): boolean {
  const { reading } = row;
  const count = Number(draft.count || 0);
  if (!reading || reading.reason !== null) return draft.text.trim() !== '' || count > 0;
  return (
    draft.text.trim() !== reading.typed ||
    draft.unit !== reading.unit ||
    count !== reading.tapeCount ||
    draft.level !== reading.level ||
    draft.gap.trim() !== reading.gapTyped ||
    draft.depth.trim() !== reading.depthTyped ||
    draft.doubled !== reading.doubled
  );
}
