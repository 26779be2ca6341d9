import { straight, type Cubic } from './cubic.js';
import { distance, type Point } from './point.js';

/** Directions in degrees, 0 to the right and 90 down; left out, the curve ends as a circle would. */
export interface SplineEnds {
  readonly leaving?: number;
  readonly arriving?: number;
}

const radians = (degrees: number): number => (degrees * Math.PI) / 180;

/** The same turn in (-π, π]. */
const turn = (angle: number): number => Math.atan2(Math.sin(angle), Math.cos(angle));

/**
 * A smooth curve through few points (J. D. Hobby, "Smooth, easy to compute interpolating splines",
 * Discrete & Computational Geometry 1, 1986; tension 1). Both pieces meeting at a knot share their tangent
 * by construction.
 */
export function smoothThrough(knots: readonly Point[], ends: SplineEnds = {}): Cubic[] {
  const last = knots.length - 1;
  if (last < 1) throw new RangeError(`A curve needs two points or more, got ${knots.length}.`);
  if (last === 1 && ends.leaving === undefined && ends.arriving === undefined) {
    return [straight(knots[0]!, knots[1]!)];
  }
  const chords = knots.slice(1).map((knot, index) => chordBetween(knots[index]!, knot));
  const turns = knots.map((_, k) =>
    k === 0 || k === last ? 0 : turn(chords[k]!.angle - chords[k - 1]!.angle),
  );
  const offsets = solveTridiagonal(equations(chords, turns, ends));
  return chords.map((chord, k) => {
    const out = offsets[k]!;
    const into = -turns[k + 1]! - offsets[k + 1]!;
    return pieceBetween(knots[k]!, knots[k + 1]!, chord, out, into);
  });
}

interface Chord {
  readonly length: number;
  readonly angle: number;
}

function chordBetween(a: Point, b: Point): Chord {
  const length = distance(a, b);
  if (length === 0) throw new RangeError(`Two knots of a curve lie on each other at ${a[0]},${a[1]}.`);
  return { length, angle: Math.atan2(b[1] - a[1], b[0] - a[0]) };
}

interface Row {
  readonly before: number;
  readonly own: number;
  readonly after: number;
  readonly right: number;
}

/** Equal mock curvature on both sides of every inner knot; at the ends a given direction or curl 1. */
function equations(chords: readonly Chord[], turns: readonly number[], ends: SplineEnds): Row[] {
  const last = chords.length;
  return turns.map((_, k): Row => {
    if (k === 0) {
      if (ends.leaving === undefined) return { before: 0, own: 1, after: 1, right: -turns[1]! };
      return { before: 0, own: 1, after: 0, right: turn(radians(ends.leaving) - chords[0]!.angle) };
    }
    if (k === last) {
      if (ends.arriving === undefined) return { before: 1, own: 1, after: 0, right: 0 };
      return { before: 0, own: 1, after: 0, right: turn(radians(ends.arriving) - chords[k - 1]!.angle) };
    }
    const before = 1 / chords[k - 1]!.length;
    const after = 1 / chords[k]!.length;
    return {
      before,
      own: 2 * (before + after),
      after,
      right: -2 * turns[k]! * before - turns[k + 1]! * after,
    };
  });
}

function solveTridiagonal(rows: readonly Row[]): number[] {
  const swept: { after: number; right: number }[] = [];
  rows.forEach((row, k) => {
    const above = swept[k - 1] ?? { after: 0, right: 0 };
    const pivot = row.own - row.before * above.after;
    swept.push({ after: row.after / pivot, right: (row.right - row.before * above.right) / pivot });
  });
  const solution = new Array<number>(rows.length).fill(0);
  for (let k = rows.length - 1; k >= 0; k--) {
    solution[k] = swept[k]!.right - swept[k]!.after * (solution[k + 1] ?? 0);
  }
  return solution;
}

/** Hobby's handle length as a share of the chord, for the angles at this end and at the other. */
function handleShare(here: number, there: number): number {
  const fit =
    Math.SQRT2 *
    (Math.sin(here) - Math.sin(there) / 16) *
    (Math.sin(there) - Math.sin(here) / 16) *
    (Math.cos(here) - Math.cos(there));
  const spread = 1 + 0.5 * (Math.sqrt(5) - 1) * Math.cos(here) + 0.5 * (3 - Math.sqrt(5)) * Math.cos(there);
  return (2 + fit) / (3 * spread);
}

function pieceBetween(from: Point, to: Point, chord: Chord, out: number, into: number): Cubic {
  const first = chord.length * handleShare(out, into);
  const second = chord.length * handleShare(into, out);
  return [
    from,
    [from[0] + Math.cos(chord.angle + out) * first, from[1] + Math.sin(chord.angle + out) * first],
    [to[0] - Math.cos(chord.angle - into) * second, to[1] - Math.sin(chord.angle - into) * second],
    to,
  ];
}
