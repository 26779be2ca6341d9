/** From what was read off the tape to the whole value of a point. Every step is exact. */
import type { MeasuringHow } from '../points/point.js';
import { add, type Length, subtract, times, ZERO_LENGTH } from '../units/length.js';
import type { TapeLengths } from './reading.js';

export function tapeLengthsTotal({ count, tape, rest }: TapeLengths): Length {
  return add(times(tape, count), rest);
}

/** No garment takes more: a greater count is a slip, and must not carry any sum away with it. */
const MOST_JOINS = 100;

/** How often the end of one tape length was joined to the start of the next; none when there is no rest to join. */
export function tapeJoins({ count, rest }: TapeLengths): number {
  if (!Number.isInteger(count)) return 0;
  return Math.min(Math.max(rest > 0 ? count : count - 1, 0), MOST_JOINS);
}

/** How often the tape was laid down: each time its zero error is read along. */
function timesLaid(lengths: TapeLengths): number {
  return lengths.count + (lengths.rest > 0 ? 1 : 0);
}

export interface TapeReading {
  /** What the tape showed; the rest where whole tapes were counted, the half where it was laid flat. */
  readonly read: Length;
  readonly how: MeasuringHow;
  /** Whole tapes before the rest; none where left out. */
  readonly tapeCount?: number;
  readonly tapeLength?: Length;
  /** What the tape shows where it should show nothing. */
  readonly tapeZero?: Length;
  /** The cloth too weak to close: the tape crossed a gap, which is not part of the garment. */
  readonly gap?: Length;
}

/**
 * The whole value of a point. The tape's zero is taken off once for each time the tape was laid down, a half
 * is doubled after that, and a gap is taken off last. May come out below zero if the zero or gap is wrong.
 */
export function wholeValue(reading: TapeReading): Length {
  const { read, how, tapeCount = 0, tapeLength = ZERO_LENGTH } = reading;
  const { tapeZero = ZERO_LENGTH, gap = ZERO_LENGTH } = reading;
  const lengths: TapeLengths = { count: tapeCount, tape: tapeLength, rest: read };
  const laid = tapeCount === 0 ? 1 : timesLaid(lengths);
  const trueLength = subtract(tapeLengthsTotal(lengths), times(tapeZero, laid));
  return subtract(how === 'flat-doubled' ? times(trueLength, 2) : trueLength, gap);
}
