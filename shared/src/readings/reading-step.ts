/**
 * How finely a figure was read, judged by the digits that were keyed: 61.50 claims more than 61.5. Inches in
 * whole numbers or fractions count as read to an eighth, unless a finer fraction was keyed.
 */
import { type Length, lengthOf, mm, UNITS_PER_INCH } from '../units/length.js';
import type { TakenReading } from './reading.js';

const WHOLE_MM = mm(1);
const EIGHTH = lengthOf(UNITS_PER_INCH / 8);

const metricStep = { mm: mm(1), cm: mm(10) } as const;

/** At most this many decimals have a step that can be held: 0.0001 mm. */
const DECIMALS = /[.,](\d{1,6})/;

export function readingStep({ typed, unit }: Pick<TakenReading, 'typed' | 'unit'>): Length {
  if (typed === undefined || unit === undefined) return WHOLE_MM;
  const decimals = DECIMALS.exec(typed)?.[1]?.length ?? 0;
  if (unit !== 'in') return stepOf(metricStep[unit], decimals);
  if (decimals > 0) return stepOf(lengthOf(UNITS_PER_INCH), decimals);
  const denominator = Number(/[/\u2044]\s*(\d{1,2})/.exec(typed)?.[1] ?? 0);
  return denominator > 8 ? lengthOf(Math.round(UNITS_PER_INCH / denominator)) : EIGHTH;
}

function stepOf(whole: Length, decimals: number): Length {
  return lengthOf(Math.max(Math.round(whole / 10 ** decimals), 1));
}
