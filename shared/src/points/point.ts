import { type Length, mm } from '../units/length.js';
import type { PointGroup } from './groups.js';
import type { GarmentKind } from './kinds.js';
import { houseTolerance, type ToleranceRule } from './tolerance.js';

/** Whether the tape lies within the opened garment or on its outer face. */
export type Side = 'inside' | 'outside';

/**
 * How the tape goes. `round`: opened out, from a fastening to the one it closes on. `curve`: laid along the
 * cloth. `flat-doubled`: from fold to fold, the half is read and the whole is twice that.
 */
export type MeasuringHow = 'round' | 'straight' | 'curve' | 'flat-doubled';

/** The garment is turned over once, so points come in this order. */
export const handlingSteps = ['opened-inside', 'front-up', 'back-up'] as const;
export type HandlingStep = (typeof handlingSteps)[number];

export const sideLabels: Readonly<Record<Side, string>> = { inside: 'Inside', outside: 'Outside' };

export const howLabels: Readonly<Record<MeasuringHow, string>> = {
  round: 'round, from fastening to fastening',
  straight: 'straight',
  curve: 'along the curve',
  'flat-doubled': 'flat, then doubled',
};

export const handlingStepLabels: Readonly<Record<HandlingStep, string>> = {
  'opened-inside': 'Opened, inside',
  'front-up': 'Front up',
  'back-up': 'Back up',
};

/** Where readings of adults' garments usually fall. A reading outside is asked about, never refused. */
export interface SoftRange {
  readonly from: Length;
  readonly to: Length;
  /** Where the range comes from, and which exceptions it already allows for. */
  readonly basis: string;
}

export interface MeasuringPoint<Id extends string = string> {
  readonly id: Id;
  readonly group: PointGroup;
  readonly name: string;
  readonly definition: string;
  readonly from: string;
  readonly to: string;
  readonly side: Side;
  readonly how: MeasuringHow;
  readonly handlingStep: HandlingStep;
  readonly kinds: readonly GarmentKind[];
  readonly softRange: SoftRange;
  /** Where a kind of part runs differently from the point's own range. */
  readonly softRangeByKind: Partial<Readonly<Record<GarmentKind, SoftRange>>>;
  readonly tolerance: ToleranceRule;
  /** The pitfall, as a sentence for the table. */
  readonly watchFor: string;
  /** Long enough that whole tapes are counted (a hem: 3 × 1500 mm + 742 mm). */
  readonly takesTapeLengths: boolean;
  /** Whether the sheet must say how the level was found. */
  readonly levelRecorded: boolean;
  /** Taken over the parts of a garment laid together as worn, never on one part. */
  readonly wornTogether: boolean;
  /** There on both sides of the garment: left and right, as worn, may each be read. */
  readonly paired: boolean;
}

/** Ranges from the working experience of the trade, not from a published count. */
export const PRACTICE = 'House experience; no published survey of garments was found.';

/** Body measurements widened for what is worn beneath and for the cut; see docs/measuring/points.md. */
export const BODY_DATA =
  'ANSUR II body measurements (US Army, 2012, open data), widened for cut and for wear beneath.';

export function between(fromMm: number, toMm: number, basis = PRACTICE): SoftRange {
  return { from: mm(fromMm), to: mm(toMm), basis };
}

type Optional =
  'softRangeByKind' | 'tolerance' | 'takesTapeLengths' | 'levelRecorded' | 'wornTogether' | 'paired';

/** A point as it is written in the catalogue files: what is usual may be left out. */
export type PointEntry<Id extends string> = Omit<MeasuringPoint<Id>, Optional> &
  Partial<Pick<MeasuringPoint<Id>, Optional>>;

export function point<const Id extends string>(entry: PointEntry<Id>): MeasuringPoint<Id> {
  return {
    softRangeByKind: {},
    tolerance: houseTolerance,
    takesTapeLengths: false,
    levelRecorded: false,
    wornTogether: false,
    paired: false,
    ...entry,
  };
}

/** The ways the tape lies most often, so that a catalogue entry says what is special about it and no more. */
export const insideRound = { side: 'inside', how: 'round', handlingStep: 'opened-inside' } as const;
export const insideStraight = { side: 'inside', how: 'straight', handlingStep: 'opened-inside' } as const;
export const insideCurve = { side: 'inside', how: 'curve', handlingStep: 'opened-inside' } as const;
export const frontStraight = { side: 'outside', how: 'straight', handlingStep: 'front-up' } as const;
export const frontCurve = { side: 'outside', how: 'curve', handlingStep: 'front-up' } as const;
export const frontDoubled = { side: 'outside', how: 'flat-doubled', handlingStep: 'front-up' } as const;
export const backStraight = { side: 'outside', how: 'straight', handlingStep: 'back-up' } as const;
export const backCurve = { side: 'outside', how: 'curve', handlingStep: 'back-up' } as const;
