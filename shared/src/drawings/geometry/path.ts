import { cubicLength, directionOn, pointOn, reversedCubic, type Cubic } from './cubic.js';
import { boxAround, distance, leftOf, stepped, type Box, type Point } from './point.js';
import { smoothThrough } from './spline.js';

/** Cubic pieces, each beginning where the one before ended. */
export type CubicPath = readonly Cubic[];

/** A place on a path and the unit direction of travel there. */
export interface PathPlace {
  readonly at: Point;
  readonly direction: Point;
}

export const pathLength = (path: CubicPath): number =>
  path.reduce((sum, cubic) => sum + cubicLength(cubic), 0);

export const transformed = (path: CubicPath, move: (point: Point) => Point): CubicPath =>
  path.map(([a, b, c, d]): Cubic => [move(a), move(b), move(c), move(d)]);

/** The other half of the garment: x = 0 is the centre. */
export const mirrored = (path: CubicPath): CubicPath => transformed(path, ([x, y]) => [-x, y]);

export const reversed = (path: CubicPath): CubicPath => path.map(reversedCubic).reverse();

/** A whole outline from its right half: the half, then its mirror image walked backwards. */
export const joinedWithMirror = (half: CubicPath): CubicPath => [...half, ...reversed(mirrored(half))];

export const startOf = (path: CubicPath): Point => piece(path, 0)[0];
export const endOf = (path: CubicPath): Point => piece(path, path.length - 1)[3];

function piece(path: CubicPath, index: number): Cubic {
  const found = path[index];
  if (!found) throw new RangeError('A path needs one piece or more.');
  return found;
}

/** Points along the path, no two further apart than about `step`. */
export function sampled(path: CubicPath, step: number): Point[] {
  const points: Point[] = [];
  for (const cubic of path) {
    const count = Math.max(2, Math.ceil(cubicLength(cubic) / step));
    for (let index = points.length === 0 ? 0 : 1; index <= count; index++)
      points.push(pointOn(cubic, index / count));
  }
  return points;
}

export const boundsOf = (paths: readonly CubicPath[], step = 8): Box =>
  boxAround(paths.flatMap((path) => sampled(path, step)));

const CHORDS_PER_PIECE = 24;

/** The place where `share` (0 to 1) of the path's length has been walked. */
export function placeAlong(path: CubicPath, share: number): PathPlace {
  const lengths = path.map(cubicLength);
  let left = share * lengths.reduce((sum, length) => sum + length, 0);
  for (const [index, length] of lengths.entries()) {
    if (left <= length || index === path.length - 1)
      return placeOnCubic(piece(path, index), left / (length || 1));
    left -= length;
  }
  return placeOnCubic(piece(path, 0), 0);
}

function placeOnCubic(cubic: Cubic, share: number): PathPlace {
  const t = parameterAt(cubic, Math.min(1, Math.max(0, share)));
  return { at: pointOn(cubic, t), direction: directionOn(cubic, t) };
}

/** Walks chords, because equal steps of t are not equal steps of cloth. */
function parameterAt(cubic: Cubic, share: number): number {
  const chords: number[] = [];
  for (let k = 1; k <= CHORDS_PER_PIECE; k++) {
    chords.push(distance(pointOn(cubic, (k - 1) / CHORDS_PER_PIECE), pointOn(cubic, k / CHORDS_PER_PIECE)));
  }
  let left = share * chords.reduce((sum, chord) => sum + chord, 0);
  for (const [index, chord] of chords.entries()) {
    if (left <= chord) return (index + (chord === 0 ? 0 : left / chord)) / CHORDS_PER_PIECE;
    left -= chord;
  }
  return 1;
}

/** The path moved `offset` to its left hand (negative: right), refitted through points of the moved line. */
export function parallel(path: CubicPath, offset: number): CubicPath {
  if (offset === 0) return path;
  const count = Math.max(4, Math.min(14, Math.ceil(pathLength(path) / 40)));
  const points = Array.from({ length: count + 1 }, (_, index) => {
    const { at, direction } = placeAlong(path, index / count);
    return stepped(at, leftOf(direction), offset);
  });
  return smoothThrough(points);
}

/** Two decimals: a hundredth of a pixel is finer than any screen shows. */
const written = (value: number): string => String(Math.round(value * 100) / 100 + 0);
const writtenPoint = ([x, y]: Point): string => `${written(x)} ${written(y)}`;

/** SVG path data. Pieces that do not join begin a new subpath. */
export function pathData(path: CubicPath, closed = false): string {
  let data = '';
  let pen: Point | undefined;
  for (const [start, startHandle, endHandle, end] of path) {
    if (!pen || distance(pen, start) > 0.01) data += `M${writtenPoint(start)}`;
    data += `C${[startHandle, endHandle, end].map(writtenPoint).join(' ')}`;
    pen = end;
  }
  return closed ? `${data}Z` : data;
}
