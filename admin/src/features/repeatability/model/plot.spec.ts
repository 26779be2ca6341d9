import { describe, expect, it } from 'vitest';
import { figure, reliabilityText, signed } from './figures.js';
import { niceStep, PLOT, plotOf } from './plot.js';

const pair = (meanMm: number, differenceMm: number) => ({ meanMm, differenceMm });

describe('the plot of difference against mean', () => {
  it('shows nought, every pair and both limits within its frame', () => {
    const pairs = [pair(611, 2), pair(589, -2), pair(655, 0)];
    const plot = plotOf({ pairs, limitsMm: { lower: -4.2, upper: 3.8 } })!;
    expect(plot.y.from).toBeLessThanOrEqual(-4.2);
    expect(plot.y.to).toBeGreaterThanOrEqual(3.8);
    expect(plot.y.ticks).toContain(0);
    for (const { x, y } of plot.dots) {
      expect(x).toBeGreaterThan(PLOT.left);
      expect(x).toBeLessThan(PLOT.width - PLOT.right);
      expect(y).toBeGreaterThan(PLOT.top);
      expect(y).toBeLessThan(PLOT.height - PLOT.bottom);
    }
    // A longer second reading lies higher.
    expect(plot.dots[0]!.y).toBeLessThan(plot.dots[1]!.y);
  });

  it('stands also for a single pair, and for readings that all agree', () => {
    const plot = plotOf({ pairs: [pair(612, 0)], limitsMm: null })!;
    expect([plot.x.at(612), plot.y.at(0)].every(Number.isFinite)).toBe(true);
    expect(plot.x.to).toBeGreaterThan(plot.x.from);
    expect(plotOf({ pairs: [], limitsMm: null })).toBeUndefined();
  });

  it('has steps that people count in', () => {
    expect([0.3, 1, 1.1, 2.4, 7, 60, 0].map(niceStep)).toEqual([0.5, 1, 2, 5, 10, 100, 1]);
  });
});

describe('its figures', () => {
  it('have a true minus, and no sign where there is nothing', () => {
    expect(figure(-0.25, 2)).toBe('−0.25');
    expect(signed(2, 1)).toBe('+2.0');
    expect(signed(-0.01, 1)).toBe('0.0');
  });

  it('never round R up to one', () => {
    expect(reliabilityText(0.99998)).toBe('0.999');
    expect(reliabilityText(1)).toBe('1.000');
    expect(reliabilityText(0.951)).toBe('0.951');
  });
});
