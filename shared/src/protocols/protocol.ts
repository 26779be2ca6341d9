import type { GarmentKind } from '../points/kinds.js';
import { findMeasuringPoint, measuringPoints, pointsForKind } from '../points/measuring-points.js';
import type { MeasuringPoint } from '../points/point.js';
import type { ViewName } from '../drawings/diagram/model.js';

export interface ProtocolPoint {
  /** A point of the catalogue, or one of the protocol's own. */
  readonly pointId: string;
  /** A required point is read, or its absence has a reason, before the sheet is complete. */
  readonly required: boolean;
  /** How many rounds the protocol asks for; the second and later ones are read blind. */
  readonly rounds: number;
}

/** Where an own point is drawn: through these places of a view, in the view's millimetres, x then y. */
export interface OwnPointLine {
  readonly view: ViewName;
  readonly along: readonly (readonly [number, number])[];
}

/** A measuring point that a museum made for itself, with its own line on the diagram. */
export interface OwnPoint extends MeasuringPoint {
  readonly line: OwnPointLine;
}

/** The list of points for a kind of part in handling order. A sheet keeps the version it was taken by. */
export interface Protocol {
  readonly kind: GarmentKind;
  readonly version: number;
  /** True for parts laid together as worn, which have points that no single part has. */
  readonly wornTogether: boolean;
  readonly points: readonly ProtocolPoint[];
  readonly ownPoints: readonly OwnPoint[];
}

/** I and O are left out: on a diagram they read as one and nought. */
const LETTERS = 'ABCDEFGHJKLMNPQRSTUVWXYZ';

/** As many points as there are letters. */
export const LONGEST_PROTOCOL = LETTERS.length;

/** A, B, C… in handling order, for the diagram and the sheet. */
export function lettersFor(protocol: Protocol): ReadonlyMap<string, string> {
  return lettersInOrder(protocolPointIds(protocol));
}

/** The letters of points in the order in which they are asked for. */
export function lettersInOrder(pointIds: readonly string[]): ReadonlyMap<string, string> {
  return new Map(pointIds.map((pointId, index) => [pointId, letterAt(index)]));
}

function letterAt(index: number): string {
  // A protocol longer than the alphabet goes on with A2, B2…: no letter is ever given twice.
  const turn = Math.floor(index / LETTERS.length);
  return `${LETTERS.charAt(index % LETTERS.length)}${turn ? turn + 1 : ''}`;
}

export function protocolPointIds(protocol: Protocol): readonly string[] {
  return protocol.points.map(({ pointId }) => pointId);
}

/** A point by its id, the protocol's own ones included; undefined where neither knows it. */
export function pointIn(protocol: Pick<Protocol, 'ownPoints'>, pointId: string): MeasuringPoint | undefined {
  return protocol.ownPoints.find(({ id }) => id === pointId) ?? findMeasuringPoint(pointId);
}

/** The points that a protocol asks for, in handling order. Ids that nothing knows are left out. */
export function pointsOf(protocol: Protocol): readonly MeasuringPoint[] {
  return protocolPointIds(protocol).flatMap((id) => pointIn(protocol, id) ?? []);
}

/** The catalogue's points that a protocol may ask for: those of its kind, or those of parts laid together as worn. */
export function askablePoints({
  kind,
  wornTogether,
}: Pick<Protocol, 'kind' | 'wornTogether'>): readonly MeasuringPoint[] {
  if (!wornTogether) return pointsForKind(kind);
  return measuringPoints.filter((point) => point.wornTogether && point.kinds.includes(kind));
}
