import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  decimalText,
  figureText,
  formatBoth,
  formatDeservedInches,
  formatLength,
  inchText,
} from './format-length.js';
import { fromInchSteps, inchDenominators, toInchSteps } from './fractions.js';
import { lengthOf, mm, times } from './length.js';
import { divideHalfUp } from './rounding.js';

const inch = mm('25.4');
const anyLength = fc.integer({ min: -1e9, max: 1e9 }).map(lengthOf);
const anyStep = fc.constantFrom(...inchDenominators);

describe('lengths as they are shown', () => {
  it('are whole millimetres, centimetres with one place, inches in eighths', () => {
    expect(formatLength(mm('611.5'), 'mm')).toBe('612 mm');
    expect(formatLength(mm('612'), 'cm')).toBe('61.2 cm');
    expect(formatLength(mm('612'), 'in')).toBe('24 1/8 in');
    expect(formatLength(mm('309.5625'), 'in', { denominator: 16 })).toBe('12 3/16 in');
    expect(formatBoth(mm('612'))).toBe('612 mm (24 1/8 in)');
    expect(figureText(mm(4), 'cm')).toBe('0.4');
  });

  it('show a difference below zero as the mirror image of the one above', () => {
    expect(formatLength(mm('-50.5'), 'mm')).toBe('−51 mm');
    expect(formatLength(mm('-50.8'), 'in')).toBe('−2 in');
    fc.assert(
      fc.property(anyLength, anyStep, (length, step) => {
        expect(toInchSteps(times(length, -1), step)).toBe(0 - toInchSteps(length, step));
      }),
    );
  });

  // International yard and pound agreement of 1959; NBS Circular 572, addendum.
  it('24 in is 609.6 mm; 610 mm is 24 in at eighths and at sixteenths', () => {
    expect(times(inch, 24)).toBe(mm('609.6'));
    expect(inchText(mm(610), 8)).toBe('24');
    expect(inchText(mm(610), 16)).toBe('24');
    expect(formatLength(mm('920.75'), 'in')).toBe('36 1/4 in');
  });

  // Cataloging Cultural Objects §3.2.1: 198 × 233 × 82 cm; sixteenths computed from the exact inch.
  it('1980, 2330 and 820 mm at quarters and at sixteenths', () => {
    const sides = [mm(1980), mm(2330), mm(820)];
    expect(sides.map((side) => inchText(side, 4))).toEqual(['78', '91 3/4', '32 1/4']);
    expect(sides.map((side) => inchText(side, 16))).toEqual(['77 15/16', '91 3/4', '32 5/16']);
  });

  // W. D. F. Vincent, Cutters' Practical Guide, p. 4: 1.5 × (7 5/16 + 7 1/8) = 21 21/32 in.
  it('a tie between two sixteenths goes up', () => {
    // 550.06875 mm has five places, so the tie is tried on the rounding itself, in thirty-seconds of an inch.
    const thirtySeconds = BigInt(3 * (7 * 16 + 5 + (7 * 16 + 2)));
    expect((Number(thirtySeconds) * 25.4) / 32).toBeCloseTo(550.06875, 5);
    const sixteenths = Number(divideHalfUp(thirtySeconds, 2n));
    expect(inchText(fromInchSteps(sixteenths, 16), 16)).toBe('21 11/16');
  });

  // NIST SP 811 B.7.2: 36 ft = 10.9728 m, written 11.0 m at the digits it deserves.
  it('36 ft is 11.0 m', () => {
    expect(decimalText(times(inch, 36 * 12), 'm', 4)).toBe('10.9728');
    expect(decimalText(times(inch, 36 * 12), 'm', 1)).toBe('11.0');
  });

  // NIST LC 1137: 40.1 in = 1018.54 mm.
  it('40.1 in is 101.9 cm', () => {
    expect(formatLength(mm('1018.54'), 'cm')).toBe('101.9 cm');
  });

  // 1000 mm = 39.370079 in, from the exact inch.
  it('1000, 1 and 2 mm at each fineness', () => {
    expect(inchDenominators.map((step) => inchText(mm(1000), step))).toEqual([
      '39 3/8',
      '39 3/8',
      '39 1/4',
      '39 1/2',
      '39',
    ]);
    expect(inchText(mm(1), 8)).toBe('0');
    expect(inchText(mm(1), 16)).toBe('1/16');
    expect(inchText(mm(2), 8)).toBe('1/8');
  });

  it('are no finer in inches than their uncertainty deserves', () => {
    expect(formatDeservedInches(mm(611), 1, 16)).toBe('24 1/16 in');
    expect(formatDeservedInches(mm(611), 2.1, 16)).toBe('24 in');
    expect(formatDeservedInches(mm(615), 2.1, 16)).toBe('24 1/4 in');
    expect(formatDeservedInches(mm(615), 100)).toBe('24 in');
  });
});

describe('rounding', () => {
  it('changes nothing when done twice', () => {
    fc.assert(
      fc.property(anyLength, anyStep, (length, step) => {
        const once = toInchSteps(length, step);
        expect(toInchSteps(fromInchSteps(once, step), step)).toBe(once);
      }),
    );
  });

  it('keeps the order of lengths', () => {
    fc.assert(
      fc.property(anyLength, anyLength, anyStep, (first, second, step) => {
        const [shorter, longer] = first <= second ? [first, second] : [second, first];
        expect(toInchSteps(shorter, step)).toBeLessThanOrEqual(toInchSteps(longer, step));
      }),
    );
  });

  it('moves a length by half a step at most', () => {
    fc.assert(
      fc.property(anyLength, anyStep, (length, step) => {
        const shown = fromInchSteps(toInchSteps(length, step), step);
        expect(Math.abs(shown - length) * 2).toBeLessThanOrEqual(254_000 / step);
      }),
    );
  });
});
