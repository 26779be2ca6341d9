/** What a derivation sees of a part: its values, those of the garment's other parts, the panels of its cut sheet. */
import type { PanelledSheet } from '../cut-sheet/panel-sum.js';
import type { GarmentKind } from '../points/kinds.js';
import { findMeasuringPoint } from '../points/measuring-points.js';
import type { MeasuringPoint } from '../points/point.js';
import {
  acceptedValues,
  acceptedValuesOn,
  type AcceptedValue,
  howTaken,
} from '../readings/accepted-value.js';
import { isTaken, type Reading, stands } from '../readings/reading.js';
import type { WornSide } from '../readings/worn-side.js';

type Values = ReadonlyMap<string, AcceptedValue>;

export interface OtherPartRead {
  readonly kind: GarmentKind;
  /** What the museum calls it; the kind's own name where left out. */
  readonly name?: string;
  readonly readings: readonly Reading[];
}

/** What lies beyond the readings of the part itself; all of it may be left out. */
export interface DeriveContext {
  readonly ownPoints?: readonly MeasuringPoint[];
  readonly otherParts?: readonly OtherPartRead[];
  readonly cutSheet?: PanelledSheet;
}

export interface OtherPartFigures {
  readonly kind: GarmentKind;
  readonly name?: string;
  readonly values: Values;
}

export interface PartFigures {
  readonly kind: GarmentKind;
  /** By point; of a point read on both sides, the side that speaks for it. */
  readonly values: Values;
  /** By point, with what was read on that side before what has no side. */
  readonly valuesOn: Readonly<Record<WornSide, Values>>;
  /** Points of which every reading that stands was read as a half. */
  readonly doubled: ReadonlySet<string>;
  readonly otherParts: readonly OtherPartFigures[];
  readonly cutSheet?: PanelledSheet;
  readonly labelOf: (pointId: string) => string;
}

export function partFigures(
  kind: GarmentKind,
  readings: readonly Reading[],
  { ownPoints = [], otherParts = [], cutSheet }: DeriveContext = {},
): PartFigures {
  const values = acceptedValues(readings, ownPoints);
  const taken = readings.filter(stands).filter(isTaken);
  const isDoubled = (pointId: string): boolean =>
    taken.every((one) => one.pointId !== pointId || howTaken(one, ownPoints) === 'flat-doubled');
  return {
    kind,
    values,
    valuesOn: {
      left: acceptedValuesOn('left', readings, ownPoints),
      right: acceptedValuesOn('right', readings, ownPoints),
    },
    doubled: new Set([...values.keys()].filter(isDoubled)),
    otherParts: otherParts.map(({ readings: theirs, ...part }) => ({
      ...part,
      values: acceptedValues(theirs),
    })),
    ...(cutSheet ? { cutSheet } : {}),
    labelOf: (pointId) =>
      (ownPoints.find(({ id }) => id === pointId) ?? findMeasuringPoint(pointId))?.name ?? pointId,
  };
}
