/** What checks see of a sheet: the readings that stand and can be a length of dress, and their accepted values. */
import type { GarmentKind } from '../points/kinds.js';
import { softRangeFor } from '../points/measuring-points.js';
import type { MeasuringPoint, SoftRange } from '../points/point.js';
import { pointIn, type Protocol } from '../protocols/protocol.js';
import {
  acceptedValue,
  acceptedValues,
  acceptedValuesOn,
  type AcceptedValue,
} from '../readings/accepted-value.js';
import { isTaken, type Reading, stands, type TakenReading } from '../readings/reading.js';
import { type WornSide, wornSides } from '../readings/worn-side.js';
import type { supports } from '../records/sheet.js';
import { type Length, mm } from '../units/length.js';
import type { Mention } from './finding-text.js';

export interface OtherPart {
  readonly kind: GarmentKind;
  readonly readings: readonly Reading[];
}

/** What the museum's other garments of that kind and decade came to at a point. */
export interface PeerValues {
  readonly pointId: string;
  readonly valuesMm: readonly number[];
}

/** A measuring sheet as the checks take it. Readings that were corrected may be among them; they are left aside. */
export interface CheckSheet {
  readonly kind: GarmentKind;
  readonly protocol: Protocol;
  readonly readings: readonly Reading[];
  readonly otherPartsOfGarment?: readonly OtherPart[];
  /** What the garment lay on; checks that need it are quiet without. */
  readonly support?: (typeof supports)[number];
  /** The length of the tape; checks that need it are quiet without. */
  readonly tapeLength?: Length;
  readonly peers?: readonly PeerValues[];
}

type Values = ReadonlyMap<string, AcceptedValue>;

export interface SheetView extends Pick<CheckSheet, 'kind' | 'protocol' | 'support' | 'tapeLength'> {
  /** Readings that were taken and stand, in order of point and round, without impossible lengths. */
  readonly taken: readonly TakenReading[];
  /** Readings that stand but are below nothing or beyond any garment. */
  readonly impossible: readonly TakenReading[];
  readonly notTaken: readonly Reading[];
  /** By point; of a point read on both sides, the side that speaks for it. */
  readonly values: Values;
  /** By point, with what was read on that side before what has no side. */
  readonly valuesOn: Readonly<Record<WornSide, Values>>;
  readonly otherParts: readonly { kind: GarmentKind; values: Values }[];
  readonly peers: readonly PeerValues[];
}

/** Nothing in dress is longer than 100 m. */
const LONGEST = mm(100_000);

function canBe(length: Length): boolean {
  return Number.isSafeInteger(length) && length >= 0 && length <= LONGEST;
}

function isPossible({ length }: TakenReading): boolean {
  return canBe(length);
}

/** A gap, depth or tape that is no length of dress is left out: no check reckons with it. */
function withoutBroken({ gap, depthBelowWaist, tapeLengths, ...reading }: TakenReading): TakenReading {
  const areSound = tapeLengths && [tapeLengths.tape, tapeLengths.rest].every(canBe);
  return {
    ...reading,
    ...(gap !== undefined && canBe(gap) ? { gap } : {}),
    ...(depthBelowWaist !== undefined && canBe(depthBelowWaist) ? { depthBelowWaist } : {}),
    ...(areSound ? { tapeLengths } : {}),
  };
}

function takenOf(readings: readonly Reading[]): readonly TakenReading[] {
  return readings
    .filter(stands)
    .filter(isTaken)
    .map(withoutBroken)
    .sort((first, second) => first.round - second.round);
}

export function viewSheet(sheet: CheckSheet): SheetView {
  const { kind, protocol, readings, otherPartsOfGarment = [], peers = [], support, tapeLength } = sheet;
  const { ownPoints } = protocol;
  const taken = takenOf(readings);
  const possible = taken.filter(isPossible);
  return {
    ...(support ? { support } : {}),
    ...(tapeLength !== undefined && canBe(tapeLength) ? { tapeLength } : {}),
    kind,
    protocol,
    peers,
    taken: possible,
    impossible: taken.filter((reading) => !isPossible(reading)),
    notTaken: readings.filter((reading) => stands(reading) && !isTaken(reading)),
    values: acceptedValues(possible, ownPoints),
    valuesOn: {
      left: acceptedValuesOn('left', possible, ownPoints),
      right: acceptedValuesOn('right', possible, ownPoints),
    },
    otherParts: otherPartsOfGarment.map((part) => ({
      kind: part.kind,
      values: acceptedValues(takenOf(part.readings).filter(isPossible)),
    })),
  };
}

/** A point that was read, or one side of it, with its readings by round. */
export interface ReadPoint {
  readonly point: MeasuringPoint;
  /** The point as a sentence names it, with its side where one was said. */
  readonly mention: Mention;
  readonly range: SoftRange;
  readonly accepted: AcceptedValue;
  readonly readings: readonly TakenReading[];
}

/** Every point that was read, each side of a pair by itself. Points that nothing knows are left out. */
export function readPoints({ kind, protocol, taken, values }: SheetView): readonly ReadPoint[] {
  return [...values.keys()].flatMap((pointId) => {
    const point = pointIn(protocol, pointId);
    if (!point) return [];
    const ofPoint = taken.filter((reading) => reading.pointId === pointId);
    return [undefined, ...wornSides].flatMap((worn) => {
      const readings = ofPoint.filter((reading) => reading.worn === worn);
      const accepted = acceptedValue(readings, pointId, worn, protocol.ownPoints);
      if (!accepted) return [];
      const mention = { mentioned: pointId, ...(worn ? { worn } : {}) };
      return [{ point, mention, range: softRangeFor(point, kind), accepted, readings }];
    });
  });
}
