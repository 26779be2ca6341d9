import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { figureText, formatLength, type LengthUnit, lengthUnits } from './format-length.js';
import { fromInchSteps } from './fractions.js';
import { mm, times, toMmString } from './length.js';
import { fromTyped, type LengthProblemCode, lengthProblemSentence } from './parse-length.js';

function read(text: string, unit: LengthUnit): string {
  const result = fromTyped({ text, unit });
  if (!result.ok) throw new Error(`${text}: ${result.problem.code}`);
  return toMmString(result.value.length);
}

describe('what people type', () => {
  it.each([
    ['612', 'mm', '612'],
    [' 1 472 mm ', 'mm', '1472'],
    ['61,5', 'cm', '615'],
    ['61.50 cm', 'cm', '615'],
    ['.5', 'cm', '5'],
    ['24 3/8', 'in', '619.125'],
    ['24-3/8', 'in', '619.125'],
    ['24.375', 'in', '619.125'],
    ['24,375', 'in', '619.125'],
    ['24 3/8 in', 'in', '619.125'],
    ['24⅜"', 'in', '619.125'],
    ['3/8', 'in', '9.525'],
    ['24 1/16', 'in', '611.1875'],
    ['0', 'mm', '0'],
  ] as const)('"%s" in a field of %s is %s mm', (text, unit, expected) => {
    expect(read(text, unit)).toBe(expected);
  });

  // International yard and pound agreement of 1959: 1 in = 25.4 mm exactly.
  it('24 in is 609.6 mm and 36 1/4 in is 920.75 mm, exactly', () => {
    expect(read('24', 'in')).toBe('609.6');
    expect(read('36 1/4', 'in')).toBe('920.75');
  });

  it('lets the typed unit win over the field, and keeps the text as it came', () => {
    expect(fromTyped({ text: ' 24 3/8 in', unit: 'mm' })).toEqual({
      ok: true,
      value: { length: mm('619.125'), unit: 'in', typed: ' 24 3/8 in' },
    });
    expect(read('61.2 CM', 'mm')).toBe('612');
  });

  it.each([
    ['', 'mm', 'empty', 0],
    ['   ', 'in', 'empty', 3],
    ['12 ells', 'in', 'unknown-unit', 3],
    ['mm', 'mm', 'not-a-number', 0],
    ['612.', 'mm', 'not-a-number', 0],
    ['1.234,5', 'mm', 'not-a-number', 0],
    ['6 x 100', 'mm', 'not-a-number', 0],
    ['24 3/8', 'mm', 'not-a-number', 0],
    ['24.5 3/8', 'in', 'not-a-number', 0],
    ['1 2 3/8', 'in', 'not-a-number', 0],
    ['-5', 'mm', 'negative', 0],
    ['−5', 'in', 'negative', 0],
    ['24 9/8', 'in', 'improper-fraction', 0],
    ['24 3/0', 'in', 'zero-denominator', 0],
    ['1.00001', 'mm', 'too-fine', 0],
    ['24 1/3', 'in', 'too-fine', 0],
    ['24 1/32', 'in', 'too-fine', 0],
    ['1000000', 'mm', 'too-large', 0],
    ['1'.repeat(100_000), 'mm', 'too-long', 0],
  ] as const)('"%s" in a field of %s is refused: %s', (text, unit, code: LengthProblemCode, at) => {
    expect(fromTyped({ text, unit })).toMatchObject({ ok: false, problem: { code, at } });
  });

  it('says how to mend it', () => {
    const sentenceFor = (text: string, unit: LengthUnit): string => {
      const result = fromTyped({ text, unit });
      return result.ok ? 'kept' : lengthProblemSentence(result.problem);
    };
    expect(sentenceFor('', 'mm')).toBe('Enter a length.');
    expect(sentenceFor('12 ells', 'in')).toBe('“ells” is not a unit used here. Use mm, cm, in.');
    expect(sentenceFor('24 1/3', 'in')).toBe(
      '“24 1/3” cannot be kept: sixteenths of an inch at the finest is wanted.',
    );
  });

  it('never throws, whatever comes', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary' }), fc.constantFrom(...lengthUnits), (text, unit) => {
        expect(typeof fromTyped({ text, unit }).ok).toBe('boolean');
      }),
    );
  });

  it('reads back what is shown, where what is shown is exact', () => {
    const millimetres = fc.nat(99_999).map((count) => ({ length: mm(count), unit: 'mm' as const }));
    const tenths = fc.nat(99_999).map((count) => ({ length: mm(count), unit: 'cm' as const }));
    const sixteenths = fc
      .nat(60_000)
      .map((count) => ({ length: times(fromInchSteps(1, 16), count), unit: 'in' as const }));
    fc.assert(
      fc.property(fc.oneof(millimetres, tenths, sixteenths), fc.boolean(), ({ length, unit }, withUnit) => {
        const format = { denominator: 16 } as const;
        const text = withUnit ? formatLength(length, unit, format) : figureText(length, unit, format);
        expect(fromTyped({ text, unit })).toMatchObject({ ok: true, value: { length, unit } });
      }),
    );
  });
});
