/** A place on a drawing: x to the right, y down. Millimetres of the garment, or pixels once projected. */
export type Point = readonly [x: number, y: number];

export interface Box {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
}

export const distance = (a: Point, b: Point): number => Math.hypot(a[0] - b[0], a[1] - b[1]);

export const between = (a: Point, b: Point, share: number): Point => [
  a[0] + (b[0] - a[0]) * share,
  a[1] + (b[1] - a[1]) * share,
];

/** The point `reach` away from `from` along a unit direction. */
export const stepped = (from: Point, direction: Point, reach: number): Point => [
  from[0] + direction[0] * reach,
  from[1] + direction[1] * reach,
];

/** The normal on the left hand of somebody walking along `direction` (y points down). */
export const leftOf = (direction: Point): Point => [direction[1], -direction[0]];

/** Shortest distance from a point to the straight piece from `a` to `b`. */
export function distanceToSegment(point: Point, a: Point, b: Point): number {
  const lengthSquared = (b[0] - a[0]) ** 2 + (b[1] - a[1]) ** 2;
  if (lengthSquared === 0) return distance(point, a);
  const share = ((point[0] - a[0]) * (b[0] - a[0]) + (point[1] - a[1]) * (b[1] - a[1])) / lengthSquared;
  return distance(point, between(a, b, Math.min(1, Math.max(0, share))));
}

/** Shortest distance from a point to a polyline; infinite where there are no points. */
export function distanceToPolyline(point: Point, polyline: readonly Point[]): number {
  let nearest = Infinity;
  for (let index = 0; index < polyline.length; index++) {
    const here = polyline[index]!;
    const next = polyline[index + 1] ?? here;
    nearest = Math.min(nearest, distanceToSegment(point, here, next));
  }
  return nearest;
}

export function boxAround(points: Iterable<Point>): Box {
  let [left, top, right, bottom] = [Infinity, Infinity, -Infinity, -Infinity];
  for (const [x, y] of points) {
    left = Math.min(left, x);
    right = Math.max(right, x);
    top = Math.min(top, y);
    bottom = Math.max(bottom, y);
  }
  return { left, top, right, bottom };
}
