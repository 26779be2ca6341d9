import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { absolute, mm, subtract, times } from '../units/length.js';
import { drawnScale, markUncertaintyPx, patternScale, pixelsPerMm, readPair } from './pattern-scale.js';

const pair = (fromX: number, fromY: number, toX: number, toY: number) => ({
  from: { x: fromX, y: fromY },
  to: { x: toX, y: toY },
});
const scaleOf = (marks: ReturnType<typeof pair>, length: number, own = 0) => {
  const scale = patternScale(marks, mm(length), own);
  if (!scale) throw new Error('expected a scale');
  return scale;
};

describe('the scale of a hand-drawn pattern', () => {
  it('reads a 3-4-5 triangle exactly (Euclid I.47)', () => {
    const scale = scaleOf(pair(0, 0, 300, 0), 150);
    expect(readPair(scale, pair(0, 0, 300, 400)).length).toBe(mm(250));
    expect(readPair(scale, pair(10, 20, 310, 420)).length).toBe(mm(250));
    expect(pixelsPerMm(scale)).toBe('2.00');
  });

  it('rounds a diagonal once: the diagonal of a square of 100 mm is 141.4214 mm (√2 = 1.41421356…)', () => {
    const scale = scaleOf(pair(0, 0, 700, 0), 100);
    expect(readPair(scale, pair(0, 0, 700, 700)).length).toBe(mm('141.4214'));
  });

  it('shows pixels for a millimetre to two places', () => {
    expect(pixelsPerMm(scaleOf(pair(0, 0, 642, 0), 200))).toBe('3.21');
    expect(pixelsPerMm(scaleOf(pair(0, 0, 0, 50), 800))).toBe('0.06');
  });

  it('is none where the marks lie on one another or the distance is nothing', () => {
    expect(patternScale(pair(5, 5, 5, 5), mm(100), 0)).toBeUndefined();
    expect(patternScale(pair(0, 0, 5, 5), mm(0), 0)).toBeUndefined();
  });

  it('says what the paper was drawn to: 1016 mm stand as 254 mm at 1:4 and as 127 mm at 1:8', () => {
    expect(drawnScale(mm(1016), mm(254))).toBe('1:4');
    expect(drawnScale(mm(1016), mm(127))).toBe('1:8');
    expect(drawnScale(mm(1016), mm('203.2'))).toBe('1:5');
    expect(drawnScale(mm(400), mm(101))).toBe('1:3.96');
    expect(drawnScale(mm(300), mm(300))).toBe('1:1');
    expect(drawnScale(mm(10), mm(20))).toBe('2:1');
    expect(drawnScale(mm(300), mm(0))).toBeUndefined();
  });

  it('is as sure as two marks a pixel out either way: √2 ÷ √3 of a pixel (NIST TN 1297, rectangular)', () => {
    expect(markUncertaintyPx(1)).toBeCloseTo(0.8165, 4);
    const scale = scaleOf(pair(0, 0, 1000, 0), 500);
    // 0.5 mm a pixel: the known pair read again carries its marks twice over.
    expect(readPair(scale, pair(0, 9, 1000, 9)).uncertaintyMm).toBeCloseTo(0.5 * 0.8165 * Math.SQRT2, 4);
    expect(readPair(scale, pair(7, 7, 7, 7)).uncertaintyMm).toBeCloseTo(0.5 * 0.8165, 4);
  });

  it('passes on how well the known distance was known, in proportion', () => {
    const scale = scaleOf(pair(0, 0, 100_000, 0), 1000, 3);
    expect(readPair(scale, pair(0, 0, 50_000, 0)).uncertaintyMm).toBeCloseTo(1.5, 3);
  });

  it('is less sure where only a smaller form of the picture is shown', () => {
    const scale = scaleOf(pair(0, 0, 1000, 0), 500);
    const fine = readPair(scale, pair(0, 0, 500, 0), 1).uncertaintyMm;
    expect(readPair(scale, pair(0, 0, 500, 0), 3).uncertaintyMm).toBeCloseTo(3 * fine, 6);
  });

  const place = fc.integer({ min: 0, max: 9000 });
  const pairs = fc.tuple(place, place, place, place).map((four) => pair(...four));
  const marks = pairs.filter(({ from, to }) => from.x !== to.x || from.y !== to.y);
  const distances = fc.integer({ min: 1, max: 4000 });

  it('reads its own marks as the known distance, exactly', () => {
    fc.assert(
      fc.property(marks, distances, (own, distance) => {
        expect(readPair(scaleOf(own, distance), own).length).toBe(mm(distance));
      }),
    );
  });

  it('does not depend on how finely the picture was scanned', () => {
    fc.assert(
      fc.property(marks, pairs, distances, fc.integer({ min: 2, max: 10 }), (own, other, distance, times) => {
        const finer = ({ from, to }: typeof own) =>
          pair(from.x * times, from.y * times, to.x * times, to.y * times);
        expect(readPair(scaleOf(finer(own), distance), finer(other)).length).toBe(
          readPair(scaleOf(own, distance), other).length,
        );
      }),
    );
  });

  it('reads twice as much where the known distance is twice as long, to the last place', () => {
    fc.assert(
      fc.property(marks, pairs, distances, (own, other, distance) => {
        const once = readPair(scaleOf(own, distance), other).length;
        const twice = readPair(scaleOf(own, 2 * distance), other).length;
        expect(absolute(subtract(twice, times(once, 2)))).toBeLessThanOrEqual(1);
      }),
    );
  });

  it('reads a pair the same from either end and wherever it lies', () => {
    fc.assert(
      fc.property(marks, pairs, distances, place, (own, other, distance, shift) => {
        const scale = scaleOf(own, distance);
        const moved = pair(
          other.to.x + shift,
          other.to.y + shift,
          other.from.x + shift,
          other.from.y + shift,
        );
        expect(readPair(scale, moved).length).toBe(readPair(scale, other).length);
      }),
    );
  });
});
