import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  add,
  compareLengths,
  fromMmString,
  isMmString,
  type Length,
  LengthError,
  lengthOf,
  mm,
  ratio,
  subtract,
  sumOf,
  times,
  toMmString,
} from './length.js';

const anyLength = fc.integer({ min: -1e12, max: 1e12 }).map(lengthOf);

describe('a length', () => {
  it('keeps every written place and drops trailing zeros', () => {
    expect(toMmString(mm('920.7500'))).toBe('920.75');
    expect(toMmString(mm('612'))).toBe('612');
    expect(toMmString(mm('0.0001'))).toBe('0.0001');
    expect(toMmString(mm('-12.5'))).toBe('-12.5');
    expect(mm(612)).toBe(mm('612'));
  });

  it('comes back from its text unchanged', () => {
    fc.assert(
      fc.property(anyLength, (length) => {
        expect(fromMmString(toMmString(length))).toBe(length);
      }),
    );
  });

  it('is refused when it could not be held exactly', () => {
    for (const text of ['1.58750001', '1e3', '', ' 612', '612mm', '0x10', 'Infinity', '9999999999999']) {
      expect(isMmString(text), text).toBe(false);
      expect(() => fromMmString(text), text).toThrow(LengthError);
    }
    expect(() => mm(1.5)).toThrow('expected whole millimetres, or decimals as text, got 1.5');
    expect(() => lengthOf(0.5)).toThrow(LengthError);
    expect(() => lengthOf(Number.NaN)).toThrow(LengthError);
  });

  it('refuses a sum that leaves the safe integers rather than losing a digit', () => {
    const greatest = lengthOf(Number.MAX_SAFE_INTEGER);
    expect(() => add(greatest, lengthOf(1))).toThrow(LengthError);
    expect(() => times(greatest, 2)).toThrow(LengthError);
    expect(() => times(mm(1), 0.5)).toThrow('a whole number of times');
  });

  it('has no negative zero, so that equal lengths are identical', () => {
    expect(Object.is(times(mm(0), -1), mm(0))).toBe(true);
    expect(Object.is(mm('-0'), mm('0'))).toBe(true);
  });

  it('adds in any order, and a subtraction undoes an addition', () => {
    fc.assert(
      fc.property(anyLength, anyLength, (first, second) => {
        expect(add(first, second)).toBe(add(second, first));
        expect(subtract(add(first, second), second)).toBe(first);
        expect(Math.sign(compareLengths(first, second))).toBe(Math.sign(subtract(first, second)));
      }),
    );
  });

  it('cannot be made by the way from a bare number', () => {
    // @ts-expect-error a number of anything is not a length
    const length: Length = 612;
    expect(length).toBe(612);
  });
});

describe('eight panels that each read 1 mm over', () => {
  // Panel sums grow ("Interpret and Display Historic Dress", on measuring in panels).
  it('put the round 8 mm over', () => {
    const panels = Array.from({ length: 8 }, () => mm(90));
    const read = panels.map((panel) => add(panel, mm(1)));
    expect(subtract(sumOf(read), sumOf(panels))).toBe(mm(8));
  });
});

describe('a ratio', () => {
  it('is a plain number, and refuses to divide by nothing', () => {
    expect(ratio(mm('3378.2'), mm('711.2'))).toBe(4.75);
    expect(() => ratio(mm(1), mm(0))).toThrow(LengthError);
  });
});
