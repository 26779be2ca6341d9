import { describe, expect, it } from 'vitest';
import { boxAround, distanceToPolyline, distanceToSegment, leftOf } from './point.js';

describe('distances', () => {
  it('to a straight piece is the plumb line, or the nearer end beyond it', () => {
    expect(distanceToSegment([5, 3], [0, 0], [10, 0])).toBeCloseTo(3, 12);
    expect(distanceToSegment([13, 4], [0, 0], [10, 0])).toBeCloseTo(5, 12);
  });

  it('to a polyline looks at every piece of it', () => {
    expect(
      distanceToPolyline(
        [10, 5],
        [
          [0, 0],
          [8, 0],
          [8, 10],
        ],
      ),
    ).toBeCloseTo(2, 12);
    expect(distanceToPolyline([1, 1], [])).toBe(Infinity);
  });
});

it('the left hand of somebody walking to the right points up the page', () => {
  expect(leftOf([1, 0])).toEqual([0, -1]);
});

it('a box takes in every point', () => {
  expect(
    boxAround([
      [3, -2],
      [-4, 9],
    ]),
  ).toEqual({ left: -4, top: -2, right: 3, bottom: 9 });
});
