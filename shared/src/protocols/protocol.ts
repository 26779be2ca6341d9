import { type GarmentKind } from '../points/kinds.js';
import { type PointId } from '../points/measuring-points.js';

export interface ProtocolPoint {
  readonly pointId: PointId;
  /** A required point is read, or its absence has a reason, before the sheet is complete. */
  readonly required: boolean;
}

/** The list of points for a kind of part in handling order. A sheet keeps the version it was taken by. */
export interface Protocol {
  readonly kind: GarmentKind;
  readonly version: number;
  /** True for parts laid together as worn, which have points that no single part has. */
  readonly wornTogether: boolean;
  readonly points: readonly ProtocolPoint[];
}

/** I and O are left out: on a diagram they read as one and nought. */
const LETTERS = 'ABCDEFGHJKLMNPQRSTUVWXYZ';

/** As many points as there are letters. */
export const LONGEST_PROTOCOL = LETTERS.length;

/** A, B, C… in handling order, for the diagram and the sheet. */
export function lettersFor(protocol: Protocol): ReadonlyMap<PointId, string> {
  return new Map(protocol.points.map(({ pointId }, index) => [pointId, letterAt(index)]));
}

function letterAt(index: number): string {
  // A protocol longer than the alphabet goes on with A2, B2…: no letter is ever given twice.
  const turn = Math.floor(index / LETTERS.length);
  return `${LETTERS.charAt(index % LETTERS.length)}${turn ? turn + 1 : ''}`;
}

export function protocolPointIds(protocol: Protocol): readonly PointId[] {
  return protocol.points.map(({ pointId }) => pointId);
}
