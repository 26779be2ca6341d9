import { describe, expect, it } from 'vitest';
import { testCheck } from '../testing/test-check.js';
import { ellipseRound, hoopAgainstEllipse } from './hoop-against-ellipse.js';

const hoop = (round: number, depth: number, width: number) => ({
  kind: 'crinoline' as const,
  readings: {
    'crinoline-base-round': round,
    'crinoline-base-depth': depth,
    'crinoline-base-width': width,
  },
});

testCheck(hoopAgainstEllipse, {
  quiet: [
    { name: 'a hoop that fits', ...hoop(2530, 850, 760) },
    { name: 'a tenth more', ...hoop(2767, 850, 750) },
    {
      name: 'a hoop whose width was not read',
      kind: 'crinoline',
      readings: { 'crinoline-base-round': 2500 },
    },
  ],
  raises: [
    {
      name: 'a width read across the half',
      ...hoop(2500, 850, 380),
      says: 'The base hoop reads 2500 mm round, but an ellipse 850 mm deep and 380 mm wide is 2003 mm round. Did the hoop stand free?',
      severity: 'question',
      points: ['crinoline-base-round', 'crinoline-base-depth', 'crinoline-base-width'],
    },
  ],
});

describe('the round of an ellipse', () => {
  it('is 2πr where it is a circle, and four times its half axis where it is flat', () => {
    expect(ellipseRound(100, 100)).toBeCloseTo(200 * Math.PI, 9);
    // The approximation is worst on a flat ellipse, and there by some four parts in ten thousand.
    expect(ellipseRound(100, 0) / 400).toBeCloseTo(1, 3);
    expect(ellipseRound(0, 0)).toBe(0);
  });

  // The perimeter with half axes 5 and 3 is 25.52699886 by the complete elliptic integral, worked out as a series here.
  it('agrees with the elliptic integral, summed as the series of Gauss and Kummer', () => {
    const exact = (a: number, b: number): number => {
      const h = ((a - b) / (a + b)) ** 2;
      let [sum, term] = [1, 1];
      for (let n = 1; n < 60; n += 1) {
        term *= (1.5 - n) / n;
        sum += term ** 2 * h ** n;
      }
      return Math.PI * (a + b) * sum;
    };
    expect(exact(5, 3)).toBeCloseTo(25.526998863, 8);
    for (const [a, b] of [
      [5, 3],
      [425, 380],
      [600, 300],
    ] as const)
      expect(ellipseRound(a, b)).toBeCloseTo(exact(a, b), 4);
  });
});
