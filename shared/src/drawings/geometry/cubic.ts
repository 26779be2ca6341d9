import { between, type Point } from './point.js';

/** One cubic Bézier piece: start, two handles, end. */
export type Cubic = readonly [start: Point, startHandle: Point, endHandle: Point, end: Point];

/** A straight piece written as a cubic, its handles at the thirds. */
export const straight = (from: Point, to: Point): Cubic => [
  from,
  between(from, to, 1 / 3),
  between(from, to, 2 / 3),
  to,
];

export function pointOn(cubic: Cubic, t: number): Point {
  const u = 1 - t;
  const along = (axis: 0 | 1) =>
    u ** 3 * cubic[0][axis] +
    3 * u * u * t * cubic[1][axis] +
    3 * u * t * t * cubic[2][axis] +
    t ** 3 * cubic[3][axis];
  return [along(0), along(1)];
}

function velocityOn(cubic: Cubic, t: number): Point {
  const u = 1 - t;
  const along = (axis: 0 | 1) =>
    3 *
    (u * u * (cubic[1][axis] - cubic[0][axis]) +
      2 * u * t * (cubic[2][axis] - cubic[1][axis]) +
      t * t * (cubic[3][axis] - cubic[2][axis]));
  return [along(0), along(1)];
}

/** Unit direction of travel at t. A handle lying on its end has none there, so the ends look just inside. */
export function directionOn(cubic: Cubic, t: number): Point {
  const [x, y] = velocityOn(cubic, Math.min(1 - 1e-6, Math.max(1e-6, t)));
  const speed = Math.hypot(x, y) || 1;
  return [x / speed, y / speed];
}

/** Nodes and weights of the 10-point Gauss–Legendre rule on [-1, 1], one side (Abramowitz & Stegun, table 25.4). */
const GAUSS_LEGENDRE: readonly (readonly [node: number, weight: number])[] = [
  [0.1488743389816312, 0.2955242247147529],
  [0.4333953941292472, 0.2692667193099963],
  [0.6794095682990244, 0.219086362515982],
  [0.8650633666889845, 0.1494513491505806],
  [0.9739065285171717, 0.0666713443086881],
];

/** Length of the curve, integrated over each half so that a tight bend stays exact to far below a micrometre. */
export function cubicLength(cubic: Cubic): number {
  let sum = 0;
  for (const middle of [0.25, 0.75]) {
    for (const [node, weight] of GAUSS_LEGENDRE) {
      for (const side of [-1, 1]) {
        const [x, y] = velocityOn(cubic, middle + 0.25 * side * node);
        sum += 0.25 * weight * Math.hypot(x, y);
      }
    }
  }
  return sum;
}

export const reversedCubic = ([a, b, c, d]: Cubic): Cubic => [d, c, b, a];
