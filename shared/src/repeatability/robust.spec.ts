import fc from 'fast-check';
import { median, medianAbsoluteDeviation as referenceMad } from 'simple-statistics';
import { describe, expect, it } from 'vitest';
import { FLAGGED_ABOVE, medianAbsoluteDeviation, medianOf, modifiedZ } from './robust.js';

// Determinations of copper in wholemeal flour, µg/g: `chem` of R's MASS, after Analytical Methods Committee (1989).
const copper = [
  ...[2.9, 3.1, 3.4, 3.4, 3.7, 3.7, 2.8, 2.5, 2.4, 2.4, 2.7, 2.2],
  ...[5.28, 3.37, 3.03, 3.03, 28.95, 3.77, 3.4, 2.2, 3.5, 3.6, 3.7, 3.7],
];

describe('middle and spread', () => {
  it('of copper in flour: median 3.385, MAD 0.355', () => {
    expect(medianOf(copper)).toBeCloseTo(3.385, 10);
    expect(medianAbsoluteDeviation(copper)).toBeCloseTo(0.355, 10);
    expect(1.4826 * (medianAbsoluteDeviation(copper) ?? 0)).toBeCloseTo(0.526323, 6);
  });

  it('agree with a library of statistics', () => {
    const figures = fc.array(fc.integer({ min: 0, max: 40_000 }), { minLength: 1, maxLength: 40 });
    fc.assert(
      fc.property(figures, (values) => {
        expect(medianOf(values)).toBe(median(values));
        expect(medianAbsoluteDeviation(values)).toBe(referenceMad(values));
      }),
    );
  });

  it('of nothing are nothing', () => {
    expect(medianOf([])).toBeNull();
    expect(medianAbsoluteDeviation([])).toBeNull();
  });
});

describe('the modified z', () => {
  it('flags exactly two determinations of copper', () => {
    expect(modifiedZ(28.95, copper)).toBeCloseTo(48.5735, 4);
    expect(modifiedZ(5.28, copper)).toBeCloseTo(3.6005, 4);
    const flagged = copper.filter((value) => Math.abs(modifiedZ(value, copper) ?? 0) > FLAGGED_ABOVE);
    expect(flagged).toEqual([5.28, 28.95]);
  });

  // Worked with the formula of Iglewicz & Hoaglin (1993): 0.6745 × 49.5 ÷ 1.5.
  it('of a waist of 661 among five about 611 is 22.258', () => {
    const waists = [610, 612, 611, 609, 613, 661];
    expect(medianOf(waists)).toBe(611.5);
    expect(medianAbsoluteDeviation(waists)).toBe(1.5);
    expect(modifiedZ(661, waists)).toBeCloseTo(22.258, 3);
  });

  it('says nothing where more than half are the same, and is never infinite', () => {
    const alike = [402, 402, 402, 402, 410];
    expect(medianAbsoluteDeviation(alike)).toBe(0);
    expect(modifiedZ(410, alike)).toBeNull();
    expect(modifiedZ(402, alike)).toBeNull();
    expect(modifiedZ(402, [])).toBeNull();
  });
});
