import { kindLabels } from '@ellwand/shared/points/kinds';
import { howLabels, type MeasuringPoint, sideLabels } from '@ellwand/shared/points/point';
import type { ProtocolVersion } from '@ellwand/shared/records/protocol';
import { dayText } from '../../../lib/moments.js';
import type { ProtocolName } from '../api/protocols.js';

export function protocolTitle({ kind, wornTogether }: ProtocolName): string {
  return wornTogether ? 'Parts laid together as worn' : kindLabels[kind].plural;
}

/** "9 points, 5 required". */
export function countWords({ points }: Pick<ProtocolVersion, 'points'>): string {
  const required = points.filter((point) => point.required).length;
  return `${points.length} ${points.length === 1 ? 'point' : 'points'}, ${required} required`;
}

/** "Ansel Dray, 12 November 2026"; the house's first version has nobody. */
export function madeWords({ madeBy, madeAt }: Pick<ProtocolVersion, 'madeBy' | 'madeAt'>): string {
  if (madeAt === null) return 'As the house began';
  return `${madeBy ?? 'Somebody who has left'}, ${dayText(madeAt)}`;
}

/** "Inside, round, from fastening to fastening". */
export function mannerWords({ side, how }: Pick<MeasuringPoint, 'side' | 'how'>): string {
  return `${sideLabels[side]}, ${howLabels[how]}`;
}
