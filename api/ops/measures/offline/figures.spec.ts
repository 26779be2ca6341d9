import { describe, expect, it } from 'vitest';
import { line, percentile } from './figures.js';

describe('figures that were measured', () => {
  // The nearest-rank example of the list 15, 20, 35, 40, 50: its 30th, 40th and 100th percentiles. From memory.
  it.each([
    [0.3, 20],
    [0.4, 20],
    [0.5, 35],
    [1, 50],
  ])('have %d of their number at or below the percentile', (share, expected) => {
    expect(percentile([50, 15, 40, 20, 35], share)).toBe(expected);
  });

  it('are none where nothing was measured', () => {
    expect(() => percentile([], 0.95)).toThrow(RangeError);
  });

  it('stand beside what they may be at most', () => {
    expect(line({ what: 'start', value: 812.34, most: 1000, unit: 'ms' })).toBe(
      'kept    start: 812.3 ms (at most 1000 ms)',
    );
    expect(line({ what: 'start', value: 1000.1, most: 1000, unit: 'ms' })).toMatch(/^MISSED/);
  });
});
