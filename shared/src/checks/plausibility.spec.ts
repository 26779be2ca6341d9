import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { kindIds } from '../points/kinds.js';
import { measuringPoint, pointsForKind, softRangeFor } from '../points/measuring-points.js';
import { read } from '../testing/sample-readings.js';
import { type Length, lengthOf, mm } from '../units/length.js';
import { explain, type SlipKind } from './plausibility.js';

const waist = measuringPoint('waist');
const causeOf = (length: Length, unit: 'mm' | 'in' = 'mm') =>
  explain(read('waist', 0, { length, unit }), waist, softRangeFor(waist, 'bodice'));

describe('what would explain a reading', () => {
  // The inch is 25.4 mm: international yard and pound agreement, 1959.
  it.each([
    ['a tenth of it', mm('61.2'), 'mm', 'ten-times-less', mm(612)],
    ['ten times it', mm(6120), 'mm', 'ten-times-more', mm(612)],
    ['its inches, 24 1/8, as millimetres', mm('24.125'), 'mm', 'inches-as-mm', mm('612.775')],
    ['612 keyed in a field of inches', mm('15544.8'), 'in', 'mm-as-inches', mm(612)],
  ] as const)('%s is a slip, and what was meant comes out exact', (_name, length, unit, slip, meant) => {
    expect(causeOf(length, unit)).toEqual({ cause: 'slip', slip: slip satisfies SlipKind, meant });
  });

  it('is asked for outside the range alone, and what it proposes lies within', () => {
    const anywhere = fc.constantFrom(...kindIds).chain((kind) =>
      fc.record({
        kind: fc.constant(kind),
        point: fc.constantFrom(...pointsForKind(kind)),
        length: fc.integer({ min: 0, max: 200_000_000 }).map(lengthOf),
        unit: fc.constantFrom('mm' as const, 'cm' as const, 'in' as const),
      }),
    );
    fc.assert(
      fc.property(anywhere, ({ kind, point, length, unit }) => {
        const range = softRangeFor(point, kind);
        const isWithin = (found: Length): boolean => found >= range.from && found <= range.to;
        const found = explain(read(point.id, 0, { length, unit }), point, range);
        expect(found.cause === 'usual').toBe(isWithin(length));
        if ('meant' in found) expect(isWithin(found.meant)).toBe(true);
        if ('bound' in found) expect([range.from, range.to]).toContain(found.bound);
      }),
      { numRuns: 500 },
    );
  });
});
