import { describe, expect, it } from 'vitest';
import { mm } from '../units/length.js';
import { tapeJoins, tapeLengthsTotal, wholeValue } from './whole-value.js';

describe('tape lengths', () => {
  it('are whole tapes and a rest: 3 × 1500 mm + 742 mm is 5242 mm with three joins', () => {
    const hem = { count: 3, tape: mm(1500), rest: mm(742) };
    expect(tapeLengthsTotal(hem)).toBe(mm(5242));
    expect(tapeJoins(hem)).toBe(3);
  });

  it('have one join fewer when nothing is left over, and none for a single tape', () => {
    expect(tapeJoins({ count: 3, tape: mm(1500), rest: mm(0) })).toBe(2);
    expect(tapeJoins({ count: 1, tape: mm(1500), rest: mm(0) })).toBe(0);
    expect(tapeJoins({ count: 0, tape: mm(1500), rest: mm(742) })).toBe(0);
  });

  it('are never more joins than a garment could take, whatever the count', () => {
    expect(tapeJoins({ count: 1e15, tape: mm(1500), rest: mm(1) })).toBe(100);
    expect(tapeJoins({ count: -3, tape: mm(1500), rest: mm(1) })).toBe(0);
    expect(tapeJoins({ count: Number.NaN, tape: mm(1500), rest: mm(1) })).toBe(0);
  });
});

describe('the whole value', () => {
  it('doubles a half, and only a half', () => {
    expect(wholeValue({ read: mm(145), how: 'flat-doubled' })).toBe(mm(290));
    expect(wholeValue({ read: mm(145), how: 'straight' })).toBe(mm(145));
  });

  it('takes the zero of the tape off each time the tape was laid', () => {
    expect(wholeValue({ read: mm(615), how: 'round', tapeZero: mm(3) })).toBe(mm(612));
    expect(wholeValue({ read: mm(148), how: 'flat-doubled', tapeZero: mm(3) })).toBe(mm(290));
    const hem = { read: mm(742), how: 'curve', tapeCount: 3, tapeLength: mm(1500), tapeZero: mm(3) } as const;
    expect(wholeValue(hem)).toBe(mm(5230));
    expect(wholeValue({ ...hem, read: mm(0) })).toBe(mm(4491));
  });

  it('takes off the gap that the tape crossed', () => {
    expect(wholeValue({ read: mm(640), how: 'round', gap: mm(28) })).toBe(mm(612));
  });
});
