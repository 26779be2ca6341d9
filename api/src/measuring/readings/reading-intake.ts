import { pointIn, type Protocol, protocolPointIds } from '@ellwand/shared/protocols/protocol';
import { lowerKind } from '@ellwand/shared/points/kinds';
import type { MeasuringHow } from '@ellwand/shared/points/point';
import type { NewReading } from '@ellwand/shared/records/sheet';
import { wholeValue } from '@ellwand/shared/readings/whole-value';
import type { LengthUnit } from '@ellwand/shared/units/format-length';
import { fromMmString, toMmString, type Length } from '@ellwand/shared/units/length';
import { fromTyped, lengthProblemSentence } from '@ellwand/shared/units/parse-length';

/** The sheet's facts that a reading is worked out with. */
export interface TapeFacts {
  readonly protocol: Protocol;
  readonly tapeLengthMm: string;
  readonly tapeZeroMm: string;
  /** Whoever the sheet names as reading the tape. */
  readonly readers: readonly string[];
  /** Everybody whom the sheet names. */
  readonly named: readonly string[];
}

export type Intake =
  | {
      readonly accepted: true;
      readonly valueMm: string | null;
      readonly unit: LengthUnit | null;
      readonly tapeLengthMm: string | null;
      readonly gapMm: string | null;
      readonly depthMm: string | null;
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
  const point = pointIn(facts.protocol, reading.pointId);
  if (!point || !protocolPointIds(facts.protocol).includes(reading.pointId))
    return refused(`A ${lowerKind(facts.protocol.kind)} has no measuring point “${reading.pointId}”.`);
  if (reading.worn && !point.paired) return refused(`${point.name} has no left and right.`);
  if (!facts.readers.includes(reading.readBy))
    return refused('The sheet does not name that person as reading the tape.');
  if (reading.heldBy !== null && !facts.named.includes(reading.heldBy))
    return refused('The sheet does not name that person as holding the tape.');
  if (reading.state === 'not-taken')
    return { accepted: true, valueMm: null, unit: null, tapeLengthMm: null, gapMm: null, depthMm: null };

  return workOut({ ...reading, how: reading.method ?? point.how }, facts);
}

/** What was read off the tape, as it is keyed and as it is kept. */
interface Keyed {
  readonly typed: string;
  readonly unit: LengthUnit;
  readonly tapeCount: number;
  readonly how: MeasuringHow;
  readonly gapTyped: string | null;
  readonly depthTyped: string | null;
}

/** The whole value of what was keyed, with the tape as the sheet describes it. */
export function workOut(keyed: Keyed, tape: Pick<TapeFacts, 'tapeLengthMm' | 'tapeZeroMm'>): Intake {
  const parsed = fromTyped({ text: keyed.typed, unit: keyed.unit });
  if (!parsed.ok) return refused(lengthProblemSentence(parsed.problem));
  const gap = beside(keyed.gapTyped, keyed.unit);
  if (typeof gap === 'string') return refused(`The gap: ${gap}`);
  const depth = beside(keyed.depthTyped, keyed.unit);
  if (typeof depth === 'string') return refused(`The depth below the waist: ${depth}`);
  const value = wholeValue({
    read: parsed.value.length,
    how: keyed.how,
    tapeCount: keyed.tapeCount,
    tapeLength: fromMmString(tape.tapeLengthMm),
    tapeZero: fromMmString(tape.tapeZeroMm),
    ...(gap === null ? {} : { gap }),
  });
  return (
    inReach(value) ?? {
      accepted: true,
      valueMm: toMmString(value),
      // A unit typed beside the figure wins over the field's own.
      unit: parsed.value.unit,
      tapeLengthMm: keyed.tapeCount > 0 ? tape.tapeLengthMm : null,
      gapMm: gap === null ? null : toMmString(gap),
      depthMm: depth === null ? null : toMmString(depth),
    }
  );
}

/** A length keyed beside the reading: null where there is none, a sentence where it cannot be read. */
function beside(text: string | null, unit: LengthUnit): Length | string | null {
  if (text === null || text === '') return null;
  const parsed = fromTyped({ text, unit });
  return parsed.ok ? parsed.value.length : lengthProblemSentence(parsed.problem);
}

function inReach(value: Length): Intake | undefined {
  if (value < 0) return refused('The tape’s zero, or the gap, is longer than what was read.');
  if (value > longest) return refused('That is longer than a kilometre.');
  return undefined;
}
