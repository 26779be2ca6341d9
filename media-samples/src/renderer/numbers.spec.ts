import { describe, expect, it } from 'vitest';
import { curve, ease } from './numbers';

describe('curve', () => {
  const through = curve([
    [0, 1],
    [1, 4],
    [2, 4],
    [5, 9],
  ]);

  it('passes through its own points', () => {
    expect([0, 1, 2, 5].map(through)).toEqual([1, 4, 4, 9]);
  });

  it('never overshoots: a waist is not narrower than the number given for it', () => {
    for (let x = 0; x <= 5; x += 0.01) expect(through(x)).toBeLessThanOrEqual(9 + 1e-12);
    for (let x = 1; x <= 2; x += 0.01) expect(through(x)).toBeCloseTo(4, 10);
  });

  it('is level beyond both ends', () => {
    expect(through(-3)).toBe(1);
    expect(through(8)).toBe(9);
  });
});

describe('ease', () => {
  it('turns round when its bounds do', () => {
    expect(ease(2, 1, 0.5)).toBe(1);
    expect(ease(2, 1, 2.5)).toBe(0);
    expect(ease(2, 1, 1.5)).toBeCloseTo(0.5, 12);
  });
});
