import {
  boxAround,
  distance,
  distanceToPolyline,
  distanceToSegment,
  type Box,
  type Point,
} from '../geometry/point.js';
import type { DrawnLine } from './drawn-line.js';

/** A letter needs this much white, in pixels, to every measuring line but its own… */
export const CLEAR_OF_LINES = 2.5;
/** …and this much to the next letter. */
export const CLEAR_OF_LETTERS = 3;
/** Roundings of the painted numbers must not eat into the rules. */
const SAFETY = 0.1;

const CELL = 24;
/** A leader this close to a line seems to belong to it, in pixels. */
const GRAZING = 3;

interface Trace {
  readonly owner: DrawnLine;
  readonly points: readonly Point[];
  readonly box: Box;
}

/** What lies on the sheet already, asked by the letters that look for room. */
export class LetterSheet {
  private readonly traces: readonly Trace[];
  private readonly ink = new Map<string, Point[]>();

  /**
   * @param radius of a letter's ring, its stroke included, in pixels
   * @param inkPoints places of outlines and seams, a few pixels apart
   * @param captions spans of text that no letter may touch
   */
  constructor(
    private readonly size: { readonly width: number; readonly height: number },
    private readonly radius: number,
    lines: readonly DrawnLine[],
    inkPoints: readonly Point[],
    private readonly captions: readonly Point[][],
  ) {
    this.traces = lines.flatMap((owner) =>
      owner.trace.map((points) => ({ owner, points, box: boxAround(points) })),
    );
    for (const point of inkPoints) {
      const key = cellOf(point);
      const cell = this.ink.get(key);
      if (cell) cell.push(point);
      else this.ink.set(key, [point]);
    }
  }

  holds([x, y]: Point): boolean {
    const edge = this.radius + 2;
    return x >= edge && y >= edge && x <= this.size.width - edge && y <= this.size.height - edge;
  }

  clearOfOtherLines(at: Point, own: DrawnLine): boolean {
    const needed = this.radius + CLEAR_OF_LINES + SAFETY;
    return this.traces.every(
      (trace) =>
        trace.owner === own ||
        outside(at, trace.box, needed) ||
        distanceToPolyline(at, trace.points) >= needed,
    );
  }

  clearOfOwnLine(at: Point, own: DrawnLine): boolean {
    return own.trace.every((points) => distanceToPolyline(at, points) >= this.radius + 2);
  }

  clearOfCaptions(at: Point): boolean {
    return this.captions.every((span) => distanceToPolyline(at, span) >= this.radius + 9);
  }

  clearOfLetter(at: Point, other: Point): boolean {
    return distance(at, other) >= 2 * this.radius + CLEAR_OF_LETTERS + SAFETY;
  }

  /** How much of the garment's own drawing a letter here would hide. */
  inkUnder(at: Point): number {
    const column = Math.floor(at[0] / CELL);
    const rowIndex = Math.floor(at[1] / CELL);
    let hidden = 0;
    for (const dx of [-1, 0, 1]) {
      for (const dy of [-1, 0, 1]) {
        const cell = this.ink.get(`${column + dx},${rowIndex + dy}`) ?? [];
        hidden += cell.filter((point) => distance(point, at) < this.radius + 1).length;
      }
    }
    return hidden;
  }

  /** How many measuring lines a leader would cross or graze. */
  linesUnder(from: Point, to: Point, own: DrawnLine): number {
    const middle: Point = [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2];
    const reach = distance(from, to) / 2 + GRAZING;
    return this.traces.filter(
      (trace) =>
        trace.owner !== own &&
        !outside(middle, trace.box, reach) &&
        trace.points.some((point) => distanceToSegment(point, from, to) < GRAZING),
    ).length;
  }
}

const cellOf = ([x, y]: Point): string => `${Math.floor(x / CELL)},${Math.floor(y / CELL)}`;

const outside = ([x, y]: Point, box: Box, reach: number): boolean =>
  x < box.left - reach || x > box.right + reach || y < box.top - reach || y > box.bottom + reach;
