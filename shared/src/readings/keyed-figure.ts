import type { Length } from '../units/length.js';
import { fromTyped } from '../units/parse-length.js';
import type { TakenReading } from './reading.js';

/** What the tape showed, as it was keyed: the rest where tapes were counted, the half where it was laid flat. */
export function keyedFigure({ typed, unit }: TakenReading): Length | undefined {
  if (typed === undefined || unit === undefined) return undefined;
  const figure = fromTyped({ text: typed, unit });
  return figure.ok ? figure.value.length : undefined;
}
