import type { PublishedMeasurement, PublishedPart } from '@ellwand/shared/records/published-garment';
import { findMeasuringPoint } from '@ellwand/shared/points/measuring-points';
import { type MeasuringHow, sideLabels } from '@ellwand/shared/points/point';
import { wornSideLabels } from '@ellwand/shared/readings/worn-side';
import { counted } from '../../lib/words';

type NotTakenReason = PublishedPart['notTaken'][number]['reason'];

/** Why a point was not taken, after its name and a colon. */
export const reasonWords: Readonly<Record<NotTakenReason, string>> = {
  absent: 'the garment has none',
  'too-fragile': 'too fragile to be handled for it',
  'cannot-be-opened': 'the garment cannot be opened',
  'fastening-stuck': 'a fastening is stuck',
  'sewn-to-a-mount': 'the garment is sewn to a mount',
  'not-accessible': 'could not be reached',
  'not-applicable': 'does not apply to this cut',
  altered: 'altered there, so that it would mislead',
  'stopped-damage-seen': 'measuring stopped because damage was seen',
};

const levelWords: Readonly<Record<NonNullable<PublishedMeasurement['levelFoundBy']>, string>> = {
  band: 'level at the band',
  seam: 'level at the seam',
  nicks: 'level at nicks in the seam',
  'dart-tips': 'level at the dart tips',
  stated: 'level as stated',
};

const supportWords: Readonly<Record<string, string>> = {
  flat: 'flat on the table',
  'flat-tissue': 'flat, tissue inside',
  'on-a-figure': 'on a figure',
  'on-a-hanger': 'on a padded hanger',
};

/** What the garment lay or hung on; words that are not ours are left as they came. */
export function supportText(support: string): string {
  return supportWords[support] ?? support;
}

const tapeWent: Readonly<Record<MeasuringHow, string>> = {
  round: 'round',
  straight: 'straight',
  curve: 'along the curve',
  'flat-doubled': 'flat, doubled',
};

/**
 * How the tape went, in as few words as a row has room for: "Inside, round". Its point's page says it in full; where
 * it went otherwise than that page says, the row tells.
 */
export function howHeld(
  { pointId, method }: Pick<PublishedMeasurement, 'pointId' | 'method'>,
  { ownPoints }: Pick<PublishedPart, 'ownPoints'>,
): string | null {
  const point = ownPoints.find(({ id }) => id === pointId) ?? findMeasuringPoint(pointId);
  if (!point) return null;
  const otherwise = method && method !== point.how ? 'flat and doubled instead of ' : '';
  return `${sideLabels[point.side]}, ${otherwise}${tapeWent[point.how]}`;
}

/** One row for each point and side. */
export function sidedKey({ pointId, worn }: Pick<PublishedMeasurement, 'pointId' | 'worn'>): string {
  return worn ? `${pointId}-${worn}` : pointId;
}

/** "Sleeve, outer, left, as worn": a name, and which of a pair it is where that was told. */
export function sidedLabel({ label, worn }: Pick<PublishedMeasurement, 'label' | 'worn'>): string {
  return worn ? `${label}, ${wornSideLabels[worn]}` : label;
}

/** How the level was found, where the point has one. */
export function levelText({ levelFoundBy }: PublishedMeasurement): string | null {
  return levelFoundBy ? levelWords[levelFoundBy] : null;
}

/** "one reading", "2 readings". How far apart they lay is a length, and stands beside it. */
export function roundsText({ rounds }: PublishedMeasurement): string {
  return rounds === 1 ? 'one reading' : counted(rounds, 'reading');
}
