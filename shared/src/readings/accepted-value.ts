/** The value of a point: the mean of the rounds that stand, and how far it can be trusted. */
import { findMeasuringPoint } from '../points/measuring-points.js';
import type { MeasuringHow, MeasuringPoint } from '../points/point.js';
import { type Length, lengthOf, longestOf, shortestOf, subtract } from '../units/length.js';
import { divideHalfUp } from '../units/rounding.js';
import { standingReadings, type Reading, type TakenReading } from './reading.js';
import { readingStep } from './reading-step.js';
import { speakingReadings, type WornSide } from './worn-side.js';
import { layingUncertaintyMm, rootOfSquares, spreadUncertaintyMm, stepUncertaintyMm } from './uncertainty.js';
import { tapeJoins } from './whole-value.js';

export interface AcceptedValue {
  readonly pointId: string;
  /** Mean of the rounds, exact and rounded once, half-up, to 0.0001 mm. */
  readonly value: Length;
  /** How many readings it is the mean of. */
  readonly n: number;
  /** Longest less shortest reading; zero for a single one. */
  readonly spread: Length;
  /** Combined standard uncertainty in mm: reading step, method, tape joins, spread. */
  readonly uncertaintyMm: number;
  readonly tapeJoins: number;
  /** The side that it was read on, for a point of which left and right were told apart. */
  readonly worn?: WornSide;
}

/** Mean of lengths, rounded once, half-up, to 0.0001 mm. Throws RangeError for an empty list. */
export function meanOf(lengths: readonly Length[]): Length {
  const sum = lengths.reduce((total, length) => total + BigInt(length), 0n);
  return lengthOf(Number(divideHalfUp(sum, BigInt(lengths.length))));
}

/** Points that a museum made for itself, which the catalogue does not have. */
export type OwnPoints = readonly Pick<MeasuringPoint, 'id' | 'how'>[];

/**
 * The value of a point, or of one side of it. Where left and right were read and no side is named, one of them speaks
 * (see `speakingReadings`). Nothing when no such reading was taken and stands. The order of readings does not matter.
 */
export function acceptedValue(
  readings: readonly Reading[],
  pointId: string,
  side?: WornSide,
  ownPoints: OwnPoints = [],
): AcceptedValue | undefined {
  const standing = standingReadings(readings, pointId);
  const taken = side ? standing.filter(({ worn }) => worn === side) : speakingReadings(standing);
  const lengths = taken.map(({ length }) => length);
  const [first, ...others] = lengths;
  if (first === undefined) return undefined;
  const spread = subtract(longestOf(first, ...others), shortestOf(first, ...others));
  return {
    pointId,
    value: meanOf(lengths),
    n: taken.length,
    spread,
    uncertaintyMm: combinedUncertaintyMm(taken, spread, ownPoints),
    tapeJoins: Math.max(...taken.map(joinsOf)),
    ...(taken[0]?.worn ? { worn: taken[0].worn } : {}),
  };
}

/**
 * Reading again by the same method does not make the method better, so step and laying count once, at the
 * worst of the rounds; only the spread is the rounds' own. A gap is a reading of its own and brings its own part.
 */
function combinedUncertaintyMm(taken: readonly TakenReading[], spread: Length, ownPoints: OwnPoints): number {
  const worst = (partOf: (reading: TakenReading, how: MeasuringHow) => number): number =>
    Math.max(...taken.map((reading) => partOf(reading, howTaken(reading, ownPoints))));
  return rootOfSquares([
    worst((reading, how) => stepUncertaintyMm(readingStep(reading), how)),
    worst((reading, how) => layingUncertaintyMm(how, joinsOf(reading))),
    worst(gapUncertaintyMm),
    spreadUncertaintyMm(spread),
  ]);
}

/** The reading's own method, else its point's; a point that neither list knows counts as laid along a curve. */
export function howTaken({ method, pointId }: TakenReading, ownPoints: OwnPoints = []): MeasuringHow {
  const point = ownPoints.find(({ id }) => id === pointId) ?? findMeasuringPoint(pointId);
  return method ?? point?.how ?? 'curve';
}

/** The gap was read straight across, in the unit of its reading. */
function gapUncertaintyMm(reading: TakenReading): number {
  if (reading.gap === undefined || reading.gap === 0) return 0;
  return rootOfSquares([
    stepUncertaintyMm(readingStep(reading), 'straight'),
    layingUncertaintyMm('straight', 0),
  ]);
}

function joinsOf({ tapeLengths }: TakenReading): number {
  return tapeLengths ? tapeJoins(tapeLengths) : 0;
}

/** The accepted value of every point that has one, by point, in the order the points first appear. */
export function acceptedValues(
  readings: readonly Reading[],
  ownPoints: OwnPoints = [],
): ReadonlyMap<string, AcceptedValue> {
  return valuesBy(readings, (pointId) => acceptedValue(readings, pointId, undefined, ownPoints));
}

/** The same for one side: points read on it, and those that have no side. */
export function acceptedValuesOn(
  side: WornSide,
  readings: readonly Reading[],
  ownPoints: OwnPoints = [],
): ReadonlyMap<string, AcceptedValue> {
  const here = readings.filter(({ worn }) => worn === undefined || worn === side);
  return valuesBy(
    here,
    (pointId) =>
      acceptedValue(here, pointId, side, ownPoints) ?? acceptedValue(here, pointId, undefined, ownPoints),
  );
}

function valuesBy(
  readings: readonly Reading[],
  valueOf: (pointId: string) => AcceptedValue | undefined,
): ReadonlyMap<string, AcceptedValue> {
  const pointIds = new Set(readings.map(({ pointId }) => pointId));
  return new Map(
    [...pointIds].flatMap((pointId) => {
      const accepted = valueOf(pointId);
      return accepted ? [[pointId, accepted] as const] : [];
    }),
  );
}
