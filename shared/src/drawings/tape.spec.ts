import { describe, expect, it } from 'vitest';
import { tapeTicks } from './tape.js';

const at = (mmPerPx: number, unit: 'mm' | 'cm' | 'in', lengthPx = 400) =>
  tapeTicks({ lengthPx, mmPerPx, unit });

describe('the tape', () => {
  it('has a tick at every millimetre from 2.4 px on, longer at 5 and at 10', () => {
    const ticks = at(1 / 2.4, 'mm', 240);
    expect(ticks).toHaveLength(101);
    expect(ticks[3]).toEqual({ px: 7.2, rank: 'minor' });
    expect(ticks[5]?.rank).toBe('middle');
    expect(ticks[10]).toMatchObject({ px: 24, rank: 'major' });
  });

  it('drops the 1 mm ticks below 2.4 px to the millimetre', () => {
    const ticks = at(1 / 2.39, 'mm');
    expect(ticks[1]?.px).toBeCloseTo(5 * 2.39, 2);
    expect(ticks[1]?.rank).toBe('minor');
  });

  it('is the same tape in centimetres, with a tenth of the figures', () => {
    const [mm, cm] = [at(2, 'mm'), at(2, 'cm')];
    expect(cm.map((tick) => tick.px)).toEqual(mm.map((tick) => tick.px));
    expect(mm.flatMap((tick) => tick.label ?? [])).toEqual([
      '0 mm',
      '100',
      '200',
      '300',
      '400',
      '500',
      '600',
      '700',
    ]);
    expect(cm.flatMap((tick) => tick.label ?? [])).toEqual([
      '0 cm',
      '10',
      '20',
      '30',
      '40',
      '50',
      '60',
      '70',
    ]);
  });

  it('is divided in eighths, halves and whole inches, an inch being 25.4 mm', () => {
    const ticks = at(0.5, 'in', 600);
    const inch = ticks.filter((tick) => tick.rank === 'major');
    expect(inch[1]?.px).toBeCloseTo(50.8, 2);
    expect(ticks.filter((tick) => tick.px < 50.8)).toHaveLength(8);
    expect(ticks[4]?.rank).toBe('middle');
    expect(inch[3]?.label).toBe('3');
  });

  it('keeps labels apart and on the tape at any scale', () => {
    for (const mmPerPx of [0.1, 0.42, 1, 2.6, 7, 20]) {
      const places = at(mmPerPx, 'mm', 900).filter((tick) => tick.label !== undefined);
      expect(places.length).toBeGreaterThan(1);
      places
        .slice(1)
        .forEach((tick, index) => expect(tick.px - places[index]!.px).toBeGreaterThanOrEqual(44));
      expect(places.at(-1)!.px).toBeLessThanOrEqual(870);
    }
  });

  it('refuses a scale of 0', () => {
    expect(() => at(0, 'mm')).toThrow('400 px at 0 mm/px');
  });
});
