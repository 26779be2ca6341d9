import { sampled, type CubicPath } from './path.js';
import { pathFrom } from './path-language.js';
import type { Point } from './point.js';

/** A hoop of a cage, seen a little from above: an oval between two edges. */
export interface Hoop {
  readonly left: Point;
  readonly right: Point;
  /** Its near half hangs lower by this, its far half stands higher. */
  readonly depth: number;
}

/** Where an edge that runs downwards passes the height `y`. */
export function edgeAt(edge: string, y: number): Point {
  const points = sampled(readOnce(edge), 2);
  const below = points.findIndex(([, at]) => at >= y);
  const [from, to] = [points[below - 1], points[below]];
  if (!from || !to) throw new RangeError(`The edge "${edge}" does not reach ${y}.`);
  return [from[0] + ((to[0] - from[0]) * (y - from[1])) / (to[1] - from[1]), y];
}

const read = new Map<string, CubicPath>();

function readOnce(edge: string): CubicPath {
  const path = read.get(edge) ?? pathFrom(edge);
  read.set(edge, path);
  return path;
}

/** The half towards the eye; `lower` moves it down, as for the other edge of a covered steel. */
export const nearHalf = (hoop: Hoop, lower = 0): string => halfOval(hoop, hoop.depth, lower);

export const farHalf = (hoop: Hoop): string => halfOval(hoop, -hoop.depth, 0);

const KNOTS = 16;

/** From left to right, through knots evenly spread round the oval: a spline follows it as closely as a pen. */
function halfOval({ left, right }: Hoop, rise: number, lower: number): string {
  const knots = Array.from({ length: KNOTS + 1 }, (_, index) => {
    const turn = (Math.PI * index) / KNOTS;
    const share = (1 - Math.cos(turn)) / 2;
    const x = left[0] + (right[0] - left[0]) * share;
    const y = left[1] + (right[1] - left[1]) * share + rise * Math.sin(turn) + lower;
    return `${x.toFixed(1)},${y.toFixed(1)}`;
  });
  const down = rise > 0 ? 90 : -90;
  return `${knots.slice(0, -1).join('..').replace('..', `{${down}}..`)}..{${-down}}${knots[KNOTS] ?? ''}`;
}
