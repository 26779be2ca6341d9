import { describe, expect, it } from 'vitest';
import { straight } from './cubic.js';
import {
  endOf,
  joinedWithMirror,
  mirrored,
  parallel,
  pathData,
  pathLength,
  placeAlong,
  sampled,
  startOf,
} from './path.js';
import { distance } from './point.js';
import { pathFrom } from './path-language.js';

const quarterCircle = pathFrom('300,0{90}..{180}0,300');

describe('a path', () => {
  it('is as long as its straight pieces together', () => {
    expect(pathLength([straight([0, 0], [30, 40]), straight([30, 40], [30, 140])])).toBeCloseTo(150, 9);
  });

  it('agrees with the chords of a fine walk along it', () => {
    const walk = sampled(quarterCircle, 0.05);
    const chords = walk.slice(1).reduce((sum, point, index) => sum + distance(walk[index]!, point), 0);
    expect(pathLength(quarterCircle)).toBeCloseTo(chords, 3);
  });

  it('gives the place by length, also where the handles make t run unevenly', () => {
    const uneven = [
      [
        [0, 0],
        [1, 0],
        [2, 0],
        [100, 0],
      ],
    ] as const;
    expect(placeAlong(uneven, 0.5).at[0]).toBeCloseTo(50, 0);
    expect(placeAlong(uneven, 1).at).toEqual([100, 0]);
  });

  it('joined with its mirror is exactly the same on both sides', () => {
    const outline = joinedWithMirror(pathFrom('0,-100{0}..80,-60..{180}0,120'));
    const half = outline.slice(0, outline.length / 2);
    const other = outline.slice(outline.length / 2);
    expect([...other].reverse().map(([a, b, c, d]) => [d, c, b, a])).toEqual(mirrored(half));
    expect(startOf(outline)[1]).toBe(endOf(outline)[1]);
  });

  it('moved to its left keeps its distance all along', () => {
    const moved = parallel(quarterCircle, -12);
    for (const point of sampled(moved, 20)) expect(Math.hypot(...point)).toBeCloseTo(288, 0);
  });

  it('writes a new subpath only where the pen is lifted', () => {
    const data = pathData(
      [straight([0, 0], [3, 0]), straight([3, 0], [3, 3]), straight([9, 9], [12, 9])],
      true,
    );
    expect(data).toBe('M0 0C1 0 2 0 3 0C3 1 3 2 3 3M9 9C10 9 11 9 12 9Z');
  });
});
