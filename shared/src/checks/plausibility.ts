/** What could explain a reading that lies outside its point's usual range. */
import type { MeasuringHow, MeasuringPoint, SoftRange } from '../points/point.js';
import type { TakenReading } from '../readings/reading.js';
import { type Length, lengthOf } from '../units/length.js';
import { divideHalfUp } from '../units/rounding.js';

export type SlipKind = 'ten-times-less' | 'ten-times-more' | 'inches-as-mm' | 'mm-as-inches';

/** A likely cause, and the value that would then be right. */
export type Explanation =
  | { readonly cause: 'usual' }
  | { readonly cause: 'slip'; readonly slip: SlipKind; readonly meant: Length }
  | { readonly cause: 'half' | 'whole'; readonly meant: Length }
  | { readonly cause: 'unexplained'; readonly bound: Length; readonly side: Beyond };

/** `just-…` within a tenth of the end of the range: there nothing needs explaining. A house setting. */
export type Beyond = 'just-below' | 'just-above' | 'below' | 'above';

/** A factor as a quotient, so that the value that was meant comes out exact: 25.4 is 254 ÷ 10. */
const slips: readonly { readonly slip: SlipKind; readonly times: bigint; readonly over: bigint }[] = [
  { slip: 'ten-times-less', times: 10n, over: 1n },
  { slip: 'inches-as-mm', times: 254n, over: 10n },
  { slip: 'ten-times-more', times: 1n, over: 10n },
  { slip: 'mm-as-inches', times: 10n, over: 254n },
];

/** A reading outside its point's range, and what would explain it. */
export function explain(reading: TakenReading, point: MeasuringPoint, range: SoftRange): Explanation {
  const { length } = reading;
  if (fits(length, range)) return { cause: 'usual' };
  const unexplained = beyond(length, range);
  if (unexplained.side.startsWith('just')) return unexplained;
  return slipOf(reading, range) ?? halfOrWhole(reading, point, range) ?? unexplained;
}

function beyond(length: Length, { from, to }: SoftRange): Explanation & { cause: 'unexplained' } {
  const [side, bound] = length < from ? (['below', from] as const) : (['above', to] as const);
  const isJust = Math.abs(length - bound) * 10 <= bound;
  return { cause: 'unexplained', bound, side: isJust ? `just-${side}` : side };
}

/** A slip carries a reading far off: one that is beyond its range by less than half again is no slip. */
function slipOf({ length, unit }: TakenReading, range: SoftRange): Explanation | undefined {
  if (length * 3 > range.from * 2 && length * 2 < range.to * 3) return undefined;
  for (const { slip, times, over } of slips) {
    // A figure can have been meant as millimetres in a field of inches only if it was keyed in inches.
    if (slip === 'mm-as-inches' && unit !== 'in') continue;
    const meant = scaled(length, times, over);
    if (fits(meant, range)) return { cause: 'slip', slip, meant };
  }
  return undefined;
}

/** Points whose half is easily read in place of the whole: rounds laid flat, and widths from a centre seam. */
function canBeHalved({ how, id }: MeasuringPoint): boolean {
  return how === 'round' || id === 'across-back' || id === 'across-front';
}

function halfOrWhole(
  reading: TakenReading,
  point: MeasuringPoint,
  range: SoftRange,
): Explanation | undefined {
  const how: MeasuringHow = reading.method ?? point.how;
  const doubled = how === 'flat-doubled';
  const half = scaled(reading.length, 1n, 2n);
  if (doubled && fits(half, range)) return { cause: 'whole', meant: half };
  const twice = scaled(reading.length, 2n, 1n);
  if (!doubled && canBeHalved(point) && fits(twice, range)) return { cause: 'half', meant: twice };
  return undefined;
}

function scaled(length: Length, times: bigint, over: bigint): Length {
  return lengthOf(Number(divideHalfUp(BigInt(length) * times, over)));
}

function fits(length: Length, { from, to }: SoftRange): boolean {
  return length >= from && length <= to;
}
