import type { MeasuringHow } from './point.js';
import { add, isLonger, type Length, mm, times } from '../units/length.js';

/** How far two rounds of one point may lie apart before it is read again. */
export interface ToleranceRule {
  readonly base: Length;
  /** Takes the place of `base` above `longFrom`. */
  readonly long: Length;
  readonly longFrom: Length;
  /** Added for each place where one tape length was joined to the next. */
  readonly perTapeJoin: Length;
}

/** A house setting without a published source: 3 mm, 5 mm above a metre, 2 mm more for each tape join. */
export const houseTolerance: ToleranceRule = {
  base: mm(3),
  long: mm(5),
  longFrom: mm(1000),
  perTapeJoin: mm(2),
};

export function allowedSpread(rule: ToleranceRule, length: Length, tapeJoins = 0): Length {
  const base = isLonger(length, rule.longFrom) ? rule.long : rule.base;
  return add(base, times(rule.perTapeJoin, tapeJoins));
}

/** The same for a point's whole value: a millimetre on a half that is doubled is two on the whole. */
export function allowedSpreadAt(
  { tolerance, how }: { readonly tolerance: ToleranceRule; readonly how: MeasuringHow },
  length: Length,
  tapeJoins = 0,
): Length {
  const allowed = allowedSpread(tolerance, length, tapeJoins);
  return how === 'flat-doubled' ? times(allowed, 2) : allowed;
}
