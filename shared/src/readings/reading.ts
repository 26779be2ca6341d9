/**
 * Readings as the domain knows them, without schemas or storage. Blank, zero and "not taken" differ: a point
 * without a reading has none at all, a reading of zero is taken, and a point left out has a reason.
 */
import type { MeasuringHow } from '../points/point.js';
import type { LengthUnit } from '../units/format-length.js';
import type { Length } from '../units/length.js';
import type { WornSide } from './worn-side.js';

/** Why a point was not taken. */
export const notTakenReasons = {
  absent: 'The garment does not have it',
  'too-fragile': 'Too fragile to handle',
  'cannot-be-opened': 'Cannot be opened without strain',
  'fastening-stuck': 'A fastening is stuck',
  'sewn-to-a-mount': 'Sewn to a mount',
  'not-accessible': 'Cannot be reached',
  'not-applicable': 'Does not apply to this cut',
  altered: 'Altered: the point is lost',
  'stopped-damage-seen': 'Stopped, because damage was seen',
} as const;

export type NotTakenReason = keyof typeof notTakenReasons;

export const notTakenReasonIds = Object.keys(notTakenReasons) as readonly NotTakenReason[];

/** How the level of bust, waist or hip was found. */
export const levelLabels = {
  band: 'at the band',
  seam: 'at the seam',
  nicks: 'at the nicks in the seam',
  'dart-tips': 'at the tips of the darts',
  stated: 'at a stated level',
} as const;

export type LevelFoundBy = keyof typeof levelLabels;

/** A long reading made of whole tapes and a rest: `{ count: 3, tape: 1500 mm, rest: 742 mm }`. */
export interface TapeLengths {
  readonly count: number;
  readonly tape: Length;
  readonly rest: Length;
}

interface ReadingFacts {
  readonly id: string;
  /** Kept as text, for a sheet may carry a point that a later catalogue no longer has. */
  readonly pointId: string;
  /** 1 for the first reading of a point, 2 for the second. */
  readonly round: number;
  /** False once a later reading has taken its place; absent means that it stands. */
  readonly stands?: boolean;
  /** Which of a pair it is; absent where the point is single or the side was not said. */
  readonly worn?: WornSide;
  readonly note?: string;
  readonly readBy?: string;
}

export interface TakenReading extends ReadingFacts {
  readonly state: 'taken';
  /** The whole value: tapes and rest added, a half doubled, the tape's zero and the gap taken off. */
  readonly length: Length;
  /** What was keyed, character for character, and in which unit. */
  readonly typed?: string;
  readonly unit?: LengthUnit;
  readonly tapeLengths?: TapeLengths;
  /** What the tape crossed where the edges could not be brought together: taken off already. */
  readonly gap?: Length;
  /** Where it was taken otherwise than its point says, such as flat and doubled for a round. */
  readonly method?: MeasuringHow;
  readonly levelFoundBy?: LevelFoundBy;
  /** How far below the waist a hip was read. */
  readonly depthBelowWaist?: Length;
  readonly fasteningPair?: string;
}

export interface NotTakenReading extends ReadingFacts {
  readonly state: 'not-taken';
  readonly notTakenReason?: NotTakenReason;
}

export type Reading = TakenReading | NotTakenReading;

export function isTaken(reading: Reading): reading is TakenReading {
  return reading.state === 'taken';
}

/** Whether no later reading has taken its place. */
export function stands(reading: Reading): boolean {
  return reading.stands !== false;
}

/** The readings of one point that were taken and still stand. */
export function standingReadings(readings: readonly Reading[], pointId: string): readonly TakenReading[] {
  return readings.filter((reading) => reading.pointId === pointId && stands(reading)).filter(isTaken);
}
