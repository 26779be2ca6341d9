import { describe, expect, it } from 'vitest';
import { seededNoise } from './noise';

const sample = (seed: number): number[] => {
  const noise = seededNoise(seed);
  return Array.from({ length: 200 }, (_, i) => noise.at(i * 0.37, i * 0.11) + noise.fold(i * 0.21, 3));
};

describe('seededNoise', () => {
  it('gives the same folds for the same seed', () => {
    expect(sample(1885)).toEqual(sample(1885));
  });

  it('gives other folds for another seed', () => {
    expect(sample(1885)).not.toEqual(sample(1886));
  });

  it('stays within -1 and 1, and reaches well into both halves', () => {
    const noise = seededNoise(7);
    const values = Array.from({ length: 4000 }, (_, i) => noise.at(i * 0.173, i * 0.091));
    expect(Math.min(...values)).toBeGreaterThanOrEqual(-1);
    expect(Math.max(...values)).toBeLessThanOrEqual(1);
    expect(Math.min(...values)).toBeLessThan(-0.4);
    expect(Math.max(...values)).toBeGreaterThan(0.4);
  });

  it('has no step where one fold meets the next', () => {
    const noise = seededNoise(3);
    for (let i = 1; i < 40; i++)
      expect(Math.abs(noise.fold(i - 1e-6) - noise.fold(i + 1e-6))).toBeLessThan(0.02);
  });
});
