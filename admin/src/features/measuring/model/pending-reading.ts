import { pointIn } from '@ellwand/shared/protocols/protocol';
import { wholeValue } from '@ellwand/shared/readings/whole-value';
import { toProtocol } from '@ellwand/shared/records/protocol';
import type { NewReading, Sheet, StoredReading } from '@ellwand/shared/records/sheet';
import { fromMmString, type Length, mm, toMmString } from '@ellwand/shared/units/length';
import { fromTyped } from '@ellwand/shared/units/parse-length';

type Taken = Extract<NewReading, { state: 'taken' }>;

/** A length keyed beside the reading, in its unit; null where nothing, or nothing readable, was keyed. */
function beside(text: string | null, unit: Taken['unit']): Length | null {
  if (!text) return null;
  const parsed = fromTyped({ text, unit });
  return parsed.ok ? parsed.value.length : null;
}

/** The whole value that the API will work out, worked out here; null where what was keyed cannot be read. */
function wholeOf(reading: Taken, sheet: Sheet): Length | null {
  const parsed = fromTyped({ text: reading.typed, unit: reading.unit });
  const point = pointIn(toProtocol(sheet.protocol), reading.pointId);
  if (!parsed.ok || !point) return null;
  const gap = beside(reading.gapTyped, reading.unit);
  const { tapeLengthMm, tapeZeroMm } = sheet.facts;
  return wholeValue({
    read: parsed.value.length,
    how: reading.method ?? point.how,
    tapeCount: reading.tapeCount,
    tapeLength: mm(tapeLengthMm),
    tapeZero: mm(tapeZeroMm),
    ...(gap === null ? {} : { gap }),
  });
}

const asMm = (length: Length | null): string | null => (length === null ? null : toMmString(length));

/** A reading that waits on this device, as it will be kept. Null where the API would refuse it. */
export function asStored(reading: NewReading, sheet: Sheet, by: string): StoredReading | null {
  const { id, pointId, round, worn, replaces, note, readBy, heldBy, device, keyedAt } = reading;
  const base = { id, pointId, round, worn, replaces, note, readBy, heldBy, device, keyedAt };
  const kept = { ...base, stands: true, recordedBy: by, receivedAt: keyedAt };
  if (reading.state === 'not-taken')
    return { ...kept, ...nothing, state: 'not-taken', reason: reading.reason };
  const whole = wholeOf(reading, sheet);
  if (whole === null || whole < 0) return null;
  const { typed, unit, tapeCount, gapTyped, depthTyped, method, levelFoundBy } = reading;
  return {
    ...kept,
    ...{ state: 'taken', reason: null, typed, unit, tapeCount, gapTyped, depthTyped, method, levelFoundBy },
    valueMm: toMmString(whole),
    tapeLengthMm: tapeCount > 0 ? toMmString(fromMmString(sheet.facts.tapeLengthMm)) : null,
    gapMm: asMm(beside(gapTyped, unit)),
    depthMm: asMm(beside(depthTyped, unit)),
  };
}

const nothing = {
  valueMm: null,
  typed: null,
  unit: null,
  tapeCount: 0,
  tapeLengthMm: null,
  gapTyped: null,
  gapMm: null,
  method: null,
  depthTyped: null,
  depthMm: null,
  levelFoundBy: null,
} as const;

/** Everything read so far: what the API has, and over it what waits here, in the order in which it was keyed. */
export function readingsSoFar(
  sheet: Sheet,
  pending: readonly NewReading[],
  by: string,
): readonly StoredReading[] {
  const waiting = pending.flatMap((reading) => asStored(reading, sheet, by) ?? []);
  const replaced = new Set(waiting.map(({ replaces }) => replaces));
  const known = new Set(waiting.map(({ id }) => id));
  const all = [...sheet.readings.filter(({ id }) => !known.has(id)), ...waiting];
  return all.map((reading) => (replaced.has(reading.id) ? { ...reading, stands: false } : reading));
}
