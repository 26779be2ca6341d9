import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { notTaken, read } from '../testing/sample-readings.js';
import { toMm } from '../units/length.js';
import { acceptedValue } from './accepted-value.js';
import type { Reading } from './reading.js';
import { valuesBySide } from './values-by-side.js';

const told = (readings: readonly Reading[]) =>
  valuesBySide(readings, 'sleeve-outer').map(({ worn, accepted, rounds }) => [
    worn,
    toMm(accepted.value),
    rounds.length,
  ]);

describe('the values of a point by side', () => {
  it('keep left and right apart, each the mean of its own rounds, right first', () => {
    const readings = [
      read('sleeve-outer', 580, { worn: 'left' }),
      read('sleeve-outer', 583, { worn: 'left', round: 2 }),
      read('sleeve-outer', 592, { worn: 'right' }),
    ];
    expect(told(readings)).toEqual([
      ['right', 592, 1],
      ['left', 581.5, 2],
    ]);
  });

  it('begin with what was read without saying on which side', () => {
    expect(told([read('sleeve-outer', 592, { worn: 'right' }), read('sleeve-outer', 588)])).toEqual([
      [null, 588, 1],
      ['right', 592, 1],
    ]);
  });

  it('are none where nothing was taken, or where what was read stands no more', () => {
    expect(told([notTaken('sleeve-outer', 'absent')])).toEqual([]);
    expect(told([read('sleeve-outer', 588, { stands: false })])).toEqual([]);
  });

  it('begin with the one that speaks for the point, and count each standing reading once', () => {
    const reading = fc.record({
      value: fc.integer({ min: 1, max: 2000 }),
      worn: fc.constantFrom(undefined, 'left' as const, 'right' as const),
      stands: fc.boolean(),
    });
    fc.assert(
      fc.property(fc.array(reading, { maxLength: 12 }), (made) => {
        const readings = made.map(({ value, worn, stands }, index) =>
          read('sleeve-outer', value, { round: index + 1, stands, ...(worn ? { worn } : {}) }),
        );
        const sides = valuesBySide(readings, 'sleeve-outer');
        const speaks = acceptedValue(readings, 'sleeve-outer');
        expect(sides[0]?.accepted).toEqual(speaks);
        expect(sides.flatMap(({ rounds }) => rounds)).toHaveLength(
          made.filter(({ stands }) => stands).length,
        );
      }),
    );
  });
});
