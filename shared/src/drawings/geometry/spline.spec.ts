import { describe, expect, it } from 'vitest';
import { directionOn } from './cubic.js';
import { pathLength } from './path.js';
import { smoothThrough } from './spline.js';

describe('a smooth curve through points', () => {
  it('with square tangents is a quarter circle, π/2 times its radius long', () => {
    const quarter = smoothThrough(
      [
        [500, 0],
        [0, 500],
      ],
      { leaving: 90, arriving: 180 },
    );
    expect(pathLength(quarter) / ((Math.PI / 2) * 500)).toBeCloseTo(1, 3);
    const middle = quarter[0]!;
    const halfway = [0, 1].map(
      (axis) => (middle[0][axis]! + 3 * middle[1][axis]! + 3 * middle[2][axis]! + middle[3][axis]!) / 8,
    );
    expect(Math.hypot(halfway[0]!, halfway[1]!)).toBeCloseTo(500, 0);
  });

  it('through points on a line is that line', () => {
    expect(
      pathLength(
        smoothThrough([
          [0, 0],
          [30, 40],
          [60, 80],
        ]),
      ),
    ).toBeCloseTo(100, 9);
  });

  it('turns nowhere at a knot', () => {
    const pieces = smoothThrough(
      [
        [0, 0],
        [120, 40],
        [90, 200],
        [240, 260],
      ],
      { leaving: 10 },
    );
    for (let k = 1; k < pieces.length; k++) {
      const [before, after] = [directionOn(pieces[k - 1]!, 1), directionOn(pieces[k]!, 0)];
      expect(before[0] * after[0] + before[1] * after[1]).toBeGreaterThan(0.999999);
    }
  });

  it('leaves and arrives in the directions asked for', () => {
    const [piece] = smoothThrough(
      [
        [0, 0],
        [100, 30],
      ],
      { leaving: 60, arriving: -20 },
    );
    const radians = Math.PI / 180;
    expect(Math.atan2(...swap(directionOn(piece!, 0)))).toBeCloseTo(60 * radians, 4);
    expect(Math.atan2(...swap(directionOn(piece!, 1)))).toBeCloseTo(-20 * radians, 4);
  });

  it('refuses one point, and two on the same spot', () => {
    expect(() => smoothThrough([[0, 0]])).toThrow('two points or more, got 1');
    expect(() =>
      smoothThrough([
        [7, 8],
        [7, 8],
        [9, 9],
      ]),
    ).toThrow('at 7,8');
  });
});

const swap = ([x, y]: readonly [number, number]): [number, number] => [y, x];
