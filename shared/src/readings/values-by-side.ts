import { acceptedValue, type AcceptedValue, type OwnPoints } from './accepted-value.js';
import {
  isTaken,
  type NotTakenReason,
  type Reading,
  standingReadings,
  stands,
  type TakenReading,
} from './reading.js';
import type { WornSide } from './worn-side.js';

/** What was read on one side of a point, or without saying on which. */
export interface SideValue {
  readonly worn: WornSide | null;
  readonly accepted: AcceptedValue;
  /** The readings behind it. */
  readonly rounds: readonly TakenReading[];
}

/** In which order sides are told: the first of them that was read speaks for the point, see `speakingReadings`. */
export const sidesInOrder: readonly (WornSide | null)[] = [null, 'right', 'left'];

/** The value of each side of a point that was read, the one that speaks for it first; none where it was not taken. */
export function valuesBySide(
  readings: readonly Reading[],
  pointId: string,
  ownPoints: OwnPoints = [],
): readonly SideValue[] {
  const standing = standingReadings(readings, pointId);
  return sidesInOrder.flatMap((worn) => {
    const rounds = standing.filter((reading) => (reading.worn ?? null) === worn);
    const accepted = acceptedValue(rounds, pointId, worn ?? undefined, ownPoints);
    return accepted ? [{ worn, accepted, rounds }] : [];
  });
}

/** Why a point, or one side of it, was not taken. Where another round took it, no reason is left. */
export function notTakenBySide(
  readings: readonly Reading[],
  pointId: string,
): readonly { readonly worn: WornSide | null; readonly reason: NotTakenReason }[] {
  const standing = readings.filter((reading) => reading.pointId === pointId && stands(reading));
  return sidesInOrder.flatMap((worn) => {
    const here = standing.filter((reading) => (reading.worn ?? null) === worn);
    // Said of both sides at once, it is not taken only where neither was.
    const taken = (worn === null ? standing : here).some(isTaken);
    const left = here.find((reading) => reading.state === 'not-taken');
    return !taken && left?.notTakenReason ? [{ worn, reason: left.notTakenReason }] : [];
  });
}
