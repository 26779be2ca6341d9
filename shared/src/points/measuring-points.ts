/** Every measuring point, in one list. Each file of the catalogue holds the points of a family of garments. */
import { accessoryPoints } from './accessory-points.js';
import { bodicePoints } from './bodice-points.js';
import { foundationPoints } from './foundation-points.js';
import type { PointGroup } from './groups.js';
import type { GarmentKind } from './kinds.js';
import { linenPoints } from './linen-points.js';
import type { MeasuringPoint, SoftRange } from './point.js';
import { skirtPoints } from './skirt-points.js';
import { sleevePoints } from './sleeve-points.js';
import { tailoringPoints } from './tailoring-points.js';
import { wornPoints } from './worn-points.js';

const catalogue = [
  ...bodicePoints,
  ...sleevePoints,
  ...skirtPoints,
  ...tailoringPoints,
  ...linenPoints,
  ...foundationPoints,
  ...accessoryPoints,
  ...wornPoints,
] as const;

export type PointId = (typeof catalogue)[number]['id'];

export type CataloguedPoint = MeasuringPoint<PointId>;

export const measuringPoints: readonly CataloguedPoint[] = catalogue;

const byId: ReadonlyMap<string, CataloguedPoint> = new Map(measuringPoints.map((entry) => [entry.id, entry]));

export function isPointId(text: string): text is PointId {
  return byId.has(text);
}

export function measuringPoint(id: PointId): CataloguedPoint {
  const found = byId.get(id);
  if (!found) throw new RangeError(`expected a measuring point, got "${id}"`);
  return found;
}

/** For ids that come from outside: nothing rather than a throw. */
export function findMeasuringPoint(id: string): CataloguedPoint | undefined {
  return byId.get(id);
}

/** The points that apply to a kind of part; those of parts laid together have a protocol of their own. */
export function pointsForKind(kind: GarmentKind): readonly CataloguedPoint[] {
  return measuringPoints.filter((entry) => entry.kinds.includes(kind) && !entry.wornTogether);
}

export function pointsInGroup(group: PointGroup): readonly CataloguedPoint[] {
  return measuringPoints.filter((entry) => entry.group === group);
}

/** The range that is usual for the point on this kind of part. */
export function softRangeFor(entry: MeasuringPoint, kind: GarmentKind): SoftRange {
  return entry.softRangeByKind[kind] ?? entry.softRange;
}
