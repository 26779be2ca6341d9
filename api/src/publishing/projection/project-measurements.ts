import type { MeasuringPoint } from '@ellwand/shared/points/point';
import { howTaken } from '@ellwand/shared/readings/accepted-value';
import type { Reading, TakenReading } from '@ellwand/shared/readings/reading';
import { shownUncertainty } from '@ellwand/shared/readings/uncertainty';
import { notTakenBySide, valuesBySide } from '@ellwand/shared/readings/values-by-side';
import type { Image } from '@ellwand/shared/records/image';
import type { PublishedMeasurement, PublishedPart } from '@ellwand/shared/records/published-garment';
import { lengthOf, longestOf, toMmString } from '@ellwand/shared/units/length';
import { divideHalfUp } from '@ellwand/shared/units/rounding';

/** What a sheet read, and the points that it knows beside the catalogue's. */
export interface Measured {
  readonly readings: readonly Reading[];
  readonly ownPoints: readonly MeasuringPoint[];
}

/** A point as the public reads it: one measurement for each side that was read, the one that speaks for it first. */
export function projectMeasurements(
  point: MeasuringPoint,
  { readings, ownPoints }: Measured,
  pictures: readonly Image[],
): PublishedMeasurement[] {
  const imageId = pictures.find((picture) => picture.pointId === point.id)?.id ?? null;
  return valuesBySide(readings, point.id, ownPoints).map(({ worn, accepted, rounds }) => {
    const half = lengthOf(Number(divideHalfUp(BigInt(accepted.value), 2n)));
    const doubled = rounds.every((reading) => howTaken(reading, ownPoints) === 'flat-doubled');
    return {
      pointId: point.id,
      label: point.name,
      worn,
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
  { id: pointId, name }: MeasuringPoint,
  readings: readonly Reading[],
): PublishedPart['notTaken'] {
  return notTakenBySide(readings, pointId).map(({ worn, reason }) => ({
    pointId,
    label: name,
    worn,
    reason,
  }));
}
