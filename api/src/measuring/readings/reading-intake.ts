import { protocolFor } from '@ellwand/shared/protocols/standard-protocols';
import { protocolPointIds } from '@ellwand/shared/protocols/protocol';
import { findMeasuringPoint } from '@ellwand/shared/points/measuring-points';
import { lowerKind, type GarmentKind } from '@ellwand/shared/points/kinds';
import type { MeasuringHow } from '@ellwand/shared/points/point';
import type { NewReading } from '@ellwand/shared/records/sheet';
import { wholeValue } from '@ellwand/shared/readings/whole-value';
import type { LengthUnit } from '@ellwand/shared/units/format-length';
import { fromMmString, toMmString, type Length } from '@ellwand/shared/units/length';
import { fromTyped, lengthProblemSentence } from '@ellwand/shared/units/parse-length';

/** The sheet's facts that a reading is worked out with. */
export interface TapeFacts {
  readonly kind: GarmentKind;
  readonly tapeLengthMm: string;
  readonly tapeZeroMm: string;
  /** Whoever the sheet names as reading the tape. */
  readonly readers: readonly string[];
}

export type Intake =
  | {
      readonly accepted: true;
      readonly valueMm: string | null;
      readonly unit: LengthUnit | null;
      readonly tapeLengthMm: string | null;
    }
  | { readonly accepted: false; readonly because: string };

const refused = (because: string): Intake => ({ accepted: false, because });

/** The longest that the database holds: six digits of millimetres. */
const longest = fromMmString('999999');

/**
 * Works out a reading's whole value from what was keyed, exactly; or says in a sentence why it cannot be taken.
 * Only what cannot be read at all is refused here. What is merely unlikely is a matter for the checks.
 */
export function takeIn(reading: NewReading, facts: TapeFacts): Intake {
  const point = findMeasuringPoint(reading.pointId);
  const asked = protocolPointIds(protocolFor(facts.kind)).some((id) => id === reading.pointId);
  if (!point || !asked)
    return refused(`A ${lowerKind(facts.kind)} has no measuring point “${reading.pointId}”.`);
  if (!facts.readers.includes(reading.readBy))
    return refused('The sheet does not name that person as reading the tape.');
  if (reading.state === 'not-taken') return { accepted: true, valueMm: null, unit: null, tapeLengthMm: null };

  return workOut({ ...reading, how: point.how }, facts);
}

/** What was read off the tape, as it is keyed and as it is kept. */
interface Keyed {
  readonly typed: string;
  readonly unit: LengthUnit;
  readonly tapeCount: number;
  readonly how: MeasuringHow;
}

/** The whole value of what was keyed, with the tape as the sheet describes it. */
export function workOut(keyed: Keyed, tape: Pick<TapeFacts, 'tapeLengthMm' | 'tapeZeroMm'>): Intake {
  const parsed = fromTyped({ text: keyed.typed, unit: keyed.unit });
  if (!parsed.ok) return refused(lengthProblemSentence(parsed.problem));
  const value = wholeValue({
    read: parsed.value.length,
    how: keyed.how,
    tapeCount: keyed.tapeCount,
    tapeLength: fromMmString(tape.tapeLengthMm),
    tapeZero: fromMmString(tape.tapeZeroMm),
  });
  return (
    inReach(value) ?? {
      accepted: true,
      valueMm: toMmString(value),
      // A unit typed beside the figure wins over the field's own.
      unit: parsed.value.unit,
      tapeLengthMm: keyed.tapeCount > 0 ? tape.tapeLengthMm : null,
    }
  );
}

function inReach(value: Length): Intake | undefined {
  if (value < 0) return refused('The tape’s zero is longer than what was read.');
  if (value > longest) return refused('That is longer than a kilometre.');
  return undefined;
}
