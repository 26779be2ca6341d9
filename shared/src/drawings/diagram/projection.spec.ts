import { describe, expect, it } from 'vitest';
import { layOut, projected } from './projection.js';

const view = (width: number, height: number, top = 0) => ({
  bounds: { left: -width / 2, right: width / 2, top, bottom: top + height },
});

describe('the sheet', () => {
  it('sets views side by side as long as the scale stays above the least', () => {
    const { places } = layOut([view(600, 600), view(600, 600)], { width: 800 }, 0.5);
    expect(places[0]!.projection.scale).toBeCloseTo((800 - 2 * 34 - 46) / 1200, 9);
    expect(places[0]!.captionAt[1]).toBe(places[1]!.captionAt[1]);
  });

  it('sets them one below the other where side by side would be too small', () => {
    const { places, height } = layOut([view(600, 600), view(600, 600)], { width: 800 }, 0.6);
    expect(places[0]!.projection.scale).toBeCloseTo((800 - 2 * 34) / 600, 9);
    expect(places[1]!.captionAt[1]).toBeGreaterThan(places[0]!.captionAt[1] + 600);
    expect(height).toBeGreaterThan(1400);
  });

  it('takes the largest arrangement when none keeps the least scale', () => {
    const { places } = layOut([view(600, 600), view(600, 600)], { width: 360 }, 9);
    expect(places[0]!.projection.scale).toBeCloseTo((360 - 2 * 26) / 600, 9);
  });

  it('keeps one scale for all, and waist beside waist', () => {
    const { places } = layOut([view(600, 500, -400), view(700, 560, -440)], { width: 800 }, 0.1);
    const [front, back] = places.map((place) => projected(place.projection)([0, 0]));
    expect(places[0]!.projection.scale).toBe(places[1]!.projection.scale);
    expect(front![1]).toBeCloseTo(back![1], 9);
  });

  it('stays within a height that is asked for', () => {
    const dress = [view(840, 1400)];
    expect(layOut(dress, { width: 800 }, 0.2).height).toBeGreaterThan(1200);
    const low = layOut(dress, { width: 800, mostHeight: 640 }, 0.2);
    expect(low.height).toBeLessThanOrEqual(640);
    expect(low.height).toBeGreaterThan(630);
    expect(projected(low.places[0]!.projection)([0, 0])[0]).toBeCloseTo(400, 6);
  });
});
