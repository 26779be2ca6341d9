/** Readings for tests, written the way a sheet is read aloud: `read('waist', 612)`. */
import type { NotTakenReading, NotTakenReason, TakenReading } from '../readings/reading.js';
import { tapeLengthsTotal } from '../readings/whole-value.js';
import { mm } from '../units/length.js';

/** A reading of whole (or, as text, decimal) millimetres; `more` overrides any of its facts. */
export function read(
  pointId: string,
  valueMm: number | string,
  more: Partial<TakenReading> = {},
): TakenReading {
  const round = more.round ?? 1;
  return {
    id: `${pointId}-${round}`,
    pointId,
    round,
    state: 'taken',
    length: mm(valueMm),
    typed: String(valueMm),
    unit: 'mm',
    ...more,
  };
}

/** The same point in several rounds. */
export function rounds(pointId: string, ...valuesMm: readonly number[]): TakenReading[] {
  return valuesMm.map((valueMm, index) => read(pointId, valueMm, { round: index + 1 }));
}

export function inTapeLengths(pointId: string, count: number, restMm: number, round = 1): TakenReading {
  const tapeLengths = { count, tape: mm(1500), rest: mm(restMm) };
  return read(pointId, restMm, { round, tapeLengths, length: tapeLengthsTotal(tapeLengths) });
}

export function notTaken(pointId: string, notTakenReason?: NotTakenReason): NotTakenReading {
  const reading = { id: `${pointId}-1`, pointId, round: 1, state: 'not-taken' } as const;
  return notTakenReason ? { ...reading, notTakenReason } : reading;
}
