/** From readings as they travel and are kept to readings as the domain reasons about them, and back to what is shown. */
import type { z } from 'zod';
import type { DerivedValue } from '../derivations/derivation.js';
import type { DeriveContext } from '../derivations/part-figures.js';
import { deriveFromReadings } from '../derivations/registry.js';
import type { GarmentKind } from '../points/kinds.js';
import type { Reading } from '../readings/reading.js';
import { shownUncertainty } from '../readings/uncertainty.js';
import { fromMmString, toMmString } from '../units/length.js';
import { fromTyped } from '../units/parse-length.js';
import type { DerivedView, StoredReading } from './sheet.js';

/** The domain's reading. Throws LengthError where a kept value is not a length. */
export function toReading(stored: StoredReading): Reading {
  const { id, pointId, round, stands, note, readBy } = stored;
  const worn = stored.worn ? { worn: stored.worn } : {};
  const facts = { id, pointId, round, stands, note, readBy, ...worn };
  if (stored.state === 'not-taken' || stored.valueMm === null) {
    return { ...facts, state: 'not-taken', ...(stored.reason ? { notTakenReason: stored.reason } : {}) };
  }
  const tapeLengths = tapeLengthsOf(stored);
  return {
    ...facts,
    state: 'taken',
    length: fromMmString(stored.valueMm),
    ...(stored.typed !== null ? { typed: stored.typed } : {}),
    ...(stored.unit ? { unit: stored.unit } : {}),
    ...(stored.levelFoundBy ? { levelFoundBy: stored.levelFoundBy } : {}),
    ...(tapeLengths ? { tapeLengths } : {}),
    ...(stored.method ? { method: stored.method } : {}),
    ...(stored.gapMm ? { gap: fromMmString(stored.gapMm) } : {}),
    ...(stored.depthMm ? { depthBelowWaist: fromMmString(stored.depthMm) } : {}),
  };
}

function tapeLengthsOf({ tapeCount, tapeLengthMm, typed, unit }: StoredReading) {
  if (tapeCount === 0 || tapeLengthMm === null || typed === null || unit === null) return undefined;
  const rest = fromTyped({ text: typed, unit });
  return rest.ok
    ? { count: tapeCount, tape: fromMmString(tapeLengthMm), rest: rest.value.length }
    : undefined;
}

/** Another part of the same garment, with the readings that speak for it. */
export interface OtherPartStored {
  readonly kind: GarmentKind;
  readonly name?: string;
  readonly readings: readonly StoredReading[];
}

export interface DerivedContext extends Omit<DeriveContext, 'otherParts'> {
  readonly otherParts?: readonly OtherPartStored[];
}

/** The derived values that the readings of a part allow, with those of the other parts, as they are shown. */
export function derivedViews(
  kind: GarmentKind,
  readings: readonly StoredReading[],
  { otherParts = [], ...context }: DerivedContext = {},
): z.output<typeof DerivedView>[] {
  const others = otherParts.map((part) => ({ ...part, readings: part.readings.map(toReading) }));
  return deriveFromReadings(kind, readings.map(toReading), { ...context, otherParts: others }).map(
    toDerivedView,
  );
}

function toDerivedView({
  id,
  label,
  formula,
  worked,
  figure,
  trace,
}: DerivedValue): z.output<typeof DerivedView> {
  return {
    id,
    label,
    formula,
    worked,
    valueMm: figure.type === 'length' ? toMmString(figure.length) : null,
    ratio: figure.type === 'ratio' ? figure.text : null,
    uncertaintyMm: figure.type === 'length' ? toMmString(shownUncertainty(figure.uncertaintyMm)) : null,
    trace: trace.map(({ pointId, label: name, value, elsewhere }) => ({
      pointId,
      label: name,
      valueMm: toMmString(value),
      ...(elsewhere ? { elsewhere } : {}),
    })),
  };
}
