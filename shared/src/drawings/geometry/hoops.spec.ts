import { describe, expect, it } from 'vitest';
import { edgeAt, farHalf, nearHalf, type Hoop } from './hoops.js';
import { endOf, sampled, startOf } from './path.js';
import { pathFrom } from './path-language.js';

const hoop: Hoop = { left: [-300, 500], right: [340, 520], depth: 40 };

describe('a hoop of a cage', () => {
  it('is fixed where an edge passes its height', () => {
    expect(edgeAt('0,0--100,200', 50)[0]).toBeCloseTo(25, 6);
    expect(edgeAt('118,-4{42}..{72}330,400', 134)[1]).toBe(134);
    expect(() => edgeAt('0,0--100,200', 201)).toThrow(RangeError);
  });

  it('runs from edge to edge, the near half below, the far half above', () => {
    for (const half of [nearHalf(hoop), farHalf(hoop)]) {
      const path = pathFrom(half);
      expect(startOf(path)).toEqual([-300, 500]);
      expect(endOf(path)).toEqual([340, 520]);
    }
    const [near, far] = [nearHalf(hoop), farHalf(hoop)].map((half) => sampled(pathFrom(half), 4));
    const level = (x: number): number => 500 + ((x + 300) / 640) * 20;
    for (const [x, y] of near!) expect(y - level(x)).toBeGreaterThan(-0.1);
    for (const [x, y] of far!) expect(y - level(x)).toBeLessThan(0.1);
  });

  it('is an oval to a millimetre', () => {
    for (const [x, y] of sampled(pathFrom(nearHalf({ left: [-100, 0], right: [100, 0], depth: 30 })), 3)) {
      expect(Math.abs(y - 30 * Math.sqrt(Math.max(0, 1 - (x / 100) ** 2)))).toBeLessThan(1);
    }
  });

  it('has two edges where the steel is covered', () => {
    const [upper, lower] = [nearHalf(hoop), nearHalf(hoop, 8)].map((half) => startOf(pathFrom(half)));
    expect(lower![1] - upper![1]).toBeCloseTo(8, 6);
  });
});
