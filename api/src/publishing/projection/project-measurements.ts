import type { MeasuringPoint } from '@ellwand/shared/points/point';
import { acceptedValue, howTaken } from '@ellwand/shared/readings/accepted-value';
import { isTaken, stands, type Reading, type TakenReading } from '@ellwand/shared/readings/reading';
import { shownUncertainty } from '@ellwand/shared/readings/uncertainty';
import type { WornSide } from '@ellwand/shared/readings/worn-side';
import type { Image } from '@ellwand/shared/records/image';
import type { PublishedMeasurement, PublishedPart } from '@ellwand/shared/records/published-garment';
import { lengthOf, longestOf, toMmString } from '@ellwand/shared/units/length';
import { divideHalfUp } from '@ellwand/shared/units/rounding';

/** What a sheet read, and the points that it knows beside the catalogue's. */
export interface Measured {
  readonly readings: readonly Reading[];
  readonly ownPoints: readonly MeasuringPoint[];
}

/** In which order sides are told: the first of them that was read speaks for the point, see `speakingReadings`. */
const sides: readonly (WornSide | undefined)[] = [undefined, 'right', 'left'];

/** A point as the public reads it: one measurement for each side that was read, the one that speaks for it first. */
export function projectMeasurements(
  point: MeasuringPoint,
  { readings, ownPoints }: Measured,
  pictures: readonly Image[],
): PublishedMeasurement[] {
  const taken = standingOf(point, readings).filter(isTaken);
  const imageId = pictures.find((picture) => picture.pointId === point.id)?.id ?? null;
  return sides.flatMap((side) => {
    const rounds = taken.filter(({ worn }) => worn === side);
    const accepted = acceptedValue(rounds, point.id, side, ownPoints);
    if (!accepted) return [];
    const half = lengthOf(Number(divideHalfUp(BigInt(accepted.value), 2n)));
    const doubled = rounds.every((reading) => howTaken(reading, ownPoints) === 'flat-doubled');
    return {
      pointId: point.id,
      label: point.name,
      worn: side ?? null,
      valueMm: toMmString(accepted.value),
      uncertaintyMm: toMmString(shownUncertainty(accepted.uncertaintyMm)),
      rounds: accepted.n,
      spreadMm: toMmString(accepted.spread),
      halfMm: doubled ? toMmString(half) : null,
      ...howRead(rounds),
      imageId,
    };
  });
}

/** What the rounds of a side tell of how they were read. Of several gaps the widest is told. */
function howRead(
  rounds: readonly TakenReading[],
): Pick<PublishedMeasurement, 'levelFoundBy' | 'tapeLengths' | 'method' | 'gapMm' | 'depthMm'> {
  const lengths = rounds.find((reading) => reading.tapeLengths)?.tapeLengths;
  const [gap, ...gaps] = rounds.flatMap((reading) => (reading.gap ? [reading.gap] : []));
  const depth = rounds.find((reading) => reading.depthBelowWaist)?.depthBelowWaist;
  return {
    levelFoundBy: rounds.find((reading) => reading.levelFoundBy)?.levelFoundBy ?? null,
    tapeLengths: lengths
      ? { count: lengths.count, tapeMm: toMmString(lengths.tape), restMm: toMmString(lengths.rest) }
      : null,
    method: rounds.some(({ method }) => method === 'flat-doubled') ? 'flat-doubled' : null,
    gapMm: gap ? toMmString(longestOf(gap, ...gaps)) : null,
    depthMm: depth ? toMmString(depth) : null,
  };
}

/** Why a point, or one side of it, has no measurement. Where another round took it, no reason is left. */
export function projectNotTaken(
  point: MeasuringPoint,
  readings: readonly Reading[],
): PublishedPart['notTaken'] {
  const standing = standingOf(point, readings);
  return sides.flatMap((side) => {
    const here = side === undefined ? standing : standing.filter(({ worn }) => worn === side);
    if (here.some(isTaken)) return [];
    const reason = here
      .filter(({ worn }) => worn === side)
      .find((reading) => reading.state === 'not-taken')?.notTakenReason;
    return reason ? { pointId: point.id, label: point.name, worn: side ?? null, reason } : [];
  });
}

function standingOf({ id }: MeasuringPoint, readings: readonly Reading[]): readonly Reading[] {
  return readings.filter((reading) => reading.pointId === id && stands(reading));
}
