import { describe, expect, it } from 'vitest';
import { toMmString } from './length.js';
import { fromOldUnit, oldUnitMm, type OldUnitId, oldUnits } from './old-units.js';

describe('units of old records', () => {
  // International yard and pound agreement of 1959; a nail is 1/16 yd.
  it.each([
    ['nail', 1, '57.15'],
    ['nail', 2, '114.3'],
    ['nail', 4, '228.6'],
    ['nail', 6, '342.9'],
    ['nail', 14, '800.1'],
    ['english-ell', 1, '1143'],
    ['flemish-ell', 1, '685.8'],
    ['french-ell-english-reckoning', 1, '1371.6'],
    ['aune-usuelle', 1, '1200'],
  ] as const)('%s × %i is %s mm, exactly', (id, count, expected) => {
    const { length, exact } = fromOldUnit(id, count);
    expect([toMmString(length), exact]).toEqual([expected, true]);
  });

  // Law of 10 December 1799: the metre is 443.296 lines of Paris.
  it.each([
    ['paris-line', 2.255829],
    ['paris-inch', 27.069949],
    ['paris-foot', 324.839385],
  ] as const)('%s is %d mm', (id, expected) => {
    expect(oldUnitMm(id)).toBeCloseTo(expected, 6);
    expect(fromOldUnit(id, 1).exact).toBe(false);
  });

  // 524 lignes; 526 5/6 lignes as found in 1742: one word, two lengths.
  it.each([
    ['aune-524', 1182.054],
    ['aune-1742', 1188.446],
  ] as const)('%s is %d mm', (id, expected) => {
    expect(oldUnitMm(id)).toBeCloseTo(expected, 3);
  });

  it('have each their own id and a source', () => {
    const ids: OldUnitId[] = oldUnits.map(({ id }) => id);
    expect(new Set(ids).size).toBe(ids.length);
    for (const unit of oldUnits) expect(unit.source, unit.id).toMatch(/\d{4}/);
  });
});
