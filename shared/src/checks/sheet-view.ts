/** What checks see of a sheet: the readings that stand and can be a length of dress, and their accepted values. */
import { type GarmentKind } from '../points/kinds.js';
import { type CataloguedPoint, findMeasuringPoint, softRangeFor } from '../points/measuring-points.js';
import { type SoftRange } from '../points/point.js';
import { type Protocol } from '../protocols/protocol.js';
import { acceptedValues, type AcceptedValue } from '../readings/accepted-value.js';
import { isTaken, type Reading, stands, type TakenReading } from '../readings/reading.js';
import { mm } from '../units/length.js';

export interface OtherPart {
  readonly kind: GarmentKind;
  readonly readings: readonly Reading[];
}

/** A measuring sheet as the checks take it. Readings that were corrected may be among them; they are left aside. */
export interface CheckSheet {
  readonly kind: GarmentKind;
  readonly protocol: Protocol;
  readonly readings: readonly Reading[];
  readonly otherPartsOfGarment?: readonly OtherPart[];
}

export interface SheetView {
  readonly kind: GarmentKind;
  readonly protocol: Protocol;
  /** Readings that were taken and stand, in order of point and round, without impossible lengths. */
  readonly taken: readonly TakenReading[];
  /** Readings that stand but are below nothing or beyond any garment. */
  readonly impossible: readonly TakenReading[];
  readonly notTaken: readonly Reading[];
  readonly values: ReadonlyMap<string, AcceptedValue>;
  readonly otherParts: readonly { kind: GarmentKind; values: ReadonlyMap<string, AcceptedValue> }[];
}

/** Nothing in dress is longer than 100 m. */
const LONGEST = mm(100_000);

function isPossible({ length }: TakenReading): boolean {
  return Number.isSafeInteger(length) && length >= 0 && length <= LONGEST;
}

function takenOf(readings: readonly Reading[]): readonly TakenReading[] {
  return readings
    .filter(stands)
    .filter(isTaken)
    .sort((first, second) => first.round - second.round);
}

export function viewSheet({ kind, protocol, readings, otherPartsOfGarment = [] }: CheckSheet): SheetView {
  const taken = takenOf(readings);
  const possible = taken.filter(isPossible);
  return {
    kind,
    protocol,
    taken: possible,
    impossible: taken.filter((reading) => !isPossible(reading)),
    notTaken: readings.filter((reading) => stands(reading) && !isTaken(reading)),
    values: acceptedValues(possible),
    otherParts: otherPartsOfGarment.map((part) => ({
      kind: part.kind,
      values: acceptedValues(takenOf(part.readings).filter(isPossible)),
    })),
  };
}

/** A point that was read, with its readings by round. Points the catalogue does not know are left out. */
export interface ReadPoint {
  readonly point: CataloguedPoint;
  readonly range: SoftRange;
  readonly accepted: AcceptedValue;
  readonly readings: readonly TakenReading[];
}

export function readPoints({ kind, taken, values }: SheetView): readonly ReadPoint[] {
  return [...values.values()].flatMap((accepted) => {
    const point = findMeasuringPoint(accepted.pointId);
    if (!point) return [];
    const readings = taken.filter(({ pointId }) => pointId === point.id);
    return [{ point, range: softRangeFor(point, kind), accepted, readings }];
  });
}

/** The point's name for the middle of a sentence; its id where the catalogue does not know it. */
export function nameOf(pointId: string): string {
  return findMeasuringPoint(pointId)?.name.toLowerCase() ?? pointId;
}
